import { EXAMPLE_PLAN } from '../lib/plan/examplePlan';
import type { Plan, PlanEvidence, PlanYarn, WeightCategory } from '../lib/plan/plan';
import { swatchGauge } from '../lib/swatches/swatchGauge';
import { lengthM, massG, priceMinor, widthMm } from '../lib/units/quantities';
import type { PresentedSwatch } from '../schemas/swatch';
import type { CurrentUser } from '../schemas/user';
import type { PresentedYarn } from '../schemas/yarn';
import { orNull } from './queries/own';
import { getSwatch } from './queries/swatches';
import { getYarn } from './queries/yarns';

/**
 * The plan that an address of the front page asks for: the example, with one's own swatch
 * (`?swatch=<id>`) put in. What cannot be had is left out.
 */
export async function askedPlan(
  search: URLSearchParams,
  user: CurrentUser | null,
): Promise<{ plan: Plan; asked: boolean }> {
  const swatchId = search.get('swatch');
  const plan = swatchId && user ? await withSwatch(EXAMPLE_PLAN, user, swatchId) : EXAMPLE_PLAN;
  return { plan, asked: plan !== EXAMPLE_PLAN };
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
