import { describe, expect, it } from 'vitest';
import { ruleEnd, ruleTicks } from '../../../src/components/ui/ruleTicks';

const numbers = (ticks: ReturnType<typeof ruleTicks>) =>
  ticks.flatMap(({ number }) => (number === undefined ? [] : [number]));

describe('ruleTicks', () => {
  it('ticks a blanket every 5 cm, longer every 10, numbered every 20', () => {
    const ticks = ruleTicks(1180, 'metric', 0.32, 40);
    expect(numbers(ticks)).toEqual([0, 20, 40, 60, 80, 100]);
    expect(ticks.map(({ atMm }) => atMm).slice(0, 4)).toEqual([0, 50, 100, 150]);
    expect(ticks.map(({ rank }) => rank).slice(0, 5)).toEqual([2, 0, 1, 0, 2]);
  });

  it('ticks a motif in millimetres when there is room for them', () => {
    const ticks = ruleTicks(142, 'metric', 3, 20);
    expect(ticks).toHaveLength(142);
    expect(numbers(ticks).slice(0, 3)).toEqual([0, 1, 2]);
  });

  it('ticks in whole inches and numbers every ten', () => {
    const ticks = ruleTicks(1180, 'imperial', 0.32, 40);
    expect(numbers(ticks)).toEqual([0, 10, 20, 30, 40]);
    // published: 1 in = 25.4 mm exactly
    expect(ticks[1]?.atMm).toBeCloseTo(25.4, 9);
  });

  it('leaves the end to the size itself', () => {
    const ticks = ruleTicks(1000, 'metric', 0.32, 40);
    expect(ticks.at(-1)?.atMm).toBe(950);
    expect(numbers(ticks)).toEqual([0, 20, 40, 60, 80]);
  });

  it('drops a number that the size at the end would run into', () => {
    // 100 stands 6.4 px before the end of 102 cm
    expect(numbers(ruleTicks(1020, 'metric', 0.32, 40))).toEqual([0, 20, 40, 60, 80]);
  });

  it('keeps ticks 3 px and numbers 27 px apart at any scale', () => {
    for (const units of ['metric', 'imperial'] as const) {
      for (const pxPerMm of [0.005, 0.02, 0.1, 0.28, 0.5, 1, 3, 8]) {
        const ticks = ruleTicks(400 / pxPerMm, units, pxPerMm, 40);
        const numbered = ticks.filter(({ number }) => number !== undefined);
        const apart = (list: typeof ticks) => ((list[1]?.atMm ?? Infinity) - 0) * pxPerMm;
        expect(apart(ticks)).toBeGreaterThanOrEqual(3);
        expect(apart(numbered)).toBeGreaterThanOrEqual(27);
      }
    }
  });

  it('draws nothing of a length that is not there', () => {
    expect(ruleTicks(0, 'metric', 1, 20)).toEqual([]);
    expect(ruleTicks(100, 'metric', NaN, 20)).toEqual([]);
  });
});

describe('ruleEnd', () => {
  it.each([
    [1180, 'metric', '118'],
    [1184, 'metric', '118'],
    [142, 'metric', '14.2'],
    [140, 'metric', '14'],
    [1180, 'imperial', '46.5'],
    [1470, 'imperial', '58'],
    [142, 'imperial', '5.6'],
  ] as const)('says %d mm in %s as %s', (lengthMm, units, shown) => {
    expect(ruleEnd(lengthMm, units)).toBe(shown);
  });
});
