import type { Plan, PlanEvidence } from '../../src/lib';
import {
  LOOP_OVER_WIDTH,
  MAKER_SPREAD,
  SEWN_FACTOR,
  SEWN_SPREAD,
  STITCH_SPREAD,
} from '../../src/lib/hand/hand';
import { MOTIF_SPREAD, PIECE_SPREAD } from '../../src/lib/hand/readingVariance';
import type { YarnUse } from '../../src/lib/hand/yarnUse';
import { blanketOf } from '../../src/lib/ledger/blanketOf';
import { useOfGroup } from '../../src/lib/ledger/colourLedger';
import { motifUse, swatchUse } from '../../src/lib/ledger/evidenceOf';
import { piecesOf, type PieceGroup } from '../../src/lib/ledger/pieces';
import { TAIL_KEPT, TAIL_M, TAIL_SPREAD } from '../../src/lib/ledger/tails';
import { SKEIN_SPREAD } from '../../src/lib/skeins/skeins';
import { weighed } from './plans';
import { normalDraw, type Random } from './random';

/** A person whose hand is known exactly: yarn per loop of each stitch, and per length sewn. */
export interface SimulatedMaker {
  readonly loopMm: (code: string) => number;
  readonly sewnFactor: number;
}

/** A maker of this stitch width, drawn from exactly the spread between makers that the library states. */
export function drawMaker(random: Random, stitchWidthMm: number): SimulatedMaker {
  const usualMm = LOOP_OVER_WIDTH * stitchWidthMm;
  const commonMm = usualMm * (1 + MAKER_SPREAD * normalDraw(random));
  const loops = new Map<string, number>();
  return {
    loopMm: (code) => {
      const known = loops.get(code) ?? commonMm + usualMm * STITCH_SPREAD * normalDraw(random);
      loops.set(code, known);
      return known;
    },
    sewnFactor: SEWN_FACTOR * (1 + SEWN_SPREAD * normalDraw(random)),
  };
}

/** Every piece of the plan's blanket, by colour. */
export const groupsOf = (plan: Plan): PieceGroup[] => piecesOf(blanketOf(plan));

/** Yarn of one colour that a maker would take if all her pieces were alike and all tails 150 mm. */
export function usualM(maker: SimulatedMaker, groups: readonly PieceGroup[]): number {
  return groups.reduce((sum, group) => {
    const use = useOfGroup(group);
    return sum + group.count * (workedM(maker, use) + use.cutM);
  }, 0);
}

/** Yarn of one colour that the blanket takes in fact: every piece and every tail a little different. */
export function blanketM(
  random: Random,
  maker: SimulatedMaker,
  groups: readonly PieceGroup[],
): number {
  return groups.reduce((sum, group) => {
    const use = useOfGroup(group);
    const eachM = workedM(maker, use);
    const tails = (group.count * use.cutM) / TAIL_M;
    const differM =
      MOTIF_SPREAD * eachM * Math.sqrt(group.count) * normalDraw(random) +
      TAIL_SPREAD * TAIL_M * Math.sqrt(tails) * normalDraw(random);
    return sum + group.count * (eachM + use.cutM) + differM;
  }, 0);
}

/** Metres in so many bought skeins, each a little over or under its put-up. */
export const skeinsM = (random: Random, skeins: number, putUpM: number): number =>
  putUpM * (skeins + SKEIN_SPREAD * Math.sqrt(skeins) * normalDraw(random));

export interface Weighing {
  readonly piece: 'swatch' | 'motifs';
  /** Motifs on the scale together. */
  readonly count: number;
  readonly resolutionG: number;
}

/** The evidence that a maker gets when she weighs the ball before and after the piece. */
export function weigh(
  random: Random,
  maker: SimulatedMaker,
  plan: Plan,
  { piece, count, resolutionG }: Weighing,
): PlanEvidence {
  const use = (piece === 'swatch' ? swatchUse(plan) : motifUse(plan, 0, count)) as YarnUse;
  const onTheDay = 1 + PIECE_SPREAD * normalDraw(random);
  const oneByOne =
    piece === 'motifs' ? 1 + (MOTIF_SPREAD / Math.sqrt(count)) * normalDraw(random) : 1;
  const tails = use.cutM / (TAIL_M * TAIL_KEPT);
  const tailsM =
    use.cutM + TAIL_KEPT * TAIL_SPREAD * TAIL_M * Math.sqrt(tails) * normalDraw(random);
  const { massG, lengthM } = plan.yarn.putUp;
  const takenG = (workedM(maker, use) * onTheDay * oneByOne + tailsM) * (massG / lengthM);
  const shown = (trueG: number): number => Math.round(trueG / resolutionG) * resolutionG;
  const beforeG = takenG + 100 + random() * resolutionG;
  const reading = weighed(Math.max(0, shown(beforeG) - shown(beforeG - takenG)), resolutionG);
  return piece === 'swatch' ? { piece, reading } : { piece, count, motifIndex: 0, reading };
}

function workedM(maker: SimulatedMaker, { loops, seamM }: YarnUse): number {
  const stitches = [...loops].reduce(
    (sum, [code, count]) => sum + (count * maker.loopMm(code)) / 1000,
    0,
  );
  return stitches + seamM * maker.sewnFactor;
}
