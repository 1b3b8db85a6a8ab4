import { describe, expect, it } from 'vitest';
import { estimate } from '../../../src/lib/ledger/estimate';
import type { Estimate } from '../../../src/lib/ledger/ledger';
import type { Plan } from '../../../src/lib/plan/plan';
import { shoppingList, type StashLot } from '../../../src/lib/shopping/shoppingList';
import { buildPlan, frozen } from '../../support/plans';

const colour = { key: 'c1', name: 'Skerry', hex: '#2f5d73' };
const plan = buildPlan({ colours: [colour] });

/** An estimate whose only colour needs so much yarn. */
const needing = (meanM: number, sdM = 5): Estimate => ({
  ...estimate(buildPlan()),
  colours: [
    {
      colour: 'c1',
      meanM,
      sdM,
      neededM: meanM + 1.645 * sdM,
      neededG: (meanM + 1.645 * sdM) / 2,
      skeins: 0,
      chances: [],
      costMinor: null,
    },
  ],
});
const buildLot = (change: Partial<StashLot> = {}): StashLot =>
  frozen({
    colour: 'c1',
    lotCode: '4417',
    wholeSkeins: 2,
    partMassesG: [],
    putUpMassG: 100,
    putUpLengthM: 200,
    ...change,
  });
const shop = (need: Estimate, stash: readonly StashLot[], of: Plan = plan) =>
  shoppingList({ estimate: need, plan: of, stash });
const lineOf = (need: Estimate, stash: readonly StashLot[]) => shop(need, stash).lines[0];

describe('shoppingList', () => {
  it('gives its worked example', () => {
    const line = lineOf(needing(1000), [buildLot()]);
    expect(line).toMatchObject({
      name: 'Skerry',
      haveM: 400,
      haveG: 200,
      toBuySkeins: 4, // 600 m are three skeins exactly, and any doubt asks for a fourth
      mixesLots: true,
      costMinor: 4 * 640,
    });
    expect(line?.neededM).toBeCloseTo(1008.225, 10);
  });

  it('buys nothing that the stash covers, in one lot', () => {
    // 380 + 1.645 × sqrt(25 + 2 × 9) = 390.8 of 400
    expect(lineOf(needing(380), [buildLot()])).toMatchObject({
      toBuySkeins: 0,
      mixesLots: false,
      costMinor: 0,
    });
  });

  it('takes part skeins by their weight, at the put-up of their own yarn', () => {
    // 40 g + 25 g at 120 m per 50 g: 156 m
    const lot = buildLot({
      wholeSkeins: 0,
      partMassesG: [40, 25],
      putUpMassG: 50,
      putUpLengthM: 120,
    });
    const line = lineOf(needing(150), [lot]);
    expect(line?.haveG).toBe(65);
    expect(line?.haveM).toBeCloseTo(156, 10);
    expect(line?.toBuySkeins).toBe(1); // 150 + 1.645 × 5 = 158.2
    expect(lineOf(needing(147), [lot])?.toBuySkeins).toBe(0); // 155.2
  });

  it('counts lots that mix, but no empty one and none of a colour that needs no yarn', () => {
    const other = buildLot({ lotCode: '4418' });
    expect(lineOf(needing(700), [buildLot(), other])?.mixesLots).toBe(true);
    const empty = buildLot({ lotCode: '4418', wholeSkeins: 0 });
    expect(lineOf(needing(300), [buildLot(), empty])?.mixesLots).toBe(false);
    expect(lineOf(needing(0, 0), [buildLot(), other])).toMatchObject({
      toBuySkeins: 0,
      mixesLots: false,
      haveM: 800,
    });
  });

  it('leaves other colours of the stash alone', () => {
    const line = lineOf(needing(300), [buildLot({ colour: 'c2' })]);
    expect(line).toMatchObject({ haveM: 0, toBuySkeins: 2, mixesLots: false });
  });

  it('buys for every colour what its estimate asks for when there is no stash', () => {
    const whole = buildPlan();
    const result = estimate(whole);
    const list = shop(result, [], whole);
    expect(list.lines.map(({ toBuySkeins }) => toBuySkeins)).toEqual(
      result.colours.map(({ skeins }) => skeins),
    );
    expect(list).toMatchObject({
      currency: 'EUR',
      toBuySkeins: result.totals.skeins,
      costMinor: result.totals.costMinor,
    });
  });

  it('has no currency and no cost without a price', () => {
    const unpriced = buildPlan({ colours: [colour], yarn: { ...plan.yarn, price: null } });
    const list = shop(needing(1000), [], unpriced);
    expect(list).toMatchObject({ currency: null, costMinor: null });
    expect(list.lines[0]?.costMinor).toBeNull();
  });
});
