import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import { CONFIDENCES } from '../../../src/lib/plan/plan';
import {
  probabilityShort,
  quantileM,
  skeinsFor,
  SKEIN_SPREAD,
} from '../../../src/lib/skeins/skeins';
import { normalQuantile } from '../../../src/lib/stats/normal';
import { FIXED_SEED } from '../../support/plans';

const anyNeed = fc.record({
  meanM: fc.double({ min: 0, max: 5000, noNaN: true }),
  varianceM2: fc.double({ min: 0, max: 1e5, noNaN: true }),
});
const anyPutUp = fc.double({ min: 5, max: 500, noNaN: true });

describe('skeinsFor', () => {
  it('gives its worked examples', () => {
    // 380 + 1.645 × sqrt(100 + 2 × 3²) = 397.9 of 400; 384 + 2.326 × sqrt(118) = 409.3
    expect(skeinsFor({ meanM: 380, varianceM2: 100 }, 200, 0.95)).toBe(2);
    expect(skeinsFor({ meanM: 384, varianceM2: 100 }, 200, 0.99)).toBe(3);
  });

  it('is none for a colour that is never used, and for what is already owned', () => {
    expect(skeinsFor({ meanM: 0, varianceM2: 0 }, 200, 0.99)).toBe(0);
    expect(skeinsFor({ meanM: -500, varianceM2: 100 }, 200, 0.99)).toBe(0);
  });

  it('covers just the mean at 50 %', () => {
    expect(skeinsFor({ meanM: 400, varianceM2: 1e6 }, 200, 0.5)).toBe(2);
    expect(skeinsFor({ meanM: 400.01, varianceM2: 1e6 }, 200, 0.5)).toBe(3);
  });

  it('counts what skeins themselves may fall short', () => {
    // exactly known 200 m: one skein is short half of the time, two suffice
    expect(skeinsFor({ meanM: 200, varianceM2: 0 }, 200, 0.95)).toBe(2);
    // 195 + 1.645 × 0.015 × 200 = 199.9
    expect(skeinsFor({ meanM: 195, varianceM2: 0 }, 200, 0.95)).toBe(1);
    expect(skeinsFor({ meanM: 195.1, varianceM2: 0 }, 200, 0.95)).toBe(2);
  });

  it('is the least number that suffices', () => {
    const meets = (
      need: { meanM: number; varianceM2: number },
      n: number,
      putUpM: number,
      z: number,
    ) =>
      need.meanM + z * Math.sqrt(need.varianceM2 + n * (SKEIN_SPREAD * putUpM) ** 2) <= n * putUpM;
    fc.assert(
      fc.property(
        anyNeed,
        anyPutUp,
        fc.constantFrom(...CONFIDENCES),
        (need, putUpM, confidence) => {
          const z = normalQuantile(confidence);
          const n = skeinsFor(need, putUpM, confidence);
          expect(meets(need, n, putUpM, z)).toBe(true);
          if (n > 0) expect(meets(need, n - 1, putUpM, z)).toBe(false);
        },
      ),
      FIXED_SEED,
    );
  });

  it('never falls as the confidence rises', () => {
    fc.assert(
      fc.property(anyNeed, anyPutUp, (need, putUpM) => {
        const counts = CONFIDENCES.map((confidence) => skeinsFor(need, putUpM, confidence));
        expect(counts).toEqual(counts.toSorted((left, right) => left - right));
      }),
      FIXED_SEED,
    );
  });

  it('counts a huge need without walking through it', () => {
    expect(skeinsFor({ meanM: 1e12, varianceM2: 1e12 }, 1, 0.5)).toBe(1e12);
  });

  it.each([
    [{ meanM: NaN, varianceM2: 1 }, 200, 0.95],
    [{ meanM: 1, varianceM2: NaN }, 200, 0.95],
    [{ meanM: Infinity, varianceM2: 1 }, 200, 0.95],
    [{ meanM: 1, varianceM2: Infinity }, 200, 0.95],
    [{ meanM: 1e20, varianceM2: 1 }, 1, 0.95],
    [{ meanM: 400, varianceM2: 1 }, 0, 0.95],
    [{ meanM: 400, varianceM2: 1 }, NaN, 0.95],
    [{ meanM: 400, varianceM2: 1 }, 200, 1],
    [{ meanM: 400, varianceM2: 1 }, 200, NaN],
  ])('refuses %o in skeins of %d at %d rather than search for ever', (need, putUpM, confidence) => {
    expect(() => skeinsFor(need, putUpM, confidence)).toThrow(DomainError);
  });
});

describe('probabilityShort', () => {
  it('is half where the mean is exactly owned', () => {
    expect(probabilityShort({ meanM: 400, varianceM2: 25 }, 2, 200)).toBeCloseTo(0.5, 12);
  });

  it('is the tail beyond what is owned', () => {
    // (400 - 380) / sqrt(100 + 18) = 1.8411; tail 0.0328 (published normal table: z 1.84, 0.0329)
    expect(probabilityShort({ meanM: 380, varianceM2: 100 }, 2, 200)).toBeCloseTo(0.0328, 4);
  });

  it('never grows with another skein', () => {
    fc.assert(
      fc.property(anyNeed, anyPutUp, fc.integer({ min: 1, max: 40 }), (need, putUpM, n) => {
        const chance = probabilityShort(need, n, putUpM);
        expect(probabilityShort(need, n + 1, putUpM)).toBeLessThanOrEqual(chance + 1e-12);
        expect(chance).toBeGreaterThanOrEqual(0);
        expect(chance).toBeLessThanOrEqual(1);
      }),
      FIXED_SEED,
    );
  });

  it('is at most what the confidence allows, with the skeins for it', () => {
    fc.assert(
      fc.property(
        anyNeed,
        anyPutUp,
        fc.constantFrom(...CONFIDENCES),
        (need, putUpM, confidence) => {
          const n = skeinsFor(need, putUpM, confidence);
          fc.pre(n > 0);
          expect(probabilityShort(need, n, putUpM)).toBeLessThanOrEqual(1 - confidence + 1e-12);
        },
      ),
      FIXED_SEED,
    );
  });
});

describe('quantileM', () => {
  it('adds the margin of the confidence to the mean, never below nothing', () => {
    expect(quantileM({ meanM: 380, varianceM2: 100 }, 0.5)).toBe(380);
    expect(quantileM({ meanM: 380, varianceM2: 100 }, 0.95)).toBeCloseTo(380 + 16.449, 3);
    expect(quantileM({ meanM: -50, varianceM2: 1 }, 0.95)).toBe(0);
  });
});
