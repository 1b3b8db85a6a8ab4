import { useState } from 'react';
import { PLAN_LIMITS } from '../../schemas/limits';
import type { MakingWeighingInput } from '../../schemas/making';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { NumberField } from '../ui/NumberField';

interface WeighDialogProps {
  colour: string;
  name: string;
  /** What the plan says was begun with; asked for once, with the first weighing. */
  begunG: number | null;
  /** What has been worked in the colour by now. */
  worked: Pick<MakingWeighingInput, 'made' | 'tails'>;
  onWeigh: (weighings: Omit<MakingWeighingInput, 'at'>[]) => void;
  onClose: () => void;
}

/** What is left of a colour, on the scale: it tells how much this maker really uses. */
export function WeighDialog(props: WeighDialogProps) {
  const { colour, name, begunG, worked, onWeigh, onClose } = props;
  const [leftG, setLeftG] = useState<number | null>(null);
  const [startG, setStartG] = useState(begunG);
  const tooMuch = leftG !== null && startG !== null && leftG > startG;
  const weighing = { colour, resolutionG: 1, gone: false };

  function save() {
    if (leftG === null || tooMuch) return;
    const left = { ...weighing, ...worked, id: crypto.randomUUID(), leftG };
    const begun = { ...weighing, made: {}, tails: 0, id: crypto.randomUUID() };
    onWeigh(startG === null ? [left] : [{ ...begun, leftG: startG }, left]);
    onClose();
  }

  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Weigh what is left of ${name}`}
      description="All of it, the ball in work too. Weigh when the motif before is finished."
      actions={
        <>
          <Button kind="primary" disabled={leftG === null || tooMuch} onClick={save}>
            Take the weight
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </>
      }
    >
      <div className="grid grid-cols-2 gap-3">
        <NumberField
          label="Left now"
          unit="g"
          min={0}
          max={PLAN_LIMITS.pieceMassG}
          value={leftG}
          error={tooMuch ? 'More than was begun with' : undefined}
          onCommit={(reading) => setLeftG(reading.ok ? reading.value : null)}
        />
        {begunG !== null && (
          <NumberField
            label="Begun with"
            unit="g"
            optional
            min={1}
            max={PLAN_LIMITS.pieceMassG}
            value={startG}
            hint="Empty if you do not know"
            onCommit={(reading) => reading.ok && setStartG(reading.value)}
          />
        )}
      </div>
    </Dialog>
  );
}
