import { describe, expect, it } from 'vitest';
import { placeColourways } from '../../../src/lib/colour/placeColourways';
import { STRIPES } from '../../../src/lib/colour/placement';
import { stripeCounts } from '../../../src/lib/colour/stripeCounts';
import { layoutFaces, mapOf } from '../../../src/lib/layout/layoutFaces';
import { SQUARES } from '../../support/arrangements';

const upTo = (most: number): number[] => Array.from({ length: most }, (_, i) => i + 1);

describe('stripeCounts', () => {
  it('gives its worked examples', () => {
    expect(stripeCounts({ by: 'diagonals', width: 1 }, 2, 3, 2)).toEqual([3, 3]);
    expect(stripeCounts({ by: 'diagonals', width: 1 }, 1, 3, 2)).toEqual([2, 1]);
  });

  it.each(STRIPES)('counts %s motif by motif to the same', (by) => {
    for (const [rows, columns] of [
      [1, 1],
      [3, 7],
      [8, 5],
    ] as const) {
      const faces = layoutFaces(SQUARES, rows, columns);
      for (const kinds of upTo(5)) {
        for (const width of upTo(4)) {
          const rule = { by, width };
          const main = upTo(kinds).map((kind) => kind - 1);
          const { colourways } = placeColourways(
            { rule, painted: [], byHand: [] },
            { main, second: [] },
            faces,
            () => mapOf(faces),
          );
          const counted = main.map((kind) => colourways.filter((each) => each === kind).length);
          expect(stripeCounts(rule, rows, columns, kinds)).toEqual(counted);
        }
      }
    }
  });
});
