import type { Gauge } from '../../../lib/gauge/gauge';
import { madeYarn, type MadeYarn } from '../../../lib/motifs/madeYarn';
import { measuredMotif, type MeasuredMotif } from '../../../lib/motifs/measuredMotif';
import type { Motif } from '../../../lib/motifs/motif';
import { lengthM, massG } from '../../../lib/units/quantities';
import { PLAN_LIMITS, POSSIBLE } from '../../../schemas/limits';
import type { MadeMotifInput } from '../../../schemas/madeMotif';
import { madeMotifOf, type MadeMotifDraft } from '../../../schemas/madeMotifForm';

/** The part of a made motif that figures follow from. */
export type Measured = Pick<MadeMotifInput, 'rounds' | 'sizes' | 'weighed' | 'putUp'>;

export interface MadeFigures {
  rounds: number;
  /** By its rounds alone, at the gauge. */
  computed: MeasuredMotif;
  /** Null while no size was taken. */
  measured: MeasuredMotif | null;
  /** Null while nothing was weighed. */
  yarn: (MadeYarn & { gramsPerM: number }) | null;
}

/** What making it told, at this gauge; null where more rounds were made than the motif is shown with. */
export function madeFigures(made: Measured, motif: Motif, gauge: Gauge): MadeFigures | null {
  const { rounds, sizes, weighed, putUp } = made;
  if (rounds > motif.rounds.length) return null;
  const worked = { ...motif, rounds: motif.rounds.slice(0, rounds) };
  const skein = putUp && { massG: massG(putUp.massG), lengthM: lengthM(putUp.lengthM) };
  return {
    rounds,
    computed: measuredMotif(worked, gauge, []),
    measured: sizes.length > 0 ? measuredMotif(worked, gauge, sizes) : null,
    yarn: weighed &&
      skein && {
        ...madeYarn(worked, weighed, skein, gauge.stitchWidthMm),
        gramsPerM: skein.massG / skein.lengthM,
      },
  };
}

/** What can be worked out of a form that may be half filled: only what is complete and can be. */
export function readableMade(draft: MadeMotifDraft, mostRounds: number): Measured {
  const { rounds: typed, sizes, weighed, putUp } = madeMotifOf(draft);
  const rounds = isCount(typed, mostRounds) ? typed : mostRounds;
  const isReadable =
    weighed !== null &&
    putUp !== null &&
    isCount(weighed.count, PLAN_LIMITS.piecesWeighed) &&
    isCount(weighed.yarns, PLAN_LIMITS.roundsPerMotif) &&
    isWithin(weighed.massG, POSSIBLE.leastPieceMassG, PLAN_LIMITS.pieceMassG) &&
    isWithin(putUp.massG, POSSIBLE.leastSkeinMassG, PLAN_LIMITS.skeinMassG) &&
    isWithin(putUp.lengthM, POSSIBLE.leastPieceLengthM, PLAN_LIMITS.skeinLengthM);
  return {
    rounds,
    sizes: growing(sizes.filter(({ round }) => round <= rounds)),
    weighed: isReadable ? weighed : null,
    putUp: isReadable ? putUp : null,
  };
}

/** While "12.4" is typed it reads 1 for a moment: a size below the round before it is left out. */
function growing(sizes: Measured['sizes']): Measured['sizes'] {
  let reachedMm = 0;
  return sizes.filter(({ acrossMm }) => {
    const isGrown = isWithin(acrossMm, POSSIBLE.leastMotifSideMm, PLAN_LIMITS.motifSideMm);
    if (!isGrown || acrossMm <= reachedMm) return false;
    reachedMm = acrossMm;
    return true;
  });
}

const isWithin = (value: number | null, least: number, most: number): boolean =>
  value !== null && value >= least && value <= most;

const isCount = (value: number | null, most: number): boolean =>
  Number.isInteger(value) && isWithin(value, 1, most);
