import { LayoutGrid } from 'lucide-react';
import { useMemo } from 'react';
import { useWatch } from 'react-hook-form';
import type { Units } from '../../../lib/units/display';
import type { PresentedSwatch, SwatchInput } from '../../../schemas/swatch';
import type { Terms } from '../../planner/stitchWord';
import { AnswerBar } from '../../ui/AnswerBar';
import { Button, ButtonLink } from '../../ui/Button';
import { ErrorSummary } from '../../ui/ErrorSummary';
import { TextArea } from '../../ui/Field';
import { SaveStatus } from '../../ui/SaveStatus';
import { useTerms, useUnits } from '../../ui/useUnits';
import { ConflictDialog } from '../form/ConflictDialog';
import { differencesOf } from '../form/differences';
import { listErrors } from '../form/formErrors';
import { WithQueries } from '../WithQueries';
import { DeleteSwatch } from './DeleteSwatch';
import { MeasurementList } from './MeasurementList';
import { SwatchFields } from './SwatchFields';
import { findingsOf, SwatchFindings, type Findings } from './SwatchFindings';
import type { YarnChoice } from '../../../lib/swatches/swatchRecord';
import { blankSwatch, exampleSwatch, PLAIN_YARN, readableSwatch } from './swatchForm';
import { GAUGE_SPAN, perSpan, showLoop, swatchWording } from './swatchWords';
import { useSwatchForm } from './useSwatchForm';

interface SwatchEditorProps {
  /** Null for a new one. */
  swatch: PresentedSwatch | null;
  /** A new one begins filled in, to look at. */
  example?: boolean;
  yarns: YarnChoice[];
  /** The day it is, as the server knows it. */
  today: string;
  units: Units;
  terms: Terms;
}

export function SwatchEditor(props: SwatchEditorProps) {
  return (
    <WithQueries>
      <Editor {...props} />
    </WithQueries>
  );
}

/** Inputs left, what they say right, at every keystroke. */
function Editor(props: SwatchEditorProps) {
  const { yarns, today } = props;
  const units = useUnits(props.units);
  const terms = useTerms(props.terms);
  const editing = useSwatchForm(
    props.swatch,
    props.example ? exampleSwatch(today) : blankSwatch(today),
  );
  const { form, saved, conflict } = editing;
  const values = useWatch({ control: form.control }) as SwatchInput;
  const findings = useMemo(() => findingsOf(readableSwatch(values, yarns)), [values, yarns]);
  const hex = yarns.find(({ id }) => id === values.yarnId)?.hex ?? PLAIN_YARN;
  const { errors, submitCount } = form.formState;

  return (
    <>
      <div className="lg:grid lg:grid-cols-[minmax(22rem,25rem)_1fr]">
        <form
          noValidate
          onSubmit={editing.submit}
          id="swatch-form"
          aria-label="The swatch"
          className="grid content-start gap-5 px-4 pt-6 pb-8 lg:border-e lg:border-line lg:px-8"
        >
          <Heading saved={saved} />
          <ErrorSummary errors={listErrors(errors)} attempt={submitCount} />
          <SwatchFields {...{ form, yarns, terms }} />
          <MeasurementList {...{ form, units, today }} />
          <div className="border-t border-line pt-4">
            <TextArea
              label="Notes"
              id="notes"
              rows={3}
              error={errors.notes?.message}
              {...form.register('notes')}
            />
          </div>
          <div className="flex flex-wrap items-center gap-3 border-line bg-ground lg:sticky lg:bottom-0 lg:z-10 lg:-mx-8 lg:border-t lg:px-8 lg:py-3">
            <Button
              kind="primary"
              type="submit"
              className="max-lg:hidden"
              busy={editing.isSaving && 'Saving…'}
            >
              Save swatch
            </Button>
            <SaveStatus state={editing.state} />
          </div>
          {saved && <DeleteSwatch swatch={saved} />}
        </form>
        <div className="px-4 pt-6 pb-10 lg:sticky lg:top-0 lg:self-start lg:px-9" data-answer>
          {findings ? (
            <SwatchFindings {...{ findings, hex, units, terms }}>
              {saved && (
                <ButtonLink icon={LayoutGrid} href={`/?swatch=${saved.id}`}>
                  Plan a blanket with this swatch
                </ButtonLink>
              )}
            </SwatchFindings>
          ) : (
            <NothingYet />
          )}
        </div>
      </div>
      <AnswerBar
        {...barWords(findings, units)}
        action={
          <Button
            kind="primary"
            type="submit"
            form="swatch-form"
            busy={editing.isSaving && 'Saving…'}
          >
            Save
          </Button>
        }
      />
      {conflict && (
        <ConflictDialog
          what="swatch"
          differences={differencesOf<SwatchInput>(
            conflict.yours,
            conflict.theirs,
            swatchWording(units, terms, yarns),
          )}
          saving={editing.isSaving}
          onKeepYours={editing.keepYours}
          onTakeTheirs={editing.takeTheirs}
          onClose={editing.closeConflict}
        />
      )}
    </>
  );
}

function Heading({ saved }: { saved: PresentedSwatch | null }) {
  return (
    <div>
      <p className="text-sm">
        <a className="link font-normal" href="/swatches">
          Swatches
        </a>
      </p>
      <h1 className="mt-1 text-xl">{saved ? saved.name : 'A new swatch'}</h1>
    </div>
  );
}

function barWords(findings: Findings | null, units: Units) {
  if (!findings) return { answer: 'No gauge yet', detail: 'measure it across and tall' };
  const { stitchWidth, rowHeight } = findings.gauge;
  const loop = findings.yarn && ` · ${showLoop(findings.yarn.after.meanMm, units)} a loop`;
  return {
    answer: `${perSpan(stitchWidth.mean, units)} × ${perSpan(rowHeight.mean, units)}`,
    detail: `stitches and rows in ${GAUGE_SPAN[units].words}${loop ?? ''}`,
  };
}

function NothingYet() {
  return (
    <p className="max-w-[52ch] text-ink-2">
      Count the stitches and rows of a flat piece and measure it across and tall: its gauge appears
      here, drawn to scale.
    </p>
  );
}
