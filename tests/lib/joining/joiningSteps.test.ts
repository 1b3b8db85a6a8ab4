import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { joiningSteps } from '../../../src/lib/joining/joiningSteps';
import { makingOrder, MAKING_ORDERS, type MakingOrder } from '../../../src/lib/joining/makingOrder';
import { gridCounts } from '../../../src/lib/layout/gridCounts';
import { layoutFaces, mapOf } from '../../../src/lib/layout/layoutFaces';
import type { Arrangement } from '../../../src/lib/layout/layouts';
import type { Plan } from '../../../src/lib/plan/plan';
import { ARRANGEMENTS, SQUARES } from '../../support/arrangements';
import { FIXED_SEED } from '../../support/plans';

function steps(
  arrangement: Arrangement,
  rows: number,
  columns: number,
  corners: Plan['corners'],
  order: MakingOrder = 'row-by-row',
) {
  const faces = layoutFaces(arrangement, rows, columns);
  const map = mapOf(faces);
  const made = makingOrder(arrangement.layout, faces, map, order);
  return { map, made, steps: joiningSteps(arrangement.layout, faces, map, made, corners) };
}

describe('joiningSteps', () => {
  it('gives its worked example: the third crosses to the second, the fourth to the first', () => {
    expect(steps(SQUARES, 2, 2, 'crossed').steps).toEqual([
      { face: 0, sides: [], corners: [{ corner: 'bottom right', to: null, reason: 'open' }] },
      {
        face: 1,
        sides: [{ side: 'left', to: 0 }],
        corners: [
          { corner: 'top left', to: 0, reason: 'edge' },
          { corner: 'bottom left', to: null, reason: 'open' },
        ],
      },
      {
        face: 2,
        sides: [{ side: 'top', to: 0 }],
        corners: [
          { corner: 'top left', to: 0, reason: 'edge' },
          { corner: 'top right', to: 1, reason: 'crossed' },
        ],
      },
      {
        face: 3,
        sides: [
          { side: 'top', to: 1 },
          { side: 'left', to: 2 },
        ],
        corners: [
          { corner: 'top left', to: 0, reason: 'crossed' },
          { corner: 'top right', to: 1, reason: 'edge' },
          { corner: 'bottom left', to: 2, reason: 'edge' },
        ],
      },
    ]);
  });

  it('gathers every corner that arrives into the first that stands there', () => {
    const inside = steps(SQUARES, 2, 2, 'gathered').steps.flatMap(({ face, corners }) =>
      corners.flatMap(({ to, reason }) => (reason === 'gathered' ? [[face, to]] : [])),
    );
    expect(inside).toEqual([
      [1, 0],
      [2, 0],
      [3, 0],
    ]);
  });

  describe.each(ARRANGEMENTS)('for $layout, $edge', (arrangement) => {
    it.each(MAKING_ORDERS)('links everything once, and nothing not yet made, %s', (order) => {
      fc.assert(
        fc.property(
          fc.integer({ min: 1, max: 60 }),
          fc.integer({ min: 1, max: 60 }),
          fc.constantFrom('crossed' as const, 'gathered' as const),
          (rows, columns, corners) => {
            const { map, made, steps: all } = steps(arrangement, rows, columns, corners, order);
            expect(made.toSorted((a, b) => a - b)).toEqual(map.outlines.map((_, i) => i));
            const place = new Map(made.map((face, i) => [face, i]));
            const sides: string[] = [];
            const wrong: string[] = [];
            let links = 0;
            for (const step of all) {
              const now = place.get(step.face) as number;
              for (const { to } of step.sides) {
                if ((place.get(to) as number) >= now) wrong.push(`side of ${step.face} to ${to}`);
                sides.push([to, step.face].sort((a, b) => a - b).join());
              }
              for (const { to } of step.corners) {
                if (to === null) continue;
                if ((place.get(to) as number) >= now) wrong.push(`corner of ${step.face} to ${to}`);
                links += 1;
              }
              const named = step.sides.map(({ side }) => side);
              if (new Set(named).size !== named.length) wrong.push(`names of ${step.face}`);
            }
            expect(wrong).toEqual([]);
            const joined = map.sides.filter(({ motifs }) => motifs.length === 2);
            expect(sides.sort()).toEqual(
              joined.map(({ motifs }) => [...motifs].sort((a, b) => a - b).join()).sort(),
            );
            expect(links).toBe(gridCounts(arrangement, rows, columns)[`${corners}Links`]);
          },
        ),
        { ...FIXED_SEED, numRuns: 8 },
      );
    });

    it('has every motif touch one already made, from the middle outwards', () => {
      const { made, steps: all } = steps(arrangement, 7, 6, 'crossed', 'outwards');
      expect(all.filter(({ sides }) => sides.length === 0)).toHaveLength(1);
      expect(made).toHaveLength(all.length);
    });
  });

  it('leaves two corners open at every junction inside that is crossed', () => {
    const { steps: all } = steps(SQUARES, 10, 8, 'crossed');
    const open = all.flatMap(({ corners }) => corners.filter(({ reason }) => reason === 'open'));
    expect(open).toHaveLength(2 * 9 * 7);
  });
});

describe('makingOrder', () => {
  const order = (which: MakingOrder) => steps(SQUARES, 3, 3, 'crossed', which).made;

  it('goes row by row, in columns, there and back, or outwards from the middle', () => {
    expect(order('row-by-row')).toEqual([0, 1, 2, 3, 4, 5, 6, 7, 8]);
    expect(order('in-columns')).toEqual([0, 3, 6, 1, 4, 7, 2, 5, 8]);
    expect(order('continuous')).toEqual([0, 1, 2, 5, 4, 3, 6, 7, 8]);
    expect(order('outwards')).toEqual([4, 1, 5, 7, 3, 2, 8, 6, 0]);
  });
});
