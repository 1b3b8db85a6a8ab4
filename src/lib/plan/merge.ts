import type { Plan } from './plan';

/** A part of a plan that is changed, kept or taken over as a whole. */
export type PlanPart = keyof Plan;

/** Which parts of two plans differ: `changedParts(plan, { ...plan, corners: 'gathered' })` is `['corners']`. */
export const changedParts = (from: Plan, to: Plan): PlanPart[] =>
  (Object.keys(to) as PlanPart[]).filter(
    (part) => JSON.stringify(from[part]) !== JSON.stringify(to[part]),
  );

/**
 * Two changes of one plan together, or null where both changed the same part, or where parts that
 * name each other's colours or rounds were changed apart.
 */
export function mergedPlan(base: Plan, mine: Plan, theirs: Plan): Plan | null {
  const myParts = changedParts(base, mine);
  const theirParts = changedParts(base, theirs);
  if (myParts.some((part) => theirParts.includes(part))) return null;
  const entwined: readonly PlanPart[] = [
    'colours',
    'motifs',
    'colourways',
    'join',
    'border',
    'evidence',
  ];
  const touches = (parts: readonly PlanPart[]): boolean =>
    parts.some((part) => part === 'colours' || part === 'motifs' || part === 'colourways');
  const shares = (parts: readonly PlanPart[]): boolean =>
    parts.some((part) => entwined.includes(part));
  if ((touches(myParts) && shares(theirParts)) || (touches(theirParts) && shares(myParts)))
    return null;
  return { ...theirs, ...Object.fromEntries(myParts.map((part) => [part, mine[part]])) };
}
