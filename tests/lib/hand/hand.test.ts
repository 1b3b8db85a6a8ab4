import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import {
  expectedM,
  handCovarianceM2,
  handVarianceAfterM2,
  handVarianceM2,
  learnHand,
  loopLengthMm,
  ownStitchVarianceM2,
  sewnFactor,
  type Evidence,
} from '../../../src/lib/hand/hand';
import { addUse, useOfStitches, type YarnUse } from '../../../src/lib/hand/yarnUse';
import { FIXED_SEED, frozen } from '../../support/plans';

const stitches = frozen(['ch', 'dc', 'sc']);
const thousandLoops = (code: string): YarnUse => ({
  loops: new Map([[code, 1000]]),
  seamM: 0,
  cutM: 0,
});
const scPiece = (lengthM: number, varianceM2 = 1): Evidence => ({
  use: thousandLoops('sc'),
  lengthM,
  varianceM2,
});
const anyUse: fc.Arbitrary<YarnUse> = fc
  .record({
    ch: fc.integer({ min: 0, max: 500 }),
    dc: fc.integer({ min: 0, max: 500 }),
    sc: fc.integer({ min: 0, max: 500 }),
  })
  .map(useOfStitches);
const anyEvidence: fc.Arbitrary<Evidence> = fc.record({
  use: anyUse,
  lengthM: fc.integer({ min: 1, max: 100 }),
  varianceM2: fc.double({ min: 0.01, max: 25, noNaN: true }),
});

describe('learnHand', () => {
  it('gives its worked example', () => {
    const hand = learnHand(8.128, stitches, []);
    const use = thousandLoops('sc');
    expect(loopLengthMm(hand, 'sc')).toBeCloseTo(42.27, 2); // 5.2 × 8.128 = 42.2656
    expect(handVarianceM2(hand, use) ** 0.5 / expectedM(hand, use)).toBeCloseTo(0.206, 3);
    expect(hand.measured.size).toBe(0);
  });

  it('learns a stitch, and through it the others, as by hand', () => {
    // Width 8: 41.6 mm a loop. 1000 loops: var 0.0425 × 41.6² = 73.5488 m², of which common
    // 0.04 × 41.6² = 69.2224. 45 m ± 1 seen: sc 41.6 + 3.4 × 73.5488 / 74.5488, dc with 69.2224.
    const hand = learnHand(8, stitches, [frozen(scPiece(45))]);
    expect(loopLengthMm(hand, 'sc')).toBeCloseTo(41.6 + (3.4 * 73.5488) / 74.5488, 10);
    expect(loopLengthMm(hand, 'dc')).toBeCloseTo(41.6 + (3.4 * 69.2224) / 74.5488, 10);
    expect(handVarianceM2(hand, thousandLoops('sc'))).toBeCloseTo(73.5488 / 74.5488, 10);
    expect(handVarianceM2(hand, thousandLoops('dc'))).toBeCloseTo(
      73.5488 - 69.2224 ** 2 / 74.5488,
      10,
    );
    expect([...hand.measured]).toEqual(['sc']);
  });

  it('takes the tails off a piece before it learns from it', () => {
    const bare = learnHand(8, stitches, [scPiece(45)]);
    const tailed = scPiece(45.45);
    const hand = learnHand(8, stitches, [{ ...tailed, use: { ...tailed.use, cutM: 0.45 } }]);
    expect(loopLengthMm(hand, 'sc')).toBeCloseTo(loopLengthMm(bare, 'sc'), 10);
  });

  it('learns the sewing factor from a sewn seam and no stitch from it', () => {
    // prior 3 ± 0.6, seen 8 m of yarn over 2 m of seam ± 0.5 m: gain 2 × 0.36 / (4 × 0.36 + 0.25)
    const seam: Evidence = {
      use: { loops: new Map(), seamM: 2, cutM: 0 },
      lengthM: 8,
      varianceM2: 0.25,
    };
    const hand = learnHand(8, stitches, [seam]);
    expect(sewnFactor(hand)).toBeCloseTo(3 + (2 * 0.72) / 1.69, 10);
    expect(loopLengthMm(hand, 'sc')).toBeCloseTo(41.6, 10);
    expect(hand.measured.size).toBe(0);
  });

  it('knows nothing of a stitch that it was not told of', () => {
    const hand = learnHand(8, ['sc'], []);
    expect(() => loopLengthMm(hand, 'dc')).toThrow('A hand of sc knows no "dc"');
    expect(() => expectedM(hand, thousandLoops('dc'))).toThrow(DomainError);
  });

  it('gives a finite answer to a reading that cannot be', () => {
    const hand = learnHand(8, stitches, [scPiece(0.001, 0.01), scPiece(4000, 0.01)]);
    expect(Number.isFinite(expectedM(hand, thousandLoops('dc')))).toBe(true);
  });

  it('does not care in which order pieces were measured', () => {
    fc.assert(
      fc.property(fc.array(anyEvidence, { maxLength: 4 }), anyUse, (evidence, use) => {
        const forward = expectedM(learnHand(8, stitches, evidence), use);
        const backward = expectedM(learnHand(8, stitches, evidence.toReversed()), use);
        expect(Math.abs(backward - forward)).toBeLessThanOrEqual(1e-9 * Math.max(1, forward));
      }),
      FIXED_SEED,
    );
  });
});

