import type { Difference } from './ConflictDialog';

/** How each part of a thing is called and shown. */
export type Wording<Thing> = readonly (readonly [label: string, show: (thing: Thing) => string])[];

/** The parts in which two versions of a thing differ, as they are shown. */
export function differencesOf<Thing>(
  yours: Thing,
  theirs: Thing,
  wording: Wording<Thing>,
): Difference[] {
  return wording
    .map(([label, show]) => ({ label, yours: show(yours), theirs: show(theirs) }))
    .filter((difference) => difference.yours !== difference.theirs);
}
