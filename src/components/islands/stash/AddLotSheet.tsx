import { FormProvider, useWatch, type UseFormReturn } from 'react-hook-form';
import type { Units } from '../../../lib/units/display';
import type { StashEntry } from '../../../schemas/stashEntry';
import { skeinLengthM, skeinMassG, type Money, type PresentedYarn } from '../../../schemas/yarn';
import type { Terms } from '../../planner/stitchWord';
import { Button } from '../../ui/Button';
import { Sheet } from '../../ui/Dialog';
import { ErrorSummary } from '../../ui/ErrorSummary';
import { Notice } from '../../ui/Notice';
import { Select } from '../../ui/Select';
import { listErrors } from '../form/formErrors';
import { useDiscardGuard } from '../form/useDiscardGuard';
import { ColourFields } from './ColourFields';
import { LotFields } from './LotFields';
import { BLANK_COLOUR, BLANK_YARN } from './stashForm';
import { useStashEntry } from './useStashEntry';
import { YarnFields } from './YarnFields';

interface AddLotSheetProps {
  yarns: readonly PresentedYarn[];
  initial: StashEntry;
  units: Units;
  terms: Terms;
  currency: Money['currency'];
  onChange: () => void;
  onClose: () => void;
}

/** Yarn, colour and lot in one form; what is there already is chosen, what is not is typed. */
export function AddLotSheet(props: AddLotSheetProps) {
  const { yarns, initial, units, terms, currency, onChange, onClose } = props;
  const { form, failure, isSaving, submit } = useStashEntry({
    initial,
    onSaved: onClose,
    onChange,
  });
  const entry = useWatch({ control: form.control }) as StashEntry;
  const { errors, submitCount, isDirty } = form.formState;
  const { requestClose, question } = useDiscardGuard(isDirty, onClose);
  const yarn = entry.yarn ?? yarns.find(({ id }) => id === entry.yarnId);
  return (
    <Sheet
      open
      onOpenChange={(open) => !open && requestClose()}
      title="Add yarn to the stash"
      actions={
        <>
          <Button kind="primary" type="submit" form="add-lot" busy={isSaving && 'Saving…'}>
            Add to the stash
          </Button>
          <Button onClick={requestClose}>Cancel</Button>
        </>
      }
    >
      <FormProvider {...form}>
        <form id="add-lot" noValidate onSubmit={submit} className="grid gap-5 pb-4">
          {failure && (
            <Notice kind="problem" live>
              {failure}
            </Notice>
          )}
          <ErrorSummary errors={listErrors(errors)} attempt={submitCount} />
          <YarnChoice form={form} yarns={yarns} />
          {entry.yarn && <YarnFields {...{ units, terms, currency }} />}
          <ColourChoice form={form} yarns={yarns} />
          {entry.colour && <ColourFields weight={yarn?.weightCategory ?? 4} />}
          <div className="border-t border-line pt-4">
            <LotFields skein={readableSkein(yarn?.putUp)} {...{ units, currency }} />
          </div>
        </form>
      </FormProvider>
      {question}
    </Sheet>
  );
}

/** A put-up that may be half typed. */
function readableSkein(putUp: PresentedYarn['putUp'] | undefined) {
  const isKnown =
    skeinMassG.safeParse(putUp?.massG).success && skeinLengthM.safeParse(putUp?.lengthM).success;
  return putUp && isKnown ? putUp : null;
}

interface ChoiceProps {
  form: UseFormReturn<StashEntry>;
  yarns: readonly PresentedYarn[];
}

function YarnChoice({ form, yarns }: ChoiceProps) {
  if (yarns.length === 0) return <h3>The yarn</h3>;
  function choose(yarnId: string) {
    const yarn = yarns.find(({ id }) => id === yarnId);
    form.setValue('yarnId', yarnId);
    form.setValue('yarn', yarn ? null : BLANK_YARN);
    chooseColour(form, yarn?.colourways[0]?.id ?? '');
  }
  return (
    <Select
      label="Yarn"
      id="yarnId"
      value={form.getValues('yarnId')}
      onChange={(event) => choose(event.target.value)}
      options={[
        ...yarns.map(({ id, name, maker }) => ({
          value: id,
          word: maker ? `${name}, ${maker}` : name,
        })),
        { value: '', word: 'a yarn not here yet' },
      ]}
    />
  );
}

function ColourChoice({ form, yarns }: ChoiceProps) {
  const yarn = yarns.find(({ id }) => id === form.getValues('yarnId'));
  if (!yarn || yarn.colourways.length === 0) return <h3>The colour</h3>;
  return (
    <Select
      label="Colour"
      id="colourwayId"
      value={form.getValues('colourwayId')}
      onChange={(event) => chooseColour(form, event.target.value)}
      options={[
        ...yarn.colourways.map(({ id, name }) => ({ value: id, word: name })),
        { value: '', word: 'a colour not here yet' },
      ]}
    />
  );
}

function chooseColour(form: UseFormReturn<StashEntry>, colourwayId: string) {
  form.setValue('colourwayId', colourwayId);
  form.setValue('colour', colourwayId ? null : BLANK_COLOUR);
}
