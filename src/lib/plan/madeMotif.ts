import { DomainError } from '../errors';
import { gaugeOf } from '../gauge/gauge';
import type { RoundSize } from '../motifs/heightBelief';
import { countedMotifs, readingOf, type WeighedMotifs } from '../motifs/madeYarn';
import { measuredMotif } from '../motifs/measuredMotif';
import type { Motif } from '../motifs/motif';
import { lengthM, massG, widthMm } from '../units/quantities';
import { withEvidence, withMotif } from './edits';
import type { Plan, PlanEvidence, WeightCategory } from './plan';

/** A yarn that runs this much further or less far to the gram is another yarn (common practice, no source). */
const ANOTHER_YARN = 0.1;

/** A motif that was made, and what it measured. */
export interface MadeMotif {
  /** Rounds that were worked. */
  readonly rounds: number;
  readonly sizes: readonly RoundSize[];
  readonly weighed: WeighedMotifs | null;
  /** Of the yarn it was made in. */
  readonly weightCategory: WeightCategory;
  /** Of that yarn too; known wherever it was weighed. */
  readonly putUp: { readonly massG: number; readonly lengthM: number } | null;
}

/**
 * The plan of this motif with what making it told: its measured size, and its weight as evidence.
 * `motif` is planned as it is given. A size is taken only where it was measured after the last round
 * planned, because one that is worked out is not a measured one. Made in another yarn than the
 * plan's, it brings its own: swatch and weights in the old one say nothing about it.
 * Throws DomainError where more rounds were made than the motif has.
 */
export function withMadeMotif(plan: Plan, motif: Motif, made: MadeMotif): Plan {
  const planned = motif.rounds.length;
  if (!(made.rounds >= 1 && made.rounds <= planned)) {
    throw new DomainError(
      'no-such-round',
      `withMadeMotif requires a motif of at least the ${made.rounds} rounds made, got ${planned}`,
    );
  }
  const changed = withMotif(inYarnOf(plan, made), motif);
  const isMeasured = made.sizes.some(({ round }) => round === planned);
  const gauge = gaugeOf(changed.swatch, changed.yarn.weightCategory);
  const sized: Plan = isMeasured
    ? { ...changed, motifSideMm: widthMm(measuredMotif(motif, gauge, made.sizes).acrossMm) }
    : changed;
  const weighed = weightInPlan(sized, made);
  return weighed ? withWeighing(sized, made.rounds, weighed) : sized;
}

/** How much further the yarn it was made in runs to the gram than the plan's; null where not known. */
function runsFurther({ yarn }: Plan, { putUp }: MadeMotif): number | null {
  return putUp && putUp.lengthM / putUp.massG / (yarn.putUp.lengthM / yarn.putUp.massG);
}

/** The plan in the yarn of the made motif, where that is another. */
function inYarnOf(plan: Plan, made: MadeMotif): Plan {
  const { putUp, weightCategory } = made;
  const factor = runsFurther(plan, made);
  if (!putUp || factor === null || Math.abs(factor - 1) <= ANOTHER_YARN) return plan;
  return {
    ...plan,
    yarn: {
      name: 'The yarn it was made in',
      weightCategory,
      putUp: { massG: massG(putUp.massG), lengthM: lengthM(putUp.lengthM) },
      price: null,
    },
    swatch: null,
    evidence: [],
  };
}

/** The weight in grams of the plan's yarn, which may run a little further or less far. */
function weightInPlan(plan: Plan, made: MadeMotif): WeighedMotifs | null {
  const factor = runsFurther(plan, made);
  if (!made.weighed || factor === null) return null;
  return {
    ...made.weighed,
    massG: made.weighed.massG * factor,
    resolutionG: made.weighed.resolutionG * factor,
  };
}

function withWeighing(plan: Plan, rounds: number, weighed: WeighedMotifs): Plan {
  const motif = plan.motifs[0] as Motif;
  const counted = countedMotifs({ ...motif, rounds: motif.rounds.slice(0, rounds) }, weighed);
  // Taken over a second time, a weight would count as two.
  const others = plan.evidence.filter((item) => !isSameWeighing(item, counted));
  const piece: PlanEvidence = isPlanned(plan, rounds, weighed)
    ? { piece: 'motifs', count: weighed.count, motifIndex: 0, reading: readingOf(weighed) }
    : counted;
  return withEvidence({ ...plan, evidence: others }, others.length, piece);
}

function isSameWeighing(left: PlanEvidence, right: PlanEvidence): boolean {
  if (left.piece !== 'counted' || right.piece !== 'counted' || left.label !== right.label)
    return false;
  const [a, b] = [left.reading, right.reading];
  return a.by === 'weighing' && b.by === 'weighing' && a.massG === b.massG;
}

/** The motifs weighed are those of the plan: as many rounds, and as many yarns attached. */
function isPlanned(plan: Plan, rounds: number, { yarns }: WeighedMotifs): boolean {
  const colours = plan.colourways.find(({ motifIndex }) => motifIndex === 0)?.roundColours ?? [];
  const attached = colours.filter((colour, i) => colour !== colours[i - 1]).length;
  return rounds === plan.motifs[0]?.rounds.length && attached === yarns;
}
