import { describe, expect, it } from 'vitest';
import { swatchCounts } from '../../../src/lib/stitches/swatchCounts';

describe('swatchCounts', () => {
  it('counts foundation, stitches and turns of its worked example', () => {
    // 20 + 1 chains, 17 turns of 1; 20 × 18 sc
    expect(swatchCounts('sc', 20, 18)).toEqual({ ch: 38, sc: 360 });
  });

  it.each([
    // common practice: N + t chains, later rows turned with t; t = 2 hdc, 3 dc, 0 sl st
    ['hdc', 20, 20, { ch: 60, hdc: 400 }],
    ['dc', 12, 1, { ch: 15, dc: 12 }],
    ['sl st', 10, 3, { ch: 10, 'sl st': 30 }],
    ['ch', 30, 2, { ch: 60 }],
    ['sc', 1, 1, { ch: 2, sc: 1 }],
  ])('counts %s, %i stitches by %i rows', (code, stitches, rows, counts) => {
    expect(swatchCounts(code, stitches, rows)).toEqual(counts);
  });

  it('throws for a stitch that is not in the table', () => {
    expect(() => swatchCounts('zz', 10, 10)).toThrow('got "zz"');
  });
});
