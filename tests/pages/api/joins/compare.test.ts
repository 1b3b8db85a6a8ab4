import { describe, expect, it } from 'vitest';
import { compareJoins, EXAMPLE_PLAN, READY_JOINS } from '../../../../src/lib';
import { POST } from '../../../../src/pages/api/joins/compare';
import { compareJoinsSchema } from '../../../../src/schemas/compareJoins';
import { callRoute } from '../../../support/callRoute';
import { expectFieldErrors } from '../../../support/refusals';

const plan = JSON.parse(JSON.stringify(EXAMPLE_PLAN)) as object;
const swatch = { stitch: 'sc', stitches: 20, rows: 18, widthMm: 140, heightMm: 118 };
const asked = async (body: object) => {
  const { status, json } = await callRoute(POST, { method: 'POST', body });
  expect(status).toBe(200);
  return compareJoinsSchema.parse(json);
};

describe('POST /api/joins/compare', () => {
  it('tries every join at the tension of the plan where nothing else is asked for', async () => {
    const { tensions } = await asked({ plan });
    expect(tensions).toHaveLength(1);
    const [own] = tensions;
    expect(own?.swatch).toBeNull();
    expect(own?.joins.map(({ key, joinM }) => [key, joinM])).toEqual(
      compareJoins(EXAMPLE_PLAN, READY_JOINS).map(({ join, joinM }) => [join.key, joinM]),
    );
    expect(own?.why).toMatch(/^Joined in the last round takes .*\sm less than whip stitch/);
  });

  it('answers each swatch with the joins asked for, in their order', async () => {
    const joins = ['sc-ridge', 'slip-stitch'];
    const wide = { ...swatch, widthMm: 168 };
    const { tensions } = await asked({ plan, joins, swatches: [swatch, wide] });
    expect(tensions.map((tension) => tension.swatch)).toEqual([0, 1]);
    for (const tension of tensions) expect(tension.joins.map(({ key }) => key)).toEqual(joins);
    const [tight, loose] = tensions.map((tension) => tension.joins[0]?.joinM ?? 0);
    // a stitch 1.2 times as wide takes 1.2 times the yarn, tails apart: 32 × 150 mm
    expect((loose ?? 0) - 4.8).toBeCloseTo(1.2 * ((tight ?? 0) - 4.8), 6);
  });

  it('says what is wrong beside each field', async () => {
    const body = { plan, joins: ['slip-stitch'], swatches: [swatch] };
    await expectFieldErrors(POST, { method: 'POST', body }, [
      { change: { plan: undefined }, fields: { plan: 'Plan is missing' } },
      { change: { joins: [] }, fields: { joins: 'Joins must be at least 1' } },
      { change: { joins: ['knot'] }, fields: { 'joins.0': 'There is no join named knot' } },
      {
        change: { joins: Array(41).fill('slip-stitch') },
        fields: { joins: 'Joins must be at most 40' },
      },
      {
        change: { swatches: Array(13).fill(swatch) },
        fields: { swatches: 'Swatches must be at most 12' },
      },
      {
        change: { swatches: [{ ...swatch, stitches: 0 }] },
        fields: { 'swatches.0.stitches': 'Stitches across the swatch must be at least 1' },
      },
      { change: { hook: 5 }, fields: { '': 'Comparison has no field named hook' } },
    ]);
  });

  it('refuses more than can be answered in good time', async () => {
    const colourways = Array(400).fill(EXAMPLE_PLAN.colourways[0]);
    const body = { plan: { ...plan, colourways }, swatches: Array(12).fill(swatch) };
    await expectFieldErrors(POST, { method: 'POST', body }, [
      {
        change: {},
        fields: {
          joins: `Joins × swatches × colourways must be at most 6000, and are ${READY_JOINS.length * 12 * 400}`,
        },
      },
    ]);
  });
});
