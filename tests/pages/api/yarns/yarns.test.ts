import { beforeEach, describe, expect, it } from 'vitest';
import { Colourway, DyeLot } from '../../../../db/models';
import { POST as addColourway } from '../../../../src/pages/api/colourways';
import * as colourway from '../../../../src/pages/api/colourways/[id]';
import { GET, POST } from '../../../../src/pages/api/yarns';
import * as yarn from '../../../../src/pages/api/yarns/[id]';
import type { CurrentUser } from '../../../../src/schemas/user';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import {
  buildColourway,
  buildLot,
  buildUser,
  buildYarn,
  yarnInput,
} from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

describe('POST /api/yarns', () => {
  it('says what is wrong beside each field', async () => {
    await expectFieldErrors(POST, { method: 'POST', user, body: yarnInput() }, [
      { change: { name: ' ' }, fields: { name: 'Yarn name is missing' } },
      { change: { name: undefined }, fields: { name: 'Yarn name is missing' } },
      { change: { name: 7 }, fields: { name: 'Yarn name must be text' } },
      {
        change: { weightCategory: 9 },
        fields: { weightCategory: 'Yarn weight category must be one of 0, 1, 2, 3, 4, 5, 6, 7' },
      },
      {
        change: { putUp: { massG: 0, lengthM: -3 } },
        fields: {
          'putUp.massG': 'Skein mass must be more than 0 g',
          'putUp.lengthM': 'Skein length must be more than 0 m',
        },
      },
      {
        change: { putUp: { massG: 0, lengthM: 240 } },
        fields: { 'putUp.massG': 'Skein mass must be more than 0 g' },
      },
      {
        change: { putUp: { massG: 100, lengthM: 90_000 } },
        fields: {
          'putUp.lengthM': 'No yarn runs 900 m to the gram: check the length and the mass',
        },
      },
      {
        change: { price: { priceMinor: 7.2, currency: 'EUR' } },
        fields: { 'price.priceMinor': 'Price of a skein must be a whole number' },
      },
      {
        change: { price: { priceMinor: 720, currency: '€' } },
        fields: { 'price.currency': 'Choose one of the listed currencies, for example EUR.' },
      },
      { change: { ownerId: 'x' }, fields: { '': 'Yarn has no field named ownerId' } },
      { change: { version: 9 }, fields: { '': 'Yarn has no field named version' } },
    ]);
  });

  it('adds a yarn', async () => {
    const { status, json } = await callRoute(POST, { method: 'POST', user, body: yarnInput() });
    expect(status).toBe(201);
    expect(json).toEqual({
      ...yarnInput(),
      id: expect.any(String),
      version: 1,
      updatedAt: expect.any(String),
      colourways: [],
    });
  });

  it('takes a yarn without a price', async () => {
    const body = yarnInput({ price: null });
    const { json } = await callRoute(POST, { method: 'POST', user, body });
    expect(json.price).toBeNull();
  });
});

describe('GET /api/yarns', () => {
  it('lists my yarns by name with their colourways by name, and nobody else’s', async () => {
    await buildYarn(await buildUser());
    const { id: yarnId } = await buildYarn(user, { name: 'windlass' });
    await buildYarn(user, { name: 'Bollard' });
    await buildColourway(user, { yarnId, name: 'tar' });
    await buildColourway(user, { yarnId, name: 'Rope' });
    const { json } = await callRoute(GET, { user });
    expect(json.total).toBe(2);
    expect(json.items.map(({ name }: { name: string }) => name)).toEqual(['Bollard', 'windlass']);
    const names = json.items[1].colourways.map(({ name }: { name: string }) => name);
    expect(names).toEqual(['Rope', 'tar']);
  });

  it('answers in pages', async () => {
    for (const name of ['A', 'B', 'C']) await buildYarn(user, { name });
    const { json } = await callRoute(GET, { user, url: '/api/yarns?limit=1&offset=1' });
    expect([json.total, json.items.length, json.items[0].name]).toEqual([3, 1, 'B']);
  });

  it.each(['limit=0', 'limit=501', 'limit=', 'limit=ten', 'offset=-1', 'page=2'])(
    'refuses ?%s',
    async (query) => {
      const { status } = await callRoute(GET, { user, url: `/api/yarns?${query}` });
      expect(status).toBe(400);
    },
  );
});

