import { beforeEach, describe, expect, it } from 'vitest';
import { SwatchMeasurement } from '../../../../db/models';
import { GET, POST } from '../../../../src/pages/api/swatches';
import * as swatch from '../../../../src/pages/api/swatches/[id]';
import type { CurrentUser } from '../../../../src/schemas/user';
import { callRoute } from '../../../support/callRoute';
import { emptyDatabase } from '../../../support/database';
import { buildSwatch, buildUser, buildYarn, swatchInput } from '../../../support/factories';
import { expectFieldErrors } from '../../../support/refusals';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

const DAY = '2026-11-08';
const SIZE = { kind: 'size', measuredOn: DAY, widthMm: 140, heightMm: 154, blocked: true } as const;
const WEIGHT = { kind: 'weight', measuredOn: DAY, massG: 14, resolutionG: 1 } as const;
const LENGTH = { kind: 'length', measuredOn: DAY, lengthM: 33.6, errorM: 0.4 } as const;

describe('POST /api/swatches', () => {
  it('says what is wrong beside each field, and changes nothing', async () => {
    const foreign = await buildYarn(await buildUser());
    const at = (measurement: object) => ({ measurements: [measurement] });
    await expectFieldErrors(POST, { method: 'POST', user, body: swatchInput() }, [
      { change: { name: '' }, fields: { name: 'Swatch name is missing' } },
      {
        change: { stitch: 'knit' },
        fields: { stitch: 'There is no stitch “knit” in the stitch table' },
      },
      {
        change: { stitches: 0 },
        fields: { stitches: 'Stitches across the swatch must be at least 1' },
      },
      { change: { rows: 2.5 }, fields: { rows: 'Rows of the swatch must be a whole number' } },
      { change: { hookMm: 0 }, fields: { hookMm: 'Hook must be more than 0 mm' } },
      { change: { yarnId: foreign.id }, fields: { yarnId: 'You have no such yarn' } },
      {
        change: at({ ...SIZE, widthMm: -1 }),
        fields: { 'measurements.0.widthMm': 'Width of the swatch must be more than 0 mm' },
      },
      {
        change: at({ ...SIZE, widthMm: 2 }),
        fields: {
          'measurements.0.widthMm':
            'Stitches of 0.1 mm cannot be: check the width and the stitches counted',
        },
      },
      {
        change: at({ ...WEIGHT, massG: 0 }),
        fields: { 'measurements.0.massG': 'Yarn weighed must be more than 0 g' },
      },
      {
        change: at({ ...WEIGHT, widthMm: 4 }),
        fields: { 'measurements.0': 'Measurement has no field named widthMm' },
      },
      {
        change: at({ ...WEIGHT, measuredOn: '2026-02-30' }),
        fields: { 'measurements.0.measuredOn': 'Date must be a day such as 2026-11-30' },
      },
      {
        change: at({ ...LENGTH, errorM: -1 }),
        fields: { 'measurements.0.errorM': 'Error of the length must not be less than 0 m' },
      },
      {
        change: at({ kind: 'smell' }),
        fields: {
          'measurements.0.kind': 'Measurement must be of a kind: size, weight or length',
        },
      },
      {
        change: { measurements: Array(101).fill(SIZE) },
        fields: { measurements: 'Measurements must be at most 100' },
      },
    ]);
    expect(await SwatchMeasurement.count()).toBe(0);
  });

  it('keeps measurements of every kind in their order, to the last digit', async () => {
    const measurements = [WEIGHT, { ...SIZE, widthMm: 140.1 }, LENGTH, SIZE];
    const body = swatchInput({ measurements });
    const { status, json } = await callRoute(POST, { method: 'POST', user, body });
    expect([status, json.measurements]).toEqual([201, measurements]);
  });

  it('names the yarn it is of', async () => {
    const { id: yarnId } = await buildYarn(user);
    const body = swatchInput({ yarnId });
    const { json } = await callRoute(POST, { method: 'POST', user, body });
    expect([json.yarnId, json.yarnName]).toEqual([yarnId, 'Towpath DK']);
  });
});

describe('GET /api/swatches', () => {
  it('lists mine, last changed first', async () => {
    await buildSwatch(await buildUser());
    const first = await buildSwatch(user, { name: 'First' });
    await buildSwatch(user, { name: 'Second' });
    await callRoute(swatch.PUT, {
      method: 'PUT',
      user,
      params: { id: first.id },
      body: { ...swatchInput({ name: 'First' }), version: 1 },
    });
    const { json } = await callRoute(GET, { user });
    expect(json.items.map(({ name }: { name: string }) => name)).toEqual(['First', 'Second']);
  });
});

describe('PUT /api/swatches/[id]', () => {
  const save = (id: string, body: object) =>
    callRoute(swatch.PUT, { method: 'PUT', user, params: { id }, body });

  it('adds a measurement after blocking', async () => {
    const { id, measurements } = await buildSwatch(user);
    const body = { ...swatchInput({ measurements: [...measurements, SIZE] }), version: 1 };
    const { status, json } = await save(id, body);
    expect([status, json.version, json.measurements]).toEqual([200, 2, [...measurements, SIZE]]);
  });

  it('answers 409 with what is there now when it changed in between', async () => {
    const { id } = await buildSwatch(user);
    const answers = await Promise.all(
      ['One', 'Two'].map((name) => save(id, { ...swatchInput({ name }), version: 1 })),
    );
    const winner = answers.find(({ status }) => status === 200);
    const loser = answers.find(({ status }) => status === 409);
    expect(loser?.json.error.current).toEqual(winner?.json);
  });
});

describe('DELETE /api/swatches/[id]', () => {
  it('takes its measurements along', async () => {
    const { id } = await buildSwatch(user);
    const { status } = await callRoute(swatch.DELETE, { method: 'DELETE', user, params: { id } });
    expect([status, await SwatchMeasurement.count()]).toEqual([204, 0]);
  });
});
