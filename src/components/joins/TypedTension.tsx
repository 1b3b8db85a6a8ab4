import { Plus } from 'lucide-react';
import { useState } from 'react';
import { stitch } from '../../lib/stitches/stitchTable';
import type { Units } from '../../lib/units/display';
import { widthMm } from '../../lib/units/quantities';
import { PLAN_LIMITS } from '../../schemas/limits';
import { FabricField } from '../planner/QuantityFields';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { NumberField } from '../ui/NumberField';
import type { Tension } from './tension';

interface TypedTensionProps {
  units: Units;
  taken: readonly string[];
  onAdd: (tension: Tension) => void;
}

/** A person's gauge by stitches across a width; rows are taken to be as tall as usual. */
export function TypedTension({ units, taken, onAdd }: TypedTensionProps) {
  const [name, setName] = useState('');
  const [stitches, setStitches] = useState<number | null>(20);
  const [overMm, setOverMm] = useState<number | null>(150);
  const [tried, setTried] = useState(false);
  const error =
    name.trim() === ''
      ? 'Say whose tension it is'
      : taken.includes(name.trim())
        ? `${name.trim()} is there already`
        : undefined;

  function add() {
    setTried(true);
    if (error || stitches === null || overMm === null) return;
    const heightMm = overMm * (stitch('sc')?.heightOverWidth ?? 1);
    onAdd({
      id: `typed ${name.trim()}`,
      name: name.trim(),
      swatch: {
        stitch: 'sc',
        stitches,
        rows: stitches,
        widthMm: widthMm(overMm),
        heightMm: widthMm(heightMm),
      },
    });
    setName('');
    setTried(false);
  }

  return (
    <div className="grid items-start gap-3 sm:grid-cols-[12rem_8rem_8rem_auto]">
      <Field
        label="Another person"
        value={name}
        maxLength={40}
        onChange={({ target }) => setName(target.value)}
        error={tried ? error : undefined}
      />
      <NumberField
        label="Stitches"
        whole
        min={1}
        max={PLAN_LIMITS.swatchStitches}
        value={stitches}
        onCommit={(reading) => setStitches(reading.ok ? reading.value : null)}
      />
      <FabricField
        label="measure across"
        units={units}
        maxMm={PLAN_LIMITS.swatchSizeMm}
        valueMm={overMm}
        onChange={setOverMm}
      />
      <Button className="justify-self-start sm:mt-[1.375rem]" icon={Plus} onClick={add}>
        Add
      </Button>
    </div>
  );
}
