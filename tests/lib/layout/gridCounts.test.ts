import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import { countsOf, gridCounts, MOST_ROWS } from '../../../src/lib/layout/gridCounts';
import { layoutMap, type Layout } from '../../../src/lib/layout/layouts';
import { bruteCounts } from '../../support/bruteCounts';

const upTo = (most: number): number[] => Array.from({ length: most }, (_, i) => i + 1);
const layouts: Layout[] = ['square', 'offset-hexagons'];

describe('countsOf', () => {
  it('reads two squares off their map', () => {
    expect(countsOf(layoutMap('square', 1, 2))).toEqual({
      motifs: 2,
      joinedSides: 1,
      outerSides: 6,
      insideJunctions: 0,
      edgeJunctions: 2,
      outerCorners: 4,
    });
  });
});

describe('gridCounts', () => {
  it('gives its worked example', () => {
    expect(gridCounts('square', 14, 16).joinedSides).toBe(418); // CALC: R(C-1) + C(R-1)
  });

  it.each(layouts)(
    'counts %s by the corners they share, for every size up to 13 × 13',
    (layout) => {
      for (const rows of upTo(13)) {
        for (const columns of upTo(13)) {
          expect({ rows, columns, ...gridCounts(layout, rows, columns) }).toEqual({
            rows,
            columns,
            ...bruteCounts(layout, rows, columns),
          });
        }
      }
    },
  );

  it.each(layouts)('counts %s as large as they may be', (layout) => {
    expect(gridCounts(layout, MOST_ROWS, 3)).toEqual(bruteCounts(layout, MOST_ROWS, 3));
    expect(gridCounts(layout, 57, 58)).toEqual(bruteCounts(layout, 57, 58));
  });

  it('counts a single motif', () => {
    expect(gridCounts('square', 1, 1)).toEqual({
      motifs: 1,
      joinedSides: 0,
      outerSides: 4,
      insideJunctions: 0,
      edgeJunctions: 0,
      outerCorners: 4,
    });
    expect(gridCounts('offset-hexagons', 1, 1)).toMatchObject({ outerSides: 6, outerCorners: 6 });
  });

  it.each([
    [0, 5],
    [5, 0],
    [-1, 5],
    [2.5, 5],
    [NaN, 5],
    [5, Infinity],
    [401, 1],
  ])('refuses %d × %d', (rows, columns) => {
    expect(() => gridCounts('square', rows, columns)).toThrow(DomainError);
  });
});
