import { FormProvider, useWatch } from 'react-hook-form';
import { OWN_STITCH_LIMITS, type OwnStitch } from '../../../lib/stitches/ownStitch';
import { ownStitchForm, type OwnStitchForm } from '../../../schemas/ownStitch';
import type { Terms } from '../../planner/stitchWord';
import { Button } from '../../ui/Button';
import { Sheet } from '../../ui/Dialog';
import { ErrorSummary } from '../../ui/ErrorSummary';
import { SaveStatus } from '../../ui/SaveStatus';
import { ConflictDialog } from '../form/ConflictDialog';
import { differencesOf } from '../form/differences';
import { listErrors } from '../form/formErrors';
import { useDiscardGuard } from '../form/useDiscardGuard';
import { useVersionedForm } from '../form/useVersionedForm';
import { stitchContent, type KeptStitch } from './keptStitch';
import { StitchFields } from './StitchFields';
import { stitchWording } from './stitchWords';
import type { Writing } from './useOwnStitches';

interface StitchSheetProps {
  writing: Writing;
  terms: Terms;
  save: (stitch: OwnStitch, from: KeptStitch | null) => Promise<KeptStitch>;
  onSaved: (stitch: KeptStitch, wasNew: boolean) => void;
  onClose: () => void;
}

/** A new stitch: the moves of dc, from which most others are a few moves away. */
const BLANK: OwnStitch = {
  abbreviation: '',
  name: '',
  moves: { wraps: 1, draws: 1, throughs: 2 },
  heightOverWidth: null,
  takes: 1,
  symbol: null,
};

const valuesOf = (kept: KeptStitch): OwnStitchForm => ({ stitch: stitchContent(kept) });

/** One stitch of the person's own, written beside the page. */
export default function StitchSheet({ writing, terms, save, onSaved, onClose }: StitchSheetProps) {
  const editing = useVersionedForm<OwnStitchForm, KeptStitch>({
    schema: ownStitchForm,
    initial: writing.kept,
    blank: { stitch: { ...BLANK, ...(writing.kept ? {} : writing.begins) } },
    valuesOf,
    prefix: 'stitch',
    save: ({ stitch }, from) => save(stitch, from),
    onSaved,
  });
  const { form, conflict, state, isSaving, saved } = editing;
  const { errors, submitCount, isDirty } = form.formState;
  const { stitch } = useWatch({ control: form.control }) as OwnStitchForm;
  const { requestClose, question } = useDiscardGuard(isDirty, onClose);
  return (
    <Sheet
      open
      onOpenChange={(open) => !open && requestClose()}
      title={saved ? `${saved.abbreviation}, ${saved.name}` : 'A stitch of your own'}
      description={
        saved
          ? 'Motifs that are kept already keep the stitch as they were saved with it.'
          : 'Say what you call it and how it is made: it is then read, drawn, measured and counted.'
      }
      actions={
        <>
          <Button kind="primary" type="submit" form="stitch-form" busy={isSaving && 'Saving…'}>
            {saved ? 'Save' : 'Add the stitch'}
          </Button>
          <Button onClick={requestClose}>Cancel</Button>
          {state.is === 'failed' && <SaveStatus state={state} className="self-center" />}
        </>
      }
    >
      <FormProvider {...form}>
        <form
          id="stitch-form"
          noValidate
          onSubmit={(event) => {
            // React hands it on to the form that the panel may stand in.
            event.stopPropagation();
            void editing.submit(event);
          }}
          className="grid gap-5 pb-4"
        >
          <ErrorSummary errors={listErrors(errors)} attempt={submitCount} />
          <StitchFields stitch={readable(stitch)} terms={terms} />
        </form>
      </FormProvider>
      {question}
      {conflict && (
        <ConflictDialog
          what="stitch"
          differences={differencesOf(
            conflict.yours.stitch,
            stitchContent(conflict.theirs),
            stitchWording,
          )}
          saving={isSaving}
          onKeepYours={editing.keepYours}
          onTakeTheirs={editing.takeTheirs}
          onClose={editing.closeConflict}
        />
      )}
    </Sheet>
  );
}

/** A stitch that may be half typed, as it can be drawn and counted. */
function readable(stitch: OwnStitch): OwnStitch {
  const { moves, heightOverWidth, symbol } = stitch;
  const { least, most } = OWN_STITCH_LIMITS.heightOverWidth;
  const hasHeight = heightOverWidth !== null && heightOverWidth >= least && heightOverWidth <= most;
  const within = (count: number | null, limit: number, from = 0): number =>
    Number.isInteger(count) ? Math.min(limit, Math.max(from, count as number)) : from;
  return {
    ...stitch,
    moves: {
      wraps: within(moves.wraps, OWN_STITCH_LIMITS.wraps),
      draws: within(moves.draws, OWN_STITCH_LIMITS.draws),
      throughs: within(moves.throughs, OWN_STITCH_LIMITS.throughs),
    },
    heightOverWidth: hasHeight ? heightOverWidth : null,
    symbol: symbol && {
      ...symbol,
      legs: within(symbol.legs, OWN_STITCH_LIMITS.legs, 1),
      bars: within(symbol.bars, OWN_STITCH_LIMITS.bars),
    },
  };
}
