import { estimate } from '../ledger/estimate';
import type { Estimate } from '../ledger/ledger';
import type { Plan } from '../plan/plan';
import type { Motif } from '../motifs/motif';
import { joinFit } from './fit';
import type { Join } from './join';

/** One join tried on a plan. */
export interface JoinComparison {
  readonly join: Join;
  /** Yarn of the join itself, tails included, in metres. */
  readonly joinM: number;
  readonly totalM: number;
  readonly skeins: number;
  readonly seamMm: number;
  readonly widthMm: number;
  readonly heightMm: number;
  readonly tails: number;
  /** Time that the join adds to the motifs and border alone. */
  readonly durationS: number;
  readonly fits: boolean;
  readonly fitWords: string;
  readonly costMinor: number | null;
}

/**
 * Every join of `joins` tried on the same grid of the plan, with the plan's own hand and border.
 * A target size is turned into rows and columns first, so that only the join differs.
 */
export function compareJoins(plan: Plan, joins: readonly Join[]): JoinComparison[] {
  const { rows, columns } = estimate(plan);
  const onGrid: Plan = { ...plan, size: { by: 'grid', rows, columns } };
  return joins.map((join): JoinComparison => {
    const result = estimate({ ...onGrid, join: { ...plan.join, key: join.key } });
    const { fits, words } = joinFit(join, plan.motifs[0] as Motif, result.sideStitches);
    return {
      join,
      joinM: joinYarnM(result),
      totalM: result.totals.meanM,
      skeins: result.totals.skeins,
      seamMm: result.size.seamMm,
      widthMm: result.size.widthMm,
      heightMm: result.size.heightMm,
      tails: result.totals.tails,
      durationS: result.totals.joinDurationS,
      fits,
      fitWords: words,
      costMinor: result.totals.costMinor,
    };
  });
}

const joinYarnM = ({ ledger }: Estimate): number =>
  ledger.reduce(
    (sum, { part, label, lengthM }) =>
      part === 'join' || (part === 'tails' && label === 'join') ? sum + lengthM : sum,
    0,
  );
