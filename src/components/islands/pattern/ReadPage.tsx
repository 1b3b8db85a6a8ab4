import { BookOpen, Trash2 } from 'lucide-react';
import type { Terms } from '../../../lib/pattern/reading';
import type { MotifSides } from '../../../lib/motifs/motif';
import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import type { Units } from '../../../lib/units/display';
import { Button } from '../../ui/Button';
import { Field } from '../../ui/Field';
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
  units: Units;
  terms: Terms;
  swatches: GaugeSwatch[];
}

/** The page that reads any pattern: paste or type it, see it understood. */
export function ReadPage({ example, units, terms, swatches }: ReadPageProps) {
  const [draft, setDraft] = usePatternDraft({ name: '', text: '', terms, sides: 4 });
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
