import { BookOpen, Trash2 } from 'lucide-react';
import type { Terms } from '../../../lib/pattern/reading';
import type { MotifSides } from '../../../lib/motifs/motif';
import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import type { Units } from '../../../lib/units/display';
import type { PresentedOwnStitch } from '../../../schemas/ownStitch';
import { Button } from '../../ui/Button';
import { Disclosure } from '../../ui/Disclosure';
import { Field } from '../../ui/Field';
import { OwnStitchesPanel } from '../stitches/OwnStitchesPanel';
import { useOwnStitches } from '../stitches/useOwnStitches';
import { WithQueries } from '../WithQueries';
import { PatternEditor } from './PatternEditor';
import { usePatternDraft } from './usePatternDraft';

/** A pattern to begin with. */
export interface ExamplePattern {
  name: string;
  text: string;
  sides: MotifSides;
}

interface ReadPageProps {
  example: ExamplePattern;
  /** The example was asked for: it is on the screen at once, in a draft of its own. */
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
  const empty = { name: '', text: '', terms, sides: 4 } as const;
  const [draft, setDraft] = usePatternDraft(asked ? { ...example, terms: 'us' } : empty, asked);
  const own = useOwnStitches({ signedIn, initial: props.stitches });
  const { name, ...pattern } = draft;
  const isEmpty = pattern.text.trim() === '';

  return (
    <>
      {isEmpty && (
        <div className="mb-6 flex flex-wrap items-center gap-x-5 gap-y-3 rounded-control border border-dashed border-edge px-5 py-4">
          <p className="max-w-[60ch] text-lg">
            Paste a motif’s rounds as they are published: every stitch is worked, counted and drawn
            as you type.
          </p>
          <Button icon={BookOpen} onClick={() => setDraft({ ...example, terms: 'us' })}>
            Load the {example.name.toLowerCase()}
          </Button>
        </div>
      )}
      {name && <h2 className="mb-4 hidden text-xl print:block">{name}</h2>}
      <PatternEditor
        {...pattern}
        {...{ name, units, swatches }}
        shownTerms={terms}
        ownStitches={own.stitches}
        onAddStitch={own.openWith}
        stitchesPanel={(onInsert) => (
          <Disclosure className="not-printed mt-5" summary={ownStitchesWord(own.stitches.length)}>
            <OwnStitchesPanel {...own.panelProps} {...{ terms, onInsert }} />
          </Disclosure>
        )}
        onChange={(change) => setDraft((old) => ({ ...old, ...change }))}
        heading={
          !isEmpty && (
            <div className="mb-3 flex items-end gap-2">
              <Field
                label="Name of the motif"
                className="flex-1"
                value={name}
                maxLength={80}
                onChange={(event) => setDraft({ ...draft, name: event.target.value })}
              />
              <Button
                kind="quiet"
                icon={Trash2}
                onClick={() => setDraft({ ...draft, name: '', text: '' })}
              >
                Begin anew
              </Button>
            </div>
          )
        }
      />
    </>
  );
}

const ownStitchesWord = (count: number): string =>
  count === 0 ? 'Stitches of your own' : `Stitches of your own: ${count}`;
