import { beforeEach, describe, expect, it } from 'vitest';
import { GET, POST } from '../../../../src/pages/api/made-motifs';
import { DELETE, PUT } from '../../../../src/pages/api/made-motifs/[id]';
import type { CurrentUser } from '../../../../src/schemas/user';
import { MADE_MOTIF_EXAMPLE } from '../../../../src/server/examples';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildMadeMotif, buildMotif, buildSwatch, buildUser } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

const mine = async () => (await callRoute(GET, { user })).json.items;
const size = (round: number, acrossMm: number) => ({ round, acrossMm });

describe('GET /api/made-motifs', () => {
  it('lists mine, the last made first, and nobody else’s', async () => {
    await buildMadeMotif(await buildUser());
    const earlier = await buildMadeMotif(user, { madeOn: '2026-11-02' });
    const later = await buildMadeMotif(user, { madeOn: '2026-11-28', motifKey: 'hexagon' });
    const { status, json } = await callRoute(GET, { user });
    expect([status, json]).toEqual([200, { items: [later, earlier], total: 2 }]);
  });

  it('lists those of one motif, page by page', async () => {
    await buildMadeMotif(user, { motifKey: 'hexagon' });
    const earlier = await buildMadeMotif(user, { madeOn: '2026-11-02' });
    await buildMadeMotif(user, { madeOn: '2026-11-28' });
    const url = 'http://localhost/api/made-motifs?motif=group-square&limit=1&offset=1';
    const { json } = await callRoute(GET, { user, url });
    expect(json).toEqual({ items: [earlier], total: 2 });
  });

  it('is for those who are signed in', async () => {
    const body = MADE_MOTIF_EXAMPLE;
    const { id } = await buildMadeMotif(user);
    const params = { id };
    const answers = [
      await callRoute(GET, {}),
      await callRoute(POST, { method: 'POST', body }),
      await callRoute(PUT, { method: 'PUT', params, body: { ...body, version: 1 } }),
      await callRoute(DELETE, { method: 'DELETE', params }),
    ];
    expect(answers.map(({ status }) => status)).toEqual([401, 401, 401, 401]);
    expect(await mine()).toHaveLength(1);
  });
});

describe('POST /api/made-motifs', () => {
  it('keeps sizes, weight and swatch', async () => {
    const swatch = await buildSwatch(user);
    const body = { ...MADE_MOTIF_EXAMPLE, swatchId: swatch.id, blocked: true, notes: 'Pinned.' };
    const { status, json } = await callRoute(POST, { method: 'POST', user, body });
    expect([status, await mine()]).toEqual([201, [json]]);
    expect(json).toMatchObject({ ...body, version: 1 });
  });

  it('keeps a weight without sizes, and sizes without a weight, of a motif of my own', async () => {
    const motif = await buildMotif(user);
    const own = { motifKey: motif.key, motifVersion: motif.version, rounds: 1 };
    const light = await buildMadeMotif(user, { ...own, sizes: [] });
    const sized = { ...own, sizes: [size(1, 38)], weighed: null, putUp: null };
    const only = await buildMadeMotif(user, sized);
    expect(await mine()).toEqual([only, light]);
  });

  it('says what is wrong beside each field, and keeps nothing', async () => {
    const { weighed } = MADE_MOTIF_EXAMPLE;
    await expectFieldErrors(POST, { method: 'POST', user, body: MADE_MOTIF_EXAMPLE }, [
      { change: { motifKey: '' }, fields: { motifKey: 'Motif is missing' } },
      { change: { motifKey: 'no-such' }, fields: { motifKey: 'You have no such motif' } },
      {
        change: { madeOn: 'yesterday' },
        fields: { madeOn: 'Date must be a day such as 2026-11-30' },
      },
      {
        change: { rounds: 0, sizes: [] },
        fields: { rounds: 'Rounds worked must be at least 1' },
      },
      {
        change: { rounds: 1 },
        fields: {
          'sizes.0.round': 'Only 1 round was worked',
          'sizes.1.round': 'Only 1 round was worked',
        },
      },
      { change: { rounds: 60 }, fields: { rounds: 'This motif has only 8 rounds' } },
      {
        change: { sizes: [size(2, 72), size(2, 73)] },
        fields: { 'sizes.1.round': 'Round 2 is measured twice' },
      },
      {
        change: { sizes: [size(3, 72), size(2, 73)] },
        fields: { 'sizes.0.acrossMm': 'Round 3 must measure more than round 2' },
      },
      {
        change: { sizes: [size(2, 6000)] },
        fields: { 'sizes.0.acrossMm': 'Size measured must be at most 5,000 mm' },
      },
      {
        change: { sizes: [], weighed: null },
        fields: { sizes: 'Measure a size after a round, or weigh what was made' },
      },
      { change: { putUp: null }, fields: { putUp: 'A weight needs the put-up of its yarn' } },
      {
        change: { putUp: { massG: 1, lengthM: 900 } },
        fields: {
          'putUp.lengthM': 'No yarn runs 900 m to the gram: check the length and the mass',
        },
      },
      {
        change: { weighed: { ...weighed, yarns: 0 } },
        fields: { 'weighed.yarns': 'Yarns attached must be at least 1' },
      },
      {
        change: { weighed: { ...weighed, massG: null } },
        fields: { 'weighed.massG': 'Yarn weighed is missing' },
      },
      {
        change: { weightCategory: 8 },
        fields: {
          weightCategory: 'Yarn weight category must be one of 0, 1, 2, 3, 4, 5, 6, 7',
        },
      },
      { change: { blocked: 'yes' }, fields: { blocked: 'Blocked must be yes or no' } },
    ]);
    expect(await mine()).toEqual([]);
  });

  it('knows no swatch and no motif of another person', async () => {
    const other = await buildUser();
    const [swatch, motif] = [await buildSwatch(other), await buildMotif(other)];
    await expectFieldErrors(POST, { method: 'POST', user, body: MADE_MOTIF_EXAMPLE }, [
      { change: { swatchId: swatch.id }, fields: { swatchId: 'You have no such swatch' } },
      { change: { motifKey: motif.key }, fields: { motifKey: 'You have no such motif' } },
    ]);
  });
});

