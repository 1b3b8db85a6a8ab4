import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import { dot } from '../../../src/lib/stats/linear';
import {
  posterior,
  varianceAfter,
  varianceOf,
  type Observation,
} from '../../../src/lib/stats/posterior';
import { FIXED_SEED, frozen } from '../../support/plans';

const value = fc.double({ min: -5, max: 5, noNaN: true });
const prior = frozen({ mean: [10, -2, 3], variance: [4, 0.25, 1] });
const observation: fc.Arbitrary<Observation> = fc.record({
  row: fc.array(value, { minLength: 3, maxLength: 3 }),
  value,
  variance: fc.double({ min: 0.01, max: 10, noNaN: true }),
});
const observations = fc.array(observation, { maxLength: 5 });

describe('posterior', () => {
  it('gives its worked example', () => {
    const belief = posterior({ mean: [0], variance: [1] }, [{ row: [1], value: 2, variance: 1 }]);
    expect(belief).toEqual({ mean: [1], covariance: [[0.5]] });
  });

  it('is the prior when nothing was observed', () => {
    const { mean, covariance } = posterior(prior, []);
    expect(mean).toEqual([10, -2, 3]);
    [4, 0.25, 1].forEach((variance, i) =>
      [0, 1, 2].forEach((j) => expect(covariance[i]?.[j]).toBeCloseTo(i === j ? variance : 0, 14)),
    );
  });

  it('learns two unknowns from their sum as by hand', () => {
    // prior N(0,1) and N(0,1), sum observed as 3 with variance 1:
    // gain = S a / (a'S a + 1) = [1/3, 1/3]; mean = [1, 1]; S = I - [1 1; 1 1]/3
    const { mean, covariance } = posterior({ mean: [0, 0], variance: [1, 1] }, [
      { row: [1, 1], value: 3, variance: 1 },
    ]);
    mean.forEach((each) => expect(each).toBeCloseTo(1, 14));
    expect(covariance.flat()).toEqual(
      [2 / 3, -1 / 3, -1 / 3, 2 / 3].map((each) => expect.closeTo(each, 14)),
    );
  });

  it('takes all observations at once or one after another to the same belief', () => {
    // Independent algorithm: Kalman updates, one observation at a time, without an inverse.
    fc.assert(
      fc.property(observations, (all) => {
        const together = posterior(prior, frozen(all));
        let mean = [...prior.mean];
        let covariance = prior.variance.map((variance, i) =>
          prior.variance.map((_, j) => (i === j ? variance : 0)),
        );
        for (const { row, value: seen, variance } of all) {
          const gain = covariance.map((line) => dot(line, row));
          const spread = dot(row, gain) + variance;
          const surprise = seen - dot(row, mean);
          mean = mean.map((each, i) => each + ((gain[i] as number) * surprise) / spread);
          covariance = covariance.map((line, i) =>
            line.map((each, j) => each - ((gain[i] as number) * (gain[j] as number)) / spread),
          );
        }
        together.mean.forEach((each, i) => expect(each).toBeCloseTo(mean[i] as number, 7));
        together.covariance.forEach((line, i) =>
          line.forEach((each, j) => expect(each).toBeCloseTo(covariance[i]?.[j] as number, 7)),
        );
      }),
      FIXED_SEED,
    );
  });

  it.each([0, -1, NaN, Infinity])('refuses an observation of variance %s', (variance) => {
    const seen = { row: [1], value: 2, variance };
    expect(() => posterior({ mean: [0], variance: [1] }, [seen])).toThrow(DomainError);
  });

  it('does not depend on the order of the observations', () => {
    fc.assert(
      fc.property(observations, (all) => {
        const forward = posterior(prior, all);
        const backward = posterior(prior, all.toReversed());
        forward.mean.forEach((each, i) => expect(backward.mean[i]).toBeCloseTo(each, 9));
      }),
      FIXED_SEED,
    );
  });

  it('never becomes less sure of anything by one more observation', () => {
    fc.assert(
      fc.property(
        observations,
        observation,
        fc.array(value, { minLength: 3, maxLength: 3 }),
        (all, next, row) => {
          const before = varianceOf(posterior(prior, all), row);
          const after = varianceOf(posterior(prior, [...all, next]), row);
          expect(after).toBeLessThanOrEqual(before * (1 + 1e-9) + 1e-9);
        },
      ),
      FIXED_SEED,
    );
  });
});

describe('varianceOf', () => {
  it('is the quadratic form of the covariance, and never negative', () => {
    expect(varianceOf(posterior(prior, []), [1, 2, 0])).toBeCloseTo(4 + 4 * 0.25, 12);
    expect(varianceOf({ mean: [0], covariance: [[-1e-18]] }, [1])).toBe(0);
  });
});

describe('varianceAfter', () => {
  it('is what the belief has after such an observation, whatever it reads', () => {
    fc.assert(
      fc.property(
        observations,
        observation,
        fc.array(value, { minLength: 3, maxLength: 3 }),
        (all, next, row) => {
          const foreseen = varianceAfter(posterior(prior, all), row, next);
          expect(foreseen).toBeCloseTo(varianceOf(posterior(prior, [...all, next]), row), 7);
        },
      ),
      FIXED_SEED,
    );
  });

  it('leaves alone what the observation does not touch', () => {
    const belief = posterior(prior, []);
    expect(varianceAfter(belief, [0, 1, 0], { row: [1, 0, 0], variance: 0.1 })).toBeCloseTo(
      0.25,
      14,
    );
  });
});
