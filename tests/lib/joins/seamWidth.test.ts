import { describe, expect, it } from 'vitest';
import type { Gauge } from '../../../src/lib/gauge/gauge';
import type { Join } from '../../../src/lib/joins/join';
import { READY_JOINS, readyJoin } from '../../../src/lib/joins/readyJoins';
import { joinEdgeMm, seamWidthMm } from '../../../src/lib/joins/seamWidth';

/** 7.5 mm wide, chains of 6.75 mm; sl st 1.4, sc 6.9, dc 13.9, tr 19.5 mm tall. */
const heights: Record<string, number> = { 'sl st': 1.4, sc: 6.9, dc: 13.9, tr: 19.5 };
const gauge: Gauge = {
  stitchWidthMm: 7.5,
  source: 'swatch',
  heightMm: (code) => heights[code] as number,
  heightSpread: () => 0.03,
};
const join = (key: string): Join => readyJoin(key) as Join;
/** Half a loop of so many chains over two stitches. */
const loopMm = (chains: number): number => Math.sqrt(((chains * 6.75) / 2) ** 2 - 7.5 ** 2);

describe('seamWidthMm', () => {
  it.each([
    ['whip-stitch', 0],
    ['mattress-stitch', 0],
    ['last-round', 0],
    ['slip-stitch', 1.4],
    ['sc-ridge', 0.4 * 6.9],
    ['flat-slip-stitch', 2.8],
    // a strand of two chains leans over one stitch: sqrt(13.5² - 7.5²)
    ['zigzag-chain', Math.sqrt(13.5 ** 2 - 7.5 ** 2)],
    ['flat-braid', 1.2 * loopMm(5)],
    ['reed-lace', 2 * 13.9 + 2 * loopMm(3)],
    ['lantern-lace', 2 * (6.9 + 19.5) + 2 * loopMm(5)],
  ])('adds for %s %d mm', (key, widthMm) => {
    expect(seamWidthMm(join(key), gauge)).toBeCloseTo(widthMm, 10);
  });
});

describe('joinEdgeMm', () => {
  it('is half a seam where a join works rounds round every motif, and nothing elsewhere', () => {
    for (const each of READY_JOINS) {
      const half = each.roundsAdded > 0 ? seamWidthMm(each, gauge) / 2 : 0;
      expect(joinEdgeMm(each, gauge)).toBe(half);
    }
    expect(joinEdgeMm(join('reed-lace'), gauge)).toBeCloseTo(13.9 + loopMm(3), 10);
  });
});
