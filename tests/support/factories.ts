import { randomUUID } from 'node:crypto';
import { sequelize, User, UserRole } from '../../db/models';
import type { PresentedBlanket } from '../../src/schemas/blanket';
import type { MadeMotifInput, PresentedMadeMotif } from '../../src/schemas/madeMotif';
import type { PresentedMotif } from '../../src/schemas/motif';
import type { OwnStitchInput, PresentedOwnStitch } from '../../src/schemas/ownStitch';
import { planSchema, type PlanInput } from '../../src/schemas/plan';
import type { Role } from '../../src/schemas/roles';
import type { LotInput, PresentedLot } from '../../src/schemas/stash';
import type { PresentedSwatch, SwatchInput } from '../../src/schemas/swatch';
import type { PresentedColourway, PresentedYarn, YarnInput } from '../../src/schemas/yarn';
import { createBlanket } from '../../src/server/commands/createBlanket';
import { createColourway } from '../../src/server/commands/createColourway';
import { createLot } from '../../src/server/commands/createLot';
import { createMadeMotif } from '../../src/server/commands/createMadeMotif';
import { createMotif } from '../../src/server/commands/createMotif';
import { createOwnStitch } from '../../src/server/commands/createOwnStitch';
import { createSwatch } from '../../src/server/commands/createSwatch';
import { createYarn } from '../../src/server/commands/createYarn';
import {
  MADE_MOTIF_EXAMPLE,
  MOTIF_EXAMPLE,
  PLAN_EXAMPLE,
  STITCH_EXAMPLE,
} from '../../src/server/examples';
import { hashPassword } from '../../src/server/passwordHash';
import { presentCurrentUser } from '../../src/server/presenters/user';
import type { CurrentUser } from '../../src/schemas/user';

/** The password of every built user. */
export const PASSWORD = 'a wound skein';
const passwordHash = hashPassword(PASSWORD);

interface UserValues {
  name?: string;
  email?: string;
  roles?: readonly Role[];
  isConfirmed?: boolean;
}

/** A person in the database, confirmed and a maker unless said otherwise. */
export async function buildUserRow(values: UserValues = {}): Promise<User> {
  const { name = 'Tamsin Okafor', roles = ['maker'], isConfirmed = true } = values;
  const user = await User.create({
    name,
    email: values.email ?? `${randomUUID()}@example.com`,
    passwordHash: await passwordHash,
    emailConfirmedAt: isConfirmed ? new Date('2026-11-01T08:00:00Z') : null,
  });
  await UserRole.bulkCreate(roles.map((role) => ({ userId: user.id, role })));
  return user.reload({ include: 'roleRows' });
}

/** The same, as routes and pages know the person who is signed in. */
export async function buildUser(values: UserValues = {}): Promise<CurrentUser> {
  return presentCurrentUser(await buildUserRow(values));
}

/** A DK yarn of 100 g and 240 m; 7.20 EUR a skein. */
export function yarnInput(values: Partial<YarnInput> = {}): YarnInput {
  return {
    name: 'Towpath DK',
    maker: 'Ostler & Fenn',
    fibre: '100 % wool',
    weightCategory: 3,
    putUp: { massG: 100, lengthM: 240 },
    price: { priceMinor: 720, currency: 'EUR' },
    ...values,
  };
}

export const buildYarn = (user: CurrentUser, values?: Partial<YarnInput>): Promise<PresentedYarn> =>
  sequelize.transaction((transaction) => createYarn(user, yarnInput(values), transaction));

interface ColourwayValues {
  yarnId?: string;
  name?: string;
  hex?: string;
}

/** A colourway, of a yarn of its own unless one is given. */
export async function buildColourway(
  user: CurrentUser,
  { yarnId, name = 'Lock Gate', hex = '#3b4a3f' }: ColourwayValues = {},
): Promise<PresentedColourway> {
  const input = { yarnId: yarnId ?? (await buildYarn(user)).id, name, hex };
  return sequelize.transaction((transaction) => createColourway(user, input, transaction));
}

/** A dye lot of two whole skeins, of a colourway of its own unless one is given. */
export async function buildLot(
  user: CurrentUser,
  values: Partial<LotInput> = {},
): Promise<PresentedLot> {
  const input: LotInput = {
    colourwayId: values.colourwayId ?? (await buildColourway(user)).id,
    lotCode: '2207',
    location: 'Blue basket',
    pricePaid: null,
    wholeSkeins: 2,
    partSkeins: [],
    ...values,
  };
  return sequelize.transaction((transaction) => createLot(user, input, transaction));
}

/** A swatch in sc, weighed and measured once. */
export function swatchInput(values: Partial<SwatchInput> = {}): SwatchInput {
  return {
    name: 'Sc in Towpath',
    yarnId: null,
    stitch: 'sc',
    stitches: 20,
    rows: 24,
    hookMm: 4.5,
    notes: '',
    measurements: [
      { kind: 'size', measuredOn: '2026-11-08', widthMm: 140, heightMm: 154, blocked: false },
      { kind: 'weight', measuredOn: '2026-11-08', massG: 14, resolutionG: 1 },
    ],
    ...values,
  };
}

export const buildSwatch = (
  user: CurrentUser,
  values?: Partial<SwatchInput>,
): Promise<PresentedSwatch> =>
  sequelize.transaction((transaction) => createSwatch(user, swatchInput(values), transaction));

export const buildMotif = (user: CurrentUser, name = 'Lattice'): Promise<PresentedMotif> =>
  sequelize.transaction((transaction) =>
    createMotif(user, { ...MOTIF_EXAMPLE, name }, transaction),
  );

export const buildOwnStitch = (
  user: CurrentUser,
  values?: Partial<OwnStitchInput>,
): Promise<PresentedOwnStitch> =>
  sequelize.transaction((transaction) =>
    createOwnStitch(user, { ...STITCH_EXAMPLE, ...values }, transaction),
  );

/** A made group square, of no swatch unless one is given. */
export const buildMadeMotif = (
  user: CurrentUser,
  values?: Partial<MadeMotifInput>,
): Promise<PresentedMadeMotif> =>
  sequelize.transaction((transaction) =>
    createMadeMotif(user, { ...MADE_MOTIF_EXAMPLE, ...values }, transaction),
  );

/** The front page's plan as JSON, with other values where given. */
export const planInput = (values: Partial<PlanInput> = {}): PlanInput => ({
  ...structuredClone(PLAN_EXAMPLE),
  ...values,
});

export const buildBlanket = (
  user: CurrentUser,
  { title = 'Eighty squares', plan = planInput() }: { title?: string; plan?: PlanInput } = {},
): Promise<PresentedBlanket> =>
  sequelize.transaction((transaction) =>
    createBlanket(user, { title, plan: planSchema.parse(plan) }, transaction),
  );
