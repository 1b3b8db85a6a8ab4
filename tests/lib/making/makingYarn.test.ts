import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN, type Plan } from '../../../src/lib';
import { madePlaces, motifKeyOf } from '../../../src/lib/making/madeMotifs';
import { makingYarn, WARN_FROM, withWeighedYarn } from '../../../src/lib/making/makingYarn';
import { workedSoFar } from '../../../src/lib/making/workedSoFar';
import { blanketFaces } from '../../../src/lib/plan/blanketFaces';
import { anyLaidPlan, FIXED_SEED } from '../../support/plans';
import fc from 'fast-check';

const motifsOf = (plan: Plan) => blanketFaces(plan, estimate(plan)).motifs;
function progressed(plan: Plan, count: number) {
  const motifs = motifsOf(plan);
  const made = new Set(motifs.slice(0, count).map(({ face }) => motifKeyOf(face)));
  return workedSoFar(plan, madePlaces(motifs, made, plan.colourways.length));
}
const of = <T extends { colour: string }>(all: readonly T[], colour: string) =>
  all.find((each) => each.colour === colour) as T;

describe('makingYarn', () => {
  it('has everything to go before the first motif, and all that was to be bought in hand', () => {
    const all = makingYarn(EXAMPLE_PLAN, new Map(), []);
    for (const { colour, meanM, skeins } of estimate(EXAMPLE_PLAN).colours) {
      const progress = of(all, colour);
      expect(progress.usedM).toBe(0);
      expect(progress.toGoM).toBeCloseTo(meanM, 6);
      expect(progress.leftM).toBe(200 * skeins);
      // bought to be 95 % sure
      expect(progress.probabilityShort).toBeLessThan(0.05);
    }
  });

  it('leaves only the border and its tails once every motif is made and joined', () => {
    const all = makingYarn(EXAMPLE_PLAN, progressed(EXAMPLE_PLAN, 80), []);
    const border = (colour: string) =>
      estimate(EXAMPLE_PLAN)
        .ledger.filter((line) => line.colour === colour)
        .filter(({ part, label }) => part === 'border' || (part === 'tails' && label === 'border'))
        .reduce((sum, { lengthM }) => sum + lengthM, 0);
    expect(of(all, 'c1').toGoM).toBeCloseTo(border('c1'), 3);
    expect(of(all, 'c2').toGoM).toBeCloseTo(border('c2'), 3);
    expect(of(all, 'c3').toGoM).toBeCloseTo(0, 3);
  });

  it('never uses more than the whole, whatever the plan and however far it is', () => {
    fc.assert(
      fc.property(anyLaidPlan, fc.double({ min: 0, max: 1, noNaN: true }), (plan, share) => {
        const count = Math.round(share * motifsOf(plan).length);
        for (const { usedM, toGoM, leftM } of makingYarn(plan, progressed(plan, count), [])) {
          expect(usedM).toBeGreaterThanOrEqual(0);
          expect(toGoM).toBeGreaterThanOrEqual(0);
          expect(leftM).toBeGreaterThanOrEqual(0);
        }
        const used = makingYarn(plan, progressed(plan, count), []);
        const whole = estimate(plan);
        for (const { colour, usedM } of used) {
          expect(usedM).toBeLessThanOrEqual(of(whole.colours, colour).meanM * (1 + 1e-9) + 1e-9);
        }
      }),
      { ...FIXED_SEED, numRuns: 25 },
    );
  });

  it('warns while there is time when a colour is used up faster than planned', () => {
    const worked = progressed(EXAMPLE_PLAN, 40);
    const { made = {}, tails = 0 } = worked.get('c2') ?? {};
    const half = of(makingYarn(EXAMPLE_PLAN, worked, []), 'c2');
    const round = (counts: typeof made) =>
      Object.fromEntries(Object.entries(counts).map(([code, count]) => [code, Math.round(count)]));
    // 500 g were begun with; half way through 40 % more is gone than should be
    const usedG = (1.4 * half.usedM) / 2;
    const weighed = [
      { colour: 'c2', leftG: 500, resolutionG: 1, made: {}, tails: 0 },
      { colour: 'c2', leftG: 500 - usedG, resolutionG: 1, made: round(made), tails },
    ];
    const after = of(makingYarn(EXAMPLE_PLAN, worked, weighed), 'c2');
    expect(half.probabilityShort).toBeLessThan(WARN_FROM);
    expect(after.probabilityShort).toBeGreaterThan(WARN_FROM);
    expect(after.leftM).toBeCloseTo(2 * (500 - usedG), 6);
    expect(after.toGoM).toBeGreaterThan(half.toGoM);
  });

  it('takes yarn worked since the last weighing off what was left then', () => {
    const then = progressed(EXAMPLE_PLAN, 20);
    const { made = {}, tails = 0 } = then.get('c3') ?? {};
    const weighed = [{ colour: 'c3', leftG: 150, resolutionG: 1, made, tails }];
    const later = of(makingYarn(EXAMPLE_PLAN, progressed(EXAMPLE_PLAN, 30), weighed), 'c3');
    const before = of(makingYarn(EXAMPLE_PLAN, then, weighed), 'c3');
    expect(before.leftM).toBeCloseTo(300, 6);
    expect(before.leftM - later.leftM).toBeCloseTo(later.usedM - before.usedM, 6);
  });
});

describe('withWeighedYarn', () => {
  it('makes the estimate surer, like any other weighing', () => {
    const { made = {}, tails = 0 } = progressed(EXAMPLE_PLAN, 40).get('c2') ?? {};
    const weighed = [
      { colour: 'c2', leftG: 500, resolutionG: 1, made: {}, tails: 0 },
      { colour: 'c2', leftG: 300, resolutionG: 1, made, tails },
    ];
    const before = of(estimate(EXAMPLE_PLAN).colours, 'c2').sdM;
    expect(of(estimate(withWeighedYarn(EXAMPLE_PLAN, weighed)).colours, 'c2').sdM).toBeLessThan(
      before,
    );
    // what was begun with alone tells nothing
    expect(withWeighedYarn(EXAMPLE_PLAN, weighed.slice(0, 1))).toEqual(EXAMPLE_PLAN);
  });
});
