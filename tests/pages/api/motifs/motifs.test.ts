import { beforeEach, describe, expect, it } from 'vitest';
import { LIBRARY_MOTIFS } from '../../../../src/lib/motifs/readyMotifs';
import { GET, POST } from '../../../../src/pages/api/motifs';
import * as motif from '../../../../src/pages/api/motifs/[id]';
import type { CurrentUser } from '../../../../src/schemas/user';
import { MOTIF_EXAMPLE } from '../../../../src/server/examples';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildMotif, buildUser } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

describe('GET /api/motifs', () => {
  it('lists the ready-made ones to anyone', async () => {
    await buildMotif(user);
    const { status, json } = await callRoute(GET);
    expect([status, json.total]).toEqual([200, LIBRARY_MOTIFS.length]);
    expect(json.items[0]).toEqual({
      key: LIBRARY_MOTIFS[0]?.key,
      readyMade: true,
      version: null,
      updatedAt: null,
      motif: LIBRARY_MOTIFS[0],
    });
  });

  it('adds mine after them, and nobody else’s', async () => {
    await buildMotif(await buildUser());
    const own = await buildMotif(user);
    const { json } = await callRoute(GET, { user });
    expect([json.total, json.items.at(-1)]).toEqual([LIBRARY_MOTIFS.length + 1, own]);
  });

  it('answers in pages', async () => {
    await buildMotif(user);
    const url = `/api/motifs?limit=2&offset=${LIBRARY_MOTIFS.length - 1}`;
    const { json } = await callRoute(GET, { user, url });
    expect(json.items.map(({ readyMade }: { readyMade: boolean }) => readyMade)).toEqual([
      true,
      false,
    ]);
  });
});

describe('POST /api/motifs', () => {
  it('is for those who have signed in', async () => {
    const { status } = await callRoute(POST, { method: 'POST', body: MOTIF_EXAMPLE });
    expect(status).toBe(401);
  });

  it('says what is wrong beside each field', async () => {
    const [first] = MOTIF_EXAMPLE.rounds;
    const withRound = (change: object) => ({ rounds: [{ ...first, ...change }] });
    await expectFieldErrors(POST, { method: 'POST', user, body: MOTIF_EXAMPLE }, [
      { change: { name: '' }, fields: { name: 'Motif name is missing' } },
      { change: { sides: 5 }, fields: { sides: 'Sides of a motif must be one of 0, 3, 4, 6, 8' } },
      { change: { rounds: [] }, fields: { rounds: 'Rounds of a motif must be at least 1' } },
      {
        change: { rounds: Array(61).fill(first) },
        fields: { rounds: 'Rounds of a motif must be at most 60' },
      },
      {
        change: withRound({ made: { dc: -1 } }),
        fields: { 'rounds.0.made.dc': 'Stitches made must not be less than 0' },
      },
      {
        change: withRound({ cornerSpace: 'ch-7' }),
        fields: { 'rounds.0.cornerSpace': 'Rnd 1 has no ch-7 space for its corners' },
      },
      { change: { key: 'group-square' }, fields: { '': 'Motif has no field named key' } },
    ]);
  });

  it('keeps a motif under its id, stitches in the order they were written', async () => {
    const body = structuredClone(MOTIF_EXAMPLE);
    body.rounds[0]!.made = { 'sl st': 1, dc: 11, ch: 11 };
    const { status, json } = await callRoute(POST, { method: 'POST', user, body });
    expect(status).toBe(201);
    expect(json.motif.key).toBe(json.key);
    const again = await callRoute(motif.GET, { user, params: { id: json.key } });
    expect(again.json.motif).toEqual({ ...body, key: json.key, version: 1 });
    expect(Object.keys(again.json.motif.rounds[0].made)).toEqual(['sl st', 'dc', 'ch']);
  });
});

describe('/api/motifs/[id]', () => {
  it('gets a ready-made one by its key', async () => {
    const { json } = await callRoute(motif.GET, { user, params: { id: 'hexagon' } });
    expect([json.readyMade, json.motif.sides]).toEqual([true, 6]);
  });

  it('does not know a key that is none', async () => {
    expect((await callRoute(motif.GET, { user, params: { id: 'lozenge' } })).status).toBe(404);
  });

  it('changes my own, once per version', async () => {
    const { key } = await buildMotif(user);
    const save = (name: string) =>
      callRoute(motif.PUT, {
        method: 'PUT',
        user,
        params: { id: key },
        body: { ...MOTIF_EXAMPLE, name, version: 1 },
      });
    const answers = await Promise.all([save('One'), save('Two')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  it('deletes my own', async () => {
    const { key } = await buildMotif(user);
    const call = { method: 'DELETE', user, params: { id: key } };
    expect((await callRoute(motif.DELETE, call)).status).toBe(204);
    expect((await callRoute(motif.DELETE, call)).status).toBe(404);
  });
});