describe('PUT /api/yarns/[id]', () => {
  const save = (id: string, body: object) =>
    callRoute(yarn.PUT, { method: 'PUT', user, params: { id }, body });

  it('changes a yarn and counts the save', async () => {
    const { id } = await buildYarn(user);
    const body = { ...yarnInput({ name: 'Towpath 4-ply', price: null }), version: 1 };
    const { status, json } = await save(id, body);
    expect([status, json.name, json.price, json.version]).toEqual([200, 'Towpath 4-ply', null, 2]);
  });

  it('answers a save that began from an older version with what is there now', async () => {
    const { id } = await buildYarn(user);
    await save(id, { ...yarnInput({ name: 'First' }), version: 1 });
    const { status, json } = await save(id, { ...yarnInput({ name: 'Second' }), version: 1 });
    expect([status, json.error.code]).toEqual([409, 'conflict']);
    expect([json.error.current.name, json.error.current.version]).toEqual(['First', 2]);
  });

  it('lets one of two saves at once through', async () => {
    const { id } = await buildYarn(user);
    const answers = await Promise.all(
      ['One', 'Two'].map((name) => save(id, { ...yarnInput({ name }), version: 1 })),
    );
    const winner = answers.find(({ status }) => status === 200);
    const loser = answers.find(({ status }) => status === 409);
    expect(loser?.json.error.current).toEqual(winner?.json);
  });

  it('refuses a skein lighter than a part skein in the stash', async () => {
    const lot = await buildLot(user, { partSkeins: [{ massG: 70 }] });
    const body = { ...yarnInput({ putUp: { massG: 50, lengthM: 120 } }), version: 1 };
    const { status, json } = await save(lot.yarn.id, body);
    expect([status, json.error.fields]).toEqual([
      400,
      { 'putUp.massG': 'A part skein of 70 g in your stash is heavier than that' },
    ]);
  });
});

describe('DELETE /api/yarns/[id]', () => {
  it('takes its colourways along', async () => {
    const { yarnId } = await buildColourway(user);
    const call = { method: 'DELETE', user, params: { id: yarnId } };
    expect((await callRoute(yarn.DELETE, call)).status).toBe(204);
    expect(await Colourway.count()).toBe(0);
    expect((await callRoute(yarn.GET, { user, params: { id: yarnId } })).status).toBe(404);
  });

  it('is refused while it is in the stash', async () => {
    const lot = await buildLot(user);
    const call = { method: 'DELETE', user, params: { id: lot.yarn.id } };
    const { status, json } = await callRoute(yarn.DELETE, call);
    expect([status, json.error]).toEqual([
      409,
      {
        code: 'in-use',
        message: 'This yarn is in your stash. Remove its dye lots there first.',
      },
    ]);
    expect(await DyeLot.count()).toBe(1);
  });
});

describe('/api/colourways', () => {
  it('adds one to a yarn of mine, in small hex digits', async () => {
    const { id: yarnId } = await buildYarn(user);
    const body = { yarnId, name: 'Lock Gate', hex: '#3B4A3F' };
    const { status, json } = await callRoute(addColourway, { method: 'POST', user, body });
    expect([status, json]).toEqual([
      201,
      { id: expect.any(String), yarnId, version: 1, name: 'Lock Gate', hex: '#3b4a3f' },
    ]);
  });

  it('says what is wrong beside each field', async () => {
    const foreign = await buildYarn(await buildUser());
    const { yarnId } = await buildColourway(user, { name: 'Lock Gate' });
    const body = { yarnId, name: 'Rope', hex: '#000000' };
    await expectFieldErrors(addColourway, { method: 'POST', user, body }, [
      {
        change: { hex: 'green' },
        fields: {
          hex: 'Colour must be written as # and six digits 0-9, a-f, such as #2f6f6b',
        },
      },
      {
        change: { name: 'lock GATE' },
        fields: { name: 'This yarn has a colourway of that name already' },
      },
      { change: { yarnId: foreign.id }, fields: { yarnId: 'You have no such yarn' } },
      { change: { yarnId: '7' }, fields: { yarnId: 'This is not the id of anything kept here' } },
    ]);
  });

  it('is renamed, but not to the name of another', async () => {
    const { id, yarnId } = await buildColourway(user, { name: 'Tar' });
    await buildColourway(user, { yarnId, name: 'Rope' });
    const save = (name: string) =>
      callRoute(colourway.PUT, {
        method: 'PUT',
        user,
        params: { id },
        body: { name, hex: '#101010', version: 1 },
      });
    expect((await save('Rope')).json.error.fields).toEqual({
      name: 'This yarn has a colourway of that name already',
    });
    expect((await save('Pitch')).json).toMatchObject({ name: 'Pitch', version: 2 });
    expect((await save('Soot')).status).toBe(409);
  });

  it('is not deleted while it is in the stash', async () => {
    const { colourway: kept } = await buildLot(user);
    const free = await buildColourway(user, { name: 'Free' });
    const remove = (id: string) =>
      callRoute(colourway.DELETE, { method: 'DELETE', user, params: { id } });
    expect((await remove(kept.id)).json.error.code).toBe('in-use');
    expect((await remove(free.id)).status).toBe(204);
  });
});
