import type { BorderRound, Plan } from '../plan/plan';
import type { BorderFix } from './borderFit';
import { mapSides, type Edging } from './edging';

/** The stitch that a round of an edging is as tall as, or nearly: its loops stand on sc. */
const heightStitch = ({ height }: Edging): string => (typeof height === 'string' ? height : 'sc');

/** The plan with an edging as its outermost round, in the colour of the round before or of the join. */
export const withEdging = (plan: Plan, edging: Edging): Plan =>
  withRounds(plan, [
    ...plan.border,
    {
      stitch: heightStitch(edging),
      colour: plan.border.at(-1)?.colour ?? plan.join.colour,
      edging,
    },
  ]);

/** The plan with a round of border taken out. */
export const withoutBorderRound = (plan: Plan, index: number): Plan =>
  withRounds(
    plan,
    plan.border.filter((_, i) => i !== index),
  );

/** The plan with a round of border moved one inwards (-1) or outwards (1). */
export function withMovedRound(plan: Plan, index: number, by: -1 | 1): Plan {
  const [round, other] = [plan.border[index], plan.border[index + by]];
  if (!round || !other) return plan;
  return withRounds(
    plan,
    plan.border.map((each, i) => (i === index ? other : i === index + by ? round : each)),
  );
}

/** The plan with a fix worked into the rounds before the edging at `index`. */
export function withBorderFix(plan: Plan, index: number, fix: BorderFix): Plan {
  const { border } = plan;
  const colour = (border[index - 1] ?? border[index])?.colour ?? plan.join.colour;
  const sc: BorderRound = { stitch: 'sc', colour };
  if (fix.kind === 'rounds')
    return withRounds(plan, border.toSpliced(index, 0, ...Array<BorderRound>(fix.count).fill(sc)));
  if (fix.inserted) return withRounds(plan, border.toSpliced(index, 0, { ...sc, adjust: fix.add }));
  return withRounds(
    plan,
    border.map((round, i) =>
      i === index - 1
        ? { ...round, adjust: mapSides(fix.add, (add, side) => add + (round.adjust?.[side] ?? 0)) }
        : round,
    ),
  );
}

const withRounds = (plan: Plan, border: readonly BorderRound[]): Plan => ({ ...plan, border });
