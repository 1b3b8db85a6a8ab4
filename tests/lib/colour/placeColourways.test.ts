import { describe, expect, it } from 'vitest';
import { placeColourways } from '../../../src/lib/colour/placeColourways';
import type { Placement, PlacementRule } from '../../../src/lib/colour/placement';
import { layoutFaces, mapOf } from '../../../src/lib/layout/layoutFaces';
import type { Arrangement } from '../../../src/lib/layout/layouts';
import { SQUARES } from '../../support/arrangements';

const MAIN = { main: [0, 1, 2], second: [] } as const;

function placed(
  rule: PlacementRule,
  rows: number,
  columns: number,
  {
    painted = [] as Placement['painted'],
    byHand = [] as Placement['byHand'],
    groups = MAIN as { main: readonly number[]; second: readonly number[] },
    arrangement = SQUARES as Arrangement,
  } = {},
) {
  const faces = layoutFaces(arrangement, rows, columns);
  const result = placeColourways({ rule, painted, byHand }, groups, faces, () => mapOf(faces));
  return { ...result, faces };
}
const inRows = ({ colourways }: { colourways: readonly number[] }, columns: number): string[] =>
  Array.from({ length: colourways.length / columns }, (_, row) =>
    colourways.slice(row * columns, (row + 1) * columns).join(''),
  );

describe('placeColourways', () => {
  it('gives its worked example', () => {
    const two = { main: [0, 1], second: [] };
    const result = placed({ by: 'diagonals', width: 1 }, 2, 3, { groups: two });
    expect(inRows(result, 3)).toEqual(['010', '101']);
  });

  it('goes in rows, columns and checks as wide as asked', () => {
    expect(inRows(placed({ by: 'rows', width: 2 }, 5, 2), 2)).toEqual([
      '00',
      '00',
      '11',
      '11',
      '22',
    ]);
    expect(inRows(placed({ by: 'columns', width: 1 }, 2, 4), 4)).toEqual(['0120', '0120']);
    expect(inRows(placed({ by: 'checks', width: 2 }, 3, 4), 4)).toEqual(['0011', '0011', '1122']);
  });

  it('repeats a tile down and across', () => {
    const tile = [
      [0, 0, 1],
      [2, 1, 1],
    ];
    expect(inRows(placed({ by: 'repeat', tile }, 3, 5), 5)).toEqual(['00100', '21121', '00100']);
  });

  it('goes from the first of a gradient to its last', () => {
    const rule = { by: 'gradient', towards: 'down', order: [2, 0, 1], seed: 4 } as const;
    const { colourways } = placed(rule, 30, 6);
    const mean = (from: number, to: number): number => {
      const places = colourways.slice(from * 6, to * 6).map((each) => [2, 0, 1].indexOf(each));
      return places.reduce((sum, place) => sum + place, 0) / places.length;
    };
    expect(mean(0, 6)).toBeLessThan(0.2);
    expect(mean(12, 18)).toBeCloseTo(1, 0);
    expect(mean(24, 30)).toBeGreaterThan(1.8);
    expect(placed(rule, 30, 6).colourways).toEqual(colourways);
  });

  it('leaves what is painted as it is, whatever the rule', () => {
    const painted = [
      [0, 1, 2, 2],
      [1, 0, 1, 1],
    ] as const;
    const rules: PlacementRule[] = [
      { by: 'rows', width: 1 },
      { by: 'repeat', tile: [[0]] },
      { by: 'gradient', towards: 'outwards', order: [0, 1, 2], seed: 1 },
      { by: 'random', seed: 1, counts: null },
    ];
    for (const rule of rules) {
      const rows = inRows(placed(rule, 3, 4, { painted }), 4);
      expect(rows[0]?.slice(1, 3)).toBe('22');
      expect(rows[1]?.[0]).toBe('1');
    }
  });

  it('leaves a colourway that is only painted out of every rule', () => {
    const painted = [[1, 1, 1, 2]] as const;
    const rules: PlacementRule[] = [
      { by: 'rows', width: 1 },
      { by: 'gradient', towards: 'down', order: [0, 1, 2], seed: 1 },
      { by: 'random', seed: 1, counts: null },
    ];
    for (const rule of rules) {
      const { colourways, alike } = placed(rule, 3, 4, { painted, byHand: [2] });
      expect(colourways.flatMap((each, i) => (each === 2 ? [i] : []))).toEqual([5]);
      expect(colourways).not.toContain(-1);
      if (rule.by === 'random') expect(alike).toBe(0);
    }
  });

  it('makes as many at random as the counts ask', () => {
    const rule = { by: 'random', seed: 3, counts: [10, 4, 6] } as const;
    const { colourways } = placed(rule, 4, 5);
    expect([0, 1, 2].map((kind) => colourways.filter((each) => each === kind).length)).toEqual([
      10, 4, 6,
    ]);
  });

  it('gives second motifs colourways of their own', () => {
    const arrangement = { layout: 'octagons', edge: 'straight' } as const;
    const groups = { main: [0, 2], second: [1, 3] };
    const rule = { by: 'random', seed: 3, counts: null } as const;
    const { faces, colourways } = placed(rule, 4, 5, { arrangement, groups });
    faces.forEach(({ slot }, i) => {
      const own = slot === 'motifs' ? groups.main : groups.second;
      expect(own).toContain(colourways[i]);
    });
  });
});
