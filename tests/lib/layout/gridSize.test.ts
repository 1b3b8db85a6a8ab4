import { describe, expect, it } from 'vitest';
import { gridFor, gridSize, type GridMeasures } from '../../../src/lib/layout/gridSize';
import { widthMm } from '../../../src/lib/units/quantities';
import { HEXAGONS, SQUARES } from '../../support/arrangements';
import { frozen } from '../../support/plans';

const measures: GridMeasures = frozen({
  sides: 4,
  acrossMm: 142,
  seamMm: 5,
  edgeMm: 0,
  borderMm: 15,
});
const target = (width: number, height: number, rule: 'nearest' | 'at-least') =>
  frozen({ by: 'target', widthMm: widthMm(width), heightMm: widthMm(height), rule } as const);

describe('gridSize', () => {
  it('gives its worked example', () => {
    // 8 × 142 + 7 × 5 + 30 = 1201; 10 × 142 + 9 × 5 + 30 = 1495
    expect(gridSize(SQUARES, 10, 8, measures)).toEqual({ widthMm: 1201, heightMm: 1495 });
  });

  it('counts a published grid of 9 cm squares', () => {
    // published: 13 × 18 squares of 9 cm make 117 × 162 cm (xstitcher81.wordpress.com, 2014)
    const bare = { sides: 4, acrossMm: 90, seamMm: 0, edgeMm: 0, borderMm: 0 } as const;
    expect(gridSize(SQUARES, 18, 13, bare)).toEqual({ widthMm: 1170, heightMm: 1620 });
  });

  it('is one motif and its surround for one motif', () => {
    const edged = { ...measures, edgeMm: 2.5 };
    expect(gridSize(SQUARES, 1, 1, edged)).toEqual({ widthMm: 177, heightMm: 177 });
  });

  it('nests rows of hexagons by a quarter of their height', () => {
    // Textbook: flat to flat 173.2 has side 100 and height 200; rows stand 150 apart
    const bare = {
      sides: 6,
      acrossMm: 100 * Math.sqrt(3),
      seamMm: 0,
      edgeMm: 0,
      borderMm: 0,
    } as const;
    const { widthMm: width, heightMm: height } = gridSize(HEXAGONS, 4, 3, bare);
    expect(width).toBeCloseTo(3.5 * 173.20508, 4);
    expect(height).toBeCloseTo(200 + 3 * 150, 10);
    expect(gridSize(HEXAGONS, 1, 3, bare).widthMm).toBeCloseTo(3 * 173.20508, 4);
  });

  it('spreads hexagons by a seam along all three directions alike', () => {
    // centres of neighbours are one motif and one seam apart, also between rows
    const { widthMm: one } = gridSize(HEXAGONS, 1, 1, measures);
    const { widthMm: two, heightMm: tall } = gridSize(HEXAGONS, 2, 1, measures);
    const { heightMm: short } = gridSize(HEXAGONS, 1, 1, measures);
    expect(Math.hypot(two - one, tall - short)).toBeCloseTo(147, 10);
  });
});

describe('gridFor', () => {
  it('takes rows and columns as given', () => {
    expect(gridFor(SQUARES, { by: 'grid', rows: 3, columns: 7 }, measures)).toEqual({
      rows: 3,
      columns: 7,
    });
  });

  it('comes nearest to a target, the smaller when both are as near', () => {
    // widths: 1201 at 8, 1348 at 9; 1274.5 lies between them
    expect(gridFor(SQUARES, target(1275, 1495, 'nearest'), measures)).toEqual({
      rows: 10,
      columns: 9,
    });
    expect(gridFor(SQUARES, target(1274.5, 1495, 'nearest'), measures).columns).toBe(8);
  });

  it('reaches a target at least', () => {
    expect(gridFor(SQUARES, target(1201, 1496, 'at-least'), measures)).toEqual({
      rows: 11,
      columns: 8,
    });
  });

  it('is the published grid for 10 in squares on 50 × 60 in', () => {
    // published: 5 × 6 = 30 squares
    const bare = { sides: 4, acrossMm: 254, seamMm: 0, edgeMm: 0, borderMm: 0 } as const;
    expect(gridFor(SQUARES, target(1270, 1524, 'at-least'), bare)).toEqual({
      rows: 6,
      columns: 5,
    });
  });

  it('is one motif where even one is too large, and never more than the most', () => {
    expect(gridFor(SQUARES, target(1, 1, 'nearest'), measures)).toEqual({ rows: 1, columns: 1 });
    expect(gridFor(SQUARES, target(1e6, 1e6, 'nearest'), measures)).toEqual({
      rows: 400,
      columns: 400,
    });
  });

  it('counts the half motif by which rows of hexagons stand out', () => {
    const bare = { sides: 4, acrossMm: 100, seamMm: 0, edgeMm: 0, borderMm: 0 } as const;
    expect(gridFor(HEXAGONS, target(350, 300, 'at-least'), bare)).toEqual({
      rows: 4,
      columns: 3,
    });
  });
});
