import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import { loopsByStitch, loopsOf } from '../../../src/lib/stitches/loops';
import { knownStitch } from '../../../src/lib/stitches/stitchTable';
import { frozen } from '../../support/plans';

describe('loopsOf', () => {
  it('adds wraps, draws and throughs', () => {
    expect(loopsOf({ wraps: 1, draws: 1, throughs: 2 })).toBe(4);
    expect(loopsOf({ wraps: 0, draws: 0, throughs: 0 })).toBe(0);
  });

  it.each([
    ['ch', 1],
    ['sl st', 1],
    ['sc', 2],
    ['esc', 3],
    ['hdc', 3],
    ['ehdc', 4],
    ['dc', 4],
    ['edc', 5],
    ['tr', 6],
    ['dtr', 8],
    ['trtr', 10],
    ['sc4tog', 5], // N + 1
    ['dc5tog', 16], // 3 N + 1
    ['4-dc pc', 17], // 4 N + 1
    ['4-hdc puff', 9], // 2 N + 1
    ['picot-4', 5], // N + 1
  ])('counts for %s %i loops, by hand', (code, loops) => {
    expect(loopsOf(knownStitch(code))).toBe(loops);
  });
});

describe('loopsByStitch', () => {
  it('multiplies the loops of each stitch by its count', () => {
    const counts = frozen({ sc: 10, dc: 2.5, ch: 0 });
    expect([...loopsByStitch(counts)]).toEqual([
      ['sc', 20],
      ['dc', 10],
      ['ch', 0],
    ]);
  });

  it('throws for a stitch that is not in the table', () => {
    expect(() => loopsByStitch({ zz: 1 })).toThrow(DomainError);
  });
});