describe('handVarianceM2', () => {
  it('never grows with more evidence', () => {
    fc.assert(
      fc.property(
        fc.array(anyEvidence, { maxLength: 4 }),
        anyEvidence,
        anyUse,
        (known, next, use) => {
          const before = handVarianceM2(learnHand(8, stitches, known), use);
          const after = handVarianceM2(learnHand(8, stitches, [...known, next]), use);
          expect(after).toBeLessThanOrEqual(before * (1 + 1e-9) + 1e-12);
        },
      ),
      FIXED_SEED,
    );
  });

  it('does not average out: twice the piece, four times the variance', () => {
    const hand = learnHand(8, stitches, [scPiece(45)]);
    const use = thousandLoops('dc');
    expect(handVarianceM2(hand, addUse(use, use))).toBeCloseTo(4 * handVarianceM2(hand, use), 9);
  });
});

describe('handVarianceAfterM2', () => {
  it('foresees what the same piece would leave once it is measured', () => {
    fc.assert(
      fc.property(
        fc.array(anyEvidence, { maxLength: 3 }),
        anyEvidence,
        anyUse,
        (known, next, use) => {
          const foreseen = handVarianceAfterM2(learnHand(8, stitches, known), use, next);
          const left = handVarianceM2(learnHand(8, stitches, [...known, next]), use);
          expect(Math.abs(foreseen - left)).toBeLessThanOrEqual(1e-8 * Math.max(1, left));
        },
      ),
      FIXED_SEED,
    );
  });
});

describe('ownStitchVarianceM2', () => {
  it('is the spread of the stitches alone while nothing is measured', () => {
    // 1000 loops of sc and 2000 of dc: (1² + 2²) × (0.05 × 41.6)²
    const use = addUse(thousandLoops('sc'), thousandLoops('dc'), 2);
    const hand = learnHand(8, stitches, []);
    expect(ownStitchVarianceM2(hand, use)).toBeCloseTo(5 * 2.08 ** 2, 6);
    expect(handVarianceM2(hand, use)).toBeCloseTo(9 * 8.32 ** 2 + 5 * 2.08 ** 2, 6);
  });

  it('is never more than the whole', () => {
    fc.assert(
      fc.property(fc.array(anyEvidence, { maxLength: 3 }), anyUse, (known, use) => {
        const hand = learnHand(8, stitches, known);
        const whole = handVarianceM2(hand, use);
        expect(ownStitchVarianceM2(hand, use)).toBeLessThanOrEqual(whole * (1 + 1e-9) + 1e-12);
      }),
      FIXED_SEED,
    );
  });
});

describe('handCovarianceM2', () => {
  it('adds up, part by part, to the variance of the whole', () => {
    fc.assert(
      fc.property(fc.array(anyEvidence, { maxLength: 3 }), anyUse, anyUse, (known, left, right) => {
        const hand = learnHand(8, stitches, known);
        const whole = addUse(left, right);
        const parts = handCovarianceM2(hand, left, whole) + handCovarianceM2(hand, right, whole);
        expect(parts).toBeCloseTo(handVarianceM2(hand, whole), 7);
        expect(handCovarianceM2(hand, left, right)).toBeCloseTo(
          handCovarianceM2(hand, right, left),
          9,
        );
      }),
      FIXED_SEED,
    );
  });
});
