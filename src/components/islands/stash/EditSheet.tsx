import type { ReactNode } from 'react';
import { FormProvider, type FieldValues, type UseFormReturn } from 'react-hook-form';
import { Button } from '../../ui/Button';
import { Sheet } from '../../ui/Dialog';
import { ErrorSummary } from '../../ui/ErrorSummary';
import { SaveStatus, type SaveState } from '../../ui/SaveStatus';
import { ConflictDialog, type Difference } from '../form/ConflictDialog';
import { listErrors } from '../form/formErrors';
import { useDiscardGuard } from '../form/useDiscardGuard';

interface EditSheetProps<Values extends FieldValues> {
  title: string;
  description?: ReactNode;
  /** "dye lot" */
  what: string;
  editing: {
    form: UseFormReturn<Values>;
    state: SaveState;
    isSaving: boolean;
    submit: (event?: React.BaseSyntheticEvent) => Promise<void>;
    keepYours: () => unknown;
    takeTheirs: () => unknown;
    closeConflict: () => void;
  };
  /** What differs from another save, when this one came second. */
  differences: Difference[] | null;
  /** Beside the saving: what else can be done with it. */
  more?: ReactNode;
  onClose: () => void;
  children: ReactNode;
}

/** One kept thing of the stash, changed beside the page. */
export function EditSheet<Values extends FieldValues>(props: EditSheetProps<Values>) {
  const { title, description, what, editing, differences, more, onClose, children } = props;
  const { form, state, isSaving, submit } = editing;
  const { errors, submitCount, isDirty } = form.formState;
  const { requestClose, question } = useDiscardGuard(isDirty, onClose);
  return (
    <Sheet
      open
      onOpenChange={(open) => !open && requestClose()}
      title={title}
      description={description}
      actions={
        <>
          <Button kind="primary" type="submit" form="edit" busy={isSaving && 'Saving…'}>
            Save
          </Button>
          {more}
          <SaveStatus state={state} className="self-center" />
        </>
      }
    >
      <FormProvider {...form}>
        <form id="edit" noValidate onSubmit={submit} className="grid gap-5 pb-4">
          <ErrorSummary errors={listErrors(errors)} attempt={submitCount} />
          {children}
        </form>
      </FormProvider>
      {question}
      {differences && (
        <ConflictDialog
          what={what}
          differences={differences}
          saving={isSaving}
          onKeepYours={editing.keepYours}
          onTakeTheirs={editing.takeTheirs}
          onClose={editing.closeConflict}
        />
      )}
    </Sheet>
  );
}
