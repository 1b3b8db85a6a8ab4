import { useMutation } from '@tanstack/react-query';
import { BookmarkPlus, BookOpen, Trash2 } from 'lucide-react';
import { createMotif } from '../../../client/queries/motifs';
import type { Terms } from '../../../lib/pattern/reading';
import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import type { Units } from '../../../lib/units/display';
import type { PresentedOwnStitch } from '../../../schemas/ownStitch';
import { Button, ButtonLink } from '../../ui/Button';
import { Field } from '../../ui/Field';
import { Notice } from '../../ui/Notice';
import { failureWords } from '../form/formErrors';
import { JoinFits } from '../motifs/JoinFits';
import { useOwnStitches } from '../stitches/useOwnStitches';
import { WithQueries } from '../WithQueries';
import { checkedMotif } from './checkedMotif';
import { PatternEditor } from './PatternEditor';
import { StitchesSection } from './StitchesSection';
import { usePatternDraft, type PatternDraft } from './usePatternDraft';

interface ReadPageProps {
  /** A pattern to begin with. */
  example: PatternDraft;
  /** Key of the example where it was asked for: it is on the screen at once, in a draft of its own. */
  asked: string | null;
  signedIn: boolean;
  stitches: PresentedOwnStitch[];
  units: Units;
  terms: Terms;
  swatches: GaugeSwatch[];
}

/** The page that reads any pattern: paste or type it, see it understood. */
export function ReadPage(props: ReadPageProps) {
  return (
    <WithQueries>
      <Reader {...props} />
    </WithQueries>
  );
}

function Reader(props: ReadPageProps) {
  const { example, asked, signedIn, units, terms, swatches } = props;
  const empty: PatternDraft = { name: '', text: '', terms, sides: 4, size: 0 };
  const { draft, setDraft } = usePatternDraft(asked ? example : empty, asked);
  const own = useOwnStitches({ signedIn, initial: props.stitches });
  const isEmpty = draft.text.trim() === '';
  const keeping = useMutation({
    mutationFn: () => createMotif(checkedMotif(draft, own.stitches)),
    onSuccess: ({ key }) => {
      // The motif holds the text from now on: the draft goes, before the page does.
      setDraft(asked ? example : empty);
      setTimeout(() => location.assign(`/motifs/${key}`));
    },
  });

  return (
    <>
      {isEmpty && (
        <div className="mb-6 flex flex-wrap items-center gap-x-5 gap-y-3 rounded-control border border-dashed border-edge px-5 py-4">
          <p className="max-w-[60ch] text-lg">
            Paste a motif’s rounds as they are published: every stitch is worked, counted and drawn
            as you type.
          </p>
          <Button icon={BookOpen} onClick={() => setDraft(example)}>
            Load the {example.name.toLowerCase()}
          </Button>
        </div>
      )}
      {draft.name && <h2 className="mb-4 hidden text-xl print:block">{draft.name}</h2>}
      <PatternEditor
        pattern={draft}
        {...{ units, swatches }}
        shownTerms={terms}
        ownStitches={own.stitches}
        onAddStitch={own.openWith}
        stitchesPanel={(onInsert) => <StitchesSection {...{ own, terms, onInsert }} />}
        onChange={(change) => setDraft((old) => ({ ...old, ...change }))}
        heading={
          !isEmpty && (
            <div className="mb-3 flex items-end gap-2">
              <Field
                label="Name of the motif"
                className="flex-1"
                value={draft.name}
                maxLength={80}
                onChange={(event) => setDraft({ ...draft, name: event.target.value })}
              />
              <Button kind="quiet" icon={Trash2} onClick={() => setDraft(empty)}>
                Begin anew
              </Button>
            </div>
          )
        }
        actions={
          signedIn ? (
            <Button
              icon={BookmarkPlus}
              busy={keeping.isPending && 'Keeping…'}
              onClick={() => keeping.mutate()}
            >
              Keep in my motifs
            </Button>
          ) : (
            <ButtonLink icon={BookmarkPlus} href={signInHref(asked)}>
              Sign in to keep it
            </ButtonLink>
          )
        }
        below={(shown) => <JoinFits {...shown} />}
      />
      {keeping.error && (
        <Notice kind="problem" live className="mt-4">
          {failureWords(keeping.error)}
        </Notice>
      )}
    </>
  );
}

/** The draft waits on this device until the person is back. */
const signInHref = (asked: string | null): string =>
  `/sign-in?returnTo=${encodeURIComponent(`/motifs/read${asked ? `?from=${asked}` : ''}`)}`;
