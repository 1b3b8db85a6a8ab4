/** What stands along a line: how much of it it takes, and where it would like to stand. */
export interface Standing {
  readonly width: number;
  /** Place of its foot, or null where it hangs on nothing. */
  readonly foot: number | null;
  /** How many stand in the same place, and so pull only together as strongly as one. */
  readonly sharing?: number;
}

/** How strongly a foot pulls, against the spring between neighbours one width apart: ours. */
export const FOOT_PULL = 0.3;

/**
 * Places of things in a row between two fixed ends: as far apart as they are wide, scaled to the
 * room there is, each drawn a little towards its foot. `begin` and `end` are null where that end is free.
 * Variant: springs between neighbours and to the feet, at rest; one tridiagonal system, so that the
 * cost grows with the length only.
 *
 * Example: two things of width 1 without feet between walls of no width at 0 and 2 stand at 0.5 and 1.5.
 */
export function spread(
  things: readonly Standing[],
  begin: { at: number; width: number } | null,
  end: { at: number; width: number } | null,
  pull = FOOT_PULL,
): number[] {
  const widths = [begin?.width ?? 0, ...things.map(({ width }) => width), end?.width ?? 0];
  const natural = widths.slice(1).map((width, i) => (width + (widths[i] ?? 0)) / 2);
  const total = natural.reduce((sum, gap) => sum + gap, 0);
  const scale = begin && end ? (end.at - begin.at) / total : 1;
  const gaps = natural.map((gap) => Math.max(1e-9, gap * scale));
  const unit = gaps.reduce((sum, gap) => sum + gap, 0) / Math.max(1, gaps.length);
  // One row for each thing: below * left + diagonal * itself + above * right = value.
  const rows = things.map(({ foot, sharing = 1 }, i) => {
    const left = i === 0 && !begin ? 0 : unit / (gaps[i] ?? 1);
    const right = i === things.length - 1 && !end ? 0 : unit / (gaps[i + 1] ?? 1);
    const own = foot === null ? 0 : pull / sharing;
    let value = own * (foot ?? 0) + left * (gaps[i] ?? 0) - right * (gaps[i + 1] ?? 0);
    if (i === 0 && begin) value += left * begin.at;
    if (i === things.length - 1 && end) value += right * end.at;
    return { left, right, diagonal: own + left + right || 1, value };
  });
  return solved(rows);
}

interface Row {
  left: number;
  right: number;
  diagonal: number;
  value: number;
}

/** Thomas's algorithm for a tridiagonal system whose off-diagonals are -left and -right. */
function solved(rows: readonly Row[]): number[] {
  const ratio: number[] = [];
  const value: number[] = [];
  rows.forEach((row, i) => {
    const pivot = row.diagonal - (i === 0 ? 0 : row.left * (ratio[i - 1] ?? 0));
    ratio.push(row.right / pivot);
    value.push((row.value + (i === 0 ? 0 : row.left * (value[i - 1] ?? 0))) / pivot);
  });
  for (let i = rows.length - 2; i >= 0; i -= 1)
    value[i] = (value[i] ?? 0) + (ratio[i] ?? 0) * (value[i + 1] ?? 0);
  return value;
}
