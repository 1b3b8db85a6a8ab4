import { describe, expect, it } from 'vitest';
import type { Join } from '../../../src/lib/joins/join';
import { countsOnSide, outerSideStitches, sideCount } from '../../../src/lib/joins/joinCounts';
import { readyJoin } from '../../../src/lib/joins/readyJoins';

const join = (key: string): Join => readyJoin(key) as Join;

describe('sideCount', () => {
  it('gives its worked example', () => {
    expect(sideCount({ perRepeat: 2, fixed: 1 }, 15, 3)).toBe(7);
    expect(sideCount({ perStitch: 2 }, 15, 3)).toBe(30);
    expect(sideCount({}, 15, 3)).toBe(0);
  });
});

describe('countsOnSide', () => {
  it('counts the whole repeats of a side that fits', () => {
    // n = 15 = 2 × 7 + 1: 8 anchors and 7 loops of 5 chains
    const braid = join('flat-braid');
    expect(countsOnSide(braid, braid.perMotifSide, 15)).toEqual({ sc: 8, ch: 35 });
  });

  it('stretches the repeats in proportion over a side that does not fit', () => {
    // n = 16: 7.5 repeats
    const braid = join('flat-braid');
    expect(countsOnSide(braid, braid.perMotifSide, 16)).toEqual({ sc: 8.5, ch: 37.5 });
  });

  it('has no part of a repeat on a side that is too short for one', () => {
    const reed = join('reed-lace');
    expect(countsOnSide(reed, reed.perMotifSide, 1)).toEqual({ dc: 2, ch: 6, sc: 1 });
  });
});

describe('outerSideStitches', () => {
  it('is what the border finds on a side', () => {
    expect(outerSideStitches(join('slip-stitch'), 15)).toBe(15);
    expect(outerSideStitches(join('flat-braid'), 15)).toBe(15); // 7 loops, 2 each, and 1
    // 5 loops of 3 chains and 4 anchors
    expect(outerSideStitches(join('reed-lace'), 15)).toBe(5 * 3 + 4);
  });
});
