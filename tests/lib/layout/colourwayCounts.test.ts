import { describe, expect, it } from 'vitest';
import { colourwayCounts } from '../../../src/lib/layout/colourwayCounts';

const upTo = (most: number): number[] => Array.from({ length: most }, (_, i) => i + 1);

describe('colourwayCounts', () => {
  it('gives its worked examples', () => {
    expect(colourwayCounts(2, 3, 2)).toEqual([3, 3]);
    expect(colourwayCounts(1, 3, 2)).toEqual([2, 1]);
  });

  it('counts motif by motif to the same, for every grid up to 9 × 9 and 5 colourways', () => {
    for (const rows of upTo(9)) {
      for (const columns of upTo(9)) {
        for (const colourways of upTo(5)) {
          const counts = upTo(colourways).map(() => 0);
          for (let motif = 0; motif < rows * columns; motif += 1) {
            const which = (Math.floor(motif / columns) + (motif % columns)) % colourways;
            counts[which] = (counts[which] ?? 0) + 1;
          }
          expect(colourwayCounts(rows, columns, colourways)).toEqual(counts);
        }
      }
    }
  });

  it('leaves colourways out when there are more of them than diagonals', () => {
    expect(colourwayCounts(1, 1, 3)).toEqual([1, 0, 0]);
  });
});
