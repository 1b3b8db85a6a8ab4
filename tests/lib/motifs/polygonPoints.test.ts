import { describe, expect, it } from 'vitest';
import { fixed, polygonPoints } from '../../../src/lib/motifs/polygonPoints';

describe('fixed', () => {
  it('writes two decimals and never a negative zero', () => {
    expect([fixed(1.005), fixed(-0.001), fixed(12), fixed(-3.456)]).toEqual([
      '1',
      '0',
      '12',
      '-3.46',
    ]);
  });
});

describe('polygonPoints', () => {
  const points = (sides: number, apothemMm: number) =>
    polygonPoints(sides, apothemMm)
      .split(' ')
      .map((point) => point.split(',').map(Number) as [number, number]);

  it('begins a square at its top right corner', () => {
    expect(polygonPoints(4, 5)).toBe('5,-5 5,5 -5,5 -5,-5');
  });

  it.each([3, 4, 6, 8])('puts the middle of each of %i sides the apothem away', (sides) => {
    const corners = points(sides, 50);
    expect(corners).toHaveLength(sides);
    corners.forEach(([x, y], i) => {
      const [nextX, nextY] = corners[(i + 1) % sides] as [number, number];
      expect(Math.hypot((x + nextX) / 2, (y + nextY) / 2)).toBeCloseTo(50, 1);
    });
  });
});
