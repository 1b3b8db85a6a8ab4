import * as z from './zod';
import { madeMotifInput, type MadeMotifInput } from './madeMotif';

/** A made motif while its form is filled in: a size for every round there is, an empty one null. */
export interface MadeMotifDraft extends Omit<MadeMotifInput, 'sizes' | 'weighed' | 'putUp'> {
  sizes: { round: number; acrossMm: number | null }[];
  weighed: { count: number; massG: number | null; resolutionG: number; yarns: number };
  putUp: { massG: number | null; lengthM: number | null };
}

/** Its fields' ids begin with "made". */
export interface MadeMotifForm {
  made: MadeMotifDraft;
}

/** What is kept of a draft: the sizes that were taken, and the weight if there is one. */
export function madeMotifOf({ sizes, weighed, putUp, ...made }: MadeMotifDraft): MadeMotifInput {
  const isWeighed = weighed.massG !== null;
  const isPutUp = putUp.massG !== null && putUp.lengthM !== null;
  const isBegun = putUp.massG !== null || putUp.lengthM !== null;
  return {
    ...made,
    sizes: takenSizes({ sizes, ...made }) as MadeMotifInput['sizes'],
    weighed: isWeighed ? (weighed as MadeMotifInput['weighed']) : null,
    putUp: isPutUp || (isWeighed && isBegun) ? (putUp as MadeMotifInput['putUp']) : null,
  };
}

const takenSizes = ({ sizes, rounds }: Pick<MadeMotifDraft, 'sizes' | 'rounds'>) =>
  sizes.filter(({ round, acrossMm }) => acrossMm !== null && !isBeyond(round, rounds));

/** Whether a round was not worked; while the number of rounds cannot be read, none is. */
export const isBeyond = (round: number, rounds: number): boolean =>
  Number.isInteger(rounds) && round > rounds;

/** Says what is wrong with what would be kept, beside the fields of the draft. */
export const madeMotifForm = z
  .custom<MadeMotifForm>((form) => typeof form === 'object' && form !== null)
  .superRefine(({ made }, issues) => {
    const { error } = madeMotifInput.safeParse(madeMotifOf(made));
    for (const { path, message } of error?.issues ?? []) {
      issues.addIssue({ code: 'custom', path: ['made', ...placeInDraft(made, path)], message });
    }
  });

function placeInDraft(made: MadeMotifDraft, path: readonly PropertyKey[]): PropertyKey[] {
  const [field, index, ...rest] = path;
  if (field === 'putUp' && index === undefined) return ['putUp', 'massG'];
  const taken = field === 'sizes' && typeof index === 'number' && takenSizes(made)[index];
  return taken ? ['sizes', made.sizes.indexOf(taken), ...rest] : [...path];
}
