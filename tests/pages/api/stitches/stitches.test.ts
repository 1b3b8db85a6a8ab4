import { beforeEach, describe, expect, it } from 'vitest';
import { GET, POST } from '../../../../src/pages/api/stitches';
import { DELETE, PUT } from '../../../../src/pages/api/stitches/[id]';
import type { CurrentUser } from '../../../../src/schemas/user';
import { STITCH_EXAMPLE } from '../../../../src/server/examples';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildOwnStitch, buildUser } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

const mine = async () => (await callRoute(GET, { user })).json.items;

describe('GET /api/stitches', () => {
  it('lists mine in the order of the alphabet, and nobody else’s', async () => {
    await buildOwnStitch(await buildUser(), { abbreviation: 'bst' });
    const second = await buildOwnStitch(user);
    const first = await buildOwnStitch(user, { abbreviation: 'bst' });
    const { status, json } = await callRoute(GET, { user });
    expect([status, json]).toEqual([200, { items: [first, second], total: 2 }]);
  });
});

describe('POST /api/stitches', () => {
  it('keeps a stitch with its moves, height and symbol', async () => {
    const body = {
      ...STITCH_EXAMPLE,
      heightOverWidth: 2.2,
      symbol: { body: 'legs', legs: 1, bars: 3 },
    };
    const { status, json } = await callRoute(POST, { method: 'POST', user, body });
    expect([status, await mine()]).toEqual([201, [json]]);
    expect(json).toMatchObject({ ...body, version: 1 });
  });

  it('says what is wrong beside each field, and keeps nothing', async () => {
    const moves = (change: object) => ({ moves: { ...STITCH_EXAMPLE.moves, ...change } });
    await expectFieldErrors(POST, { method: 'POST', user, body: STITCH_EXAMPLE }, [
      {
        change: { abbreviation: 'L2' },
        fields: {
          abbreviation: 'Abbreviation must be two or more small letters, such as lst',
        },
      },
      { change: { abbreviation: 'htr' }, fields: { abbreviation: 'Patterns use “htr” already' } },
      { change: { name: '' }, fields: { name: 'Name of the stitch is missing' } },
      {
        change: moves({ wraps: -1 }),
        fields: { 'moves.wraps': 'Wraps must not be less than 0' },
      },
      {
        change: moves({ draws: 0, throughs: 0 }),
        fields: { 'moves.throughs': 'A stitch needs at least one draw or one through' },
      },
      {
        change: { heightOverWidth: 21 },
        fields: { heightOverWidth: 'Height must be at most 20 widths' },
      },
      { change: { takes: 21 }, fields: { takes: 'Stitches taken up must be at most 20' } },
      {
        change: { symbol: { body: 'star', legs: 1, bars: 0 } },
        fields: {
          'symbol.body': 'Symbol must be one of chain, dot, cross, legs, popcorn, puff, picot',
        },
      },
    ]);
    expect(await mine()).toEqual([]);
  });

  it('takes an abbreviation once, from each person', async () => {
    await buildOwnStitch(await buildUser());
    await buildOwnStitch(user);
    const call = { method: 'POST', user, body: STITCH_EXAMPLE };
    const { status, json } = await callRoute(POST, call);
    expect([status, json.error.fields]).toEqual([
      400,
      { abbreviation: 'You have a stitch of that abbreviation already' },
    ]);
    expect(await mine()).toHaveLength(1);
  });
});

describe('/api/stitches/[id]', () => {
  const put = (id: string, change: object, by: CurrentUser | undefined = user) =>
    callRoute(PUT, {
      method: 'PUT',
      ...(by && { user: by }),
      params: { id },
      body: { ...STITCH_EXAMPLE, version: 1, ...change },
    });

  it('changes mine, once per version', async () => {
    const { id } = await buildOwnStitch(user);
    const answers = await Promise.all([put(id, { name: 'one' }), put(id, { name: 'two' })]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const refused = answers.find(({ status }) => status === 409);
    expect(refused?.json.error.current).toEqual((await mine())[0]);
  });

  it('refuses a change to a word that is taken, and changes nothing', async () => {
    await buildOwnStitch(user, { abbreviation: 'bst' });
    const kept = await buildOwnStitch(user);
    const taken = await put(kept.id, { abbreviation: 'bst' });
    expect([taken.status, taken.json.error.fields]).toEqual([
      400,
      { abbreviation: 'You have a stitch of that abbreviation already' },
    ]);
    const known = await put(kept.id, { abbreviation: 'rnd' });
    expect(known.json.error.fields).toEqual({ abbreviation: 'Patterns use “rnd” already' });
    expect((await mine())[1]).toEqual(kept);
  });

  it('deletes mine', async () => {
    const { id } = await buildOwnStitch(user);
    const call = { method: 'DELETE', user, params: { id } };
    expect((await callRoute(DELETE, call)).status).toBe(204);
    expect((await callRoute(DELETE, call)).status).toBe(404);
    expect(await mine()).toEqual([]);
  });
});
