import { describe, expect, it } from 'vitest';
import { layoutFor, layoutsFor, type Layout } from '../../../src/lib/layout/layouts';
import type { MotifSides } from '../../../src/lib/motifs/motif';

describe('layoutFor', () => {
  it.each<[MotifSides, Layout]>([
    [0, 'square'],
    [3, 'triangles'],
    [4, 'square'],
    [6, 'offset-hexagons'],
    [8, 'octagons'],
  ])('lays motifs of %i sides in %s', (sides, layout) => {
    expect(layoutFor(sides)).toBe(layout);
  });
});

describe('layoutsFor', () => {
  it('offers squares every layout of squares', () => {
    expect(layoutsFor(4)).toEqual(['square', 'brick', 'on-point', 'large-and-small']);
  });
});
