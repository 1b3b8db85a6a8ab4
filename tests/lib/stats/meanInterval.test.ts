import { describe, expect, it } from 'vitest';
import { meanInterval } from '../../../src/lib/stats/meanInterval';

/** Values whose sample standard deviation is 1, so that plusMinus × √count is the t quantile itself. */
function tQuantileFor(count: number, confidence: number): number {
  const half = Math.sqrt((count - 1) / count);
  const values = Array.from({ length: count }, (_, i) => (i % 2 === 0 ? half : -half));
  return (meanInterval(values, confidence)?.plusMinus ?? NaN) * Math.sqrt(count);
}

describe('meanInterval', () => {
  it('gives the worked example', () => {
    const interval = meanInterval([7.4, 7.5, 7.6]);
    expect(interval?.mean).toBeCloseTo(7.5, 12);
    // t(0.975, 2) = 4.303 (NIST/SEMATECH e-Handbook, 1.3.6.7.2), times 0.1 / √3.
    expect(interval?.plusMinus).toBeCloseTo((4.303 * 0.1) / Math.sqrt(3), 4);
    expect(interval?.count).toBe(3);
  });

  it.each([
    // Published: NIST/SEMATECH e-Handbook, table 1.3.6.7.2, upper critical values of Student's t.
    { count: 2, confidence: 0.95, t: 12.706 },
    { count: 4, confidence: 0.95, t: 3.182 },
    { count: 10, confidence: 0.95, t: 2.262 },
    { count: 10, confidence: 0.99, t: 3.25 },
    { count: 30, confidence: 0.9, t: 1.699 },
  ])('uses the published quantile for $count values at $confidence', ({ count, confidence, t }) => {
    // An odd count is not balanced around zero; every count here is even.
    expect(tQuantileFor(count, confidence)).toBeCloseTo(t, 3);
  });

  it('has no interval for one value, which shows no spread', () => {
    expect(meanInterval([7.5])).toEqual({ mean: 7.5, plusMinus: null, count: 1 });
  });

  it('has no answer for no values', () => {
    expect(meanInterval([])).toBeNull();
  });

  it('has no width when all values agree', () => {
    expect(meanInterval([7.5, 7.5, 7.5])?.plusMinus).toBe(0);
  });

  it('does not change its values', () => {
    expect(() => meanInterval(Object.freeze([7.6, 7.4, 7.5]))).not.toThrow();
  });
});