describe('/api/made-motifs/[id]', () => {
  const put = (id: string, change: object, by: CurrentUser = user) =>
    callRoute(PUT, {
      method: 'PUT',
      user: by,
      params: { id },
      body: { ...MADE_MOTIF_EXAMPLE, version: 1, ...change },
    });

  it('changes mine, once per version, and says what the other save holds', async () => {
    const { id } = await buildMadeMotif(user);
    const answers = await Promise.all([put(id, { notes: 'one' }), put(id, { notes: 'two' })]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const refused = answers.find(({ status }) => status === 409);
    expect(refused?.json.error).toEqual({
      code: 'conflict',
      message: 'This was saved from elsewhere in the meantime.',
      current: (await mine())[0],
    });
  });

  it('refuses a change that is not right, and changes nothing', async () => {
    const kept = await buildMadeMotif(user);
    const { status, json } = await put(kept.id, { sizes: [size(5, 160)] });
    expect([status, json.error.fields]).toEqual([
      400,
      { 'sizes.0.round': 'Only 4 rounds were worked' },
    ]);
    expect(await mine()).toEqual([kept]);
  });

  it('takes a weight away, and puts one right of a motif that has gone since', async () => {
    const motif = await buildMotif(user);
    const own = {
      motifKey: motif.key,
      motifVersion: motif.version,
      rounds: 1,
      sizes: [size(1, 38)],
    };
    const { id } = await buildMadeMotif(user, own);
    const stranger = { ...own, motifKey: 'gone' };
    expect((await put(id, { ...stranger, weighed: null })).json.error.fields).toEqual({
      motifKey: 'You have no such motif',
    });
    const { status, json } = await put(id, { ...own, weighed: null, putUp: null });
    expect([status, json.weighed, json.putUp, json.version]).toEqual([200, null, null, 2]);
  });

  it('deletes mine', async () => {
    const { id } = await buildMadeMotif(user);
    const call = { method: 'DELETE', user, params: { id } };
    expect((await callRoute(DELETE, call)).status).toBe(204);
    expect((await callRoute(DELETE, call)).status).toBe(404);
    expect(await mine()).toEqual([]);
  });

  it('has nothing of anyone else’s, in the words of an unknown id', async () => {
    const other = await buildUser();
    const kept = await buildMadeMotif(user);
    const call = { method: 'DELETE', user: other, params: { id: kept.id } };
    const answers = [await put(kept.id, {}, other), await callRoute(DELETE, call)];
    for (const { status, json } of answers) {
      expect([status, json.error]).toEqual([
        404,
        { code: 'not-found', message: 'There is nothing of yours at this address.' },
      ]);
    }
    expect(await mine()).toEqual([kept]);
  });
});
