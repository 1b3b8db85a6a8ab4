import { Check, TriangleAlert } from 'lucide-react';
import { FLAT_FULLNESS, type MotifGeometry } from '../../../lib/motifs/geometry';
import type { Reading, WorkedRound } from '../../../lib/pattern/reading';
import type { Terms } from '../../planner/stitchWord';
import { classNames } from '../../ui/classNames';
import { claimInWords } from './claimInWords';

interface FullnessProps {
  round: WorkedRound;
  geometry: MotifGeometry;
  fullness: number | undefined;
  /** Small enough to be pulled flat, whatever the counts. */
  isEarly: boolean;
}

/** Whether the round lies flat, in a word, and whether it is the first that does not. */
export function Fullness({ round, geometry, fullness, isEarly }: FullnessProps) {
  const begins = geometry.trouble?.label === round.label;
  if (fullness === undefined || (isEarly && !begins)) return null;
  const [least, most] = FLAT_FULLNESS;
  const word = fullness < least ? 'cups' : fullness > most ? 'ruffles' : 'flat';
  return (
    <span
      className={classNames('block text-sm', word === 'flat' ? 'text-ink-2' : 'text-amber-ink')}
    >
      {word}
      {begins && ', from here'}
    </span>
  );
}

/** The bracketed note of a round, and whether the round agrees with it. */
interface ClaimProps {
  round: WorkedRound;
  reading: Reading;
  terms: Terms;
}

export function Claim({ round, reading, terms }: ClaimProps) {
  if (!round.note) return <span className="text-ink-2">nothing</span>;
  const { begin, end } = round.note;
  const disagrees = reading.diagnostics.some(
    (each) => each.code === 'count-note' && each.begin >= begin && each.end <= end,
  );
  const Icon = disagrees ? TriangleAlert : Check;
  return (
    <span className="inline-flex items-start gap-1.5">
      <Icon
        size={16}
        aria-label={disagrees ? 'disagrees:' : 'agrees:'}
        className={classNames('mt-0.5 shrink-0', disagrees ? 'text-madder' : 'text-teal')}
      />
      {claimInWords(round, reading.pattern, terms)}
    </span>
  );
}

/** One figure where all sides agree, else each. */
export function perSideInWords({ perSide, sideCounts }: WorkedRound): string {
  const differ = new Set(sideCounts).size > 1;
  return differ ? sideCounts.join(', ') : String(perSide);
}
