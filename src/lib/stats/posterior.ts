import { DomainError } from '../errors';
import { dot, inverse, times, type Matrix, type Vector } from './linear';

/** A linear-Gaussian belief about some unknowns. */
export interface Belief {
  readonly mean: Vector;
  readonly covariance: Matrix;
}

/** Independent Gaussian prior, one mean and variance for each unknown. */
export interface Prior {
  readonly mean: Vector;
  readonly variance: Vector;
}

/** value = row · unknowns + noise of this variance. */
export interface Observation {
  readonly row: Vector;
  readonly value: number;
  readonly variance: number;
}

/**
 * Exact posterior of a linear-Gaussian model, in information form.
 * With every prior variance very large this is ordinary least squares (tested against NIST's
 * certified regressions). Cost: one inverse of the size of the unknowns.
 * Throws DomainError for an observation without noise, which would leave nothing to weigh it against.
 *
 * Example: prior mean 0, variance 1; one observation of 2 with row [1] and variance 1 gives
 * mean 1 and variance 0.5.
 */
export function posterior(prior: Prior, observations: readonly Observation[]): Belief {
  const precision = prior.variance.map((variance, i) =>
    prior.variance.map((_, j) => (i === j ? 1 / variance : 0)),
  );
  const pull = prior.mean.map(() => 0);
  for (const { row, value, variance } of observations) {
    if (!(variance > 0 && variance < Infinity)) {
      throw new DomainError(
        'no-noise',
        `posterior requires observations of a positive finite variance, got ${variance}`,
      );
    }
    const surprise = value - dot(row, prior.mean);
    row.forEach((weight, i) => {
      if (weight === 0) return;
      pull[i] = (pull[i] ?? 0) + (weight * surprise) / variance;
      const line = precision[i];
      if (line) row.forEach((other, j) => (line[j] = (line[j] ?? 0) + (weight * other) / variance));
    });
  }
  const covariance = inverse(precision);
  const shift = times(covariance, pull);
  return { mean: prior.mean.map((value, i) => value + (shift[i] ?? 0)), covariance };
}

/** Variance of `row · unknowns` under the belief. */
export const varianceOf = (belief: Belief, row: Vector): number =>
  Math.max(0, dot(row, times(belief.covariance, row)));

/**
 * Variance that `row · unknowns` would keep after one more observation, whatever it turned out
 * to read: the rank-one update, which needs no second inverse.
 */
export function varianceAfter(
  belief: Belief,
  row: Vector,
  next: { readonly row: Vector; readonly variance: number },
): number {
  const gain = times(belief.covariance, next.row);
  const shared = dot(row, gain);
  return Math.max(0, varianceOf(belief, row) - shared ** 2 / (dot(next.row, gain) + next.variance));
}
