import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import { countsOf, gridCounts, MOST_ROWS } from '../../../src/lib/layout/gridCounts';
import { layoutFaces, mapOf } from '../../../src/lib/layout/layoutFaces';
import type { Arrangement } from '../../../src/lib/layout/layouts';
import { ARRANGEMENTS, HEXAGONS, SQUARES } from '../../support/arrangements';
import { bruteCounts } from '../../support/bruteCounts';

const upTo = (most: number): number[] => Array.from({ length: most }, (_, i) => i + 1);
const counted = (arrangement: Arrangement, rows: number, columns: number) => {
  const faces = layoutFaces(arrangement, rows, columns);
  return countsOf(arrangement, faces, mapOf(faces));
};
const named = ARRANGEMENTS.map((each) => [`${each.layout}, ${each.edge}`, each] as const);

describe('gridCounts', () => {
  it('gives its worked example', () => {
    expect(gridCounts(SQUARES, 14, 16).joinedSides).toBe(418); // CALC: R(C-1) + C(R-1)
  });

  it.each(named)('carries %s on as its whole map has it, up to 9 × 9', (_, arrangement) => {
    for (const rows of upTo(9)) {
      for (const columns of upTo(9)) {
        const { joinedSides, outerSides, ...whole } = counted(arrangement, rows, columns);
        const counts = gridCounts(arrangement, rows, columns);
        expect({ rows, columns, ...counts }).toMatchObject({ rows, columns, ...whole });
        expect(counts.joinedSides).toBeCloseTo(joinedSides, 8);
        expect(counts.outerSides).toBeCloseTo(outerSides, 8);
      }
    }
  });

  it.each([
    ['squares', SQUARES],
    ['hexagons', HEXAGONS],
  ])('counts %s by the middles of their sides, for every size up to 13 × 13', (_, arrangement) => {
    for (const rows of upTo(13)) {
      for (const columns of upTo(13)) {
        const brute = bruteCounts(arrangement.layout, rows, columns);
        expect(gridCounts(arrangement, rows, columns)).toMatchObject(brute);
      }
    }
    expect(gridCounts(arrangement, MOST_ROWS, 3)).toMatchObject(
      bruteCounts(arrangement.layout, MOST_ROWS, 3),
    );
  });

  it.each(named)('shares every side of %s out: joined twice, and outer once', (_, arrangement) => {
    for (const [rows, columns] of [
      [1, 1],
      [3, 4],
      [6, 5],
    ] as const) {
      const map = mapOf(layoutFaces(arrangement, rows, columns));
      const joined = map.sides.filter(({ motifs }) => motifs.length === 2).length;
      const all = map.outlines.reduce((sum, outline) => sum + outline.length, 0);
      expect(2 * joined + (map.sides.length - joined)).toBe(all);
    }
  });

  it('links corners as often as junctions ask: squares crossed 2 and gathered 3 inside, 1 on the edge', () => {
    // inside (10 - 1)(8 - 1) = 63; on the edge 2 × 9 + 2 × 7 = 32
    const counts = gridCounts(SQUARES, 10, 8);
    expect(counts.crossedLinks).toBe(63 * 2 + 32);
    expect(counts.gatheredLinks).toBe(63 * 3 + 32);
    expect(gridCounts(SQUARES, 1, 1).crossedLinks).toBe(0);
    expect(gridCounts(SQUARES, 1, 2).gatheredLinks).toBe(2);
  });

  it('gathers three corners of hexagons whatever is asked for', () => {
    const { crossedLinks, gatheredLinks, insideJunctions, edgeJunctions } = gridCounts(
      HEXAGONS,
      3,
      4,
    );
    expect(crossedLinks).toBe(2 * insideJunctions + edgeJunctions);
    expect(gatheredLinks).toBe(crossedLinks);
  });

  it('counts six corners of triangles gathered five times and crossed three', () => {
    // strips of 2 and 5: one junction of six inside, by hand from a drawing
    const counts = gridCounts({ layout: 'triangles', edge: 'toothed' }, 2, 5);
    expect(counts.insideJunctions).toBe(2);
    expect(counts.gatheredLinks - counts.crossedLinks).toBe(2 * (5 - 3));
  });

  it('finds the lines that seams can be worked in without cutting', () => {
    // squares: every row and every column; hexagons: zigzags between rows, and each seam in a row
    expect(gridCounts(SQUARES, 10, 8).seamLines).toBe(9 + 7);
    expect(gridCounts(HEXAGONS, 5, 7).seamLines).toBe(4 + 5 * 6);
  });

  it('straightens edges with halves and quarters', () => {
    expect(gridCounts({ layout: 'brick', edge: 'straight' }, 6, 4)).toMatchObject({
      motifs: 3 * 4 + 3 * 3,
      halves: 6,
    });
    // 3 rows of 2 on point: rows of 2, 1, 2; infill above and below 1 each and 2 at the sides
    expect(gridCounts({ layout: 'on-point', edge: 'straight' }, 3, 2)).toMatchObject({
      motifs: 5,
      halves: 4,
      quarters: 4,
    });
    expect(gridCounts({ layout: 'octagons', edge: 'straight' }, 3, 4)).toMatchObject({
      motifs: 12,
      fillers: 6,
      halfFillers: 10,
      quarterFillers: 4,
    });
    expect(gridCounts({ layout: 'large-and-small', edge: 'toothed' }, 3, 3)).toMatchObject({
      motifs: 5,
      fillers: 16,
    });
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
    expect(() => gridCounts(SQUARES, rows, columns)).toThrow(DomainError);
  });
});
