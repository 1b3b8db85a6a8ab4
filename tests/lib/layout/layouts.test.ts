import { describe, expect, it } from 'vitest';
import { layoutFor, layoutMap, type Layout } from '../../../src/lib/layout/layouts';
import type { MotifSides } from '../../../src/lib/motifs/motif';

const layouts: Layout[] = ['square', 'offset-hexagons'];
const sizes = [1, 2, 3, 5, 8].flatMap((rows) =>
  [1, 2, 4, 7].map((columns) => [rows, columns] as const),
);

describe('layoutFor', () => {
  it.each<[MotifSides, Layout | null]>([
    [0, 'square'],
    [3, null],
    [4, 'square'],
    [6, 'offset-hexagons'],
    [8, null],
  ])('plans motifs of %i sides in %s', (sides, layout) => {
    expect(layoutFor(sides)).toBe(layout);
  });
});

describe.each(layouts)('layoutMap of %s', (layout) => {
  it.each(sizes)('obeys Euler, V - E + F = 2, for %i × %i', (rows, columns) => {
    const { corners, sides, outlines } = layoutMap(layout, rows, columns);
    expect(corners.length - sides.length + (outlines.length + 1)).toBe(2);
  });

  it.each(sizes)('shares each side between two motifs at most, for %i × %i', (rows, columns) => {
    const { sides, outlines } = layoutMap(layout, rows, columns);
    const joined = sides.filter(({ motifs }) => motifs.length === 2).length;
    const outer = sides.filter(({ motifs }) => motifs.length === 1).length;
    expect(joined + outer).toBe(sides.length);
    expect(2 * joined + outer).toBe(outlines.reduce((sum, outline) => sum + outline.length, 0));
  });
});

describe('layoutMap of offset-hexagons', () => {
  it('sets odd rows half a motif to the right', () => {
    // motif 2 is the first of the second row: it touches motifs 0 and 1 above it
    const { sides } = layoutMap('offset-hexagons', 2, 2);
    const neighbours = sides
      .filter(({ motifs }) => motifs.length === 2 && motifs.includes(2))
      .map(({ motifs }) => motifs.find((motif) => motif !== 2));
    expect(neighbours.toSorted()).toEqual([0, 1, 3]);
  });
});
