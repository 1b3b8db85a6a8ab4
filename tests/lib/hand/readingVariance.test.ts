import { describe, expect, it } from 'vitest';
import { readingLengthM, readingVarianceM2 } from '../../../src/lib/hand/readingVariance';
import { lengthM, massG } from '../../../src/lib/units/quantities';
import { frozen, unravelled, weighed } from '../../support/plans';

const putUp = frozen({ massG: massG(100), lengthM: lengthM(200) });

describe('readingLengthM', () => {
  it('takes a mass at the metres per gram of the put-up', () => {
    expect(readingLengthM(weighed(44, 1), putUp)).toBe(88);
  });

  it('takes an unravelled length as it is', () => {
    expect(readingLengthM(unravelled(31.5, 0.2), putUp)).toBe(31.5);
  });
});

describe('readingVarianceM2', () => {
  it('gives its worked example', () => {
    // weighing 2 × 1²/12 g² × (2 m/g)² = 0.667; piece (0.02 × 88)² = 3.098; motifs (0.03 × 88)²/4 = 1.742
    expect(readingVarianceM2(weighed(44, 1), putUp, 88, 4)).toBeCloseTo(
      2 / 3 + 3.0976 + 1.7424,
      12,
    );
  });

  it('is that of rounding two readings evenly: a sixth of the step squared', () => {
    // A value rounded to a step r is off by a uniform amount of variance r²/12.
    expect(readingVarianceM2(weighed(0, 6), { massG: massG(1), lengthM: lengthM(1) }, 0, 0)).toBe(
      6,
    );
  });

  it('squares the stated error of an unravelled piece, which has no motifs to differ', () => {
    expect(readingVarianceM2(unravelled(30, 0.5), putUp, 30, 0)).toBeCloseTo(0.25 + 0.36, 12);
  });

  it('falls towards the spread of a day as more motifs are weighed together', () => {
    const relative = [1, 2, 4, 8, 1000].map(
      (motifs) => readingVarianceM2(weighed(0, 0.001), putUp, 1, motifs) ** 0.5,
    );
    expect(relative).toEqual(relative.toSorted((left, right) => right - left));
    expect(relative[0]).toBeCloseTo(Math.sqrt(0.02 ** 2 + 0.03 ** 2), 4);
    expect(relative[4]).toBeCloseTo(0.02, 3);
  });
});
