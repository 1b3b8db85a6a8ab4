import { ArrowLeftRight } from 'lucide-react';
import { MOTIF_SIDES, type MotifSides } from '../../../lib/motifs/motif';
import type { Terms } from '../../../lib/pattern/reading';
import { SHAPE_WORDS } from '../../motifs/motifWords';
import { Button } from '../../ui/Button';
import { SegmentedControl } from '../../ui/SegmentedControl';
import { Select } from '../../ui/Select';

interface PatternOptionsProps {
  terms: Terms;
  sides: MotifSides;
  size: number;
  sizes: number;
  onTerms: (terms: Terms) => void;
  onSides: (sides: MotifSides) => void;
  onSize: (size: number) => void;
  /** Writes the text anew in the other terms; null without a text. */
  onConvert: (() => void) | null;
}

const TERMS = [
  { value: 'us', word: 'US' },
  { value: 'uk', word: 'UK' },
] as const;

/** How the text is to be read. */
export function PatternOptions(props: PatternOptionsProps) {
  const { terms, sides, size, sizes, onTerms, onSides, onSize, onConvert } = props;
  return (
    <div className="mb-3 flex flex-wrap items-end gap-x-4 gap-y-3">
      <Select
        label="Shape"
        className="w-32"
        value={String(sides)}
        onChange={(event) => onSides(Number(event.target.value) as MotifSides)}
        options={MOTIF_SIDES.map((count) => ({ value: String(count), word: SHAPE_WORDS[count] }))}
      />
      <div>
        <span className="label mb-1" aria-hidden>
          The text is in
        </span>
        <SegmentedControl
          label="Terms of the text"
          className="h-10 coarse:h-11"
          options={TERMS}
          value={terms}
          onChange={onTerms}
        />
      </div>
      {sizes > 1 && (
        <Select
          label="Size"
          className="w-28"
          value={String(size)}
          onChange={(event) => onSize(Number(event.target.value))}
          options={Array.from({ length: sizes }, (_, i) => ({
            value: String(i),
            word: `${i + 1} of ${sizes}`,
          }))}
        />
      )}
      {onConvert && (
        <Button kind="quiet" icon={ArrowLeftRight} onClick={onConvert}>
          Rewrite in {terms === 'us' ? 'UK' : 'US'} terms
        </Button>
      )}
    </div>
  );
}
