import type { StitchCounts } from './stitch';

/** Sum of two counts, stitch by stitch: `addCounts({ sc: 2 }, { sc: 1, ch: 1 })` is `{ sc: 3, ch: 1 }`. */
export function addCounts(left: StitchCounts, right: StitchCounts): StitchCounts {
  const sum: Record<string, number> = { ...left };
  for (const [code, count] of Object.entries(right)) sum[code] = (sum[code] ?? 0) + count;
  return sum;
}

/** Counts times a whole or fractional number: `scaleCounts({ sc: 2 }, 3)` is `{ sc: 6 }`. */
export function scaleCounts(counts: StitchCounts, factor: number): StitchCounts {
  return Object.fromEntries(Object.entries(counts).map(([code, count]) => [code, count * factor]));
}

/** `left` less `right`, never below zero; stitches that vanish are left out. */
export function subtractCounts(left: StitchCounts, right: StitchCounts): StitchCounts {
  return Object.fromEntries(
    Object.entries(left)
      .map(([code, count]) => [code, Math.max(0, count - (right[code] ?? 0))] as const)
      .filter(([, count]) => count > 0),
  );
}

/** All stitches together: `totalCount({ sc: 6, ch: 1 })` is 7. */
export const totalCount = (counts: StitchCounts): number =>
  Object.values(counts).reduce((sum, count) => sum + count, 0);
