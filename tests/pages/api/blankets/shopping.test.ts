import Papa from 'papaparse';
import { beforeEach, describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN } from '../../../../src/lib';
import * as blanketRoute from '../../../../src/pages/api/blankets/[id]';
import * as colourLink from '../../../../src/pages/api/blankets/[id]/colour-links/[colour]';
import { GET } from '../../../../src/pages/api/blankets/[id]/shopping-list';
import { GET as getCsv } from '../../../../src/pages/api/blankets/[id]/shopping-list.csv';
import { GET as listKept, POST as keep } from '../../../../src/pages/api/shopping-lists';
import * as kept from '../../../../src/pages/api/shopping-lists/[id]';
import { DEFAULT_PREFERENCES } from '../../../../src/schemas/preferences';
import type { CurrentUser } from '../../../../src/schemas/user';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import {
  buildBlanket,
  buildColourway,
  buildLot,
  buildUser,
  buildYarn,
  planInput,
} from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

/** A yarn as the example plan has: medium, 100 g and 200 m. */
const buildAran = (name = 'Lindry Aran') =>
  buildYarn(user, { name, weightCategory: 4, putUp: { massG: 100, lengthM: 200 } });
const shopping = async (id: string) => (await callRoute(GET, { user, params: { id } })).json;
const link = (id: string, colour: string, colourwayId: string | null) =>
  callRoute(colourLink.PUT, { method: 'PUT', user, params: { id, colour }, body: { colourwayId } });

describe('GET /api/blankets/[id]/shopping-list', () => {
  it('wants everything bought when there is no stash', async () => {
    const { id } = await buildBlanket(user);
    const json = await shopping(id);
    const { colours, totals } = estimate(EXAMPLE_PLAN);
    expect(json.toBuySkeins).toBe(totals.skeins);
    expect(json.costMinor).toBe(totals.costMinor);
    expect([json.currency, json.confidence, json.title]).toEqual(['EUR', 0.95, 'Eighty squares']);
    expect(json.lines[0]).toEqual({
      colour: 'c1',
      name: 'Skerry',
      hex: '#2f5d73',
      neededM: colours[0]?.neededM,
      neededG: colours[0]?.neededG,
      haveM: 0,
      haveG: 0,
      toBuySkeins: colours[0]?.skeins,
      mixesLots: expect.any(Boolean),
      costMinor: colours[0]?.costMinor,
      stash: { match: 'none', colourway: null, weightDiffers: false, lots: [] },
    });
  });

  it('takes off what the stash has in a colourway of the same name and weight', async () => {
    const yarn = await buildAran();
    const colourway = await buildColourway(user, { yarnId: yarn.id, name: 'SKERRY' });
    const lot = await buildLot(user, {
      colourwayId: colourway.id,
      wholeSkeins: 1,
      partSkeins: [{ massG: 25 }],
    });
    const { id } = await buildBlanket(user);
    const [line] = (await shopping(id)).lines;
    // 1 skein of 100 g and 200 m, and a quarter of another.
    expect([line.haveM, line.haveG]).toEqual([250, 125]);
    expect(line.stash).toEqual({
      match: 'by name',
      colourway: { id: colourway.id, name: 'SKERRY', hex: '#3b4a3f', yarnName: 'Lindry Aran' },
      weightDiffers: false,
      lots: [{ id: lot.id, lotCode: '2207', totalM: 250, totalG: 125 }],
    });
  });

  it('matches no yarn of another weight by name, but one that is linked', async () => {
    const dk = await buildColourway(user, { name: 'Skerry' });
    await buildLot(user, { colourwayId: dk.id });
    const { id } = await buildBlanket(user);
    expect((await shopping(id)).lines[0].stash.match).toBe('none');
    const { status, json } = await link(id, 'c1', dk.id);
    expect(status).toBe(200);
    expect(json.lines[0].stash).toMatchObject({ match: 'linked', weightDiffers: true });
    expect(json.lines[0].haveM).toBe(480);
  });

  it('keeps a colour out of the stash where that was chosen, until the link is taken away', async () => {
    const yarn = await buildAran();
    const colourway = await buildColourway(user, { yarnId: yarn.id, name: 'Skerry' });
    await buildLot(user, { colourwayId: colourway.id });
    const { id } = await buildBlanket(user);
    const out = await link(id, 'c1', null);
    expect([out.json.lines[0].stash.match, out.json.lines[0].haveM]).toEqual(['kept out', 0]);
    const back = await callRoute(colourLink.DELETE, {
      method: 'DELETE',
      user,
      params: { id, colour: 'c1' },
    });
    expect(back.json.lines[0].stash.match).toBe('by name');
  });

  it('never counts one colourway for two colours', async () => {
    const yarn = await buildAran();
    const skerry = await buildColourway(user, { yarnId: yarn.id, name: 'Skerry' });
    await buildLot(user, { colourwayId: skerry.id });
    const { id } = await buildBlanket(user);
    const linked = (await link(id, 'c2', skerry.id)).json.lines;
    expect(linked.map(({ haveM }: { haveM: number }) => haveM)).toEqual([0, 400, 0, 0, 0]);
    const twice = await link(id, 'c3', skerry.id);
    expect([twice.status, twice.json.error.fields]).toEqual([
      400,
      { colourwayId: 'This colourway serves Barley already' },
    ]);
  });

  it("refuses another person's colourway and a colour that is none", async () => {
    const foreign = await buildColourway(await buildUser());
    const { id } = await buildBlanket(user);
    expect((await link(id, 'c1', foreign.id)).json.error.fields).toEqual({
      colourwayId: 'You have no such colourway',
    });
    const none = await link(id, 'c9', null);
    expect([none.status, none.json.error.message]).toEqual([
      404,
      'This blanket has no such colour.',
    ]);
  });
});

