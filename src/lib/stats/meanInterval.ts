import quantile from '@stdlib/stats-base-dists-t-quantile';

export interface MeanInterval {
  readonly mean: number;
  /** Half the width of the interval; null with one value, which shows no spread to go by. */
  readonly plusMinus: number | null;
  readonly count: number;
}

/**
 * Mean of repeated measurements and its two-sided interval by Student's t: the mean plus or minus
 * t(1 - (1 - confidence)/2, count - 1) × s / √count, s being the sample standard deviation.
 * In the unit of the values; null when there are none.
 * Source: NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.5.2, confidence limits for the mean.
 *
 * Example: `meanInterval([7.4, 7.5, 7.6])` is 7.5 plus or minus 4.303 × 0.1 / √3 = 0.248.
 */
export function meanInterval(values: readonly number[], confidence = 0.95): MeanInterval | null {
  const count = values.length;
  if (count === 0) return null;
  const mean = values.reduce((sum, value) => sum + value, 0) / count;
  if (count === 1) return { mean, plusMinus: null, count };
  const squares = values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
  const standardError = Math.sqrt(squares / (count - 1) / count);
  const t = quantile(1 - (1 - confidence) / 2, count - 1);
  return { mean, plusMinus: t * standardError, count };
}
