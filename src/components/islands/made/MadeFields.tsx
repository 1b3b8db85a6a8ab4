import { useController, useFormContext, useWatch } from 'react-hook-form';
import type { Motif } from '../../../lib/motifs/motif';
import { FABRIC_UNIT, YARN_UNIT, type Units } from '../../../lib/units/display';
import { KEPT_LIMITS } from '../../../schemas/limits';
import { isBeyond, type MadeMotifForm } from '../../../schemas/madeMotifForm';
import { acrossWord } from '../../motifs/motifWords';
import { Checkbox } from '../../ui/Checkbox';
import { Field, TextArea } from '../../ui/Field';
import { Select } from '../../ui/Select';
import { NumberInput } from '../form/NumberInput';

interface MadeFieldsProps {
  motif: Motif;
  units: Units;
}

/** What was worked, what the tape read after each round, and what the scale did. */
export function MadeFields({ motif, units }: MadeFieldsProps) {
  const { control, register, formState } = useFormContext<MadeMotifForm>();
  const errors = formState.errors.made;
  const blocked = useController({ control, name: 'made.blocked' });
  return (
    <>
      <div className="grid grid-cols-6 gap-x-2.5 gap-y-3">
        <Field
          className="col-span-3"
          label="Made on"
          id="made.madeOn"
          type="date"
          error={errors?.madeOn?.message}
          {...register('made.madeOn')}
        />
        <NumberInput
          className="col-span-3"
          control={control}
          name="made.rounds"
          label="Rounds worked"
          whole
        />
        <Checkbox
          className="col-span-6"
          label="blocked before it was measured"
          checked={blocked.field.value}
          onChange={(event) => blocked.field.onChange(event.target.checked)}
        />
      </div>
      <SizeFields motif={motif} units={units} />
      <WeightFields units={units} />
      <TextArea
        label="Notes"
        id="made.notes"
        rows={2}
        maxLength={KEPT_LIMITS.notesLength}
        error={errors?.notes?.message}
        {...register('made.notes')}
      />
    </>
  );
}

function SizeFields({ motif, units }: MadeFieldsProps) {
  const { control, formState } = useFormContext<MadeMotifForm>();
  const [rounds, sizes] = useWatch({ control, name: ['made.rounds', 'made.sizes'] });
  const { word, mm } = FABRIC_UNIT[units];
  const wrong = formState.errors.made?.sizes;
  const error = wrong?.root?.message ?? wrong?.message;
  return (
    <fieldset id="made.sizes" tabIndex={-1} aria-describedby={error && 'made.sizes-error'}>
      <legend className="mb-1 font-bold">
        The tape
        <span className="font-normal text-ink-2">
          , {acrossWord(motif.sides)}, after each round you measured
        </span>
      </legend>
      <div className="grid grid-cols-[repeat(auto-fill,minmax(5.25rem,1fr))] gap-2.5">
        {sizes.map(
          ({ round }, i) =>
            !isBeyond(round, rounds) && (
              <NumberInput
                key={round}
                control={control}
                name={`made.sizes.${i}.acrossMm`}
                label={motif.rounds[round - 1]?.label ?? `round ${round}`}
                unit={word}
                factor={mm}
                step={units === 'metric' ? 0.1 : 0.125}
              />
            ),
        )}
      </div>
      {error && (
        <p id="made.sizes-error" className="mt-1 text-sm text-madder">
          {error}
        </p>
      )}
    </fieldset>
  );
}

/** Steps that scales have, in g. */
const SCALE_STEPS_G = [0.01, 0.1, 0.2, 0.5, 1, 2, 5] as const;

function WeightFields({ units }: Pick<MadeFieldsProps, 'units'>) {
  const { control } = useFormContext<MadeMotifForm>();
  const { field, fieldState } = useController({ control, name: 'made.weighed.resolutionG' });
  const steps = [...new Set<number>([...SCALE_STEPS_G, field.value])].sort((a, b) => a - b);
  const { word, m } = YARN_UNIT[units];
  return (
    <fieldset>
      <legend className="mb-1 font-bold">
        The scale<span className="font-normal text-ink-2">, if you weighed them</span>
      </legend>
      <div className="grid grid-cols-6 gap-x-2.5 gap-y-3">
        <NumberInput
          className="col-span-2"
          control={control}
          name="made.weighed.count"
          label="Motifs together"
          whole
        />
        <NumberInput
          className="col-span-2"
          control={control}
          name="made.weighed.massG"
          label="weigh"
          unit="g"
        />
        <Select
          className="col-span-2"
          label="Scale reads"
          id={field.name}
          value={String(field.value)}
          onChange={(event) => field.onChange(Number(event.target.value))}
          onBlur={field.onBlur}
          error={fieldState.error?.message}
          options={steps.map((each) => ({ value: String(each), word: `to ${each} g` }))}
        />
        <NumberInput
          className="col-span-2"
          control={control}
          name="made.putUp.massG"
          label="A skein of"
          unit="g"
        />
        <NumberInput
          className="col-span-2"
          control={control}
          name="made.putUp.lengthM"
          label="holds"
          unit={word}
          factor={m}
        />
        <NumberInput
          className="col-span-2"
          control={control}
          name="made.weighed.yarns"
          label="Yarns attached"
          whole
        />
        <p className="col-span-6 -mt-1.5 text-sm text-ink-2">
          Of several motifs the differences average out: four tell more than one. Each yarn attached
          to a motif leaves two tails in it.
        </p>
      </div>
    </fieldset>
  );
}
