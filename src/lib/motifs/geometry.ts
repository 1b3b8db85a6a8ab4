import { chainLengthMm, type Gauge } from '../gauge/gauge';
import type { Motif, MotifRound, MotifSides } from './motif';

/** Under the first a motif cups, over the second it ruffles (common practice, no source). */
export const FLAT_FULLNESS = [0.92, 1.08] as const;
/** Radius of a magic ring in stitch widths: ours. */
const MAGIC_RING_WIDTHS = 0.25;
/** Relative standard deviation of a side measured with a tape: ours. */
export const MEASURED_SIDE_SPREAD = 0.01;

export interface RoundGeometry {
  readonly label: string;
  readonly heightMm: number;
  /** As `MotifGeometry.acrossMm`, after this round. */
  readonly acrossMm: number;
  /** Side, or circumference of a circle, as its stitches would make it over as its height makes it. */
  readonly fullness: number;
}

export interface MotifGeometry {
  /** Flat to flat for an even number of sides; diameter of a circle; finished side of a square; height of a triangle. */
  readonly acrossMm: number;
  /** Length of one side; a quarter of the circumference of a circle. */
  readonly sideMm: number;
  /** Standard deviation of `acrossMm`. */
  readonly acrossSdMm: number;
  readonly rounds: readonly RoundGeometry[];
  /** First round at which the motif stops lying flat, if any. */
  readonly trouble: { readonly label: string; readonly kind: 'cups' | 'ruffles' } | null;
}

/**
 * Size of a motif from the heights of its rounds, and how flat its stitch counts let it lie.
 * Apothem = ring radius + heights; side = 2 × apothem × tan(π / sides). A measured `acrossMm`
 * rescales the result but not the fullness.
 *
 * Example: one round of sc 6.9 mm tall round a magic ring of 1.875 mm is 17.55 mm across.
 */
export function motifGeometry(
  motif: Motif,
  gauge: Gauge,
  measuredAcrossMm: number | null,
): MotifGeometry {
  const ringMm = ringRadiusMm(motif, gauge);
  const apothems = apothemsAcross(motif.sides);
  const perApothem = motif.sides === 0 ? Math.PI / 2 : 2 * Math.tan(Math.PI / motif.sides);
  let apothemMm = ringMm;
  const rounds = motif.rounds.map((round): RoundGeometry => {
    const heightMm = roundHeightMm(round, gauge);
    apothemMm += heightMm;
    return {
      label: round.label,
      heightMm,
      acrossMm: apothems * apothemMm,
      fullness: fullnessOf(motif, round, apothemMm, gauge),
    };
  });
  const acrossMm = measuredAcrossMm ?? apothems * apothemMm;
  return {
    acrossMm,
    sideMm: (acrossMm / apothems) * perApothem,
    acrossSdMm:
      measuredAcrossMm === null
        ? apothems * heightSdMm(motif, gauge)
        : MEASURED_SIDE_SPREAD * measuredAcrossMm,
    rounds,
    trouble: troubleOf(rounds),
  };
}

/** How often the apothem goes into the size across: a triangle's corner stands two above the middle. */
export const apothemsAcross = (sides: MotifSides): number => (sides === 3 ? 3 : 2);

/** Height of a round in mm: its stitch, or its chain loops as two sides of a flat triangle. */
export function roundHeightMm({ height }: Pick<MotifRound, 'height'>, gauge: Gauge): number {
  if (typeof height === 'string') return gauge.heightMm(height);
  const halfLoopMm = (height.chains * chainLengthMm(gauge)) / 2;
  const halfGapMm = (height.gapStitches * gauge.stitchWidthMm) / 2;
  return Math.sqrt(Math.max(0, halfLoopMm ** 2 - halfGapMm ** 2));
}

/** Radius of the foundation ring: its chains bent to a circle. */
export function ringRadiusMm(motif: Motif, gauge: Gauge): number {
  return motif.ring.chains === 0
    ? MAGIC_RING_WIDTHS * gauge.stitchWidthMm
    : (motif.ring.chains * chainLengthMm(gauge)) / (2 * Math.PI);
}

/** Side by its stitches over side by its height, after a round of this apothem. */
export function fullnessOf(
  { sides }: Pick<Motif, 'sides'>,
  round: Pick<MotifRound, 'perSide'>,
  apothemMm: number,
  { stitchWidthMm }: Pick<Gauge, 'stitchWidthMm'>,
): number {
  if (sides === 0) return (round.perSide * stitchWidthMm) / (2 * Math.PI * apothemMm);
  // One stitch width for the two half corners of the side.
  const byStitchesMm = (round.perSide + 1) * stitchWidthMm;
  return byStitchesMm / (2 * apothemMm * Math.tan(Math.PI / sides));
}

/** Rounds of one stitch err together; different stitches err apart. */
function heightSdMm(motif: Motif, gauge: Gauge): number {
  const sdByStitch = new Map<string, number>();
  for (const round of motif.rounds) {
    const code = typeof round.height === 'string' ? round.height : 'ch';
    const sdMm = roundHeightMm(round, gauge) * gauge.heightSpread(code);
    sdByStitch.set(code, (sdByStitch.get(code) ?? 0) + sdMm);
  }
  return Math.hypot(...sdByStitch.values());
}

/** The first rounds are small enough to be pulled flat: a third round must agree. */
export function troubleOf(rounds: readonly RoundGeometry[]): MotifGeometry['trouble'] {
  const [least, most] = FLAT_FULLNESS;
  const bad = ({ fullness }: RoundGeometry): boolean => fullness < least || fullness > most;
  const last = rounds.at(-1);
  if (rounds.length < 3 || !last || !bad(last)) return null;
  const start = rounds.findLastIndex((round) => !bad(round)) + 1;
  return {
    label: rounds[start]?.label ?? last.label,
    kind: last.fullness < least ? 'cups' : 'ruffles',
  };
}
