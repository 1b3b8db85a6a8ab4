import { useController, type Control } from 'react-hook-form';
import { FABRIC_UNIT, YARN_UNIT, type Units } from '../../../lib/units/display';
import type { SwatchInput } from '../../../schemas/swatch';
import { Checkbox } from '../../ui/Checkbox';
import { Select } from '../../ui/Select';
import { NumberInput } from '../form/NumberInput';

interface KindFieldsProps {
  control: Control<SwatchInput>;
  index: number;
}

export function SizeFields({ control, index, units }: KindFieldsProps & { units: Units }) {
  const { word, mm } = FABRIC_UNIT[units];
  const step = units === 'metric' ? 0.1 : 0.125;
  const blocked = useController({ control, name: `measurements.${index}.blocked` });
  const shared = { control, unit: word, factor: mm, step, className: 'col-span-2' };
  return (
    <>
      <NumberInput {...shared} name={`measurements.${index}.widthMm`} label="across" />
      <NumberInput {...shared} name={`measurements.${index}.heightMm`} label="tall" />
      <Checkbox
        className="col-span-2 self-end pb-2.5 coarse:pb-0"
        label="blocked"
        checked={blocked.field.value === true}
        onChange={(event) => blocked.field.onChange(event.target.checked)}
      />
    </>
  );
}

/** Steps that scales have, in g. */
const SCALE_STEPS_G = [0.01, 0.1, 0.2, 0.5, 1, 2, 5] as const;

export function WeightFields({ control, index }: KindFieldsProps) {
  const { field, fieldState } = useController({
    control,
    name: `measurements.${index}.resolutionG`,
  });
  const step = field.value as number;
  const steps = [...new Set<number>([...SCALE_STEPS_G, step])].sort((a, b) => a - b);
  return (
    <>
      <NumberInput
        className="col-span-3"
        control={control}
        name={`measurements.${index}.massG`}
        label="weighs"
        unit="g"
      />
      <Select
        className="col-span-3"
        label="scale reads"
        id={field.name}
        value={String(step)}
        onChange={(event) => field.onChange(Number(event.target.value))}
        onBlur={field.onBlur}
        error={fieldState.error?.message}
        options={steps.map((each) => ({ value: String(each), word: `to ${each} g` }))}
      />
    </>
  );
}

export function LengthFields({ control, index, units }: KindFieldsProps & { units: Units }) {
  const { word, m } = YARN_UNIT[units];
  const shared = { control, unit: word, factor: m, className: 'col-span-3' };
  return (
    <>
      <NumberInput {...shared} name={`measurements.${index}.lengthM`} label="unravels to" />
      <NumberInput
        {...shared}
        name={`measurements.${index}.errorM`}
        label="give or take"
        step={0.1}
      />
    </>
  );
}
