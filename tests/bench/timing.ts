import { performance } from 'node:perf_hooks';

const WARM_UP = 3;

/**
 * Every work timed once in each round, so that a busy moment hits all alike; the least of the
 * rounds, which is the one that other work on the machine disturbed least.
 */
export function leastMs(
  works: readonly (() => void)[],
  rounds: number,
  warmUp = WARM_UP,
): number[] {
  const least = works.map(() => Infinity);
  for (let round = -warmUp; round < rounds; round += 1) {
    works.forEach((work, i) => {
      const startMs = performance.now();
      work();
      const tookMs = performance.now() - startMs;
      if (round >= 0) least[i] = Math.min(least[i] as number, tookMs);
    });
  }
  return least;
}

/** Slope of log time over log count, by least squares, from a count on. */
export function exponent(
  counts: readonly number[],
  times: readonly number[],
  from: number,
): number {
  const points = counts
    .map((count, i) => [Math.log(count), Math.log(times[i] as number)] as const)
    .filter((_, i) => (counts[i] as number) >= from);
  const mean = (axis: 0 | 1): number =>
    points.reduce((sum, point) => sum + point[axis], 0) / points.length;
  const [meanX, meanY] = [mean(0), mean(1)];
  const along = points.reduce((sum, [x, y]) => sum + (x - meanX) * (y - meanY), 0);
  return along / points.reduce((sum, [x]) => sum + (x - meanX) ** 2, 0);
}
