import { makingInput, makingSchema, type Making, type MakingInput } from '../../schemas/making';

/** What of a making this device keeps: marks not yet sent, and what the server said last. */
export interface DeviceMarks {
  readonly unsent: MakingInput;
  readonly seen: Making | null;
}

export const NO_MARKS: MakingInput = { ticks: [], weighings: [], order: null };

export const deviceKey = (blanketId: string): string => `ellwise.making.${blanketId}`;

/** What is stored may be of an older edition or edited by hand: what does not hold is left out. */
export function readMarks(blanketId: string): DeviceMarks {
  try {
    const stored = JSON.parse(localStorage.getItem(deviceKey(blanketId)) ?? '{}') as Partial<
      Record<keyof DeviceMarks, unknown>
    >;
    const unsent = makingInput.safeParse(stored.unsent);
    const seen = makingSchema.safeParse(stored.seen);
    return {
      unsent: unsent.success ? unsent.data : NO_MARKS,
      seen: seen.success ? seen.data : null,
    };
  } catch {
    return { unsent: NO_MARKS, seen: null };
  }
}

/** Whether the browser kept it; one without storage only cannot go on after it is closed offline. */
export function writeMarks(blanketId: string, marks: DeviceMarks): boolean {
  try {
    localStorage.setItem(deviceKey(blanketId), JSON.stringify(marks));
    return true;
  } catch {
    return false;
  }
}

/** Marks that were not among those sent: added, or changed, in the meantime. */
export function withoutSent(unsent: MakingInput, sent: MakingInput): MakingInput {
  const isSent = (mark: { at: string }, others: readonly { at: string }[]): boolean =>
    others.some((other) => JSON.stringify(other) === JSON.stringify(mark));
  return {
    ticks: unsent.ticks.filter((tick) => !isSent(tick, sent.ticks)),
    weighings: unsent.weighings.filter((weighing) => !isSent(weighing, sent.weighings)),
    order: JSON.stringify(unsent.order) === JSON.stringify(sent.order) ? null : unsent.order,
  };
}