describe('GET /api/blankets/[id]/shopping-list.csv', () => {
  it('is RFC 4180 and safe in a spreadsheet', async () => {
    const plan = planInput();
    plan.colours[0]!.name = '=HYPERLINK("http://x")';
    plan.colours[1]!.name = 'Barley, "pale"';
    plan.colours[2]!.name = '-1+1';
    plan.yarn.name = '@Lindry';
    const { id } = await buildBlanket(user, { plan });
    const { status, text, headers } = await callRoute(getCsv, { user, params: { id } });
    expect([status, headers.get('content-type')]).toEqual([
      200,
      'text/csv; charset=utf-8; header=present',
    ]);
    expect(headers.get('content-disposition')).toBe('attachment; filename="shopping-list.csv"');
    expect(text.endsWith('\r\n')).toBe(true);
    expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
    const { data, errors } = Papa.parse<string[]>(text.trimEnd());
    expect([errors, data.length]).toEqual([[], 6]);
    expect(data[0]?.slice(0, 4)).toEqual(['Yarn', 'Colour', 'Needed (m)', 'Needed (g)']);
    expect(data.slice(1, 4).map(([yarn, name]) => [yarn, name])).toEqual([
      ["'@Lindry", `'=HYPERLINK("http://x")`],
      ["'@Lindry", 'Barley, "pale"'],
      ["'@Lindry", "'-1+1"],
    ]);
    const [first] = estimate(EXAMPLE_PLAN).colours;
    expect(Number(data[1]?.[2])).toBeCloseTo(first!.neededM, 0);
    expect(data[1]?.slice(6, 9)).toEqual([
      String(first!.skeins),
      (first!.costMinor! / 100).toFixed(2),
      'EUR',
    ]);
  });

  it("is in the person's own units", async () => {
    const { id } = await buildBlanket(user);
    const preferences = { ...DEFAULT_PREFERENCES, units: 'imperial' as const };
    const { text } = await callRoute(getCsv, { user, params: { id }, preferences });
    const [heads, first] = Papa.parse<string[]>(text).data;
    expect(heads?.slice(2, 4)).toEqual(['Needed (yd)', 'Needed (oz)']);
    const { neededM } = estimate(EXAMPLE_PLAN).colours[0]!;
    expect(Number(first?.[2])).toBeCloseTo(neededM / 0.9144, 0);
  });
});

describe('/api/shopping-lists', () => {
  const keepOne = async (blanketId: string) =>
    (await callRoute(keep, { method: 'POST', user, body: { blanketId } })).json;

  it('keeps a list as it was on the day', async () => {
    const { id } = await buildBlanket(user);
    const before = await shopping(id);
    const list = await keepOne(id);
    await callRoute(blanketRoute.PUT, {
      method: 'PUT',
      user,
      params: { id },
      body: {
        title: 'Smaller',
        plan: planInput({ size: { by: 'grid', rows: 2, columns: 2 } }),
        version: 1,
      },
    });
    const { json } = await callRoute(kept.GET, { user, params: { id: list.id } });
    expect(json).toEqual(list);
    expect(json.toBuySkeins).toBe(before.toBuySkeins);
    expect(json.lines).toEqual(before.lines.map((line: object) => ({ ...line, bought: false })));
  });

  it('ticks lines off, once per version', async () => {
    const { id } = await buildBlanket(user);
    const list = await keepOne(id);
    const tick = (bought: string[]) =>
      callRoute(kept.PUT, {
        method: 'PUT',
        user,
        params: { id: list.id },
        body: { version: 1, bought },
      });
    const answers = await Promise.all([tick(['c2']), tick(['c4'])]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const winner = answers.find(({ status }) => status === 200)!.json;
    expect(winner.lines.filter(({ bought }: { bought: boolean }) => bought)).toHaveLength(1);
  });

  it('refuses what it cannot tick', async () => {
    const { id } = await buildBlanket(user);
    const list = await keepOne(id);
    const call = { method: 'PUT', user, params: { id: list.id }, body: { version: 1, bought: [] } };
    await expectFieldErrors(kept.PUT, call, [
      {
        change: { bought: ['c1', 'c9'] },
        fields: { 'bought.1': 'There is no line of this colour' },
      },
      { change: { bought: 'c1' }, fields: { bought: 'Lines bought must be a list' } },
      { change: { lines: [] }, fields: { '': 'Shopping list has no field named lines' } },
    ]);
  });

  it("is not made of another person's blanket", async () => {
    const { id } = await buildBlanket(await buildUser());
    const call = { method: 'POST', user, body: { blanketId: id } };
    await expectFieldErrors(keep, call, [
      { change: {}, fields: { blanketId: 'You have no such blanket' } },
    ]);
  });

  it('lists the newest first and deletes', async () => {
    const { id } = await buildBlanket(user);
    const [first, second] = [await keepOne(id), await keepOne(id)];
    const listed = async () => (await callRoute(listKept, { user })).json;
    expect((await listed()).items.map((list: { id: string }) => list.id)).toEqual([
      second.id,
      first.id,
    ]);
    await callRoute(kept.DELETE, { method: 'DELETE', user, params: { id: second.id } });
    expect((await listed()).total).toBe(1);
  });
});
