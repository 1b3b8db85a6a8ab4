import { beforeEach, describe, expect, it } from 'vitest';
import { Blanket, BlanketColourLink, BlanketRevision } from '../../../../db/models';
import { estimate, EXAMPLE_PLAN } from '../../../../src/lib';
import { GET, POST } from '../../../../src/pages/api/blankets';
import * as blanket from '../../../../src/pages/api/blankets/[id]';
import { POST as restore } from '../../../../src/pages/api/blankets/[id]/restore';
import { GET as revisions } from '../../../../src/pages/api/blankets/[id]/revisions';
import { GET as revision } from '../../../../src/pages/api/blankets/[id]/revisions/[version]';
import { POST as restoreRevision } from '../../../../src/pages/api/blankets/[id]/revisions/[version]/restore';
import { KEPT_LIMITS } from '../../../../src/schemas/limits';
import type { CurrentUser } from '../../../../src/schemas/user';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildBlanket, buildUser, planInput } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

const save = (id: string, body: object) =>
  callRoute(blanket.PUT, { method: 'PUT', user, params: { id }, body });
const remove = (id: string) =>
  callRoute(blanket.DELETE, { method: 'DELETE', user, params: { id } });

describe('POST /api/blankets', () => {
  it('says what is wrong beside each field', async () => {
    const plan = planInput();
    await expectFieldErrors(POST, { method: 'POST', user, body: { title: 'Eighty', plan } }, [
      { change: { title: '' }, fields: { title: 'Title is missing' } },
      {
        change: { title: 'x'.repeat(121) },
        fields: { title: 'Title must have at most 120 characters' },
      },
      { change: { plan: undefined }, fields: { plan: 'Plan is missing' } },
      {
        change: { plan: planInput({ join: { key: 'flat-braid', colour: 'c9' } }) },
        fields: { 'plan.join.colour': 'There is no colour with the key c9' },
      },
      {
        change: { plan: planInput({ confidence: 1 as never }) },
        fields: { 'plan.confidence': 'Confidence must be one of 0.5, 0.8, 0.9, 0.95, 0.99' },
      },
      { change: { deletedAt: null }, fields: { '': 'Blanket has no field named deletedAt' } },
    ]);
  });

  it('refuses a body that is too large before reading it whole', async () => {
    const body = { title: 'x'.repeat(300_000), plan: planInput() };
    const { status, json } = await callRoute(POST, { method: 'POST', user, body });
    expect([status, json.error.code]).toEqual([413, 'too-large']);
  });

  it('keeps the plan to the last digit and in its order', async () => {
    const plan = planInput();
    plan.motifs[0]!.rounds[0]!.made = { 'sl st': 1, dc: 11, ch: 11 };
    plan.swatch!.widthMm = 149.99999999999997;
    const { status, json } = await callRoute(POST, {
      method: 'POST',
      user,
      body: { title: 'Eighty', plan },
    });
    expect(status).toBe(201);
    const again = await callRoute(blanket.GET, { user, params: { id: json.id } });
    expect(again.json).toEqual({
      id: json.id,
      version: 1,
      title: 'Eighty',
      createdAt: expect.any(String),
      updatedAt: expect.any(String),
      deletedAt: null,
      plan,
    });
    const { made } = again.json.plan.motifs[0].rounds[0];
    expect(Object.keys(made)).toEqual(['sl st', 'dc', 'ch']);
  });
});

describe('GET /api/blankets', () => {
  it('lists mine with the figures of their estimates, last changed first', async () => {
    await buildBlanket(await buildUser());
    const first = await buildBlanket(user, { title: 'First' });
    await buildBlanket(user, { title: 'Second' });
    await save(first.id, { title: 'First', plan: planInput(), version: 1 });
    const { json } = await callRoute(GET, { user });
    const { size, totals, rows, columns } = estimate(EXAMPLE_PLAN);
    expect(json.items.map(({ title }: { title: string }) => title)).toEqual(['First', 'Second']);
    expect(json.items[0].figures).toEqual({
      rows,
      columns,
      widthMm: size.widthMm,
      heightMm: size.heightMm,
      skeins: totals.skeins,
      meanM: totals.meanM,
      costMinor: totals.costMinor,
    });
    expect(json.items[0]).not.toHaveProperty('plan');
  });

  it('leaves deleted ones to a list of their own', async () => {
    const { id } = await buildBlanket(user, { title: 'Gone' });
    await buildBlanket(user, { title: 'Here' });
    await remove(id);
    const here = await callRoute(GET, { user, url: '/api/blankets' });
    const gone = await callRoute(GET, { user, url: '/api/blankets?deleted=only' });
    expect([here.json.total, here.json.items[0].title]).toEqual([1, 'Here']);
    expect([gone.json.total, gone.json.items[0].title]).toEqual([1, 'Gone']);
    const both = await callRoute(GET, { user, url: '/api/blankets?deleted=both' });
    expect(both.json.error.fields).toEqual({ deleted: 'deleted must be one of no, only' });
  });
});

