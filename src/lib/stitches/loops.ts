import { knownStitch } from './stitchTable';
import type { Moves, StitchCode, StitchCounts } from './stitch';

/**
 * Loops of yarn that a stitch lays: one for each wrap, draw and through.
 * Published row lengths of ch : sc : hdc : dc, 5.10 : 10.6 : 15.7 : 20.4 (windchilde.com), stand as
 * these loop counts do, 1 : 2 : 3 : 4, within 4 %.
 *
 * Example: `loopsOf({ wraps: 1, draws: 1, throughs: 2 })` is 4, a double crochet.
 */
export const loopsOf = ({ wraps, draws, throughs }: Moves): number => wraps + draws + throughs;

/** Loops laid by each stitch of `counts`. Throws DomainError for a stitch that is not in the table. */
export function loopsByStitch(counts: StitchCounts): Map<StitchCode, number> {
  return new Map(
    Object.entries(counts).map(([code, count]) => [code, count * loopsOf(knownStitch(code))]),
  );
}
