import type { Motif } from '../motifs/motif';
import type { Fit, Join } from './join';

/** A round of sc with 3 sc in each corner adds this many stitches to every side. */
const STITCHES_ADDED_BY_SC_ROUND = 2;

/** Whether a side fits, and if not, what would. */
export type FitResult =
  | { readonly fits: true; readonly repeats: number }
  | {
      readonly fits: false;
      /** Whole repeats that there is room for. */
      readonly repeats: number;
      /** Stitches over the last count that fits. */
      readonly over: number;
      /** Nearest counts that fit, below (when there is one) and above. */
      readonly nearest: readonly number[];
      /** Rounds of sc with 3 in each corner that would make it fit, or null when none would. */
      readonly scRounds: number | null;
    };

/**
 * Whether a side of `n` stitches between corner centres suits a join that needs n = r modulo m.
 *
 * Example: 15 stitches for 4 q + 3 fit with 3 repeats; 16 do not: nearest 15 and 19, and no number
 * of sc rounds helps, since each adds 2.
 */
export function fitOf(n: number, { multipleOf: m, plus: r }: Fit): FitResult {
  const repeats = Math.max(0, Math.floor((n - r) / m));
  const below = repeats * m + r;
  if (below === n) return { fits: true, repeats };
  const nearest = n < r ? [r] : [below, below + m];
  return { fits: false, repeats, over: n - below, nearest, scRounds: scRoundsToFit(n, m, r) };
}

function scRoundsToFit(n: number, m: number, r: number): number | null {
  for (let rounds = 1; rounds <= m; rounds += 1) {
    const stitches = n + rounds * STITCHES_ADDED_BY_SC_ROUND;
    if (stitches >= r && (stitches - r) % m === 0) return rounds;
  }
  return null;
}

/**
 * The fit in words: "15 stitches a side fit: 3 repeats of 4, and 3." Singular and plural as due.
 */
export function fitInWords(n: number, fit: Fit): string {
  const result = fitOf(n, fit);
  const side = `${counted(n, 'stitch', 'stitches')} a side`;
  if (result.fits) {
    const verb = n === 1 ? 'fits' : 'fit';
    return fit.multipleOf === 1
      ? `${side} ${verb}: any count does.`
      : `${side} ${verb}: ${counted(result.repeats, 'repeat', 'repeats')} of ${fit.multipleOf}, and ${fit.plus}.`;
  }
  const rounds = result.scRounds;
  const cure =
    rounds === null
      ? 'Rounds of sc cannot make it fit: choose another number of rounds or another join.'
      : `${counted(rounds, 'round', 'rounds')} of sc with 3 sc in each corner would make it fit.`;
  return `${side} ${n === 1 ? 'does' : 'do'} not fit a multiple of ${fit.multipleOf} and ${fit.plus}: ${result.nearest.join(' or ')} would. ${cure}`;
}

const counted = (count: number, one: string, more: string): string =>
  `${count} ${count === 1 ? one : more}`;

/** Whether a join needs chain spaces along the sides of a motif whose last round has none. */
export function lacksSpaces({ needsSpaces = false }: Join, motif: Motif): boolean {
  const last = motif.rounds.at(-1);
  return needsSpaces && !Object.keys(last?.spaces ?? {}).some((kind) => kind !== last?.cornerSpace);
}

/** How a join suits a motif whose side it works along `n` stitches of: yes or no, and why in words. */
export function joinFit(join: Join, motif: Motif, n: number): { fits: boolean; words: string } {
  if (lacksSpaces(join, motif)) {
    return { fits: false, words: 'The last round has no chain spaces along its sides to link by.' };
  }
  return { fits: fitOf(n, join.fit).fits, words: fitInWords(n, join.fit) };
}
