import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compareJoins, type JoinComparison } from '../../../src/lib/joins/compareJoins';
import { READY_JOINS, readyJoin } from '../../../src/lib/joins/readyJoins';
import { whyCheapest } from '../../../src/lib/joins/whyCheapest';
import { whyInWords } from '../../../src/lib/joins/whyInWords';
import { anyLaidPlan, buildPlan, FIXED_SEED, frozen } from '../../support/plans';

const tried = (...keys: string[]): JoinComparison[] =>
  compareJoins(
    buildPlan(),
    keys.map((key) => readyJoin(key)!),
  );
const words = (...keys: string[]): string => {
  const why = whyCheapest(tried(...keys));
  return why ? whyInWords(why, 'metric', 'us') : '';
};

/** A comparison of bare figures: stitches of one kind, and tails of 150 mm. */
function bare(joinKey: string, count: number, loopsEach: number, eachMm: number, tails = 0) {
  const loops = count * loopsEach;
  const lengthM = (loops * eachMm) / 1000;
  const yarn = {
    stitches: [{ stitch: 'sc', count, loops, lengthM }],
    sewnM: 0,
    tails,
    tailsM: tails * 0.15,
  };
  return frozen({ ...tried(joinKey)[0]!, joinM: lengthM + yarn.tailsM, yarn });
}

describe('whyCheapest', () => {
  it('gives its worked example: as many stitches, half the loops', () => {
    // by hand: 4,000 × 1 × 25 mm = 100 m, 4,000 × 2 × 25 mm = 200 m
    const why = whyCheapest([bare('sc-ridge', 4000, 2, 25), bare('slip-stitch', 4000, 1, 25)]);
    expect(why?.cheapest.join.key).toBe('slip-stitch');
    expect(why?.reasons).toEqual([{ cause: 'loops', lessM: expect.closeTo(100, 9) }]);
  });

  it('shares a difference between number and loops as their logarithms stand', () => {
    // by hand: 1 × 2 against 2 × 1 of the same loop is no difference: + and - the same
    const even = whyCheapest([bare('slip-stitch', 1000, 2, 10), bare('sc-ridge', 2000, 1, 10, 10)]);
    expect(even?.lessM).toBeCloseTo(1.5, 9);
    const lessM = Object.fromEntries(even?.reasons.map((each) => [each.cause, each.lessM]) ?? []);
    expect(lessM.stitches).toBeCloseTo(20 * Math.log(2), 9);
    expect(lessM.loops).toBeCloseTo(-20 * Math.log(2), 9);
    expect(lessM.tails).toBeCloseTo(1.5, 9);
  });

  it('leaves nothing of the difference unexplained, for any plan and any joins', () => {
    fc.assert(
      fc.property(anyLaidPlan, fc.subarray([...READY_JOINS], { minLength: 2 }), (plan, joins) => {
        const comparisons = compareJoins(plan, joins);
        const why = whyCheapest(comparisons);
        if (!why) return;
        expect(why.next.joinM).toBeGreaterThan(why.cheapest.joinM);
        const sum = why.reasons.reduce((total, { lessM }) => total + lessM, 0);
        expect(sum).toBeCloseTo(why.lessM, 6);
      }),
      FIXED_SEED,
    );
  });

  it('passes over joins that do not fit while another does', () => {
    const [slip, ridge] = tried('slip-stitch', 'sc-ridge');
    const unfit = { ...tried('last-round')[0]!, fits: false };
    expect(whyCheapest([unfit, slip!, ridge!])?.cheapest.join.key).toBe('slip-stitch');
    expect(whyCheapest([unfit, { ...ridge!, fits: false }])?.cheapest.join.key).toBe('last-round');
  });

  it('has nothing to say of one join, of none, and of joins that take the same', () => {
    expect(whyCheapest([])).toBeNull();
    expect(whyCheapest(tried('slip-stitch'))).toBeNull();
    expect(whyCheapest(tried('whip-stitch', 'mattress-stitch'))).toBeNull();
  });
});

describe('whyInWords', () => {
  it('names the stitches where each join has one of its own', () => {
    // trade's loops: 1 of a slip stitch, 2 of a single crochet; corners' chains bring the mean to 1.9
    expect(words('slip-stitch', 'sc-ridge')).toBe(
      'Slip stitch, back loops takes 76\u00a0m less than single crochet ridge, because a slip stitch lays 1 loop and not 1.9 as a single crochet.',
    );
  });

  it('says what each reason comes to, and what speaks against', () => {
    expect(words('zigzag-chain', 'flat-braid')).toMatch(
      /^Zigzag chain takes 395\sm less than flat braid: 448\sm because it has 6,848 stitches and chains and not 17,152 \(flat braid adds 1 round to every motif\), and 19\sm because it leaves 32 tails and not 160; against that, 72\sm more because .*\.$/,
    );
  });

  it('sets sewing beside stitches, and names what takes as much', () => {
    expect(words('mattress-stitch', 'whip-stitch', 'slip-stitch')).toMatch(
      /^Mattress stitch, like whip stitch, takes 30\sm less than slip stitch, back loops, because sewing takes 51\sm and stitches take 81\sm\.$/,
    );
  });

  it('speaks the units and terms of the reader', () => {
    const why = whyCheapest(tried('slip-stitch', 'sc-ridge'))!;
    // 75.7 m are 83 yd; a US single crochet is a UK double crochet
    expect(whyInWords(why, 'imperial', 'uk')).toMatch(
      /takes 83\syd less .* as a double crochet\.$/,
    );
  });
});
