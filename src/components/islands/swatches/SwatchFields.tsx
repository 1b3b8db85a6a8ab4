import type { UseFormReturn } from 'react-hook-form';
import { BASIC_STITCHES, stitch } from '../../../lib/stitches/stitchTable';
import type { SwatchInput } from '../../../schemas/swatch';
import { stitchWord, type Terms } from '../../planner/stitchWord';
import { Field } from '../../ui/Field';
import { Select } from '../../ui/Select';
import { NumberInput } from '../form/NumberInput';
import type { YarnChoice } from '../../../lib/swatches/swatchRecord';

interface SwatchFieldsProps {
  form: UseFormReturn<SwatchInput>;
  yarns: readonly YarnChoice[];
  terms: Terms;
}

/** What the swatch is: its name, yarn, stitch, counts and hook. */
export function SwatchFields({ form, yarns, terms }: SwatchFieldsProps) {
  const { control, register, formState, getValues } = form;
  const { errors } = formState;
  return (
    <div className="grid grid-cols-6 gap-x-2.5 gap-y-3">
      <Field
        className="col-span-6"
        label="Name"
        id="name"
        hint="What you will know it by: the stitch, the yarn and the hook"
        autoComplete="off"
        error={errors.name?.message}
        {...register('name')}
      />
      <Select
        className="col-span-6"
        label="Yarn"
        id="yarnId"
        hint={yarns.length === 0 ? <AddYarn /> : undefined}
        error={errors.yarnId?.message}
        options={[
          { value: '', word: 'not one of mine' },
          ...yarns.map(({ id, name }) => ({ value: id, word: name })),
        ]}
        {...register('yarnId', { setValueAs: (id: string | null) => id || null })}
      />
      <Select
        className="col-span-4"
        label="Worked in"
        id="stitch"
        error={errors.stitch?.message}
        options={stitchOptions(getValues('stitch'), terms)}
        {...register('stitch')}
      />
      <NumberInput
        className="col-span-2"
        control={control}
        name="hookMm"
        label="Hook"
        unit="mm"
        step={0.5}
      />
      <NumberInput
        className="col-span-3"
        control={control}
        name="stitches"
        label="Stitches"
        whole
      />
      <NumberInput className="col-span-3" control={control} name="rows" label="Rows" whole />
    </div>
  );
}

function AddYarn() {
  return (
    <>
      Yarns come from{' '}
      <a className="link font-normal" href="/stash">
        your stash
      </a>
      . A weight in grams needs one: its skein says how many metres a gram is.
    </>
  );
}

/** The stitches of the table that make a fabric, and the swatch's own if it is another. */
function stitchOptions(current: string, terms: Terms) {
  const fabric = BASIC_STITCHES.filter(({ code }) => code !== 'ch' && code !== 'sl st');
  const own = stitch(current);
  const all = own && !fabric.some(({ code }) => code === current) ? [own, ...fabric] : fabric;
  return all.map((each) => ({
    value: each.code,
    word: `${stitchWord(each, terms)}, ${terms === 'us' ? each.us : each.uk}`,
  }));
}
