import { useMemo } from 'react';
import { FormProvider, useWatch } from 'react-hook-form';
import type { Gauge } from '../../../lib/gauge/gauge';
import type { Motif, MotifSides } from '../../../lib/motifs/motif';
import { showFabric, showYarn, type Units } from '../../../lib/units/display';
import type { MadeMotifInput } from '../../../schemas/madeMotif';
import { madeMotifForm, madeMotifOf, type MadeMotifForm } from '../../../schemas/madeMotifForm';
import { acrossWord } from '../../motifs/motifWords';
import { Button } from '../../ui/Button';
import { Sheet } from '../../ui/Dialog';
import { ErrorSummary } from '../../ui/ErrorSummary';
import { SaveStatus } from '../../ui/SaveStatus';
import { ConflictDialog } from '../form/ConflictDialog';
import { differencesOf } from '../form/differences';
import { listErrors } from '../form/formErrors';
import { useDiscardGuard } from '../form/useDiscardGuard';
import { useVersionedForm } from '../form/useVersionedForm';
import { showDay } from '../swatches/swatchWords';
import { blankMade, madeContent, madeValues, type KeptMade, type MadeOf } from './keptMade';
import { MadeFields } from './MadeFields';
import { madeFigures, readableMade, type MadeFigures } from './madeFigures';
import { MadeFindings } from './MadeFindings';
import { madeWording, sizeGiveOrTake } from './madeWords';

interface MadeSheetProps {
  /** Null for a new one. */
  kept: KeptMade | null;
  /** What was kept last: its scale and yarn are likely used again. */
  last: KeptMade | undefined;
  of: MadeOf;
  motif: Motif;
  gauge: Gauge;
  gaugeName: string;
  units: Units;
  save: (made: MadeMotifInput, from: KeptMade | null) => Promise<KeptMade>;
  onSaved: (wasNew: boolean) => void;
  onClose: () => void;
}

/** One made motif: what was measured left, what it says right, at every keystroke. */
export default function MadeSheet(props: MadeSheetProps) {
  const { kept, last, of, motif, gauge, gaugeName, units, onSaved, onClose } = props;
  const rounds = Math.max(motif.rounds.length, kept?.rounds ?? 0);
  const editing = useVersionedForm<MadeMotifForm, KeptMade>({
    schema: madeMotifForm,
    initial: kept,
    blank: blankMade(of, rounds, today(), last),
    valuesOf: (row) => madeValues(row, rounds),
    prefix: 'made',
    save: ({ made }, from) => props.save(madeMotifOf(made), from),
    onSaved: (_, wasNew) => onSaved(wasNew),
  });
  const { form, conflict, state, isSaving, saved } = editing;
  const { errors, submitCount, isDirty } = form.formState;
  const { made } = useWatch({ control: form.control }) as MadeMotifForm;
  const figures = useMemo(
    () => madeFigures(readableMade(made, motif.rounds.length), motif, gauge),
    [made, motif, gauge],
  );
  const { requestClose, question } = useDiscardGuard(isDirty, onClose);
  return (
    <Sheet
      wide
      open
      onOpenChange={(open) => !open && requestClose()}
      title={saved ? `Made on ${showDay(saved.madeOn)}` : 'Measure one you made'}
      description="After any round, as many or as few as you like. Lay it flat and do not pull."
      actions={
        <>
          {figures && <LiveAnswer figures={figures} sides={motif.sides} units={units} />}
          <Button kind="primary" type="submit" form="made-form" busy={isSaving && 'Saving…'}>
            {saved ? 'Save' : 'Keep it'}
          </Button>
          <Button onClick={requestClose}>Cancel</Button>
          {state.is === 'failed' && <SaveStatus state={state} className="self-center" />}
        </>
      }
    >
      <FormProvider {...form}>
        <div className="grid gap-x-10 gap-y-6 pb-4 lg:grid-cols-[minmax(20rem,24rem)_1fr]">
          <form
            id="made-form"
            noValidate
            onSubmit={(event) => {
              // React hands it on to the form that the section may stand in.
              event.stopPropagation();
              void editing.submit(event);
            }}
            className="grid content-start gap-5"
          >
            <ErrorSummary errors={listErrors(errors)} attempt={submitCount} />
            <MadeFields motif={motif} units={units} />
          </form>
          <div className="min-w-0 lg:sticky lg:top-0 lg:self-start">
            {figures && <MadeFindings {...{ figures, gaugeName, units }} sides={motif.sides} />}
          </div>
        </div>
      </FormProvider>
      {question}
      {conflict && (
        <ConflictDialog
          what="made motif"
          differences={differencesOf(
            madeMotifOf(conflict.yours.made),
            madeContent(conflict.theirs),
            madeWording(units),
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

interface LiveAnswerProps {
  figures: MadeFigures;
  sides: MotifSides;
  units: Units;
}

/** On a phone the answer stays in view above the keyboard, whatever field is filled in. */
function LiveAnswer({ figures, sides, units }: LiveAnswerProps) {
  const { measured, computed, yarn } = figures;
  const { acrossMm, acrossSdMm } = measured ?? computed;
  return (
    <p className="w-full tabular-nums lg:hidden" aria-hidden>
      <b>
        {showFabric(acrossMm, units)} {acrossWord(sides)}
      </b>{' '}
      <span className="text-ink-2">
        ± {sizeGiveOrTake(acrossSdMm, units)}
        {yarn && ` · ${showYarn(yarn.after.meanM, units)} of yarn`}
      </span>
    </p>
  );
}

/** The day it is where the person is: "2026-11-30". */
function today(): string {
  const now = new Date();
  const two = (value: number) => String(value).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
