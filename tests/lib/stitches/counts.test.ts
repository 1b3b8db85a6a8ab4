import { describe, expect, it } from 'vitest';
import {
  addCounts,
  scaleCounts,
  subtractCounts,
  totalCount,
} from '../../../src/lib/stitches/counts';
import { frozen } from '../../support/plans';

describe('addCounts', () => {
  it('adds stitch by stitch and keeps what only one side has', () => {
    expect(addCounts(frozen({ sc: 2 }), frozen({ sc: 1, ch: 1 }))).toEqual({ sc: 3, ch: 1 });
    expect(addCounts({}, {})).toEqual({});
  });
});

describe('scaleCounts', () => {
  it('multiplies every stitch by a whole or fractional number', () => {
    expect(scaleCounts(frozen({ sc: 2 }), 3)).toEqual({ sc: 6 });
    expect(scaleCounts({ sc: 2, ch: 1 }, 0.5)).toEqual({ sc: 1, ch: 0.5 });
  });
});

describe('subtractCounts', () => {
  it('takes away, leaves out what vanishes and never goes below zero', () => {
    expect(subtractCounts(frozen({ ch: 15, dc: 23, 'sl st': 4 }), frozen({ 'sl st': 3 }))).toEqual({
      ch: 15,
      dc: 23,
      'sl st': 1,
    });
    expect(subtractCounts({ sc: 2 }, { sc: 2 })).toEqual({});
    expect(subtractCounts({ sc: 2 }, { sc: 5, tr: 1 })).toEqual({});
  });
});

describe('totalCount', () => {
  it('counts all stitches together', () => {
    expect(totalCount({ sc: 6, ch: 1 })).toBe(7);
    expect(totalCount({})).toBe(0);
  });
});
