import tQuantile from '@stdlib/stats-base-dists-t-quantile';
import { describe, expect, it } from 'vitest';
import { normalQuantile, normalTail } from '../../src/lib/stats/normal';
import { referenceRows } from '../support/reference';

describe('normal quantiles', () => {
  it.each(referenceRows<'probability' | 'z'>('normal-quantiles.csv'))(
    'are as published at $probability: $z', // NIST/SEMATECH e-Handbook, READ
    ({ probability, z }) => {
      expect(normalQuantile(Number(probability)).toFixed(3)).toBe(z);
      expect(normalTail(Number(z))).toBeCloseTo(1 - Number(probability), 3);
    },
  );
});

describe('t quantiles', () => {
  it.each(referenceRows<'degrees_of_freedom' | 't95' | 't975' | 't995'>('t-quantiles.csv'))(
    'are as published at $degrees_of_freedom degrees of freedom', // NIST TN 1297 and e-Handbook, READ
    ({ degrees_of_freedom: df, t95, t975, t995 }) => {
      const at = (probability: number): string => tQuantile(probability, Number(df)).toFixed(3);
      expect([at(0.95), at(0.975), at(0.995)]).toEqual([t95, t975, t995]);
    },
  );

  it('become normal as the degrees of freedom grow', () => {
    expect(tQuantile(0.95, 1e7)).toBeCloseTo(normalQuantile(0.95), 6);
  });
});
