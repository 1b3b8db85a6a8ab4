import { describe, expect, it } from 'vitest';
import { fitInWords, fitOf, joinFit } from '../../../src/lib/joins/fit';
import type { Join } from '../../../src/lib/joins/join';
import { readyJoin } from '../../../src/lib/joins/readyJoins';
import type { Motif } from '../../../src/lib/motifs/motif';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';

const fourAndThree = { multipleOf: 4, plus: 3 };
const any = { multipleOf: 1, plus: 0 };

describe('fitOf', () => {
  it('gives its worked examples', () => {
    expect(fitOf(15, fourAndThree)).toEqual({ fits: true, repeats: 3 });
    expect(fitOf(16, fourAndThree)).toEqual({
      fits: false,
      repeats: 3,
      over: 1,
      nearest: [15, 19],
      scRounds: null,
    });
  });

  it('says how many rounds of sc would make it fit', () => {
    // 17 + 2 = 19 = 4 × 4 + 3
    expect(fitOf(17, fourAndThree)).toMatchObject({ nearest: [15, 19], scRounds: 1 });
    // 9 for 6 q + 1: 11, 13
    expect(fitOf(9, { multipleOf: 6, plus: 1 })).toMatchObject({ nearest: [7, 13], scRounds: 2 });
  });

  it('knows no count below the least that fits', () => {
    expect(fitOf(1, fourAndThree)).toMatchObject({ repeats: 0, nearest: [3], scRounds: 1 });
    expect(fitOf(3, fourAndThree)).toEqual({ fits: true, repeats: 0 });
    expect(fitOf(0, fourAndThree)).toMatchObject({ nearest: [3], scRounds: null });
  });

  it('fits any side of a join that asks for nothing', () => {
    for (const n of [0, 1, 17]) expect(fitOf(n, any)).toEqual({ fits: true, repeats: n });
  });

  it('names only counts that fit, either side of the one it was given', () => {
    for (let n = 0; n < 60; n += 1) {
      for (const fit of [fourAndThree, { multipleOf: 2, plus: 1 }, { multipleOf: 5, plus: 0 }]) {
        const result = fitOf(n, fit);
        if (result.fits) continue;
        for (const near of result.nearest) expect(fitOf(near, fit).fits).toBe(true);
        const [below = -1, above = result.nearest[0] as number] = result.nearest;
        expect(above).toBeGreaterThan(n);
        if (result.nearest.length === 2) expect(below).toBeLessThan(n);
        if (result.scRounds !== null) {
          expect(fitOf(n + 2 * result.scRounds, fit).fits).toBe(true);
          for (let fewer = 1; fewer < result.scRounds; fewer += 1) {
            expect(fitOf(n + 2 * fewer, fit).fits).toBe(false);
          }
        }
      }
    }
  });
});

describe('fitInWords', () => {
  it.each([
    [15, fourAndThree, '15 stitches a side fit: 3 repeats of 4, and 3.'],
    [7, fourAndThree, '7 stitches a side fit: 1 repeat of 4, and 3.'],
    [1, any, '1 stitch a side fits: any count does.'],
    [16, any, '16 stitches a side fit: any count does.'],
    [
      16,
      fourAndThree,
      '16 stitches a side do not fit a multiple of 4 and 3: 15 or 19 would. Rounds of sc cannot make it fit: choose another number of rounds or another join.',
    ],
    [
      17,
      fourAndThree,
      '17 stitches a side do not fit a multiple of 4 and 3: 15 or 19 would. 1 round of sc with 3 sc in each corner would make it fit.',
    ],
    [
      1,
      fourAndThree,
      '1 stitch a side does not fit a multiple of 4 and 3: 3 would. 1 round of sc with 3 sc in each corner would make it fit.',
    ],
    [
      9,
      { multipleOf: 6, plus: 1 },
      '9 stitches a side do not fit a multiple of 6 and 1: 7 or 13 would. 2 rounds of sc with 3 sc in each corner would make it fit.',
    ],
  ])('says of %i stitches for %o', (n, fit, words) => {
    expect(fitInWords(n, fit)).toBe(words);
  });
});

describe('joinFit', () => {
  const lastRound = readyJoin('last-round') as Join;

  it('asks a join in the last round for chain spaces to link by', () => {
    // Both have 15 stitches a side; only the group square has chain spaces between its groups.
    const grouped = readyMotif('group-square', 4) as Motif;
    const solid = readyMotif('solid-square', 4) as Motif;
    expect(joinFit(lastRound, grouped, 15).fits).toBe(true);
    expect(joinFit(lastRound, solid, 15)).toEqual({
      fits: false,
      words: 'The last round has no chain spaces along its sides to link by.',
    });
  });

  it('goes by the stitch count otherwise', () => {
    const solid = readyMotif('solid-square', 4) as Motif;
    const braid = readyJoin('flat-braid') as Join;
    expect(joinFit(braid, solid, 15)).toEqual({ fits: true, words: fitInWords(15, braid.fit) });
    expect(joinFit(braid, solid, 16).fits).toBe(false);
  });
});
