import { beforeEach, describe, expect, it } from 'vitest';
import { DyeLot, PartSkein } from '../../../../db/models';
import { GET, POST } from '../../../../src/pages/api/stash';
import * as lot from '../../../../src/pages/api/stash/[id]';
import type { CurrentUser } from '../../../../src/schemas/user';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildColourway, buildLot, buildUser, buildYarn } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

const LOT = { lotCode: '2207', location: '', pricePaid: null, wholeSkeins: 3, partSkeins: [] };

describe('POST /api/stash', () => {
  it('says what is wrong beside each field, and changes nothing', async () => {
    const { id: colourwayId } = await buildColourway(user);
    const foreign = await buildColourway(await buildUser());
    const body = { ...LOT, colourwayId };
    await expectFieldErrors(POST, { method: 'POST', user, body }, [
      {
        change: { wholeSkeins: -1 },
        fields: { wholeSkeins: 'Whole skeins must not be less than 0' },
      },
      {
        change: { wholeSkeins: 1.5 },
        fields: { wholeSkeins: 'Whole skeins must be a whole number' },
      },
      {
        change: { wholeSkeins: 1e9 },
        fields: { wholeSkeins: 'Whole skeins must be at most 100,000' },
      },
      {
        change: { partSkeins: [{ massG: 30 }, { massG: 0 }] },
        fields: { 'partSkeins.1.massG': 'Mass of a part skein must be more than 0 g' },
      },
      {
        change: { partSkeins: [{ massG: 30 }, { massG: 101 }] },
        fields: { 'partSkeins.1.massG': 'A whole skein weighs only 100 g' },
      },
      {
        change: { lotCode: 'x'.repeat(41) },
        fields: { lotCode: 'Dye lot must have at most 40 characters' },
      },
      {
        change: { colourwayId: foreign.id },
        fields: { colourwayId: 'You have no such colourway' },
      },
      { change: { totalM: 5 }, fields: { '': 'Dye lot has no field named totalM' } },
    ]);
    expect([await DyeLot.count(), await PartSkein.count()]).toEqual([0, 0]);
  });

  it('adds a dye lot and says what it comes to', async () => {
    const { id: colourwayId } = await buildColourway(user);
    const body = { ...LOT, colourwayId, partSkeins: [{ massG: 41 }, { massG: 9.5 }] };
    const { status, json } = await callRoute(POST, { method: 'POST', user, body });
    expect(status).toBe(201);
    // 3 skeins of 100 g and 240 m, and 50.5 g more.
    expect(json).toMatchObject({ totalG: 350.5, partSkeins: [{ massG: 41 }, { massG: 9.5 }] });
    expect(json.totalM).toBeCloseTo(350.5 * 2.4, 9);
    expect(json.yarn).toMatchObject({ name: 'Towpath DK', putUp: { massG: 100, lengthM: 240 } });
  });

  it('refuses the same lot of a colourway twice, also at once', async () => {
    const { id: colourwayId } = await buildColourway(user);
    const add = () => callRoute(POST, { method: 'POST', user, body: { ...LOT, colourwayId } });
    const answers = await Promise.all([add(), add()]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 400]);
    expect(answers.find(({ status }) => status === 400)?.json.error.fields).toEqual({
      lotCode: 'This dye lot of this colourway is in your stash already',
    });
  });
});

describe('GET /api/stash', () => {
  it('lists by yarn, colour and lot', async () => {
    const towpath = await buildYarn(user, { name: 'Towpath' });
    const bollard = await buildYarn(user, { name: 'bollard' });
    const rope = await buildColourway(user, { yarnId: towpath.id, name: 'Rope' });
    const tar = await buildColourway(user, { yarnId: bollard.id, name: 'Tar' });
    await buildLot(user, { colourwayId: rope.id, lotCode: 'B', partSkeins: [{ massG: 9 }] });
    await buildLot(user, { colourwayId: rope.id, lotCode: 'A' });
    await buildLot(user, { colourwayId: tar.id, lotCode: 'C' });
    await buildLot(await buildUser());
    const { json } = await callRoute(GET, { user });
    const shown = json.items.map(
      (each: { yarn: { name: string }; lotCode: string }) => `${each.yarn.name} ${each.lotCode}`,
    );
    expect(shown).toEqual(['bollard C', 'Towpath A', 'Towpath B']);
    expect([json.total, json.items[2].partSkeins]).toEqual([3, [{ massG: 9 }]]);
  });
});

describe('PUT /api/stash/[id]', () => {
  const save = (id: string, body: object) =>
    callRoute(lot.PUT, { method: 'PUT', user, params: { id }, body });

  it('takes what was used and weighs a part skein in', async () => {
    const { id } = await buildLot(user, { partSkeins: [{ massG: 20 }] });
    const body = { ...LOT, wholeSkeins: 1, partSkeins: [{ massG: 63 }], version: 1 };
    const { status, json } = await save(id, body);
    expect([status, json.version, json.totalG]).toEqual([200, 2, 163]);
    expect(await PartSkein.count()).toBe(1);
  });

  it('leaves everything as it was when a part skein is too heavy', async () => {
    const { id } = await buildLot(user, { partSkeins: [{ massG: 20 }] });
    await save(id, { ...LOT, wholeSkeins: 0, partSkeins: [{ massG: 400 }], version: 1 });
    const { json } = await callRoute(lot.GET, { user, params: { id } });
    expect([json.version, json.wholeSkeins, json.partSkeins]).toEqual([1, 2, [{ massG: 20 }]]);
  });

  it('lets one of two saves at once through, with its part skeins whole', async () => {
    const { id } = await buildLot(user);
    const answers = await Promise.all(
      [30, 40].map((massG) => save(id, { ...LOT, partSkeins: [{ massG }, { massG }], version: 1 })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const winner = answers.find(({ status }) => status === 200);
    const { json } = await callRoute(lot.GET, { user, params: { id } });
    expect(json).toEqual(winner?.json);
    expect(answers.find(({ status }) => status === 409)?.json.error.current).toEqual(json);
  });
});

describe('DELETE /api/stash/[id]', () => {
  it('removes the lot with its part skeins', async () => {
    const { id } = await buildLot(user, { partSkeins: [{ massG: 20 }] });
    const { status } = await callRoute(lot.DELETE, { method: 'DELETE', user, params: { id } });
    expect([status, await DyeLot.count(), await PartSkein.count()]).toEqual([204, 0, 0]);
  });
});
