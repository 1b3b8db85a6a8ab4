import tQuantile from '@stdlib/stats-base-dists-t-quantile';
import { describe, expect, it } from 'vitest';
import { dot } from '../../src/lib/stats/linear';
import { posterior, varianceOf, type Belief } from '../../src/lib/stats/posterior';
import { digitsAlike, referenceJson, referenceRows } from '../support/reference';

/** NIST StRD, linear least squares. Nine digits at least: the program's own demand. */
const DIGITS = 9;
/** So wide that what is known beforehand weighs nothing. */
const WIDE = 1e16;

interface Certified {
  powers: number[];
  estimates: number[];
  standardDeviations: number[];
  residualStandardDeviation: number;
  prediction?: { x: number; y: number; halfWidth95: number };
}
const certified = referenceJson<Record<string, Certified>>('nist-certified.json');

interface Fit {
  belief: Belief;
  residualSd: number;
  degreesOfFreedom: number;
  rowAt: (x: number) => number[];
}

/** Ordinary least squares by the library's own posterior: a wide prior, noise of variance 1. */
function fitOf(name: string, { powers }: Certified): Fit {
  const data = referenceRows<'x' | 'y'>(`nist-${name}.csv`);
  const rowAt = (x: number): number[] => powers.map((power) => x ** power);
  const observations = data.map(({ x, y }) => ({
    row: rowAt(Number(x)),
    value: Number(y),
    variance: 1,
  }));
  const belief = posterior(
    { mean: powers.map(() => 0), variance: powers.map(() => WIDE) },
    observations,
  );
  const squares = observations.map(({ row, value }) => (value - dot(row, belief.mean)) ** 2);
  const degreesOfFreedom = data.length - powers.length;
  const sum = squares.reduce((total, square) => total + square, 0);
  return { belief, residualSd: Math.sqrt(sum / degreesOfFreedom), degreesOfFreedom, rowAt };
}

describe.each(Object.entries(certified))('posterior with a wide prior on %s', (name, facts) => {
  const fit = fitOf(name, facts);

  it('agrees with the certified estimates', () => {
    facts.estimates.forEach((estimate, i) =>
      expect(digitsAlike(fit.belief.mean[i] as number, estimate)).toBeGreaterThanOrEqual(DIGITS),
    );
  });

  it('agrees with their certified standard deviations', () => {
    facts.standardDeviations.forEach((sd, i) => {
      const variance = fit.belief.covariance[i]?.[i] as number;
      expect(digitsAlike(fit.residualSd * Math.sqrt(variance), sd)).toBeGreaterThanOrEqual(DIGITS);
    });
  });

  it('leaves the certified residual standard deviation', () => {
    expect(digitsAlike(fit.residualSd, facts.residualStandardDeviation)).toBeGreaterThanOrEqual(
      DIGITS,
    );
  });
});

describe('prediction on norris', () => {
  it('gives at x = 500 the interval of one more reading', () => {
    // CALC: 500.796086 ± 1.824292, t(34) = 2.032245
    const facts = certified.norris as Certified;
    const { x, y, halfWidth95 } = facts.prediction as NonNullable<Certified['prediction']>;
    const { belief, residualSd, degreesOfFreedom, rowAt } = fitOf('norris', facts);
    const row = rowAt(x);
    const t = tQuantile(0.975, degreesOfFreedom);
    expect(dot(row, belief.mean)).toBeCloseTo(y, 6);
    expect(t).toBeCloseTo(2.032245, 6);
    expect(t * residualSd * Math.sqrt(1 + varianceOf(belief, row))).toBeCloseTo(halfWidth95, 6);
  });
});
