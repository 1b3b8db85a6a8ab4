import cdf from '@stdlib/stats-base-dists-normal-cdf';
import quantile from '@stdlib/stats-base-dists-normal-quantile';

/** Standard normal quantile: `normalQuantile(0.95)` is 1.6449 to four decimals; 0.5 gives 0. */
export const normalQuantile = (probability: number): number => quantile(probability, 0, 1);

/** Chance that a standard normal value exceeds z: `normalTail(1.6449)` is 0.05 to four decimals. */
export const normalTail = (z: number): number => cdf(-z, 0, 1);
