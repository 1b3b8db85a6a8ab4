import { beforeEach, describe, expect, it } from 'vitest';
import { EXAMPLE_PLAN } from '../../src/lib/plan/examplePlan';
import type { CurrentUser } from '../../src/schemas/user';
import { askedPlan } from '../../src/server/askedPlan';
import { emptyDatabase } from '../support/database';
import { buildMotif, buildSwatch, buildUser, buildYarn } from '../support/factories';

beforeEach(emptyDatabase);

const asked = async (query: string, user: CurrentUser | null = null) =>
  askedPlan(new URLSearchParams(query), user);
const motifOf = async (query: string, user: CurrentUser | null = null) =>
  (await asked(query, user)).plan.motifs[0];

describe('askedPlan', () => {
  it('is the example when nothing is asked', async () => {
    expect(await asked('')).toEqual({ plan: EXAMPLE_PLAN, asked: false });
  });

  it('puts in a ready-made motif, to the rounds asked', async () => {
    expect(await motifOf('motif=hexagon&rounds=3')).toMatchObject({ key: 'hexagon' });
    expect((await motifOf('motif=hexagon&rounds=3'))?.rounds).toHaveLength(3);
  });

  it.each(['0', '-1', '2.5', 'many', '999999'])(
    'works a motif to all its rounds when asked for %s',
    async (rounds) => {
      expect((await motifOf(`motif=hexagon&rounds=${rounds}`))?.rounds).toHaveLength(5);
    },
  );

  it('puts in a motif of one’s own, and nobody else’s', async () => {
    const user = await buildUser();
    const { key } = await buildMotif(user);
    expect((await motifOf(`motif=${key}`, user))?.key).toBe(key);
    expect((await asked(`motif=${key}`, await buildUser())).asked).toBe(false);
    expect((await asked(`motif=${key}`)).asked).toBe(false);
  });

  it('puts in a swatch of one’s own with its yarn and its reading', async () => {
    const user = await buildUser();
    const yarn = await buildYarn(user);
    const { id } = await buildSwatch(user, { yarnId: yarn.id });
    const { plan } = await asked(`swatch=${id}`, user);
    expect(plan.yarn.name).toBe(yarn.name);
    expect(plan.swatch).toMatchObject({ stitch: 'sc', stitches: 20, rows: 24, widthMm: 140 });
    expect(plan.evidence).toHaveLength(1);
  });

  it('leaves out what cannot be had', async () => {
    expect((await asked('motif=nothing&swatch=nothing', await buildUser())).asked).toBe(false);
  });
});
