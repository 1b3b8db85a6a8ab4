import {
  expectedM,
  handVarianceM2,
  learnHand,
  loopLengthMm,
  usualM,
  type Evidence,
  type Hand,
} from '../hand/hand';
import { PIECE_SPREAD, readingLengthM, readingVarianceM2 } from '../hand/readingVariance';
import { useOfStitches, type YarnUse } from '../hand/yarnUse';
import { READING_TOLERANCE } from '../ledger/notices';
import { TAIL_KEPT, TAIL_M } from '../ledger/tails';
import type { PutUp, YarnReading } from '../plan/plan';
import { loopsOf } from '../stitches/loops';
import { knownStitch } from '../stitches/stitchTable';
import { swatchCounts } from '../stitches/swatchCounts';
import { lengthM, massG } from '../units/quantities';
import type { SwatchMeasurement, SwatchRecord, SwatchYarn } from './swatchRecord';

/** A swatch has the tail it begins with and the one it ends with. */
const SWATCH_TAILS = 2;

/** Yarn per loop of the swatch's stitch, in mm, as believed at some point. */
export interface LoopBelief {
  readonly meanMm: number;
  readonly sdMm: number;
}

export interface SwatchYarnFindings {
  /** Yarn the swatch took, in metres, and how unsure its readings leave that. */
  readonly lengthM: number;
  readonly sdM: number;
  readonly readings: number;
  /** Loops of yarn laid in the whole swatch, chains included. */
  readonly loops: number;
  readonly loopsPerStitch: number;
  /** From the stitch width alone, and once the swatch was weighed or unravelled. */
  readonly before: LoopBelief;
  readonly after: LoopBelief;
  /** Yarn such a swatch usually takes, in metres. */
  readonly usualM: number;
  /** The readings are further from that than makers differ. */
  readonly questioned: boolean;
}

/**
 * What the swatch's weighings and unravellings say about this maker's yarn per loop, or null when
 * there are none that can be read as a length. Readings of one swatch are averaged by how exact
 * they are; that it is one piece counts once.
 *
 * Example: 20 × 18 sc, 7.5 mm wide, 15 g at 2 m/g to 1 g: 30 m; 39.3 mm a loop, from 39 before.
 */
export function swatchYarn(swatch: SwatchRecord, stitchWidthMm: number): SwatchYarnFindings | null {
  const readings = readingsOf(swatch.measurements, swatch.yarn);
  if (readings.length === 0) return null;
  const use = swatchUse(swatch);
  const evidence = evidenceOf(readings, use, stitchWidthMm);
  const codes = [...use.loops.keys()];
  const before = learnHand(stitchWidthMm, codes, []);
  const after = learnHand(stitchWidthMm, codes, [evidence]);
  const expectedBeforeM = expectedM(before, use);
  const usualSdM = Math.sqrt(handVarianceM2(before, use) + evidence.varianceM2);
  return {
    lengthM: evidence.lengthM,
    sdM: Math.sqrt(evidence.readVarianceM2),
    readings: readings.length,
    loops: [...use.loops.values()].reduce((sum, count) => sum + count, 0),
    loopsPerStitch: loopsOf(knownStitch(swatch.stitch)),
    before: beliefOf(before, swatch.stitch),
    after: beliefOf(after, swatch.stitch),
    usualM: expectedBeforeM,
    questioned: Math.abs(evidence.lengthM - expectedBeforeM) > READING_TOLERANCE * usualSdM,
  };
}

/** Every stitch of the swatch, with what its tails keep once woven in and trimmed. */
function swatchUse({ stitch, stitches, rows }: SwatchRecord): YarnUse {
  const use = useOfStitches(swatchCounts(stitch, stitches, rows));
  return { ...use, cutM: SWATCH_TAILS * TAIL_M * TAIL_KEPT };
}

interface Read {
  readonly lengthM: number;
  /** Of the reading alone. */
  readonly varianceM2: number;
}

/** A weight needs the yarn's metres per gram; a length speaks for itself. */
function readingsOf(measurements: readonly SwatchMeasurement[], yarn: SwatchYarn | null): Read[] {
  const perMetre: PutUp = { massG: massG(1), lengthM: lengthM(1) };
  const putUp: PutUp | null = yarn && {
    massG: massG(yarn.putUp.massG),
    lengthM: lengthM(yarn.putUp.lengthM),
  };
  return measurements.flatMap((each): Read[] => {
    if (each.kind === 'length') {
      const { lengthM: metres, errorM } = each;
      return [
        read({ by: 'unravelling', lengthM: lengthM(metres), errorM: lengthM(errorM) }, perMetre),
      ];
    }
    if (each.kind === 'size' || !putUp) return [];
    const { massG: grams, resolutionG } = each;
    return [read({ by: 'weighing', massG: massG(grams), resolutionG: massG(resolutionG) }, putUp)];
  });
}

function read(reading: YarnReading, putUp: PutUp): Read {
  // Of a piece of no length only the reading itself is unsure.
  return {
    lengthM: readingLengthM(reading, putUp),
    varianceM2: readingVarianceM2(reading, putUp, 0, 0),
  };
}

/** A length said to be without error still cannot outweigh the others by more than this, in m². */
const LEAST_VARIANCE_M2 = 1e-6;

function evidenceOf(
  readings: readonly Read[],
  use: YarnUse,
  stitchWidthMm: number,
): Evidence & { readonly readVarianceM2: number } {
  const weights = readings.map(({ varianceM2 }) => 1 / Math.max(varianceM2, LEAST_VARIANCE_M2));
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const meanM =
    readings.reduce((sum, reading, i) => sum + reading.lengthM * (weights[i] ?? 0), 0) / total;
  return {
    use,
    lengthM: meanM,
    readVarianceM2: 1 / total,
    varianceM2: 1 / total + (PIECE_SPREAD * usualM(stitchWidthMm, use)) ** 2,
  };
}

function beliefOf(hand: Hand, code: string): LoopBelief {
  const oneLoop: YarnUse = { loops: new Map([[code, 1]]), seamM: 0, cutM: 0 };
  return {
    meanMm: loopLengthMm(hand, code),
    sdMm: 1000 * Math.sqrt(handVarianceM2(hand, oneLoop)),
  };
}
