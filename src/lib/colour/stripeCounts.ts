import type { PlacementRule, Stripes } from './placement';

/**
 * How many motifs of a full grid each of `colourways` gets where they only take turns. Cost grows
 * with rows + columns and the colourways, not with the area.
 *
 * Example: `stripeCounts({ by: 'diagonals', width: 1 }, 2, 3, 2)` is `[3, 3]`; of 1 × 3 `[2, 1]`.
 */
export function stripeCounts(
  { by, width }: PlacementRule & { by: Stripes },
  rows: number,
  columns: number,
  colourways: number,
): number[] {
  const counts = Array.from({ length: colourways }, () => 0);
  const add = (turn: number, motifs: number): void => {
    counts[turn % colourways] = (counts[turn % colourways] ?? 0) + motifs;
  };
  if (by === 'diagonals') {
    for (let diagonal = 0; diagonal < rows + columns - 1; diagonal += 1) {
      const motifs = Math.min(diagonal + 1, rows, columns, rows + columns - 1 - diagonal);
      add(Math.floor(diagonal / width), motifs);
    }
    return counts;
  }
  const down = turns(by === 'columns' ? Infinity : width, rows, colourways);
  const across = turns(by === 'rows' ? Infinity : width, columns, colourways);
  down.forEach((high, i) => across.forEach((wide, j) => add(i + j, high * wide)));
  return counts;
}

/** Of `size` rows, how many are at each turn when it changes every `width` rows. */
function turns(width: number, size: number, colourways: number): number[] {
  const counts = Array.from({ length: colourways }, () => 0);
  for (let i = 0; i < size; i += 1) {
    const turn = Math.floor(i / width) % colourways;
    counts[turn] = (counts[turn] ?? 0) + 1;
  }
  return counts;
}
