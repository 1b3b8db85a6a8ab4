import { beforeEach, describe, expect, it } from 'vitest';
import { MadeMotifRow } from '../../../../db/models';
import { READY_MOTIFS } from '../../../../src/lib/motifs/readyMotifs';
import { GET, POST } from '../../../../src/pages/api/motifs';
import * as motif from '../../../../src/pages/api/motifs/[id]';
import * as versions from '../../../../src/pages/api/motifs/[id]/versions';
import * as version from '../../../../src/pages/api/motifs/[id]/versions/[version]';
import * as restoring from '../../../../src/pages/api/motifs/[id]/versions/[version]/restore';
import type { CurrentUser } from '../../../../src/schemas/user';
import { MOTIF_EXAMPLE } from '../../../../src/server/examples';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildMadeMotif, buildMotif, buildUser } from '../../../support/factories';
import { LONG_STITCH } from '../../../support/longStitch';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

const create = (body: object) => callRoute(POST, { method: 'POST', user, body });
const put = (key: string, change: object) =>
  callRoute(motif.PUT, {
    method: 'PUT',
    user,
    params: { id: key },
    body: { ...MOTIF_EXAMPLE, version: 1, ...change },
  });
const restore = (key: string, from: number, version: number) =>
  callRoute(restoring.POST, {
    method: 'POST',
    user,
    params: { id: key, version: String(from) },
    body: { version },
  });

describe('GET /api/motifs', () => {
  it('lists the ready-made ones to anyone', async () => {
    await buildMotif(user);
    const { status, json } = await callRoute(GET);
    expect([status, json.total]).toEqual([200, READY_MOTIFS.length]);
    expect(json.items[0]).toEqual({
      key: READY_MOTIFS[0]?.key,
      readyMade: true,
      version: null,
      updatedAt: null,
      name: READY_MOTIFS[0]?.name,
      sides: READY_MOTIFS[0]?.sides,
      motif: READY_MOTIFS[0],
      problems: { errors: 0, warnings: 0 },
    });
  });

  it('adds mine after them, and nobody else’s', async () => {
    await buildMotif(await buildUser());
    const { pattern: _text, ...own } = await buildMotif(user);
    const { json } = await callRoute(GET, { user });
    expect([json.total, json.items.at(-1)]).toEqual([READY_MOTIFS.length + 1, own]);
  });

  it('answers in pages', async () => {
    await buildMotif(user);
    const url = `/api/motifs?limit=2&offset=${READY_MOTIFS.length - 1}`;
    const { json } = await callRoute(GET, { user, url });
    expect(json.items.map(({ readyMade }: { readyMade: boolean }) => readyMade)).toEqual([
      true,
      false,
    ]);
  });
});

describe('POST /api/motifs', () => {
  it('says what is wrong beside each field', async () => {
    await expectFieldErrors(POST, { method: 'POST', user, body: MOTIF_EXAMPLE }, [
      { change: { name: '' }, fields: { name: 'Motif name is missing' } },
      { change: { sides: 5 }, fields: { sides: 'Sides of a motif must be one of 0, 3, 4, 6, 8' } },
      { change: { text: undefined }, fields: { text: 'Pattern text is missing' } },
      {
        change: { text: 'x'.repeat(50_001) },
        fields: { text: 'Pattern text must have at most 50,000 characters' },
      },
      { change: { terms: 'fr' }, fields: { terms: 'Terms must be one of us, uk' } },
      { change: { size: 20 }, fields: { size: 'Size must be at most 19' } },
      {
        change: { stitches: [LONG_STITCH, LONG_STITCH] },
        fields: { stitches: 'Own stitches must each have an abbreviation of their own' },
      },
      { change: { key: 'group-square' }, fields: { '': 'Motif has no field named key' } },
      { change: { rounds: [] }, fields: { '': 'Motif has no field named rounds' } },
    ]);
    expect((await callRoute(GET, { user })).json.total).toBe(READY_MOTIFS.length);
  });

  it('keeps the text and works its rounds', async () => {
    const { status, json } = await create(MOTIF_EXAMPLE);
    expect(status).toBe(201);
    expect(json).toMatchObject({
      version: 1,
      readyMade: false,
      problems: { errors: 0, warnings: 0 },
    });
    expect(json.pattern).toEqual(MOTIF_EXAMPLE);
    expect(json.motif).toMatchObject({ key: json.key, version: 1, sides: 4 });
    // Worked by hand: 4 groups of 3 dc, the first dc of them ch 3; ch 2 after each; one sl st to join.
    expect(json.motif.rounds[0]).toMatchObject({
      made: { ch: 11, dc: 11, 'sl st': 1 },
      tally: { dc: 12 },
    });
    const again = await callRoute(motif.GET, { user, params: { id: json.key } });
    expect(again.json).toEqual(json);
  });

  it('works a text with stitches of one’s own', async () => {
    const text = 'Rnd 1: Ch 3 (counts as dc), 11 lst in magic ring; join. (1 dc, 11 lst)';
    const { json } = await create({ ...MOTIF_EXAMPLE, sides: 0, text, stitches: [LONG_STITCH] });
    expect(json.problems).toEqual({ errors: 0, warnings: 0 });
    expect(json.motif.rounds[0].tally).toEqual({ dc: 1, 'lst{1,1,3}': 11 });
  });

  it.each([
    ['has no round yet', 'Ch 4, join with sl st to form ring.'],
    ['is empty', ''],
    ['is worked in rows', 'Ch 11.\nRow 1: Sc in 2nd ch from hook and in each ch across, turn.'],
  ])('keeps a text that %s, without rounds', async (_, text) => {
    const { status, json } = await create({ ...MOTIF_EXAMPLE, text });
    expect([status, json.motif, json.pattern.text]).toEqual([201, null, text]);
  });

  it('keeps a text with errors and says how many', async () => {
    const text = 'Rnd 1: Ch 3 (counts as dc), 10 dcc in magic ring; join. (12 dc)';
    const { json } = await create({ ...MOTIF_EXAMPLE, text });
    // "dcc" is no abbreviation, and so the note's 12 dc are not made.
    expect(json.problems.errors).toBeGreaterThanOrEqual(2);
    expect(json.pattern.text).toBe(text);
  });

  it('keeps a text that no plan takes, without rounds', async () => {
    // 61 rounds; a plan takes motifs of 60.
    const first = 'Rnd 1: Ch 1, 6 sc in magic ring; join. (6 sc)\n';
    const text = `${first}Rnds 2-61: Ch 1, sc in each sc around; join.`;
    const { status, json } = await create({ ...MOTIF_EXAMPLE, sides: 0, text });
    expect([status, json.motif]).toEqual([201, null]);
  });

  it('takes what a PDF leaves in a text out of it', async () => {
    const { json } = await create({
      ...MOTIF_EXAMPLE,
      text: 'Rnd 1:\f 6 sc\r\nin magic ring.',
    });
    expect(json.pattern.text).toBe('Rnd 1:  6 sc\nin magic ring.');
  });
});

