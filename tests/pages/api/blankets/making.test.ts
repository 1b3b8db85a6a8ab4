import { randomUUID } from 'node:crypto';
import { beforeEach, describe, expect, it } from 'vitest';
import { Blanket, MakingTick } from '../../../../db/models';
import * as blanketRoute from '../../../../src/pages/api/blankets/[id]';
import { GET, POST } from '../../../../src/pages/api/blankets/[id]/making';
import { makingSchema, type MakingInput } from '../../../../src/schemas/making';
import type { CurrentUser } from '../../../../src/schemas/user';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildBlanket, buildUser } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

const NOTHING: MakingInput = { ticks: [], weighings: [], order: null };
const at = (minute: number) => new Date(Date.UTC(2026, 10, 30, 18, minute)).toISOString();
const weighing = (change: object = {}) => ({
  id: randomUUID(),
  colour: 'c2',
  leftG: 62.5,
  resolutionG: 1,
  made: { dc: 480, ch: 96 },
  tails: 16,
  gone: false,
  at: at(5),
  ...change,
});

let user: CurrentUser;
let id: string;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
  ({ id } = await buildBlanket(user));
});

const mark = (marks: Partial<MakingInput>) =>
  callRoute(POST, { method: 'POST', user, params: { id }, body: { ...NOTHING, ...marks } });
const ticked = async () =>
  (await MakingTick.findAll({ where: { blanketId: id }, order: ['motif'] })).map(
    ({ motif, done }) => [motif, done],
  );

describe('/api/blankets/[id]/making', () => {
  it('begins with nothing made, row by row', async () => {
    const { status, json } = await callRoute(GET, { user, params: { id } });
    expect([status, json]).toEqual([200, { order: 'row-by-row', ticks: [], weighings: [] }]);
  });

  it('keeps marks, and answers with everything marked', async () => {
    const left = weighing();
    const { status, json } = await mark({
      ticks: [
        { motif: 'm0:0', done: true, at: at(1) },
        { motif: 's12:3', done: true, at: at(2) },
      ],
      weighings: [left],
      order: { order: 'outwards', at: at(0) },
    });
    expect(status).toBe(200);
    expect(makingSchema.parse(json)).toEqual(json);
    expect(json.order).toBe('outwards');
    expect(json.weighings).toEqual([left]);
    expect((await callRoute(GET, { user, params: { id } })).json).toEqual(json);
  });

  it('brings marks of two devices together, whichever arrives first', async () => {
    await mark({ ticks: [{ motif: 'm0:1', done: true, at: at(10) }] });
    // a phone that was offline: it ticked and unticked others before, and this one earlier
    await mark({
      ticks: [
        { motif: 'm0:0', done: true, at: at(1) },
        { motif: 'm0:1', done: false, at: at(4) },
        { motif: 'm0:2', done: true, at: at(5) },
        { motif: 'm0:2', done: false, at: at(6) },
      ],
    });
    expect(await ticked()).toEqual([
      ['m0:0', true],
      ['m0:1', true],
      ['m0:2', false],
    ]);
  });

  it('takes the same marks twice for once', async () => {
    const marks = { ticks: [{ motif: 'm0:0', done: true, at: at(1) }], weighings: [weighing()] };
    const first = await mark(marks);
    expect((await mark(marks)).json).toEqual(first.json);
    expect(await ticked()).toHaveLength(1);
  });

  it('loses nothing when devices send at once', async () => {
    const answers = await Promise.all(
      Array.from({ length: 8 }, (_, i) =>
        mark({ ticks: [{ motif: `m${i}:0`, done: true, at: at(i) }] }),
      ),
    );
    expect(answers.map(({ status }) => status)).toEqual(Array(8).fill(200));
    expect(await ticked()).toHaveLength(8);
  });

  it('does not let a clock that is ahead hold a mark for ever', async () => {
    await mark({ ticks: [{ motif: 'm0:0', done: true, at: '2199-01-01T00:00:00Z' }] });
    await mark({ ticks: [{ motif: 'm0:0', done: false, at: new Date().toISOString() }] });
    expect(await ticked()).toEqual([['m0:0', false]]);
  });

  it('takes a weighing back without forgetting that it was', async () => {
    const left = weighing();
    await mark({ weighings: [left] });
    await mark({ weighings: [{ ...left, gone: true, at: at(7) }] });
    const { json } = await mark({ weighings: [left] });
    expect(json.weighings).toEqual([{ ...left, gone: true, at: at(7) }]);
  });

  it('leaves the plan and its version alone', async () => {
    const before = (await callRoute(blanketRoute.GET, { user, params: { id } })).json;
    await mark({ order: { order: 'in-columns', at: at(1) } });
    expect((await callRoute(blanketRoute.GET, { user, params: { id } })).json).toEqual(before);
  });

  it('answers gone for a deleted blanket', async () => {
    await Blanket.update({ deletedAt: new Date() }, { where: { id } });
    expect((await mark({})).status).toBe(410);
    expect((await callRoute(GET, { user, params: { id } })).status).toBe(410);
  });

  it('says what is wrong beside each field, and changes nothing', async () => {
    const tick = { motif: 'm0:0', done: true, at: at(1) };
    await expectFieldErrors(POST, { method: 'POST', user, params: { id }, body: NOTHING }, [
      {
        change: { ticks: [{ ...tick, motif: 'row 1' }] },
        fields: { 'ticks.0.motif': 'Motif must be written as m or s, row, colon, column: m2:3' },
      },
      {
        change: { ticks: [{ ...tick, at: 'yesterday' }] },
        fields: { 'ticks.0.at': 'Time must be a moment such as 2026-11-30T18:00:00Z' },
      },
      {
        change: { weighings: [weighing({ leftG: -1 })] },
        fields: { 'weighings.0.leftG': 'What is left must not be less than 0 g' },
      },
      {
        change: { weighings: [weighing({ made: { knit: 3 } })] },
        fields: { 'weighings.0.made.knit': 'There is no stitch “knit” in the stitch table' },
      },
      {
        change: { order: { order: 'anyhow', at: at(1) } },
        fields: { 'order.order': expect.stringContaining('Order must be one of') },
      },
    ]);
    expect(await ticked()).toEqual([]);
  });
});