describe('PUT /api/blankets/[id]', () => {
  it('saves and counts the save', async () => {
    const { id } = await buildBlanket(user);
    const plan = planInput({ confidence: 0.8 });
    const { status, json } = await save(id, { title: 'Ninety', plan, version: 1 });
    expect([status, json.title, json.version, json.plan]).toEqual([200, 'Ninety', 2, plan]);
  });

  it('answers 409 with the blanket as it is when another tab saved first', async () => {
    const { id } = await buildBlanket(user);
    const answers = await Promise.all(
      ['One', 'Two'].map((title) => save(id, { title, plan: planInput(), version: 1 })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const winner = answers.find(({ status }) => status === 200);
    const loser = answers.find(({ status }) => status === 409);
    expect(loser?.json.error).toEqual({
      code: 'conflict',
      message: 'This was saved from elsewhere in the meantime.',
      current: winner?.json,
    });
    expect(await BlanketRevision.count()).toBe(2);
  });

  it('refuses an older version also when it was never the current one', async () => {
    const { id } = await buildBlanket(user);
    const { status } = await save(id, { title: 'A', plan: planInput(), version: 7 });
    expect(status).toBe(409);
  });

  it('forgets the link of a colour that is gone', async () => {
    const { id } = await buildBlanket(user);
    await BlanketColourLink.bulkCreate(
      ['c1', 'c5'].map((colourKey) => ({
        blanketId: id,
        ownerId: user.id,
        colourKey,
        colourwayId: null,
      })),
    );
    const plan = planInput();
    plan.colours = plan.colours.slice(0, 4);
    for (const each of plan.colourways) each.roundColours = ['c1', 'c2', 'c3', 'c4'];
    await save(id, { title: 'Four colours', plan, version: 1 });
    expect((await BlanketColourLink.findAll()).map(({ colourKey }) => colourKey)).toEqual(['c1']);
  });
});

describe('DELETE /api/blankets/[id] and POST …/restore', () => {
  it('puts a blanket away and brings it back as it was', async () => {
    const before = await buildBlanket(user);
    const { id } = before;
    expect((await remove(id)).status).toBe(204);
    const away = await callRoute(blanket.GET, { user, params: { id } });
    expect(away.json.deletedAt).not.toBeNull();
    const refused = await save(id, { title: 'A', plan: planInput(), version: 1 });
    expect([refused.status, refused.json.error.message]).toEqual([
      410,
      'This blanket was deleted. Restore it first.',
    ]);
    const back = await callRoute(restore, { method: 'POST', user, params: { id } });
    expect([back.status, back.json]).toEqual([200, before]);
  });

  it('may be asked twice', async () => {
    const { id } = await buildBlanket(user);
    expect([(await remove(id)).status, (await remove(id)).status]).toEqual([204, 204]);
  });
});

describe('/api/blankets/[id]/revisions', () => {
  const listOf = (id: string) => callRoute(revisions, { user, params: { id } });

  it('keeps every save, newest first', async () => {
    const { id } = await buildBlanket(user, { title: 'One' });
    await save(id, { title: 'Two', plan: planInput({ confidence: 0.5 }), version: 1 });
    const { json } = await listOf(id);
    expect(json).toEqual({
      total: 2,
      items: [
        { version: 2, title: 'Two', savedAt: expect.any(String), isCurrent: true },
        { version: 1, title: 'One', savedAt: expect.any(String), isCurrent: false },
      ],
    });
    const first = await callRoute(revision, { user, params: { id, version: '1' } });
    expect([first.json.title, first.json.plan]).toEqual(['One', planInput()]);
  });

  it('saves an older one again without losing the newer', async () => {
    const { id } = await buildBlanket(user, { title: 'One' });
    await save(id, { title: 'Two', plan: planInput({ confidence: 0.5 }), version: 1 });
    const call = (version: number) =>
      callRoute(restoreRevision, {
        method: 'POST',
        user,
        params: { id, version: '1' },
        body: { version },
      });
    expect((await call(1)).status).toBe(409);
    const { json } = await call(2);
    expect([json.version, json.title, json.plan]).toEqual([3, 'One', planInput()]);
    expect((await listOf(id)).json.items.map(({ title }: { title: string }) => title)).toEqual([
      'One',
      'Two',
      'One',
    ]);
  });

  it('does not know a save that is not kept', async () => {
    const { id } = await buildBlanket(user);
    const none = await callRoute(revision, { user, params: { id, version: '9' } });
    expect([none.status, none.json.error.message]).toEqual([
      404,
      'This save of the blanket is not kept.',
    ]);
    const odd = await callRoute(revision, { user, params: { id, version: '-1' } });
    expect(odd.status).toBe(400);
  });

  it('forgets the oldest beyond the limit', async () => {
    const { id, plan } = await buildBlanket(user);
    const most = KEPT_LIMITS.revisionsPerBlanket;
    await BlanketRevision.bulkCreate(
      Array.from({ length: most - 1 }, (_, i) => ({
        blanketId: id,
        version: i + 2,
        title: 'x',
        plan,
        schemaVersion: 1,
        savedAt: new Date(),
      })),
    );
    await Blanket.update({ version: most }, { where: { id } });
    await save(id, { title: 'One more', plan: planInput(), version: most });
    expect(await BlanketRevision.count()).toBe(most);
    expect(await BlanketRevision.min('version')).toBe(2);
  });
});
