import type { StitchCounts } from '../stitches/stitch';
import type { Motif, MotifRound, MotifSides } from './motif';

/** What a newer save of a motif does otherwise than the one a plan holds. */
export interface MotifChanges {
  /** Sides before and now, where they differ. */
  readonly sides: readonly [before: MotifSides, now: MotifSides] | null;
  /** Rounds that the plan works and the newer save no longer has. */
  readonly roundsGone: number;
  /** Rounds that the newer save has beyond those of the plan. */
  readonly roundsMore: number;
  /** Rounds of both that are made otherwise, with what they count. */
  readonly rounds: readonly {
    readonly label: string;
    readonly before: StitchCounts;
    readonly now: StitchCounts;
  }[];
}

/**
 * Compares the motif of a plan, worked to so many rounds, with a newer save of it. A plan may work
 * fewer rounds than its motif has: more rounds alone alter nothing for it.
 *
 * Example: 4 rounds of which the 4th has 60 hdc, against 5 of which the 4th has 64: one round changed,
 * one more.
 */
export function motifChanges(planned: Motif, now: Motif): MotifChanges {
  const both = Math.min(planned.rounds.length, now.rounds.length);
  return {
    sides: planned.sides === now.sides ? null : [planned.sides, now.sides],
    roundsGone: planned.rounds.length - both,
    roundsMore: now.rounds.length - both,
    rounds: planned.rounds.slice(0, both).flatMap((round, i) => {
      const newer = now.rounds[i] as MotifRound;
      return isSame(round, newer)
        ? []
        : [{ label: newer.label, before: round.tally, now: newer.tally }];
    }),
  };
}

const isSame = (left: MotifRound, right: MotifRound): boolean =>
  sameCounts(left.made, right.made) &&
  sameCounts(left.tally, right.tally) &&
  sameCounts(left.spaces, right.spaces) &&
  left.perSide === right.perSide;

const sameCounts = (left: StitchCounts, right: StitchCounts): boolean =>
  Object.keys({ ...left, ...right }).every((code) => (left[code] ?? 0) === (right[code] ?? 0));
