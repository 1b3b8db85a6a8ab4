import { UNMEASURED_HEIGHT_SPREAD, UNMEASURED_WIDTH_SPREAD, type Gauge } from '../gauge/gauge';
import { READING_TOLERANCE } from '../ledger/notices';
import { dot } from '../stats/linear';
import { varianceOf } from '../stats/posterior';
import {
  apothemsAcross,
  fullnessOf,
  motifGeometry,
  troubleOf,
  type MotifGeometry,
  type RoundGeometry,
} from './geometry';
import { heightBelief, tapeErrorMm, type RoundSize } from './heightBelief';
import type { Motif } from './motif';
import { requireSizes } from './requireSizes';

export interface MeasuredRound extends RoundGeometry {
  /** Standard deviation of `acrossMm`. */
  readonly acrossSdMm: number;
  /** What the tape read after this round, or null. */
  readonly measuredMm: number | null;
  /** The tape is further from what the gauge says than hands differ. */
  readonly questioned: boolean;
}

export interface MeasuredMotif extends MotifGeometry {
  readonly rounds: readonly MeasuredRound[];
}

/**
 * Geometry of a motif whose size across was measured after some of its rounds. Rounds that were not
 * measured follow those of like height that were: their heights by the gauge, corrected by the exact
 * posterior of a linear-Gaussian model. Sizes in mm, in any order, each round at most once.
 *
 * Without sizes it is `motifGeometry`; only its spread counts that each round and the ring differ too.
 * Throws DomainError for a round that the motif has not, and for sizes that do not grow.
 *
 * Example: one round of sc, 17.55 mm across by a gauge known to 3 %, measured as 20 mm: 19.525 mm,
 * give or take 0.45 mm (one standard deviation).
 */
export function measuredMotif(
  motif: Motif,
  gauge: Gauge,
  sizes: readonly RoundSize[],
): MeasuredMotif {
  requireSizes(motif, sizes);
  const computed = motifGeometry(motif, gauge, null);
  const usual = heightBelief(motif, gauge, []);
  const { belief, heightRow, acrossRow, kindOf } = heightBelief(motif, gauge, sizes);
  const apothems = apothemsAcross(motif.sides);
  const ringMm = usual.belief.mean[0] as number;
  const byGaugeMm = (acrossMm: number): number => acrossMm - apothems * ringMm;
  const across = (round: number, byGauge: number) => ({
    acrossMm: byGaugeMm(byGauge) + dot(acrossRow(round), belief.mean),
    acrossSdMm: Math.sqrt(varianceOf(belief, acrossRow(round))),
  });
  const measuredMm = new Map(sizes.map(({ round, acrossMm }) => [round, acrossMm]));

  const rounds = motif.rounds.map((round, i): MeasuredRound => {
    const n = i + 1;
    const byGauge = computed.rounds[i] as RoundGeometry;
    const size = across(n, byGauge.acrossMm);
    const read = measuredMm.get(n) ?? null;
    const usualSdMm = Math.sqrt(varianceOf(usual.belief, usual.acrossRow(n)));
    const width =
      gauge.stitchWidthMm * (1 + widthShare(gauge) * (belief.mean[kindOf(n)] as number));
    return {
      label: round.label,
      heightMm: byGauge.heightMm + dot(heightRow(n), belief.mean),
      ...size,
      fullness: fullnessOf(motif, round, size.acrossMm / apothems, { stitchWidthMm: width }),
      measuredMm: read,
      questioned:
        read !== null &&
        Math.abs(read - byGauge.acrossMm) >
          READING_TOLERANCE * Math.hypot(usualSdMm, tapeErrorMm(byGauge.acrossMm)),
    };
  });
  const whole = across(motif.rounds.length, computed.acrossMm);
  return {
    ...whole,
    sideMm: (whole.acrossMm * computed.sideMm) / computed.acrossMm,
    rounds,
    trouble: troubleOf(rounds),
  };
}

/**
 * Share of a height's surprise that is the stitch's width's: none where a swatch measured the width;
 * with a width from the yarn category alone, a taller stitch is mostly a larger one.
 */
const widthShare = ({ source }: Gauge): number =>
  source === 'swatch'
    ? 0
    : UNMEASURED_WIDTH_SPREAD ** 2 / (UNMEASURED_WIDTH_SPREAD ** 2 + UNMEASURED_HEIGHT_SPREAD ** 2);
