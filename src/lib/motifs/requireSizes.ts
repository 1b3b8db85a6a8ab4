import { DomainError } from '../errors';
import type { RoundSize } from './heightBelief';
import type { Motif } from './motif';

/** Throws DomainError for a round that the motif has not, and for sizes that do not grow. */
export function requireSizes({ rounds }: Motif, sizes: readonly RoundSize[]): void {
  const outside = sizes.find(
    ({ round }) => !(Number.isInteger(round) && round >= 1 && round <= rounds.length),
  );
  if (outside) {
    throw new DomainError(
      'no-such-round',
      `measuredMotif requires rounds 1 to ${rounds.length}, got ${outside.round}`,
    );
  }
  const byRound = [...sizes].sort((a, b) => a.round - b.round);
  byRound.forEach(({ round, acrossMm }, i) => {
    const before = byRound[i - 1];
    const isGrown = acrossMm > (before?.acrossMm ?? 0) && acrossMm < Infinity;
    if (!isGrown || before?.round === round) {
      throw new DomainError(
        'sizes-do-not-grow',
        `measuredMotif requires sizes that grow from round to round, got ${acrossMm} after round ${round}`,
      );
    }
  });
}
