import { EXAMPLE_PLAN } from '../lib/plan/examplePlan';
import { withMotif } from '../lib/plan/edits';
import type { Plan, PlanEvidence, PlanYarn, WeightCategory } from '../lib/plan/plan';
import { layoutFor } from '../lib/layout/layouts';
import type { Motif } from '../lib/motifs/motif';
import { readyMotif } from '../lib/motifs/readyMotifs';
import { swatchGauge } from '../lib/swatches/swatchGauge';
import { lengthM, massG, priceMinor, widthMm } from '../lib/units/quantities';
import type { PresentedSwatch } from '../schemas/swatch';
import type { CurrentUser } from '../schemas/user';
import type { PresentedYarn } from '../schemas/yarn';
import { getMotif } from './queries/motifs';
import { orNull } from './queries/own';
import { getSwatch } from './queries/swatches';
import { getYarn } from './queries/yarns';

/**
 * The plan that an address of the front page asks for: the example, with a motif to so many rounds
 * (`?motif=hexagon&rounds=3`) or one's own swatch (`?swatch=<id>`) put in. What cannot be had is left
 * out.
 */
export async function askedPlan(
  search: URLSearchParams,
  user: CurrentUser | null,
): Promise<{ plan: Plan; asked: boolean }> {
  const motif = await askedMotif(search, user);
  const withAskedMotif = motif ? withMotif(EXAMPLE_PLAN, motif) : EXAMPLE_PLAN;
  const swatchId = search.get('swatch');
  const plan = swatchId && user ? await withSwatch(withAskedMotif, user, swatchId) : withAskedMotif;
  return { plan, asked: plan !== EXAMPLE_PLAN };
}

/** A ready-made motif by its key or one of one's own by its id, if a blanket of it can be laid out. */
async function askedMotif(
  search: URLSearchParams,
  user: CurrentUser | null,
): Promise<Motif | null> {
  const key = search.get('motif') ?? '';
  const rounds = /^[1-9]\d?$/.test(search.get('rounds') ?? '')
    ? Number(search.get('rounds'))
    : Infinity;
  const own = user && !readyMotif(key) ? await orNull(getMotif(user, key)) : null;
  const motif = readyMotif(key) ?? own?.motif ?? null;
  return motif && layoutFor(motif.sides) && { ...motif, rounds: motif.rounds.slice(0, rounds) };
}

/** The plan with a kept swatch as its gauge and only evidence, in the swatch's own yarn. */
async function withSwatch(plan: Plan, user: CurrentUser, id: string): Promise<Plan> {
  const swatch = await orNull(getSwatch(user, id));
  if (!swatch) return plan;
  const yarn = swatch.yarnId ? await orNull(getYarn(user, swatch.yarnId)) : null;
  const gauge = swatchGauge({ ...swatch, yarn });
  const { stitch, stitches, rows } = swatch;
  return {
    ...plan,
    yarn: yarn ? planYarn(yarn) : plan.yarn,
    swatch: gauge && {
      stitch,
      stitches,
      rows,
      widthMm: widthMm(gauge.widthMm),
      heightMm: widthMm(gauge.heightMm),
    },
    evidence: gauge ? swatchEvidence(swatch) : [],
  };
}

const planYarn = ({ name, weightCategory, putUp, price }: PresentedYarn): PlanYarn => ({
  name,
  weightCategory: weightCategory as WeightCategory,
  putUp: { massG: massG(putUp.massG), lengthM: lengthM(putUp.lengthM) },
  price: price && { priceMinor: priceMinor(price.priceMinor), currency: price.currency },
});

/** Its latest length, or else its latest weight: two readings of one piece are not two pieces. */
function swatchEvidence({ measurements }: PresentedSwatch): PlanEvidence[] {
  const length = measurements.findLast((each) => each.kind === 'length');
  if (length) {
    const reading = {
      by: 'unravelling',
      lengthM: lengthM(length.lengthM),
      errorM: lengthM(length.errorM),
    } as const;
    return [{ piece: 'swatch', reading }];
  }
  const weight = measurements.findLast((each) => each.kind === 'weight');
  if (!weight) return [];
  const reading = {
    by: 'weighing',
    massG: massG(weight.massG),
    resolutionG: massG(weight.resolutionG),
  } as const;
  return [{ piece: 'swatch', reading }];
}
