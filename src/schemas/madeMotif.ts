import * as z from './zod';
import {
  counted,
  day,
  flag,
  list,
  listOf,
  listQuery,
  measured,
  moment,
  name,
  notes,
  strict,
  uuid,
  version,
} from './fields';
import { KEPT_LIMITS, PLAN_LIMITS, POSSIBLE } from './limits';
import { pieceMassG, scaleResolutionG } from './swatch';
import { putUpSchema, weightCategory } from './yarn';

/** Size across after a round, as `RoundGeometry.acrossMm` means it. */
const acrossAfterRound = strict('Measurement', {
  round: counted('Round measured', 1, PLAN_LIMITS.roundsPerMotif),
  acrossMm: measured('Size measured', 'mm', PLAN_LIMITS.motifSideMm, POSSIBLE.leastMotifSideMm),
});

const weighed = strict('Weight', {
  count: counted('Motifs weighed', 1, PLAN_LIMITS.piecesWeighed),
  massG: pieceMassG,
  resolutionG: scaleResolutionG,
  /** How often a yarn was attached to each motif: it leaves two tails every time. */
  yarns: counted('Yarns attached', 1, PLAN_LIMITS.roundsPerMotif),
});

const motifKey = name('Motif', PLAN_LIMITS.keyLength);

const madeMotifFields = {
  /** Key of a ready-made motif or id of one's own. */
  motifKey,
  /** The save of one's own motif that was worked; null for a ready-made one. */
  motifVersion: version.nullable(),
  madeOn: day,
  rounds: counted('Rounds worked', 1, PLAN_LIMITS.roundsPerMotif),
  /** One's own swatch of the same yarn and hook, whose gauge it is compared with. */
  swatchId: uuid.nullable(),
  weightCategory,
  putUp: putUpSchema.nullable(),
  sizes: list('Sizes', acrossAfterRound, 0, PLAN_LIMITS.roundsPerMotif),
  weighed: weighed.nullable(),
  blocked: flag('Blocked'),
  notes: notes('Notes', KEPT_LIMITS.notesLength),
};

/** A motif that was made, and what it measured. */
export const madeMotifInput = strict('Made motif', madeMotifFields).superRefine(checkMade);
export type MadeMotifInput = z.output<z.ZodObject<typeof madeMotifFields>>;
export const madeMotifUpdate = strict('Made motif', { ...madeMotifFields, version }).superRefine(
  checkMade,
);

function checkMade(made: MadeMotifInput, issues: z.RefinementCtx): void {
  const refuse = (path: (string | number)[], message: string) =>
    issues.addIssue({ code: 'custom', path, message });
  checkRounds(made, refuse);
  checkGrowth(made, refuse);
  if (made.weighed && !made.putUp) refuse(['putUp'], 'A weight needs the put-up of its yarn');
  if (made.sizes.length === 0 && !made.weighed) {
    refuse(['sizes'], 'Measure a size after a round, or weigh what was made');
  }
}

type Refuse = (path: (string | number)[], message: string) => void;

function checkRounds({ rounds, sizes }: MadeMotifInput, refuse: Refuse): void {
  const seen = new Set<number>();
  sizes.forEach(({ round }, i) => {
    const path = ['sizes', i, 'round'];
    const worked = rounds === 1 ? '1 round was' : `${rounds} rounds were`;
    if (round > rounds) refuse(path, `Only ${worked} worked`);
    else if (seen.has(round)) refuse(path, `Round ${round} is measured twice`);
    seen.add(round);
  });
}

/** A round makes a motif larger; what was entered in the wrong place shows by it. */
function checkGrowth({ sizes }: MadeMotifInput, refuse: Refuse): void {
  const byRound = sizes
    .map((size, i) => ({ ...size, i }))
    .sort((left, right) => left.round - right.round);
  byRound.forEach(({ round, acrossMm, i }, place) => {
    const before = byRound[place - 1];
    if (!before || before.round === round || before.acrossMm < acrossMm) return;
    refuse(['sizes', i, 'acrossMm'], `Round ${round} must measure more than round ${before.round}`);
  });
}

export const madeMotifSchema = z.strictObject({
  id: z.uuid(),
  version,
  updatedAt: moment,
  ...madeMotifFields,
});
export type PresentedMadeMotif = z.output<typeof madeMotifSchema>;
export const madeMotifListSchema = listOf(madeMotifSchema);

/** `?motif=…`: those made of one motif. */
export const madeMotifsQuery = listQuery.extend({ motif: motifKey.optional() });
