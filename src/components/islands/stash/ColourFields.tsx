import { useFormContext, useWatch } from 'react-hook-form';
import type { WeightCategory } from '../../../lib/plan/plan';
import type { ColourForm } from '../../../schemas/stashEntry';
import { Field } from '../../ui/Field';
import { WoundCard } from '../../ui/WoundCard';
import { HexInput } from '../form/HexInput';

const HEX = /^#[0-9a-f]{6}$/i;

/** A colour of a yarn: its name, and how to draw it. */
export function ColourFields({ weight }: { weight: WeightCategory }) {
  const { control, register, formState } = useFormContext<ColourForm>();
  const hex = useWatch({ control, name: 'colour.hex' });
  return (
    <div className="grid grid-cols-[1fr_9rem_auto] items-start gap-x-2.5">
      <Field
        label="Colour name"
        id="colour.name"
        autoComplete="off"
        error={formState.errors.colour?.name?.message}
        {...register('colour.name')}
      />
      <HexInput name="colour.hex" label="Drawn as" />
      <WoundCard
        className="mt-1.5 self-center"
        colour={HEX.test(hex) ? hex : '#888888'}
        weight={weight}
      />
    </div>
  );
}
