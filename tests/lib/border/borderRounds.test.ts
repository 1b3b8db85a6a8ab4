import { describe, expect, it } from 'vitest';
import { borderRounds } from '../../../src/lib/border/borderRounds';
import { gridCounts } from '../../../src/lib/layout/gridCounts';
import { HEXAGONS, SQUARES } from '../../support/arrangements';
import { frozen } from '../../support/plans';

const squares = gridCounts(SQUARES, 10, 8);

describe('borderRounds', () => {
  it('gives its worked example', () => {
    // 36 sides × 15 + 32 junctions × 2 + 4 corners × 3 = 616; 8 more in the next round
    expect(borderRounds(frozen(['sc', 'sc']), squares, 15)).toEqual([
      { sc: 616, ch: 1, 'sl st': 1 },
      { sc: 624, ch: 1, 'sl st': 1 },
    ]);
  });

  it('is nothing without rounds', () => {
    expect(borderRounds([], squares, 15)).toEqual([]);
  });

  it('goes round a single motif', () => {
    expect(borderRounds(['sc'], gridCounts(SQUARES, 1, 1), 15)).toEqual([
      { sc: 4 * 15 + 12, ch: 1, 'sl st': 1 },
    ]);
  });

  it('puts more into a corner the taller the stitch, and turns with its own chains', () => {
    // common practice, no source: 3 in a corner up to hdc, 5 dc, 7 tr; 604 + 4 sides and junctions
    const made = (code: string) => borderRounds([code], squares, 15)[0];
    expect(made('hdc')).toEqual({ hdc: 604 + 12, ch: 2, 'sl st': 1 });
    expect(made('dc')).toEqual({ dc: 604 + 20, ch: 3, 'sl st': 1 });
    expect(made('tr')).toEqual({ tr: 604 + 28, ch: 4, 'sl st': 1 });
  });

  it('grows from the round below, whatever its stitch', () => {
    const counts = borderRounds(['sc', 'dc', 'sc'], squares, 15).map(
      ({ sc, dc }) => (sc ?? dc) as number,
    );
    expect(counts).toEqual([616, 616 + 16, 616 + 16 + 8]);
  });

  it('holds a stitch at every outer corner of hexagons and grows at four of them', () => {
    const hexagons = gridCounts(HEXAGONS, 3, 4);
    const { outerSides, edgeJunctions, outerCorners } = hexagons;
    const all = outerSides * 10 + edgeJunctions * 2 + outerCorners;
    expect(outerCorners).toBeGreaterThan(4);
    expect(borderRounds(['sc', 'sc'], hexagons, 10).map(({ sc }) => sc)).toEqual([
      all + 8,
      all + 16,
    ]);
  });
});
