import { Plus, X } from 'lucide-react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { partLengthM, type SkeinSize } from '../../../lib/stash/lotYarn';
import { showYarn, type Units } from '../../../lib/units/display';
import { KEPT_LIMITS } from '../../../schemas/limits';
import type { LotForm } from '../../../schemas/stashEntry';
import { Button } from '../../ui/Button';
import { NumberInput } from '../form/NumberInput';

interface PartSkeinListProps {
  skein: SkeinSize | null;
  units: Units;
}

/** Part skeins by weight, each with the length that its weight stands for. */
export function PartSkeinList({ skein, units }: PartSkeinListProps) {
  const { control } = useFormContext<LotForm>();
  const { fields, append, remove } = useFieldArray({ control, name: 'lot.partSkeins' });
  const parts = useWatch({ control, name: 'lot.partSkeins' });
  return (
    <fieldset id="lot.partSkeins" tabIndex={-1} className="col-span-6">
      <legend className="label">Part skeins, weighed without their bands</legend>
      <ul className="mt-1 grid gap-2">
        {fields.map(({ id }, index) => {
          const massG = parts[index]?.massG ?? 0;
          return (
            <li key={id} className="grid grid-cols-6 items-start gap-2.5">
              <NumberInput
                className="col-span-3"
                control={control}
                name={`lot.partSkeins.${index}.massG`}
                label={`Part skein ${index + 1}`}
                labelHidden
                unit="g"
              />
              <span className="figures col-span-1 flex min-h-10 items-center justify-end whitespace-nowrap text-ink-2 coarse:min-h-11">
                {skein && massG > 0 && showYarn(partLengthM(massG, skein), units)}
              </span>
              <span className="col-span-2 text-end">
                <Button
                  kind="quiet"
                  icon={X}
                  aria-label={`Remove part skein ${index + 1}`}
                  onClick={() => remove(index)}
                >
                  Remove
                </Button>
              </span>
            </li>
          );
        })}
      </ul>
      {fields.length < KEPT_LIMITS.partSkeinsPerLot && (
        <Button
          kind="quiet"
          icon={Plus}
          className="-ms-2"
          onClick={() =>
            append(
              { massG: null as unknown as number },
              { focusName: `lot.partSkeins.${fields.length}.massG` },
            )
          }
        >
          Part skein
        </Button>
      )}
    </fieldset>
  );
}
