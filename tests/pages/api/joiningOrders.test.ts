import { describe, expect, it } from 'vitest';
import { POST } from '../../../src/pages/api/joining-orders';
import { joiningOrderSchema } from '../../../src/schemas/joiningOrder';
import { callRoute } from '../../support/callRoute';
import { expectFieldErrors } from '../../support/refusals';

const body = { layout: 'square', rows: 2, columns: 2, corners: 'crossed', order: 'row-by-row' };

describe('POST /api/joining-orders', () => {
  it('tells a stranger what every motif links to, from 1, and null where a corner is left open', async () => {
    const { status, json } = await callRoute(POST, { method: 'POST', body });
    expect(status).toBe(200);
    expect(joiningOrderSchema.parse(json)).toEqual(json);
    // by hand: the third crosses to the second, the fourth to the first
    expect(json.steps[0]).toEqual({
      row: 1,
      column: 1,
      sides: [],
      corners: [{ corner: 'bottom right', to: null, reason: 'open' }],
    });
    expect(json.steps[3]).toEqual({
      row: 2,
      column: 2,
      sides: [
        { side: 'top', to: { row: 1, column: 2 } },
        { side: 'left', to: { row: 2, column: 1 } },
      ],
      corners: [
        { corner: 'top left', to: { row: 1, column: 1 }, reason: 'crossed' },
        { corner: 'top right', to: { row: 1, column: 2 }, reason: 'edge' },
        { corner: 'bottom left', to: { row: 2, column: 1 }, reason: 'edge' },
      ],
    });
  });

  it('numbers second motifs apart', async () => {
    const octagons = { ...body, layout: 'octagons', order: 'outwards' };
    const { json } = await callRoute(POST, { method: 'POST', body: octagons });
    expect(json.steps.filter(({ second }: { second?: true }) => second)).toHaveLength(1);
  });

  it('goes row by row where no order is asked for, and knows the short words', async () => {
    const { order: _, ...plain } = body;
    const asked = async (change: object) =>
      (await callRoute(POST, { method: 'POST', body: { ...plain, ...change } })).json;
    expect(await asked({})).toEqual(await asked({ order: 'row-by-row' }));
    expect(await asked({ order: 'columns' })).toEqual(await asked({ order: 'in-columns' }));
  });

  it('says what is wrong beside each field', async () => {
    await expectFieldErrors(POST, { method: 'POST', body }, [
      { change: { rows: 0 }, fields: { rows: 'Rows of motifs must be at least 1' } },
      { change: { columns: 1e6 }, fields: { columns: 'Motifs in a row must be at most 100' } },
      { change: { columns: 2.5 }, fields: { columns: 'Motifs in a row must be a whole number' } },
      {
        change: { corners: 'knotted' },
        fields: { corners: expect.stringContaining('Corners must be') },
      },
      {
        change: { layout: 'spiral' },
        fields: { layout: expect.stringContaining('Layout must be') },
      },
      { change: { order: 'anyhow' }, fields: { order: expect.stringContaining('Order must be') } },
      { change: { hook: 5 }, fields: { '': 'Joining order has no field named hook' } },
    ]);
  });
});
