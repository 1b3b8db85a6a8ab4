import * as z from './zod';
import { MOTIF_SIDES } from '../lib/motifs/motif';
import { choice, counted, list, name, strict, version } from './fields';
import { PLAN_LIMITS } from './limits';
import { knownStitch, stitchCounts } from './stitchCounts';

const { stitchesPerRound } = PLAN_LIMITS;

const loopHeight = strict('Chain loop', {
  chains: counted('Chains of a loop', 1, PLAN_LIMITS.chainsPerLoop),
  gapStitches: counted('Stitches spanned by a loop', 0, PLAN_LIMITS.gapStitches),
});

/** A stitch, or chain loops. */
export const roundHeight = z.union([knownStitch, loopHeight], {
  error: 'Height of a round must be a stitch such as dc, or chain loops',
});

const spaces = z
  .record(
    name('Kind of space', PLAN_LIMITS.keyLength),
    counted('Spaces of a round', 0, stitchesPerRound),
    { error: 'Spaces must be counts by kind' },
  )
  .refine((counted) => Object.keys(counted).length <= PLAN_LIMITS.spaceKinds, {
    error: `Spaces must be of at most ${PLAN_LIMITS.spaceKinds} kinds`,
  });

const roundSchema = strict('Round', {
  label: name('Name of a round'),
  made: stitchCounts('Stitches made', stitchesPerRound),
  travel: stitchCounts('Stitches to travel', stitchesPerRound),
  tally: stitchCounts('Stitches counted', stitchesPerRound),
  spaces,
  cornerSpace: name('Space of a corner', PLAN_LIMITS.keyLength).nullable(),
  perSide: counted('Stitches of a side', 0, stitchesPerRound),
  height: roundHeight,
}).superRefine((round, context) => {
  for (const [code, count] of Object.entries(round.travel)) {
    const made = round.made[code] ?? 0;
    if (count > made) {
      const message = `${round.label} travels over ${count} ${code} but makes only ${made}`;
      context.addIssue({ code: 'custom', path: ['travel', code], message });
    }
  }
  if (round.cornerSpace !== null && round.spaces[round.cornerSpace] === undefined) {
    const message = `${round.label} has no ${round.cornerSpace} space for its corners`;
    context.addIssue({ code: 'custom', path: ['cornerSpace'], message });
  }
});

/** A motif as rounds of counted stitches, as a plan holds it; plans kept before motifs had versions name none. */
export const motifSchema = strict('Motif', {
  key: name('Key of a motif', PLAN_LIMITS.keyLength),
  version: version.nullable().default(null),
  name: name('Motif name'),
  sides: choice('Sides of a motif', MOTIF_SIDES),
  ring: strict('Ring', {
    chains: counted('Chains of the ring', 0, stitchesPerRound),
    made: stitchCounts('Stitches of the ring', stitchesPerRound),
  }),
  rounds: list('Rounds of a motif', roundSchema, 1, PLAN_LIMITS.roundsPerMotif),
});
