import { randomUUID } from 'node:crypto';
import { beforeEach, describe, expect, it } from 'vitest';
import {
  Blanket,
  Colourway,
  DyeLot,
  MadeMotifRow,
  PartSkein,
  sequelize,
  ShoppingList,
  Swatch,
  User,
  Yarn,
} from '../../db/models';
import { createShoppingList } from '../../src/server/commands/createShoppingList';
import { linkColour } from '../../src/server/commands/linkColour';
import type { CurrentUser } from '../../src/schemas/user';
import { emptyDatabase } from '../support/database';
import {
  buildBlanket,
  buildColourway,
  buildLot,
  buildMadeMotif,
  buildMotif,
  buildOwnStitch,
  buildSwatch,
  buildUser,
  buildYarn,
} from '../support/factories';

let user: CurrentUser;
beforeEach(async () => {
  await emptyDatabase();
  user = await buildUser();
});

const update = (table: string, set: string) => sequelize.query(`UPDATE ${table} SET ${set}`);

describe('constraints of the database itself', () => {
  it.each([
    "name = ''",
    `name = '${'x'.repeat(81)}'`,
    'weight_category = 8',
    'put_up_mass_g = 0',
    "put_up_mass_g = 'NaN'",
    "put_up_length_m = 'Infinity'",
    'put_up_length_m = -1',
    'price_minor = -1',
    'currency = null',
    "currency = 'euro'",
    'version = 0',
  ])('refuse a yarn with %s', async (set) => {
    await buildYarn(user);
    await expect(update('yarns', set)).rejects.toThrow(/violates|out of range/);
  });

  it.each([
    ['colourways', "hex = 'red'"],
    ['dye_lots', 'whole_skeins = -1'],
    ['dye_lots', 'currency = null, price_paid_minor = 4'],
    ['part_skeins', 'mass_g = 0'],
    ['swatches', 'stitches = 0'],
    ['swatches', 'hook_mm = 0'],
    ['swatch_measurements', "kind = 'colour'"],
    ['swatch_measurements', 'width_mm = null, mass_g = 3, resolution_g = 1'],
    ['motifs', 'sides = 5'],
    ['motifs', "ring = '[]'"],
    ['motifs', "terms = 'fr'"],
    ['motif_versions', 'size = 20'],
    ['motif_versions', "stitches = '{}'"],
    ['own_stitches', "abbreviation = 'Lst'"],
    ['own_stitches', 'draws = 0, throughs = 0'],
    ['own_stitches', "symbol = '[]'"],
    ['made_motifs', 'weighed_yarns = 0'],
    ['made_motifs', 'weighed_count = null'],
    ['made_motifs', 'put_up_length_m = null'],
    ['made_motifs', 'put_up_mass_g = null, put_up_length_m = null'],
    ['made_motifs', "sizes = '{}'"],
    ['blankets', "plan = '[]'"],
    ['blankets', "title = ''"],
    ['blanket_revisions', 'version = 0'],
    ['shopping_lists', 'confidence = 1'],
    ['shopping_lists', "lines = '{}'"],
  ])('refuse in %s: %s', async (table, set) => {
    await buildEverything();
    await expect(update(table, set)).rejects.toThrow(/violates/);
  });

  it('refuse the same colour name twice in a yarn, however capitalised', async () => {
    const { yarnId } = await buildColourway(user, { name: 'Lock Gate' });
    const again = { ownerId: user.id, yarnId, name: 'LOCK gate', hex: '#000000' };
    await expect(Colourway.create(again)).rejects.toThrow('Validation error');
  });

  it("refuse a colourway on another person's yarn", async () => {
    const yarn = await buildYarn(await buildUser());
    const stray = { ownerId: user.id, yarnId: yarn.id, name: 'Lock Gate', hex: '#000000' };
    await expect(Colourway.create(stray)).rejects.toThrow('colourways_of_own_yarn');
  });

  it("refuse a made motif compared with another person's swatch", async () => {
    const swatch = await buildSwatch(await buildUser());
    const made = await buildMadeMotif(user);
    const stray = MadeMotifRow.update({ swatchId: swatch.id }, { where: { id: made.id } });
    await expect(stray).rejects.toThrow('made_motifs_of_own_swatch');
  });

  it("refuse a dye lot of another person's colourway", async () => {
    const { colourway } = await buildLot(await buildUser());
    await expect(
      DyeLot.create({
        ownerId: user.id,
        colourwayId: colourway.id,
        lotCode: 'x',
        location: '',
        pricePaidMinor: null,
        currency: null,
        wholeSkeins: 1,
      }),
    ).rejects.toThrow('dye_lots_of_own_colourway');
  });
});

describe('deleting', () => {
  it('takes everything of a person with the account, and nothing of anyone else', async () => {
    await buildEverything();
    const other = await buildUser();
    await buildLot(other);
    await User.destroy({ where: { id: user.id } });
    expect(await Promise.all([Yarn.count(), DyeLot.count(), Blanket.count()])).toEqual([1, 1, 0]);
    expect(await ShoppingList.count()).toBe(0);
    expect(await PartSkein.count()).toBe(0);
  });

  it('leaves a swatch without its yarn', async () => {
    const yarn = await buildYarn(user);
    const { id } = await buildSwatch(user, { yarnId: yarn.id });
    await Yarn.destroy({ where: { id: yarn.id } });
    expect((await Swatch.findByPk(id))?.yarnId).toBeNull();
  });

  it('leaves a made motif without its swatch', async () => {
    const swatch = await buildSwatch(user);
    const { id } = await buildMadeMotif(user, { swatchId: swatch.id });
    await Swatch.destroy({ where: { id: swatch.id } });
    const made = await MadeMotifRow.findByPk(id);
    expect([made?.swatchId, made?.ownerId]).toEqual([null, user.id]);
  });

  it('leaves a shopping list without its blanket', async () => {
    const blanket = await buildBlanket(user);
    const { id } = await sequelize.transaction((transaction) =>
      createShoppingList(user, blanket.id, transaction),
    );
    await Blanket.destroy({ where: { id: blanket.id } });
    const list = await ShoppingList.findByPk(id);
    expect([list?.blanketId, list?.ownerId]).toEqual([null, user.id]);
  });

  it('keeps a colourway that is in the stash', async () => {
    const { colourway } = await buildLot(user);
    await expect(Colourway.destroy({ where: { id: colourway.id } })).rejects.toThrow(
      'dye_lots_of_own_colourway',
    );
  });
});

async function buildEverything(): Promise<void> {
  const yarn = await buildYarn(user, { name: randomUUID() });
  const colourway = await buildColourway(user, { yarnId: yarn.id });
  await buildLot(user, { colourwayId: colourway.id, partSkeins: [{ massG: 41 }] });
  await buildSwatch(user, { yarnId: yarn.id });
  await buildMotif(user);
  await buildMadeMotif(user);
  await buildOwnStitch(user);
  const blanket = await buildBlanket(user);
  await sequelize.transaction(async (transaction) => {
    await linkColour(user, blanket.id, 'c1', colourway.id, transaction);
    await createShoppingList(user, blanket.id, transaction);
  });
}
