import type { Plan } from '../plan/plan';
import type { Blanket } from './blanketOf';
import type { LedgerLine } from './ledger';

/** One move of the hook at an easy pace: ours, until the maker times herself. */
export const SECONDS_PER_MOVE = 0.9;
/** One sewn stitch, drawn through: ours. */
const SECONDS_PER_SEWN_STITCH = 4;
/** Weaving in and trimming one tail: ours. */
const SECONDS_PER_TAIL = 45;

/** Time at the hook and the needle, in seconds: moves, sewn stitches and tails; and the join's part of it. */
export function workingTimeS(
  plan: Plan,
  blanket: Blanket,
  lines: readonly LedgerLine[],
): { readonly durationS: number; readonly joinDurationS: number } {
  const perMoveS = plan.secondsPerMove ?? SECONDS_PER_MOVE;
  const sewnStitches = blanket.join.sewn ? blanket.counts.joinedSides * blanket.sideStitches : 0;
  const lineS = ({ part, loops, count }: LedgerLine): number =>
    part === 'tails' ? count * SECONDS_PER_TAIL : loops * perMoveS;
  const ofJoin = lines.filter(
    ({ part, label }) => part === 'join' || (part === 'tails' && label === 'join'),
  );
  const sewnS = sewnStitches * SECONDS_PER_SEWN_STITCH;
  return {
    durationS: lines.reduce((sum, line) => sum + lineS(line), sewnS),
    joinDurationS: ofJoin.reduce((sum, line) => sum + lineS(line), sewnS),
  };
}
