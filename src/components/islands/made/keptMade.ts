import type { MadeMotifInput } from '../../../schemas/madeMotif';
import type { MadeMotifDraft, MadeMotifForm } from '../../../schemas/madeMotifForm';

/** A made motif as it is kept: in the account, or on this device. */
export interface KeptMade extends MadeMotifInput {
  readonly id: string;
  readonly version: number;
}

/** What was made alone, as the server takes it. */
export function madeContent(kept: KeptMade): MadeMotifInput {
  const { motifKey, motifVersion, madeOn, rounds, swatchId, weightCategory } = kept;
  const { putUp, sizes, weighed, blocked, notes } = kept;
  return {
    ...{ motifKey, motifVersion, madeOn, rounds, swatchId, weightCategory },
    ...{ putUp, sizes, weighed, blocked, notes },
  };
}

/** Which motif is measured, and beside which gauge. */
export type MadeOf = Pick<
  MadeMotifInput,
  'motifKey' | 'motifVersion' | 'swatchId' | 'weightCategory'
>;

const NO_WEIGHT: MadeMotifDraft['weighed'] = { count: 1, massG: null, resolutionG: 1, yarns: 1 };
const NO_PUT_UP: MadeMotifDraft['putUp'] = { massG: null, lengthM: null };

/** Nothing measured yet; scale, yarn and the number of yarns as they were the last time. */
export function blankMade(
  of: MadeOf,
  rounds: number,
  madeOn: string,
  last: KeptMade | undefined,
): MadeMotifForm {
  const { count = 1, resolutionG = 1, yarns = 1 } = last?.weighed ?? {};
  return {
    made: {
      ...of,
      madeOn,
      rounds,
      sizes: everyRound(rounds),
      weighed: { count, massG: null, resolutionG, yarns },
      putUp: last?.putUp ?? NO_PUT_UP,
      blocked: last?.blocked ?? false,
      notes: '',
    },
  };
}

/** A kept one in the form, with a field for every round. */
export function madeValues(kept: KeptMade, rounds: number): MadeMotifForm {
  const { sizes, weighed, putUp, ...made } = madeContent(kept);
  return {
    made: {
      ...made,
      sizes: everyRound(Math.max(rounds, made.rounds)).map(
        (empty) => sizes.find(({ round }) => round === empty.round) ?? empty,
      ),
      weighed: weighed ?? NO_WEIGHT,
      putUp: putUp ?? NO_PUT_UP,
    },
  };
}

const everyRound = (rounds: number): MadeMotifDraft['sizes'] =>
  Array.from({ length: rounds }, (_, i) => ({ round: i + 1, acrossMm: null }));
