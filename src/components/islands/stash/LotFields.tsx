import { useFormContext, useWatch } from 'react-hook-form';
import { lotYarn, type SkeinSize } from '../../../lib/stash/lotYarn';
import { showMass, showYarn, type Units } from '../../../lib/units/display';
import type { LotForm } from '../../../schemas/stashEntry';
import type { Money } from '../../../schemas/yarn';
import { Field } from '../../ui/Field';
import { NumberInput } from '../form/NumberInput';
import { PriceInput } from '../form/PriceInput';
import { PartSkeinList } from './PartSkeinList';
import { amountWords } from './stashWords';

interface LotFieldsProps {
  /** Of the yarn chosen or typed; null until that can be read. */
  skein: SkeinSize | null;
  units: Units;
  currency: Money['currency'];
}

/** What there is of one dye lot, where it lies, and what was paid. */
export function LotFields({ skein, units, currency }: LotFieldsProps) {
  const { control, register, formState } = useFormContext<LotForm>();
  const errors = formState.errors.lot;
  return (
    <div className="grid grid-cols-6 gap-x-2.5 gap-y-3">
      <Field
        className="col-span-3"
        label="Dye lot"
        id="lot.lotCode"
        hint="From the band, if there is one"
        autoComplete="off"
        error={errors?.lotCode?.message}
        {...register('lot.lotCode')}
      />
      <NumberInput
        className="col-span-3"
        control={control}
        name="lot.wholeSkeins"
        label="Whole skeins"
        whole
      />
      <PartSkeinList skein={skein} units={units} />
      <LotTotal skein={skein} units={units} />
      <Field
        className="col-span-3"
        label="Place"
        id="lot.location"
        autoComplete="off"
        error={errors?.location?.message}
        {...register('lot.location')}
      />
      <PriceInput
        className="col-span-3"
        name="lot.pricePaid"
        label="Paid for a skein"
        currency={currency}
      />
    </div>
  );
}

function LotTotal({ skein, units }: Omit<LotFieldsProps, 'currency'>) {
  const { control } = useFormContext<LotForm>();
  const lot = useWatch({ control, name: 'lot' });
  const weighed = lot.partSkeins.filter(({ massG }) => massG > 0);
  const amounts = { wholeSkeins: lot.wholeSkeins || 0, partSkeins: weighed };
  const total = skein && lotYarn(amounts, skein);
  return (
    <p role="status" className="col-span-6 rounded-control bg-sunk px-3 py-2">
      {amountWords(amounts)}
      {total ? (
        <>
          {': '}
          <b className="tabular-nums">{showYarn(total.lengthM, units)}</b>,{' '}
          {showMass(total.massG, units)}
        </>
      ) : (
        <span className="text-ink-2">: metres once the skein’s grams and metres are known</span>
      )}
    </p>
  );
}
