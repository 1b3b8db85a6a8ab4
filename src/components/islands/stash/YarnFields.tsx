import { useFormContext } from 'react-hook-form';
import { YARN_UNIT, type Units } from '../../../lib/units/display';
import type { YarnForm } from '../../../schemas/stashEntry';
import type { Money } from '../../../schemas/yarn';
import type { Terms } from '../../planner/stitchWord';
import { Field } from '../../ui/Field';
import { Select } from '../../ui/Select';
import { weightOptions } from '../../yarnWeights';
import { NumberInput } from '../form/NumberInput';
import { PriceInput } from '../form/PriceInput';

interface YarnFieldsProps {
  units: Units;
  terms: Terms;
  currency: Money['currency'];
}

/** A yarn as its band tells it. */
export function YarnFields({ units, terms, currency }: YarnFieldsProps) {
  const { control, register, formState } = useFormContext<YarnForm>();
  const errors = formState.errors.yarn;
  const { word, m } = YARN_UNIT[units];
  return (
    <div className="grid grid-cols-6 gap-x-2.5 gap-y-3">
      <Field
        className="col-span-3"
        label="Yarn name"
        id="yarn.name"
        autoComplete="off"
        error={errors?.name?.message}
        {...register('yarn.name')}
      />
      <Field
        className="col-span-3"
        label="Maker"
        id="yarn.maker"
        autoComplete="off"
        error={errors?.maker?.message}
        {...register('yarn.maker')}
      />
      <Select
        className="col-span-6"
        label="Weight"
        id="yarn.weightCategory"
        error={errors?.weightCategory?.message}
        options={weightOptions(terms)}
        {...register('yarn.weightCategory', { setValueAs: Number })}
      />
      <NumberInput
        className="col-span-2"
        control={control}
        name="yarn.putUp.massG"
        label="Skein"
        unit="g"
        step={5}
      />
      <NumberInput
        className="col-span-2"
        control={control}
        name="yarn.putUp.lengthM"
        label="holds"
        unit={word}
        factor={m}
        step={5}
      />
      <PriceInput className="col-span-2" name="yarn.price" label="costs" currency={currency} />
      <Field
        className="col-span-6"
        label="Fibre"
        id="yarn.fibre"
        autoComplete="off"
        error={errors?.fibre?.message}
        {...register('yarn.fibre')}
      />
    </div>
  );
}
