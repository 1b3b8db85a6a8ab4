import {
  expectedM,
  handVarianceAfterM2,
  handVarianceM2,
  learnHand,
  usualM,
  type Hand,
} from '../hand/hand';
import { readingVarianceM2 } from '../hand/readingVariance';
import { addUse, NO_YARN, type YarnUse } from '../hand/yarnUse';
import { skeinsFor } from '../skeins/skeins';
import { normalQuantile } from '../stats/normal';
import type { Plan, PlanEvidence, YarnReading } from '../plan/plan';
import { lengthM, massG, QUANTITY_LIMITS } from '../units/quantities';
import type { ColourLedger } from './colourLedger';
import { evidenceOf, motifUse, swatchUse } from './evidenceOf';
import type { NextMeasurement } from './ledger';

/** Motifs that could be weighed together. */
const TOGETHER = [1, 2, 4, 8, 12] as const;
/** Kitchen scales read to 1 g, better ones to 0.1 g. */
const KITCHEN_G = 1;
const FINE_G = 0.1;
/** Unravelled yarn is measured to about 1 % (ours). */
const UNRAVELLED_ERROR = 0.01;

interface Candidate extends Pick<NextMeasurement, 'kind' | 'motifs' | 'resolutionG'> {
  /** Hand variance that some use would be left with. */
  readonly left: (use: YarnUse) => number;
}

/**
 * What each further measurement would be worth, best first: the safety margin and the skeins that
 * the same model would leave once it was made, whatever it read. Only those that cut the margin.
 */
export function nextMeasurements(
  plan: Plan,
  hand: Hand,
  colours: readonly ColourLedger[],
): NextMeasurement[] {
  const whole = colours.reduce((sum, { use }) => addUse(sum, use), NO_YARN);
  const meanM = expectedM(hand, whole);
  if (meanM <= 0) return [];
  const z = Math.max(normalQuantile(plan.confidence), normalQuantile(0.8));
  const ownM2 = (colour: ColourLedger): number => colour.pieceVarianceM2 + colour.tailVarianceM2;
  const restM2 = colours.reduce((sum, colour) => sum + ownM2(colour), 0);
  const margin = (handM2: number): number => (z * Math.sqrt(handM2 + restM2)) / meanM;
  const skeins = (colour: ColourLedger, handM2: number): number =>
    skeinsFor(
      { meanM: colour.meanM, varianceM2: handM2 + ownM2(colour) },
      plan.yarn.putUp.lengthM,
      plan.confidence,
    );
  const marginNow = margin(handVarianceM2(hand, whole));

  return candidates(plan, hand)
    .map(({ kind, motifs, resolutionG, left }): NextMeasurement => {
      const each = colours.map((colour) => ({
        colour: colour.colour,
        now: skeins(colour, colour.handVarianceM2),
        then: skeins(colour, left(colour.use)),
      }));
      return {
        kind,
        motifs,
        resolutionG,
        marginNow,
        marginThen: margin(left(whole)),
        skeinsNow: each.reduce((sum, { now }) => sum + now, 0),
        skeinsThen: each.reduce((sum, { then }) => sum + then, 0),
        fewer: each.filter(({ now, then }) => then < now),
      };
    })
    .filter(({ marginThen }) => marginThen < 0.99 * marginNow)
    .sort((left, right) => left.marginThen - right.marginThen);
}

function candidates(plan: Plan, hand: Hand): Candidate[] {
  const finest = Math.min(KITCHEN_G, ...plan.evidence.map(({ reading }) => resolutionOf(reading)));
  return [
    ...swatchCandidates(plan, hand, finest),
    ...motifCandidates(plan, hand, finest),
    ...finerScale(plan, hand),
  ];
}

function swatchCandidates(plan: Plan, hand: Hand, resolutionG: number): Candidate[] {
  const use = swatchUse(plan);
  if (!use || plan.evidence.some(({ piece }) => piece === 'swatch')) return [];
  const aboutM = expectedM(hand, use);
  // A hand learnt from readings that contradict its gauge can expect less than nothing.
  const errorM = lengthM(Math.min(Math.max(0, UNRAVELLED_ERROR * aboutM), QUANTITY_LIMITS.lengthM));
  const unravelled = { by: 'unravelling', lengthM: lengthM(0), errorM } as const;
  return [
    candidate(plan, hand, 'weigh the swatch', use, 0, weighed(resolutionG)),
    candidate(plan, hand, 'unravel the swatch', use, 0, unravelled),
  ];
}

function motifCandidates(plan: Plan, hand: Hand, resolutionG: number): Candidate[] {
  const motifIndex = plan.colourways[0]?.motifIndex ?? 0;
  const already = Math.max(
    0,
    ...plan.evidence.map((item) => (item.piece === 'motifs' ? item.count : 0)),
  );
  return TOGETHER.filter((count) => count > already).flatMap((count) => {
    const use = motifUse(plan, motifIndex, count);
    return use
      ? [candidate(plan, hand, 'weigh motifs together', use, count, weighed(resolutionG))]
      : [];
  });
}

function candidate(
  plan: Plan,
  hand: Hand,
  kind: NextMeasurement['kind'],
  use: YarnUse,
  motifs: number,
  reading: YarnReading,
): Candidate {
  const varianceM2 = readingVarianceM2(
    reading,
    plan.yarn.putUp,
    usualM(hand.stitchWidthMm, use),
    motifs,
  );
  return {
    kind,
    motifs,
    resolutionG: reading.by === 'weighing' ? reading.resolutionG : 0,
    left: (of) => handVarianceAfterM2(hand, of, { use, varianceM2 }),
  };
}

/** The same pieces on a finer scale: their readings replaced, so the hand is learnt anew. */
function finerScale(plan: Plan, hand: Hand): Candidate[] {
  if (
    !plan.evidence.some(
      ({ reading }) => resolutionOf(reading) > FINE_G && reading.by === 'weighing',
    )
  )
    return [];
  const evidence = plan.evidence.map((item): PlanEvidence => {
    const { reading } = item;
    const finer =
      reading.by === 'weighing'
        ? { ...reading, resolutionG: massG(Math.min(FINE_G, reading.resolutionG)) }
        : reading;
    return { ...item, reading: finer };
  });
  const finer = learnHand(
    hand.stitchWidthMm,
    hand.stitches,
    evidenceOf({ ...plan, evidence }, hand.stitchWidthMm),
  );
  const motifs = Math.max(
    0,
    ...plan.evidence.map((item) => (item.piece === 'motifs' ? item.count : 0)),
  );
  return [
    {
      kind: 'read a finer scale',
      motifs,
      resolutionG: FINE_G,
      left: (use) => handVarianceM2(finer, use),
    },
  ];
}

const weighed = (resolutionG: number): YarnReading => ({
  by: 'weighing',
  massG: massG(0),
  resolutionG: massG(resolutionG),
});

const resolutionOf = (reading: YarnReading): number =>
  reading.by === 'weighing' ? reading.resolutionG : KITCHEN_G;
