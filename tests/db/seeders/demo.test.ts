import { beforeAll, describe, expect, it } from 'vitest';
import {
  Blanket,
  BlanketRevision,
  Colourway,
  DyeLot,
  MadeMotifRow,
  ShoppingList,
  Swatch,
  SwatchMeasurement,
  User,
  Yarn,
} from '../../../db/models';
import { seedDemo } from '../../../db/seeders/demo';
import demo from '../../../data/demo/people.json';
import yarns from '../../../data/demo/yarns.json';
import { estimate, gaugeOf, lengthM, madeYarn, massG, measuredMotif } from '../../../src/lib';
import { getMotif } from '../../../src/server/queries/motifs';
import { presentMadeMotif } from '../../../src/server/presenters/madeMotif';
import { swatchGauge } from '../../../src/lib/swatches/swatchGauge';
import { getSwatch } from '../../../src/server/queries/swatches';
import { presentCurrentUser } from '../../../src/server/presenters/user';
import { planSchema } from '../../../src/schemas/plan';
import { ROLES } from '../../../src/schemas/roles';
import { verifyPassword } from '../../../src/server/passwordHash';
import { emptyDatabase } from '../../support/database';

const counts = async () =>
  Promise.all(
    [User, Yarn, Colourway, DyeLot, Swatch, SwatchMeasurement, Blanket, BlanketRevision].map(
      (model) => (model as typeof User).count(),
    ),
  );

beforeAll(async () => {
  await emptyDatabase();
  await seedDemo();
}, 60_000);

describe('seedDemo', () => {
  it('adds everyone, confirmed and with the documented password', async () => {
    const people = await User.findAll();
    expect(people).toHaveLength(demo.people.length);
    expect(people.every(({ emailConfirmedAt }) => emailConfirmedAt)).toBe(true);
    expect(await verifyPassword(demo.password, people[0]!.passwordHash)).toBe(true);
  });

  it('has someone in every role', () => {
    expect(new Set(demo.people.flatMap(({ roles }) => roles))).toEqual(new Set(ROLES));
  });

  it('adds nothing a second time', async () => {
    const before = await counts();
    expect(await seedDemo()).toBe(0);
    expect(await counts()).toEqual(before);
  });

  it('has yarns of weights 1 to 5 in more than thirty colours', () => {
    expect(new Set(yarns.map(({ weightCategory }) => weightCategory))).toEqual(
      new Set([1, 2, 3, 4, 5]),
    );
    expect(yarns.flatMap(({ colourways }) => colourways).length).toBeGreaterThan(30);
  });

  it('has plans that need no question: gauges, readings and joins agree', async () => {
    const blankets = await Blanket.findAll();
    expect(new Set(blankets.map(({ plan }) => plan.join.key)).size).toBeGreaterThanOrEqual(8);
    for (const { title, plan } of blankets) {
      const { notices, totals } = estimate(planSchema.parse(plan));
      const questions = notices.filter(({ severity }) => severity === 'question');
      expect({ title, questions }).toEqual({ title, questions: [] });
      expect(totals.skeins).toBeGreaterThan(0);
    }
  });

  it('keeps shopping lists that the stash takes something off', async () => {
    const lists = await ShoppingList.findAll();
    expect(lists.length).toBeGreaterThan(0);
    for (const { lines } of lists) {
      expect(lines.some(({ haveM, toBuySkeins }) => haveM > 0 && toBuySkeins > 0)).toBe(true);
    }
  });

  it('has made motifs that hands could make, one of a motif of one’s own', async () => {
    const rows = await MadeMotifRow.findAll();
    expect(rows.some(({ motifVersion }) => motifVersion !== null)).toBe(true);
    for (const row of rows) {
      const made = presentMadeMotif(row);
      const owner = presentCurrentUser(
        (await User.findByPk(row.ownerId, { include: 'roleRows' })) as User,
      );
      const { motif } = await getMotif(owner, made.motifKey);
      const swatch = await getSwatch(owner, made.swatchId as string);
      const worked = { ...motif!, rounds: motif!.rounds.slice(0, made.rounds) };
      const { widthMm, heightMm } = swatchGauge({ ...swatch, yarn: null })!;
      const gauge = gaugeOf({ ...swatch, widthMm, heightMm } as never, made.weightCategory);
      const skein = { massG: massG(made.putUp!.massG), lengthM: lengthM(made.putUp!.lengthM) };
      const { rounds } = measuredMotif(worked, gauge, made.sizes);
      const yarn = madeYarn(worked, made.weighed!, skein, gauge.stitchWidthMm);
      expect([rounds.some(({ questioned }) => questioned), yarn.questioned]).toEqual([
        false,
        false,
      ]);
    }
  });
});
