import type { Placement } from '../colour/placement';
import { colourwayGroups } from '../ledger/blanketOf';
import type { Colourway, Plan, PlanEvidence } from './plan';

/** The plan without one of its motifs and the colourways worked in it; pieces weighed of it go too. */
export function withoutMotif(plan: Plan, index: number): Plan {
  const renumbered = (i: number): number => (i > index ? i - 1 : i);
  const kept = plan.colourways.map(({ motifIndex }) => motifIndex !== index);
  return {
    ...plan,
    ...withColourways(plan, kept),
    motifs: plan.motifs.filter((_, i) => i !== index),
    secondMotif:
      plan.secondMotif === null || plan.secondMotif === index ? null : renumbered(plan.secondMotif),
    evidence: plan.evidence.flatMap((item): PlanEvidence[] =>
      item.piece !== 'motifs'
        ? [item]
        : item.motifIndex === index
          ? []
          : [{ ...item, motifIndex: renumbered(item.motifIndex) }],
    ),
    colourways: plan.colourways.flatMap((each, i): Colourway[] =>
      kept[i] ? [{ ...each, motifIndex: renumbered(each.motifIndex) }] : [],
    ),
  };
}

/**
 * The plan without one of its colourways; what was painted in it follows the rule again. The last
 * one of the main or of the second motif stays.
 */
export function withoutColourway(plan: Plan, index: number): Plan {
  const groups = Object.values(colourwayGroups(plan));
  if (groups.some((group) => group.length === 1 && group[0] === index)) return plan;
  const kept = plan.colourways.map((_, i) => i !== index);
  return { ...plan, ...withColourways(plan, kept) };
}

/** Colourways that are kept, and the placement with their new numbers. */
function withColourways(
  { colourways, placement }: Plan,
  kept: readonly boolean[],
): Pick<Plan, 'colourways' | 'placement'> {
  const newNumber = (i: number): number => kept.slice(0, i).filter(Boolean).length;
  return {
    colourways: colourways.filter((_, i) => kept[i]),
    placement: renumbered(placement, (i) => (kept[i] ? newNumber(i) : null)),
  };
}

function renumbered(
  { rule, painted, byHand }: Placement,
  to: (i: number) => number | null,
): Placement {
  const all = (colourways: readonly number[]): number[] => colourways.flatMap((i) => to(i) ?? []);
  return {
    byHand: all(byHand),
    painted: painted.flatMap(([row, column, length, colourway]) => {
      const now = to(colourway);
      return now === null ? [] : [[row, column, length, now] as const];
    }),
    rule:
      rule.by === 'repeat'
        ? { ...rule, tile: rule.tile.map((row) => row.map((i) => to(i) ?? 0)) }
        : rule.by === 'gradient'
          ? { ...rule, order: all(rule.order).length > 0 ? all(rule.order) : [0] }
          : rule.by === 'random' && rule.counts
            ? { ...rule, counts: null }
            : rule,
  };
}
