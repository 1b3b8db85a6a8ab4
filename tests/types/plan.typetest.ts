/** Lines that must not compile: `astro check` fails when one of them does. */
import {
  compareJoins,
  estimate,
  EXAMPLE_PLAN,
  fitOf,
  lengthM,
  massG,
  READY_JOINS,
  readyMotif,
  widthMm,
  type Confidence,
  type Plan,
  type PlanEvidence,
  type PlanSize,
} from '../../src/lib';

estimate(EXAMPLE_PLAN);
compareJoins(EXAMPLE_PLAN, READY_JOINS);

// @ts-expect-error a measured side is fabric, not yarn
export const side: Plan = { ...EXAMPLE_PLAN, motifSideMm: lengthM(0.142) };

// @ts-expect-error a plan is read, never changed
EXAMPLE_PLAN.join.key = 'whip-stitch';
// @ts-expect-error nor are its lists
EXAMPLE_PLAN.colours.push({ key: 'c9', name: 'Fescue', hex: '#80a080' });

// @ts-expect-error confidences are the five that the program offers
export const confidence: Confidence = 0.97;
// @ts-expect-error there is no weight category 8
export const category: Plan['yarn']['weightCategory'] = 8;

// @ts-expect-error a size is a grid or a target, not half of each
export const size: PlanSize = { by: 'grid', widthMm: widthMm(1200), heightMm: widthMm(1500) };

export const reading: PlanEvidence = {
  piece: 'swatch',
  // @ts-expect-error a weighing has the resolution of its scale
  reading: { by: 'weighing', massG: massG(15) },
};

const fit = fitOf(16, { multipleOf: 4, plus: 3 });
// @ts-expect-error nearest counts are there only once it is known not to fit
export const nearest = fit.nearest;

// @ts-expect-error a motif may not exist, which the caller has to look at
export const rounds = readyMotif('group-square').rounds;
