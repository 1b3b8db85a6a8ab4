import { describe, expect, it } from 'vitest';
import { SLOT_FACTS } from '../../../src/lib/layout/face';
import { cornerInsets, placed } from '../../../src/lib/layout/lattice';
import { layoutFaces, mapOf } from '../../../src/lib/layout/layoutFaces';
import { ARRANGEMENTS } from '../../support/arrangements';

const sizes = [1, 2, 3, 5, 8].flatMap((rows) =>
  [1, 2, 4, 7].map((columns) => [rows, columns] as const),
);
type Point = readonly [number, number];
const areaOf = (outline: readonly Point[]): number =>
  outline.reduce((sum, [x, y], i) => {
    const [nextX, nextY] = outline[(i + 1) % outline.length] as Point;
    return sum + (x * nextY - nextX * y) / 2;
  }, 0);

describe.each(ARRANGEMENTS)('layoutFaces of $layout, $edge', (arrangement) => {
  const outlines = (rows: number, columns: number): Point[][] =>
    layoutFaces(arrangement, rows, columns).map(({ points }) =>
      points.map((point) => placed(arrangement.layout, point)),
    );

  it.each(sizes)('obeys Euler, V - E + F = 2, for %i × %i', (rows, columns) => {
    // Textbook; large squares of a single row of blocks, or motifs that only touch at a point, stay connected.
    const map = mapOf(layoutFaces(arrangement, rows, columns));
    expect(map.corners.length - map.sides.length + (map.outlines.length + 1)).toBe(2);
  });

  it('shares each side between two motifs at most', () => {
    const { sides } = mapOf(layoutFaces(arrangement, 5, 6));
    expect(Math.max(...sides.map(({ motifs }) => motifs.length))).toBe(2);
  });

  it('goes round every motif clockwise, its corners all as far out as they should be', () => {
    for (const outline of outlines(4, 5)) {
      expect(areaOf(outline)).toBeGreaterThan(0);
      for (const [x, y] of cornerInsets(outline)) expect(Math.hypot(x, y)).toBeLessThan(4);
    }
  });

  it('gives whole motifs of a kind the same area, halves half of it and quarters a quarter', () => {
    const faces = layoutFaces(arrangement, 4, 5);
    const areas = new Map<boolean, number>();
    outlines(4, 5).forEach((outline, i) => {
      const { second, share } = SLOT_FACTS[faces[i]?.slot ?? 'motifs'];
      const whole = areaOf(outline) / share;
      expect(whole).toBeCloseTo(areas.get(second) ?? whole, 10);
      areas.set(second, whole);
    });
  });

  it('leaves nothing uncovered: motifs have the area of the outline round them', () => {
    const faces = layoutFaces(arrangement, 4, 5);
    const all = outlines(4, 5).reduce((sum, outline) => sum + areaOf(outline), 0);
    const map = mapOf(faces);
    const places = new Map(
      faces.flatMap(({ points }) =>
        points.map((point) => [`${point[0]},${point[1]}`, placed(arrangement.layout, point)]),
      ),
    );
    // The outer sides, each the way its motif goes round, enclose the whole.
    const outer = map.outlines.flatMap((outline) =>
      outline.flatMap((from, i) => {
        const to = outline[(i + 1) % outline.length] as string;
        const side = map.sides.find(({ ends }) => ends.includes(from) && ends.includes(to));
        return side?.motifs.length === 1 ? [[places.get(from), places.get(to)]] : [];
      }),
    );
    const enclosed = outer.reduce((sum, [from, to]) => {
      const [[x, y], [nextX, nextY]] = [from as Point, to as Point];
      return sum + (x * nextY - nextX * y) / 2;
    }, 0);
    expect(all).toBeCloseTo(enclosed, 8);
  });

  it('gives every motif of a kind an address of its own', () => {
    const addresses = layoutFaces(arrangement, 6, 5).map(
      ({ slot, row, column }) => `${SLOT_FACTS[slot].second} ${row} ${column}`,
    );
    expect(new Set(addresses).size).toBe(addresses.length);
  });
});

it('fills a rectangle where the edge is straight', () => {
  for (const layout of ['brick', 'on-point', 'octagons', 'triangles'] as const) {
    const faces = layoutFaces({ layout, edge: 'straight' }, 4, 5);
    const outlines = faces.map(({ points }) => points.map((point) => placed(layout, point)));
    const [xs, ys] = [0, 1].map((axis) => outlines.flat().map((point) => point[axis] as number));
    const span = (values: readonly number[] = []) => Math.max(...values) - Math.min(...values);
    const all = outlines.reduce((sum, outline) => sum + areaOf(outline), 0);
    expect(all).toBeCloseTo(span(xs) * span(ys), 8);
  }
});

it('leaves squares of an octagon’s side between octagons', () => {
  // Textbook: an octagon of side s is (1 + √2) s wide
  const faces = layoutFaces({ layout: 'octagons', edge: 'toothed' }, 2, 2);
  const sides = faces.map(({ points }) => {
    const [from, to] = points.map((point) => placed('octagons', point));
    return Math.hypot((to?.[0] ?? 0) - (from?.[0] ?? 0), (to?.[1] ?? 0) - (from?.[1] ?? 0));
  });
  for (const side of sides) expect(side).toBeCloseTo(2 / (1 + Math.SQRT2), 10);
});
