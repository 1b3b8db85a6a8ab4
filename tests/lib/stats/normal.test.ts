import { describe, expect, it } from 'vitest';
import { normalQuantile, normalTail } from '../../../src/lib/stats/normal';

describe('normalQuantile', () => {
  it('gives its worked examples', () => {
    expect(normalQuantile(0.95)).toBeCloseTo(1.6449, 4); // published: NIST e-Handbook table, 1.645
    expect(normalQuantile(0.5)).toBe(0);
  });

  it('is odd about one half', () => {
    for (const p of [0.6, 0.8, 0.99])
      expect(normalQuantile(1 - p)).toBeCloseTo(-normalQuantile(p), 12);
  });
});

describe('normalTail', () => {
  it('gives its worked example and undoes the quantile', () => {
    expect(normalTail(1.6449)).toBeCloseTo(0.05, 4);
    for (const p of [0.5, 0.8, 0.9, 0.95, 0.99]) {
      expect(normalTail(normalQuantile(p))).toBeCloseTo(1 - p, 12);
    }
  });

  it('keeps its digits far out in the tail', () => {
    // published: 6.2209605742717841e-16 at z = 8 (Abramowitz and Stegun 26.2, from memory)
    expect(normalTail(8) / 6.220960574271785e-16).toBeCloseTo(1, 10);
    expect(normalTail(Infinity)).toBe(0);
    expect(normalTail(-Infinity)).toBe(1);
  });
});
