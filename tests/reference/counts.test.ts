import { describe, expect, it } from 'vitest';
import { readyMotif } from '../../src/lib';
import { gridCounts } from '../../src/lib/layout/gridCounts';
import { planeMap, type Outline } from '../../src/lib/layout/planeMap';
import { HEXAGONS, SQUARES } from '../support/arrangements';
import { referenceRows } from '../support/reference';

const upTo = (most: number): number[] => Array.from({ length: most }, (_, i) => i + 1);

describe('the classic group square', () => {
  const rounds = readyMotif('group-square')?.rounds ?? [];

  it.each(referenceRows<'round' | 'dc' | 'cumulative_dc'>('group-square.csv'))(
    'has $dc dc in round $round, $cumulative_dc in all',
    ({ round, dc, cumulative_dc }) => {
      const worked = rounds.slice(0, Number(round));
      expect(worked.at(-1)?.tally.dc).toBe(Number(dc));
      expect(worked.reduce((sum, { tally }) => sum + (tally.dc ?? 0), 0)).toBe(
        Number(cumulative_dc),
      );
    },
  );
});

describe('square grids', () => {
  it.each(referenceRows<'rows' | 'columns' | 'seams'>('square-grid-seams.csv'))(
    'of $rows × $columns have $seams seams',
    ({ rows, columns, seams }) => {
      expect(gridCounts(SQUARES, Number(rows), Number(columns)).joinedSides).toBe(Number(seams));
    },
  );

  it('follow the published formulas for every size up to 60 × 60', () => {
    for (const R of upTo(60)) {
      for (const C of upTo(60)) {
        const counts = gridCounts(SQUARES, R, C);
        expect(counts).toMatchObject({
          motifs: R * C,
          joinedSides: R * (C - 1) + C * (R - 1),
          outerSides: 2 * (R + C),
          insideJunctions: (R - 1) * (C - 1),
          edgeJunctions: 2 * (R - 1) + 2 * (C - 1),
          outerCorners: 4,
        });
        expect(4 * R * C).toBe(2 * counts.joinedSides + counts.outerSides);
      }
    }
  });
});

describe('offset rows of hexagons', () => {
  it.each(referenceRows<'rows' | 'columns' | 'seams'>('hexagon-rows.csv'))(
    'of $rows × $columns have $seams seams',
    ({ rows, columns, seams }) => {
      const counts = gridCounts(HEXAGONS, Number(rows), Number(columns));
      expect(counts.joinedSides).toBe(Number(seams));
    },
  );

  it('follow the published formula for every size up to 60 × 60', () => {
    for (const R of upTo(60)) {
      for (const C of upTo(60)) {
        const counts = gridCounts(HEXAGONS, R, C);
        expect(counts.joinedSides).toBe(3 * R * C - 2 * R - 2 * C + 1);
        expect(6 * R * C).toBe(2 * counts.joinedSides + counts.outerSides);
      }
    }
  });
});

describe('patches of hexagons round one', () => {
  /** Motifs of k rings, corners named by the three cells that meet there (axial coordinates). */
  function patch(rings: number): Outline[] {
    const cells: [q: number, r: number][] = [];
    for (let q = 1 - rings; q < rings; q += 1) {
      for (let r = Math.max(1 - rings, 1 - rings - q); r < Math.min(rings, rings - q); r += 1) {
        cells.push([q, r]);
      }
    }
    const around = [
      [1, 0],
      [1, -1],
      [0, -1],
      [-1, 0],
      [-1, 1],
      [0, 1],
    ] as const;
    return cells.map(([q, r]) =>
      around.map(([dq, dr], i) => {
        const [eq, er] = around[(i + 1) % 6] as readonly [number, number];
        const meeting = [`${q},${r}`, `${q + dq},${r + dr}`, `${q + eq},${r + er}`];
        return meeting.sort().join(' ');
      }),
    );
  }

  it.each(referenceRows<'rings' | 'motifs' | 'seams' | 'outer_sides'>('hexagon-patches.csv'))(
    'of $rings rings have $motifs motifs and $seams seams',
    (row) => {
      const k = Number(row.rings);
      const map = planeMap(patch(k));
      const joined = map.sides.filter(({ motifs }) => motifs.length === 2).length;
      expect(map.outlines).toHaveLength(Number(row.motifs)); // centred hexagonal numbers, OEIS A003215
      expect(joined).toBe(Number(row.seams));
      expect(map.sides.length - joined).toBe(Number(row.outer_sides));
      expect(map.corners).toHaveLength(6 * k ** 2); // published: 24 for two rings
      expect(map.corners.length - map.sides.length + (map.outlines.length + 1)).toBe(2);
    },
  );
});
