import { beforeEach, describe, expect, it } from 'vitest';
import { EXAMPLE_PLAN } from '../../src/lib/plan/examplePlan';
import type { CurrentUser } from '../../src/schemas/user';
import { askedPlan } from '../../src/server/askedPlan';
import { emptyDatabase } from '../support/database';
import { buildSwatch, buildUser, buildYarn } from '../support/factories';

beforeEach(emptyDatabase);

const asked = async (query: string, user: CurrentUser | null = null) =>
  askedPlan(new URLSearchParams(query), user);

describe('askedPlan', () => {
  it('is the example when nothing is asked', async () => {
    expect(await asked('')).toEqual({ plan: EXAMPLE_PLAN, asked: false });
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
    expect((await asked('swatch=nothing', await buildUser())).asked).toBe(false);
  });
});
