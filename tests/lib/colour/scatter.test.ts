import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evenQuotas, scatter } from '../../../src/lib/colour/scatter';
import { seeded } from '../../../src/lib/colour/seeded';
import { layoutFaces, mapOf } from '../../../src/lib/layout/layoutFaces';
import { ARRANGEMENTS } from '../../support/arrangements';
import { FIXED_SEED } from '../../support/plans';

type Neighbours = readonly (readonly number[])[];

function neighboursOf(arrangement: (typeof ARRANGEMENTS)[number], rows: number, columns: number) {
  const faces = layoutFaces(arrangement, rows, columns);
  const near: number[][] = faces.map(() => []);
  for (const { motifs } of mapOf(faces).sides) {
    const [one, other] = motifs;
    if (one === undefined || other === undefined) continue;
    near[one]?.push(other);
    near[other]?.push(one);
  }
  return near;
}

function scattered(neighbours: Neighbours, kinds: number, seed: number) {
  const random = seeded(seed);
  return scatter({
    neighbours,
    settled: neighbours.map(() => null),
    quotas: evenQuotas(neighbours.length, kinds, random),
    random,
  });
}

const countsOf = (kinds: readonly number[], count: number): number[] =>
  Array.from({ length: count }, (_, kind) => kinds.filter((each) => each === kind).length);
const alikeOf = (neighbours: Neighbours, kinds: readonly number[]): number =>
  neighbours.flatMap((near, i) => near.filter((each) => each > i && kinds[each] === kinds[i]))
    .length;

describe('scatter', () => {
  it.each(ARRANGEMENTS)(
    'puts no two alike side by side in $layout, $edge, with counts that differ by one at most',
    (arrangement) => {
      fc.assert(
        fc.property(
          fc.integer({ min: 1, max: 12 }),
          fc.integer({ min: 1, max: 12 }),
          // Common practice, no source: four colourways suffice on squares, one more round hexagons.
          fc.integer({ min: 5, max: 9 }),
          fc.nat(1e6),
          (rows, columns, kinds, seed) => {
            const neighbours = neighboursOf(arrangement, rows, columns);
            const result = scattered(neighbours, kinds, seed);
            const counts = countsOf(result.kinds, kinds);
            expect(alikeOf(neighbours, result.kinds)).toBe(0);
            expect(result.alike).toBe(0);
            expect(Math.max(...counts) - Math.min(...counts)).toBeLessThanOrEqual(1);
          },
        ),
        FIXED_SEED,
      );
    },
  );

  it('finds the checkerboard for two kinds on squares, and the threefold one on hexagons', () => {
    // Textbook: a square grid is bipartite; the faces of a hexagonal tiling take three colours.
    const squares = neighboursOf({ layout: 'square', edge: 'toothed' }, 9, 8);
    const hexagons = neighboursOf({ layout: 'offset-hexagons', edge: 'toothed' }, 7, 8);
    for (let seed = 0; seed < 20; seed += 1) {
      expect(scattered(squares, 2, seed).alike).toBe(0);
      expect(scattered(hexagons, 3, seed).alike).toBe(0);
    }
  });

  it('says how many pairs it could not part', () => {
    const hexagons = neighboursOf({ layout: 'offset-hexagons', edge: 'toothed' }, 2, 2);
    const { kinds, alike } = scattered(hexagons, 2, 1);
    expect(alike).toBe(alikeOf(hexagons, kinds));
    expect(alike).toBeGreaterThan(0);
  });

  it('keeps what is settled, and never exceeds quotas that leave room', () => {
    const neighbours = neighboursOf({ layout: 'square', edge: 'toothed' }, 10, 8);
    const settled = neighbours.map((_, i) => (i % 11 === 0 ? 3 : null));
    const quotas = [30, 10, 20, 20];
    const { kinds } = scatter({ neighbours, settled, quotas, random: seeded(7) });
    settled.forEach((kind, i) => kind !== null && expect(kinds[i]).toBe(kind));
    expect(countsOf(kinds, 4)).toEqual(quotas);
  });

  it('is the same for the same seed, and another for another', () => {
    const neighbours = neighboursOf({ layout: 'square', edge: 'toothed' }, 10, 8);
    expect(scattered(neighbours, 4, 5)).toEqual(scattered(neighbours, 4, 5));
    expect(scattered(neighbours, 4, 5)).not.toEqual(scattered(neighbours, 4, 6));
  });

  it('finds a fair arrangement wherever one exists: brute force on six squares', () => {
    const neighbours = neighboursOf({ layout: 'square', edge: 'toothed' }, 2, 3);
    for (const kinds of [2, 3, 4]) {
      const all = Array.from({ length: kinds ** 6 }, (_, code) =>
        neighbours.map((__, i) => Math.floor(code / kinds ** i) % kinds),
      );
      const fair = all.filter((each) => {
        const counts = countsOf(each, kinds);
        return alikeOf(neighbours, each) === 0 && Math.max(...counts) - Math.min(...counts) <= 1;
      });
      expect(fair.length).toBeGreaterThan(0);
      for (let seed = 0; seed < 30; seed += 1) {
        expect(fair).toContainEqual(scattered(neighbours, kinds, seed).kinds);
      }
    }
  });
});

describe('evenQuotas', () => {
  it('shares out so that no two differ by more than one', () => {
    const quotas = evenQuotas(80, 3, seeded(1));
    expect(quotas.reduce((sum, quota) => sum + quota)).toBe(80);
    expect(quotas.toSorted()).toEqual([26, 27, 27]);
  });
});
