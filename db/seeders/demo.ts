import type { Transaction } from 'sequelize';
import blankets from '../../data/demo/blankets.json';
import madeMotifs from '../../data/demo/madeMotifs.json';
import motifs from '../../data/demo/motifs.json';
import ownStitches from '../../data/demo/ownStitches.json';
import demo from '../../data/demo/people.json';
import stash from '../../data/demo/stash.json';
import swatches from '../../data/demo/swatches.json';
import yarns from '../../data/demo/yarns.json';
import { blanketInput } from '../../src/schemas/blanket';
import type { Motif } from '../../src/lib/motifs/motif';
import { motifInput } from '../../src/schemas/motif';
import { ownStitchInput } from '../../src/schemas/ownStitch';
import { preferencesSchema } from '../../src/schemas/preferences';
import { roleSchema } from '../../src/schemas/roles';
import { lotInput } from '../../src/schemas/stash';
import { swatchInput } from '../../src/schemas/swatch';
import type { CurrentUser } from '../../src/schemas/user';
import { colourwayInput, yarnInput } from '../../src/schemas/yarn';
import { createBlanket } from '../../src/server/commands/createBlanket';
import { createColourway } from '../../src/server/commands/createColourway';
import { createLot } from '../../src/server/commands/createLot';
import { createMotif } from '../../src/server/commands/createMotif';
import { createOwnStitch } from '../../src/server/commands/createOwnStitch';
import { createShoppingList } from '../../src/server/commands/createShoppingList';
import { createSwatch } from '../../src/server/commands/createSwatch';
import { createYarn } from '../../src/server/commands/createYarn';
import { updateBlanket } from '../../src/server/commands/updateBlanket';
import { updateMotif } from '../../src/server/commands/updateMotif';
import { hashPassword } from '../../src/server/passwordHash';
import { sequelize, User, UserRole } from '../models';
import { addMadeMotifs, type DemoMadeMotif } from './demoMadeMotifs';
import { demoPlan } from './demoPlan';

type Person = (typeof demo.people)[number];
const ofOwner = <Items>(all: Partial<Record<string, Items[]>>, { email }: Person): Items[] =>
  all[email.split('@')[0]!] ?? [];

/**
 * Loads the demo people that are not there yet, each with all they keep, through the same schemas
 * and commands as the site; who is there already is left alone. Answers how many were added.
 */
export async function seedDemo(): Promise<number> {
  const passwordHash = await hashPassword(demo.password);
  return sequelize.transaction(async (transaction) => {
    let added = 0;
    for (const person of demo.people) {
      if (await User.findOne({ where: { email: person.email }, transaction })) continue;
      const user = await addPerson(person, passwordHash, transaction);
      await furnish(user, person, transaction);
      added += 1;
    }
    return added;
  });
}

async function addPerson(
  { name, email, ...person }: Person,
  passwordHash: string,
  transaction: Transaction,
): Promise<CurrentUser> {
  const preferences = preferencesSchema.parse(person.preferences);
  const { id } = await User.create(
    { name, email, passwordHash, emailConfirmedAt: new Date(), ...preferences },
    { transaction },
  );
  const roles = person.roles.map((role) => roleSchema.parse(role));
  await UserRole.bulkCreate(
    roles.map((role) => ({ userId: id, role })),
    { transaction },
  );
  return { id, name, email, roles };
}

async function furnish(user: CurrentUser, person: Person, transaction: Transaction): Promise<void> {
  const ownLots = ofOwner(stash, person);
  const ownSwatches = ofOwner(swatches, person);
  const ownBlankets = ofOwner<DemoBlanket>(blankets, person);
  const used = new Set([...ownLots, ...ownSwatches, ...ownBlankets].map(({ yarn }) => yarn));

  const yarnIds = new Map<string, string>();
  const colourwayIds = new Map<string, string>();
  for (const { colourways, ...yarn } of yarns.filter(({ name }) => used.has(name))) {
    const { id: yarnId } = await createYarn(user, yarnInput.parse(yarn), transaction);
    yarnIds.set(yarn.name, yarnId);
    for (const colourway of colourways) {
      const input = colourwayInput.parse({ yarnId, ...colourway });
      const { id } = await createColourway(user, input, transaction);
      colourwayIds.set(`${yarn.name} ${colourway.name}`, id);
    }
  }
  for (const { yarn, colour, ...lot } of ownLots) {
    const colourwayId = colourwayIds.get(`${yarn} ${colour}`);
    await createLot(user, lotInput.parse({ colourwayId, ...lot }), transaction);
  }
  const swatchIds = new Map<string, string>();
  for (const { yarn, ...swatch } of ownSwatches) {
    const input = swatchInput.parse({ yarnId: yarnIds.get(yarn), ...swatch });
    swatchIds.set(swatch.name, (await createSwatch(user, input, transaction)).id);
  }
  for (const stitch of ofOwner<unknown>(ownStitches, person)) {
    await createOwnStitch(user, ownStitchInput.parse(stitch), transaction);
  }
  const ownMotifs: (Motif | null)[] = [];
  for (const { saves } of ofOwner<{ saves: unknown[] }>(motifs, person)) {
    ownMotifs.push(...(await addMotif(user, saves, transaction)));
  }
  const kept = { motifs: ownMotifs, swatchIds, yarns };
  await addMadeMotifs(user, ofOwner<DemoMadeMotif>(madeMotifs, person), kept, transaction);
  for (const blanket of ownBlankets) await addBlanket(user, blanket, ownMotifs, transaction);
}

/** Every save of a motif, the first and those after it. */
async function addMotif(
  user: CurrentUser,
  saves: unknown[],
  transaction: Transaction,
): Promise<(Motif | null)[]> {
  const [first, ...later] = saves.map((save) => motifInput.parse(save));
  const saved = [await createMotif(user, first!, transaction)];
  for (const input of later) {
    const { key, version } = saved.at(-1)!;
    const update = { ...input, version: version ?? 1 };
    saved.push(await updateMotif(user, key, update, transaction));
  }
  return saved.map(({ motif }) => motif);
}

type DemoBlanket = Parameters<typeof demoPlan>[0] & {
  title: string;
  /** Titles of saves before the last. */
  earlier?: string[];
  shoppingList?: boolean;
};

async function addBlanket(
  user: CurrentUser,
  { title, earlier = [], shoppingList, ...blanket }: DemoBlanket,
  ownMotifs: readonly (Motif | null)[],
  transaction: Transaction,
): Promise<void> {
  const plan = demoPlan(blanket, ownMotifs);
  const [first, ...later] = [...earlier, title].map((each) =>
    blanketInput.parse({ title: each, plan }),
  );
  let saved = await createBlanket(user, first!, transaction);
  for (const input of later) {
    saved = await updateBlanket(user, saved.id, { ...input, version: saved.version }, transaction);
  }
  if (shoppingList) await createShoppingList(user, saved.id, transaction);
}

const isRun = process.argv[1] === import.meta.filename;
const isRefused = process.env.NODE_ENV === 'production' && process.env.ELLWISE_DEMO !== '1';
if (isRun && isRefused) {
  console.log('The demo accounts have a known password: not in production without ELLWISE_DEMO=1.');
} else if (isRun) {
  try {
    console.log(`demo: ${await seedDemo()} people added`);
  } finally {
    await sequelize.close();
  }
}
