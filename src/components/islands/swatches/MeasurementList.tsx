import { Plus, Ruler, Scale, Spool, Trash2, type LucideIcon } from 'lucide-react';
import { useFieldArray, type UseFormReturn } from 'react-hook-form';
import type { Units } from '../../../lib/units/display';
import { KEPT_LIMITS } from '../../../schemas/limits';
import type { Measurement, SwatchInput } from '../../../schemas/swatch';
import { Button } from '../../ui/Button';
import { LengthFields, SizeFields, WeightFields } from './MeasurementFields';
import { blankMeasurement } from './swatchForm';

interface MeasurementListProps {
  form: UseFormReturn<SwatchInput>;
  units: Units;
  today: string;
}

type Kind = Measurement['kind'];

const kinds: Record<Kind, { word: string; add: string; icon: LucideIcon }> = {
  size: { word: 'Size', add: 'Size', icon: Ruler },
  weight: { word: 'Weight', add: 'Weight', icon: Scale },
  length: { word: 'Unravelled', add: 'Unravelled length', icon: Spool },
};

/** Any number of measurements, of three kinds, in the order they were taken. */
export function MeasurementList({ form, units, today }: MeasurementListProps) {
  const { control, formState } = form;
  const { fields, append, remove } = useFieldArray({ control, name: 'measurements' });
  const error = formState.errors.measurements?.root ?? formState.errors.measurements;
  return (
    <fieldset id="measurements" tabIndex={-1} className="border-t border-line pt-4">
      <legend className="float-start w-full font-bold">Measured</legend>
      <div className="clear-both">
        {fields.length === 0 && (
          <p className="pt-2 text-ink-2">
            Nothing yet. A size gives the gauge; a weight or an unravelled length tells how much
            yarn you pull into a loop.
          </p>
        )}
        <ol className="divide-y divide-line">
          {fields.map(({ id, kind }, index) => (
            <MeasurementItem
              key={id}
              {...{ form, units, kind, index }}
              onRemove={() => remove(index)}
            />
          ))}
        </ol>
        {typeof error?.message === 'string' && <p className="text-madder">{error.message}</p>}
        {fields.length < KEPT_LIMITS.measurementsPerSwatch && (
          <div className="-ms-2 flex flex-wrap pt-2">
            {(Object.keys(kinds) as Kind[]).map((kind) => (
              <Button
                key={kind}
                kind="quiet"
                icon={Plus}
                onClick={() => append(blankMeasurement(kind, today), { shouldFocus: false })}
              >
                {kinds[kind].add}
              </Button>
            ))}
          </div>
        )}
      </div>
    </fieldset>
  );
}

interface MeasurementItemProps {
  form: UseFormReturn<SwatchInput>;
  units: Units;
  kind: Kind;
  index: number;
  onRemove: () => void;
}

function MeasurementItem({ form, units, kind, index, onRemove }: MeasurementItemProps) {
  const { word, icon: Icon } = kinds[kind];
  const { control, register, formState } = form;
  const name = `measurements.${index}.measuredOn` as const;
  const dateError = formState.errors.measurements?.[index]?.measuredOn?.message;
  return (
    <li className="grid grid-cols-6 gap-x-2.5 gap-y-2 py-3">
      <div className="col-span-6 flex items-center gap-2">
        <p className="flex flex-1 items-center gap-1.5 font-bold">
          <Icon size={16} aria-hidden className="text-ink-2" />
          {word}
        </p>
        <input
          type="date"
          id={name}
          aria-label={`${word}, measured on`}
          aria-invalid={dateError ? true : undefined}
          aria-describedby={dateError && `${name}-error`}
          className="min-h-8 rounded-control bg-transparent text-sm text-ink-2 coarse:min-h-11"
          {...register(name)}
        />
        <Button
          kind="quiet"
          small
          icon={Trash2}
          className="-me-2"
          aria-label={`Remove measurement ${index + 1}: ${word}`}
          onClick={onRemove}
        >
          Remove
        </Button>
      </div>
      {dateError && (
        <p id={`${name}-error`} className="col-span-6 text-sm text-madder">
          {dateError}
        </p>
      )}
      {kind === 'size' && <SizeFields {...{ control, units, index }} />}
      {kind === 'weight' && <WeightFields {...{ control, index }} />}
      {kind === 'length' && <LengthFields {...{ control, units, index }} />}
    </li>
  );
}
