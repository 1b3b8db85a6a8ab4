/**
 * How many motifs each of `colourways` gets when they alternate along the diagonals of the grid:
 * the motif in row r and column c is number (r + c) modulo their count. Cost grows with
 * rows + columns, not with the area.
 *
 * Example: `colourwayCounts(2, 3, 2)` is `[3, 3]`; `colourwayCounts(1, 3, 2)` is `[2, 1]`.
 */
export function colourwayCounts(rows: number, columns: number, colourways: number): number[] {
  const counts = Array.from({ length: colourways }, () => 0);
  for (let diagonal = 0; diagonal < rows + columns - 1; diagonal += 1) {
    const motifs = Math.min(diagonal + 1, rows, columns, rows + columns - 1 - diagonal);
    counts[diagonal % colourways] = (counts[diagonal % colourways] ?? 0) + motifs;
  }
  return counts;
}
