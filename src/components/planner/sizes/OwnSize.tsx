import { Plus } from 'lucide-react';
import { useState } from 'react';
import type { BlanketSize } from '../../../lib/sizes/blanketSizes';
import type { Units } from '../../../lib/units/display';
import { PLAN_LIMITS } from '../../../schemas/limits';
import { Button } from '../../ui/Button';
import { Field } from '../../ui/Field';
import { FabricField } from '../QuantityFields';

interface OwnSizeProps {
  units: Units;
  taken: readonly string[];
  onAdd: (size: BlanketSize) => void;
}

/** A size of one's own, by name, width and height. */
export function OwnSize({ units, taken, onAdd }: OwnSizeProps) {
  const [name, setName] = useState('');
  const [width, setWidth] = useState<number | null>(1000);
  const [height, setHeight] = useState<number | null>(1200);
  const [tried, setTried] = useState(false);
  const called = name.trim();
  const error =
    called === ''
      ? 'Give the size a name'
      : taken.includes(called)
        ? `There is a size called ${called}`
        : undefined;

  function add() {
    setTried(true);
    if (error || width === null || height === null) return;
    onAdd({ key: `own ${called}`, name: called, widthMm: width, heightMm: height });
    setName('');
    setTried(false);
  }

  return (
    <div className="not-printed grid items-start gap-3 sm:grid-cols-[12rem_8rem_8rem_auto]">
      <Field
        label="A size of your own"
        value={name}
        maxLength={40}
        onChange={({ target }) => setName(target.value)}
        error={tried ? error : undefined}
      />
      <FabricField
        label="Width"
        units={units}
        maxMm={PLAN_LIMITS.targetSizeMm}
        valueMm={width}
        onChange={setWidth}
      />
      <FabricField
        label="height"
        units={units}
        maxMm={PLAN_LIMITS.targetSizeMm}
        valueMm={height}
        onChange={setHeight}
      />
      <Button className="justify-self-start sm:mt-[1.375rem]" icon={Plus} onClick={add}>
        Add
      </Button>
    </div>
  );
}
