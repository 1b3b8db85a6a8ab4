import type { PutUp, YarnReading } from '../plan/plan';

/** How much one measured piece differs from what the same hand makes on another day: ours. */
export const PIECE_SPREAD = 0.02;
/** How much each motif differs from the next: ours. */
export const MOTIF_SPREAD = 0.03;

/** Yarn that a reading stands for, in metres: its length, or its mass at the put-up's metres per gram. */
export function readingLengthM(reading: YarnReading, putUp: PutUp): number {
  return reading.by === 'unravelling'
    ? reading.lengthM
    : (reading.massG * putUp.lengthM) / putUp.massG;
}

/**
 * Variance in m² of a reading of about `lengthM` over `motifs` like motifs (0 for any other piece).
 * Weighing: a scale read before and after, each rounded to its resolution r: 2 r²/12. Unravelling:
 * the stated error. Then the piece as a whole, and the motifs, which average out.
 *
 * Example: 44 g at 2 m/g on a scale to 1 g, 4 motifs: 0.67 + 3.10 + 1.74 = 5.51 m².
 */
export function readingVarianceM2(
  reading: YarnReading,
  putUp: PutUp,
  lengthM: number,
  motifs: number,
): number {
  const read =
    reading.by === 'unravelling'
      ? reading.errorM ** 2
      : ((2 * reading.resolutionG ** 2) / 12) * (putUp.lengthM / putUp.massG) ** 2;
  const eachMotif = motifs > 0 ? (MOTIF_SPREAD * lengthM) ** 2 / motifs : 0;
  return read + (PIECE_SPREAD * lengthM) ** 2 + eachMotif;
}
