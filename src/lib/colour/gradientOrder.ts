import type { Plan } from '../plan/plan';
import { apart, perceived, type Perceived } from './perceived';

/**
 * Colourways in the order of a gradient: along the line, in OKLab, between the two that are
 * furthest apart, the lighter of these first.
 */
export function gradientOrder(plan: Plan, colourways: readonly number[]): number[] {
  const seen = colourways.map((colourway) => ({ colourway, colour: meanColour(plan, colourway) }));
  let ends = [seen[0], seen[0]];
  let furthest = -1;
  for (const one of seen) {
    for (const other of seen) {
      const distance = apart(one.colour, other.colour);
      if (distance > furthest) [furthest, ends] = [distance, [one, other]];
    }
  }
  const [one, other] = ends.toSorted(
    (left, right) => (right?.colour.l ?? 0) - (left?.colour.l ?? 0),
  );
  if (!one || !other) return [];
  const along = ({ l, a, b }: Perceived): number =>
    (l - one.colour.l) * (other.colour.l - one.colour.l) +
    (a - one.colour.a) * (other.colour.a - one.colour.a) +
    (b - one.colour.b) * (other.colour.b - one.colour.b);
  return seen
    .toSorted((left, right) => along(left.colour) - along(right.colour))
    .map(({ colourway }) => colourway);
}

/** The colour of a motif seen from far: its rounds, the outer ones more as they are longer. */
function meanColour(plan: Plan, colourway: number): Perceived {
  const rounds = plan.colourways[colourway]?.roundColours ?? [];
  let [l, a, b, all] = [0, 0, 0, 0];
  rounds.forEach((key, i) => {
    const colour = perceived(plan.colours.find((each) => each.key === key)?.hex ?? '#888888');
    const share = 2 * i + 1;
    l += share * colour.l;
    a += share * colour.a;
    b += share * colour.b;
    all += share;
  });
  return all === 0 ? perceived('#888888') : { l: l / all, a: a / all, b: b / all };
}
