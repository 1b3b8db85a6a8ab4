import { Save } from 'lucide-react';
import { useMemo } from 'react';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import type { PresentedMotif } from '../../../schemas/motif';
import { Button } from '../../ui/Button';
import { Field } from '../../ui/Field';
import { Notice } from '../../ui/Notice';
import { SaveStatus } from '../../ui/SaveStatus';
import { ConflictDialog } from '../form/ConflictDialog';
import { differencesOf, type Wording } from '../form/differences';
import { useLeaveWarning } from '../form/useLeaveWarning';
import { checkedMotif } from '../pattern/checkedMotif';
import { PatternEditor } from '../pattern/PatternEditor';
import { READ_ONLY_ONCE } from '../pattern/planMotif';
import { StitchesSection } from '../pattern/StitchesSection';
import { usePatternDraft, type PatternDraft } from '../pattern/usePatternDraft';
import { useOwnStitches } from '../stitches/useOwnStitches';
import { DeleteMotif } from './DeleteMotif';
import { BelowMotif } from './BelowMotif';
import type { MotifPageProps } from './MotifPage';
import { MotifVersions } from './MotifVersions';
import { useMotifSaving } from './useMotifSaving';

/** A motif of one's own: changed in its text, saved as its next version. */
export function OwnMotif(props: MotifPageProps) {
  const { presented, versions, swatches, made, signedIn, units, terms } = props;
  const saving = useMotifSaving(presented);
  const { kept, version, conflict } = saving;
  const { key } = kept;
  const { draft, setDraft, isChanged } = usePatternDraft(draftOf(kept), key);
  useLeaveWarning(isChanged);
  const own = useOwnStitches({ signedIn, initial: props.stitches });
  const keptStitches = kept.pattern.stitches;
  const stitches = useMemo(
    () => withKept(own.stitches, keptStitches),
    [own.stitches, keptStitches],
  );
  const isNamed = draft.name.trim() !== '';
  const isWithoutText = kept.pattern.text === '' && kept.motif !== null;

  function save() {
    saving.save(checkedMotif(draft, stitches), (saved) =>
      // What was typed while it was being saved stays, as unsaved.
      setDraft((now) => (now === draft ? draftOf(saved) : now)),
    );
  }

  return (
    <>
      {isWithoutText && (
        <Notice className="mb-4">
          This motif was kept as counted rounds. Blankets use them as they are; write its pattern
          here to see its chart.
        </Notice>
      )}
      {saving.failure && (
        <Notice kind="problem" live className="mb-4">
          {saving.failure}
        </Notice>
      )}
      <PatternEditor
        pattern={draft}
        {...{ swatches, units }}
        shownTerms={terms}
        ownStitches={stitches}
        identity={isChanged ? READ_ONLY_ONCE : { key, version }}
        onAddStitch={own.openWith}
        stitchesPanel={(onInsert) => <StitchesSection {...{ own, terms, onInsert }} />}
        onChange={(change) => setDraft((old) => ({ ...old, ...change }))}
        heading={
          <div className="mb-3">
            <div className="flex flex-wrap items-end gap-2">
              <Field
                label="Name of the motif"
                className="min-w-52 flex-1"
                value={draft.name}
                maxLength={80}
                error={isNamed ? undefined : 'A motif needs a name'}
                onChange={(event) => setDraft({ ...draft, name: event.target.value })}
              />
              <Button
                kind="primary"
                icon={Save}
                busy={saving.isBusy && 'Saving…'}
                aria-disabled={!isChanged || !isNamed}
                onClick={() => isChanged && isNamed && save()}
              >
                Save as version {version + 1}
              </Button>
              <DeleteMotif
                motifKey={key}
                name={kept.name}
                onDeleted={() => {
                  setDraft(draftOf(kept));
                  setTimeout(() => location.assign('/motifs'));
                }}
              />
            </div>
            <SaveStatus
              className="mt-2"
              state={isChanged ? { is: 'unsaved' } : { is: 'saved', at: `as version ${version}` }}
            />
            {isChanged && (
              <Button kind="quiet" small onClick={() => setDraft(draftOf(kept))}>
                Back to version {version}
              </Button>
            )}
            <MotifVersions
              motifKey={key}
              initial={versions}
              text={draft.text}
              isBusy={saving.isBusy}
              onRestore={(from) => saving.restore(from, (saved) => setDraft(draftOf(saved)))}
            />
          </div>
        }
        below={(shown) => (
          <BelowMotif {...{ shown, made, signedIn }} motifKey={key} motifVersion={version} />
        )}
      />
      {conflict && (
        <ConflictDialog
          what="motif"
          differences={differencesOf(draft, draftOf(conflict), WORDING)}
          saving={saving.isBusy}
          onKeepYours={save}
          onTakeTheirs={() => {
            setDraft(draftOf(conflict));
            saving.takeTheirs();
          }}
          onClose={saving.forgetConflict}
        />
      )}
    </>
  );
}

function draftOf({ pattern }: PresentedMotif): PatternDraft {
  const { name, text, terms, sides, size } = pattern;
  return { name, text, terms, sides, size };
}

/** The person's stitches as they are now, and those the motif was kept with that are no longer there. */
function withKept(now: readonly OwnStitch[], kept: readonly OwnStitch[]): readonly OwnStitch[] {
  const known = new Set(now.map(({ abbreviation }) => abbreviation));
  const gone = kept.filter(({ abbreviation }) => !known.has(abbreviation));
  return gone.length === 0 ? now : [...now, ...gone];
}

const WORDING: Wording<PatternDraft> = [
  ['Name', ({ name }) => name],
  ['Terms', ({ terms }) => terms.toUpperCase()],
  ['Sides', ({ sides }) => String(sides)],
  ['Text', ({ text }) => text],
];
