import { describe, expect, it } from 'vitest';
import { CONFIDENCES } from '../../src/lib';
import {
  metresAt,
  outcomeOf,
  publishedAnd,
  simulate,
  skeinsAt,
  type Outcome,
} from '../support/calibration';
import { normalDraw, seeded } from '../support/random';

/**
 * Makers drawn from exactly the spread that the library states, who weigh something, plan, buy and
 * make. No source but the definition of a quantile: what suffices with 95 % is short for 5 %.
 */
const MAKERS = 700;
const cases = simulate(20_261_201, MAKERS, [{ piece: 'motifs', count: 4, resolutionG: 1 }]);
const blind = simulate(20_261_202, MAKERS, []);
const random = seeded(20_261_203);

describe('the generator behind the simulation', () => {
  it('gives the known values of its algorithm', () => {
    // published implementation, mulberry32(42): 0.6011037519201636, 0.44829055899754167 (from memory)
    const draw = seeded(42);
    expect([draw(), draw()]).toEqual([0.6011037519201636, 0.44829055899754167]);
  });

  it('draws standard normal values', () => {
    const draw = seeded(3);
    const values = Array.from({ length: 100_000 }, () => normalDraw(draw));
    const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
    const square = values.reduce((sum, value) => sum + value ** 2, 0) / values.length;
    const beyond = values.filter((value) => value > 1.645).length / values.length;
    // four standard errors: 1, sqrt(2) and sqrt(0.05 × 0.95) over sqrt(100 000)
    expect(Math.abs(mean)).toBeLessThan(0.0127);
    expect(Math.abs(square - 1)).toBeLessThan(0.0179);
    expect(Math.abs(beyond - 0.05)).toBeLessThan(0.0028);
  });
});

describe.each([
  ['after four motifs were weighed on a kitchen scale', cases],
  ['with nothing weighed', blind],
])('calibration %s', (_, simulated) => {
  const expectNear = ({ short, standardError }: Outcome, share: number): void => {
    expect(short).toBeGreaterThan(share - 3.5 * standardError);
    expect(short).toBeLessThan(share + 3.5 * standardError);
  };

  it.each(CONFIDENCES)('has metres for %d run short as often as they say', (confidence) => {
    expectNear(outcomeOf(simulated, metresAt(confidence)), 1 - confidence);
  });

  it.each(CONFIDENCES)(
    'has whole skeins for %d run short no more often than that',
    (confidence) => {
      const { short, standardError } = outcomeOf(simulated, skeinsAt(confidence, random));
      expect(short).toBeLessThan(1 - confidence + 2 * standardError);
    },
  );
});

describe('weighing four motifs', () => {
  it('leaves much less over than planning blind, at the same confidence', () => {
    const { surplus } = outcomeOf(cases, metresAt(0.95));
    expect(surplus).toBeLessThan(outcomeOf(blind, metresAt(0.95)).surplus / 4);
  });

  it("runs short much more rarely than the pattern's yardage and a tenth, and leaves less over", () => {
    const habit = outcomeOf(cases, publishedAnd(0.1, random));
    const planned = outcomeOf(cases, skeinsAt(0.95, random));
    expect(habit.short).toBeGreaterThan(0.2);
    expect(planned.short).toBeLessThan(0.05);
    expect(planned.surplus).toBeLessThan(habit.surplus);
  });
});
