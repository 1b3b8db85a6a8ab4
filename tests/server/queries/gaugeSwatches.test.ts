import { beforeEach, describe, expect, it } from 'vitest';
import type { CurrentUser } from '../../../src/schemas/user';
import { listGaugeSwatches } from '../../../src/server/queries/gaugeSwatches';
import { emptyDatabase } from '../../support/database';
import { buildSwatch, buildUser, buildYarn } from '../../support/factories';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

describe('listGaugeSwatches', () => {
  it('lists swatches with the size and the weight of their yarn', async () => {
    const yarn = await buildYarn(user, { weightCategory: 2 });
    const { id, name } = await buildSwatch(user, { yarnId: yarn.id });
    // The built swatch: 20 sc and 24 rows over 140 × 154 mm.
    expect(await listGaugeSwatches(user)).toEqual([
      {
        id,
        name,
        weightCategory: 2,
        swatch: { stitch: 'sc', stitches: 20, rows: 24, widthMm: 140, heightMm: 154 },
      },
    ]);
  });

  it('does not know the weight of a yarn that is not named', async () => {
    await buildSwatch(user, { yarnId: null });
    const [swatch] = await listGaugeSwatches(user);
    expect(swatch?.weightCategory).toBeNull();
  });

  it('leaves out what has no size, and whatever is another’s', async () => {
    await buildSwatch(user, { measurements: [] });
    await buildSwatch(await buildUser());
    expect(await listGaugeSwatches(user)).toEqual([]);
  });
});