describe('/api/motifs/[id]', () => {
  it('gets a ready-made one by its key', async () => {
    const { json } = await callRoute(motif.GET, { user, params: { id: 'hexagon' } });
    expect([json.readyMade, json.motif.sides]).toEqual([true, 6]);
    expect(json.pattern.text).toMatch(/^Rnd 1: Ch 3/);
  });

  it('does not know a key that is none', async () => {
    expect((await callRoute(motif.GET, { user, params: { id: 'lozenge' } })).status).toBe(404);
  });

  it('changes my own, once per version', async () => {
    const { key } = await buildMotif(user);
    const answers = await Promise.all([put(key, { name: 'One' }), put(key, { name: 'Two' })]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const refused = answers.find(({ status }) => status === 409);
    const saved = answers.find(({ status }) => status === 200);
    expect(refused?.json.error.current).toEqual(saved?.json);
  });

  it('deletes my own, with what was measured of it', async () => {
    const { key } = await buildMotif(user);
    await buildMadeMotif(user, { motifKey: key, motifVersion: 1, rounds: 1, sizes: [] });
    await buildMadeMotif(user);
    const call = { method: 'DELETE', user, params: { id: key } };
    expect((await callRoute(motif.DELETE, call)).status).toBe(204);
    expect((await callRoute(motif.DELETE, call)).status).toBe(404);
    expect(await MadeMotifRow.count({ where: { motifKey: key } })).toBe(0);
    expect(await MadeMotifRow.count()).toBe(1);
  });
});

describe('/api/motifs/[id]/versions', () => {
  it('lists every save, newest first, and shows each as it was', async () => {
    const first = await buildMotif(user, 'First');
    const second = (await put(first.key, { name: 'Second', text: `${MOTIF_EXAMPLE.text} x` })).json;
    const { json } = await callRoute(versions.GET, { user, params: { id: first.key } });
    expect(json.items).toMatchObject([
      { version: 2, name: 'Second', isCurrent: true, rounds: 1 },
      { version: 1, name: 'First', isCurrent: false, rounds: 1 },
    ]);
    const shown = async (number: string) =>
      (await callRoute(version.GET, { user, params: { id: first.key, version: number } })).json;
    expect(await shown('1')).toEqual(first);
    expect(await shown('2')).toEqual(second);
  });

  it('does not know a save that is none', async () => {
    const { key } = await buildMotif(user);
    const params = { id: key, version: '2' };
    expect((await callRoute(version.GET, { user, params })).status).toBe(404);
    const bad = await callRoute(version.GET, { user, params: { id: key, version: 'x' } });
    expect(bad.status).toBe(400);
  });

  it('takes an older one up again as the newest', async () => {
    const first = await buildMotif(user, 'First');
    await put(first.key, { name: 'Second' });
    const { status, json } = await restore(first.key, 1, 2);
    expect([status, json.version, json.pattern]).toEqual([200, 3, first.pattern]);
    expect((await restore(first.key, 2, 2)).status).toBe(409);
    const { json: list } = await callRoute(versions.GET, { user, params: { id: first.key } });
    expect(list.total).toBe(3);
  });
});
