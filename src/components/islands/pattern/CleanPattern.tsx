import { Copy, Printer } from 'lucide-react';
import { memo, useMemo, useState } from 'react';
import { printPattern } from '../../../lib/pattern/print/printPattern';
import type { Reading, Terms } from '../../../lib/pattern/reading';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import { Button } from '../../ui/Button';
import { printSheet } from '../../ui/printSheet';
import { SegmentedControl } from '../../ui/SegmentedControl';

interface CleanPatternProps {
  reading: Reading;
  name: string;
  /** What it comes out as, for the printed page: "A square of 4 rounds, 13 cm a side". */
  about: string;
  ownStitches?: readonly OwnStitch[];
}

const TERMS = [
  { value: 'us', word: 'US terms' },
  { value: 'uk', word: 'UK terms' },
] as const;
const WORDS = [
  { value: 'short', word: 'Abbreviations' },
  { value: 'full', word: 'Full words' },
] as const;

/** The pattern as a clean page, in either terms, short or in full, with the key of its abbreviations. */
export const CleanPattern = memo(({ reading, name, about, ownStitches }: CleanPatternProps) => {
  const [terms, setTerms] = useState<Terms>(reading.terms);
  const [words, setWords] = useState<'short' | 'full'>('short');
  const [copied, setCopied] = useState(false);
  const { lines, key } = useMemo(
    () => printPattern(reading.pattern, { terms, fullWords: words === 'full', ownStitches }),
    [reading.pattern, terms, words, ownStitches],
  );

  async function copy() {
    try {
      await navigator.clipboard.writeText(lines.join('\n'));
      setCopied(true);
    } catch {
      setCopied(false);
    }
  }

  return (
    <section aria-labelledby="clean-pattern" data-sheet>
      <h2 id="clean-pattern" className="sheet-hidden">
        Clean pattern page
      </h2>
      <div className="sheet-shown mb-4 hidden">
        <h1>{name || 'Motif'}</h1>
        <p className="mt-1">{about}</p>
      </div>
      <div className="not-printed mt-2 flex flex-wrap items-center gap-3">
        <SegmentedControl label="Terms" options={TERMS} value={terms} onChange={setTerms} />
        <SegmentedControl label="Words" options={WORDS} value={words} onChange={setWords} />
        <Button small icon={Copy} onClick={() => void copy()}>
          {copied ? 'Copied' : 'Copy'}
        </Button>
        <Button small icon={Printer} onClick={printSheet}>
          Print the pattern
        </Button>
      </div>
      <div className="mt-4 grid gap-x-14 gap-y-6 lg:grid-cols-[minmax(0,1fr)_18rem]">
        <div className="grid max-w-[72ch] content-start gap-2 font-mono">
          {lines.map((line, i) => (
            <p key={i}>{line}</p>
          ))}
        </div>
        {key.length > 0 && (
          <div>
            <h3>Abbreviations</h3>
            <dl className="mt-1 grid grid-cols-[auto_1fr] gap-x-4 gap-y-0.5">
              {key.map(({ abbreviation, meaning }) => (
                <div key={abbreviation} className="contents">
                  <dt className="font-mono">{abbreviation}</dt>
                  <dd className="text-ink-2">{meaning}</dd>
                </div>
              ))}
            </dl>
          </div>
        )}
      </div>
    </section>
  );
});
CleanPattern.displayName = 'CleanPattern';
