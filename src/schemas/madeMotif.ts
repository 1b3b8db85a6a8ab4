import * as z from './zod';
import {
  choice,
  counted,
  day,
  list,
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
import { checkPutUp } from './possible';
import { pieceMassG, scaleResolutionG } from './swatch';
import { skeinLengthM, skeinMassG, weightCategory } from './yarn';

/** Size across after a round, as `RoundGeometry.acrossMm` means it. */
const acrossAfterRound = strict('Measurement', {
  round: counted('Round measured', 1, PLAN_LIMITS.roundsPerMotif),
  acrossMm: measured('Size measured', 'mm', PLAN_LIMITS.motifSideMm, POSSIBLE.leastMotifSideMm),
});

const weighed = strict('Weight', {
  count: counted('Motifs weighed', 1, PLAN_LIMITS.piecesWeighed),
  massG: pieceMassG,
  resolutionG: scaleResolutionG,
});

const madeMotifFields = {
  /** Key of a ready-made motif or id of one's own. */
  motifKey: name('Motif', PLAN_LIMITS.keyLength),
  /** The save of one's own motif that was worked; null for a ready-made one. */
  motifVersion: version.nullable(),
  name: name('Name'),
  madeOn: day,
  /** Rounds that were worked. */
  rounds: counted('Rounds worked', 1, PLAN_LIMITS.roundsPerMotif),
  swatchId: uuid.nullable(),
  weightCategory,
  putUp: strict('Put-up', { massG: skeinMassG, lengthM: skeinLengthM })
    .superRefine(checkPutUp)
    .nullable(),
  sizes: list('Sizes', acrossAfterRound, 0, PLAN_LIMITS.roundsPerMotif),
  weighed: weighed.nullable(),
  blocked: choice('Blocked', ['yes', 'no']),
  notes: notes('Notes', KEPT_LIMITS.notesLength),
};

/** A motif that was made, and what it measured. */
export const madeMotifInput = strict('Made motif', madeMotifFields).superRefine(checkMade);
export type MadeMotifInput = z.output<typeof madeMotifInput>;
export const madeMotifUpdate = strict('Made motif', { ...madeMotifFields, version }).superRefine(
  checkMade,
);

function checkMade(made: MadeMotifInput, issues: z.RefinementCtx): void {
  const seen = new Set<number>();
  made.sizes.forEach(({ round }, i) => {
    const path = ['sizes', i, 'round'];
    if (round > made.rounds) {
      const message = `Only ${made.rounds} rounds were worked`;
      issues.addIssue({ code: 'custom', path, message });
    } else if (seen.has(round)) {
      issues.addIssue({ code: 'custom', path, message: `Round ${round} is measured twice` });
    }
    seen.add(round);
  });
  const bySize = [...made.sizes].sort((a, b) => a.round - b.round);
  bySize.forEach(({ round, acrossMm }, i) => {
    const before = bySize[i - 1];
    if (before && before.acrossMm >= acrossMm) {
      const path = ['sizes', made.sizes.findIndex((each) => each.round === round), 'acrossMm'];
      const message = `Round ${round} must measure more than round ${before.round}`;
      issues.addIssue({ code: 'custom', path, message });
    }
  });
  if (made.weighed && !made.putUp) {
    const message = 'A weight needs the put-up of its yarn';
    issues.addIssue({ code: 'custom', path: ['putUp'], message });
  }
  if (made.sizes.length === 0 && !made.weighed) {
    issues.addIssue({ code: 'custom', path: ['sizes'], message: 'Measure a size or a weight' });
  }
}

export const madeMotifSchema = z.strictObject({
  id: z.uuid(),
  version,
  updatedAt: moment,
  ...madeMotifFields,
});
export type PresentedMadeMotif = z.output<typeof madeMotifSchema>;

/** `?motif=…`: those made of one motif. */
export const madeMotifsQuery = listQuery.extend({
  motif: name('Motif', PLAN_LIMITS.keyLength).optional(),
});
export type MadeMotifsQuery = z.output<typeof madeMotifsQuery>;
