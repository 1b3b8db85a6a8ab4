import { estimate } from '../ledger/estimate';
import type { Estimate, LedgerLine } from '../ledger/ledger';
import type { Plan, PlanSwatch } from '../plan/plan';
import type { Motif } from '../motifs/motif';
import type { StitchCode } from '../stitches/stitch';
import { joinFit } from './fit';
import type { Join } from './join';

/** What the yarn of a join goes into, summed from its ledger lines. */
export interface JoinYarn {
  /** By stitch, chains among them; the most worked first. */
  readonly stitches: readonly {
    readonly stitch: StitchCode;
    readonly count: number;
    readonly loops: number;
    readonly lengthM: number;
  }[];
  readonly sewnM: number;
  readonly tails: number;
  readonly tailsM: number;
}

/** One join tried on a plan. */
export interface JoinComparison {
  readonly join: Join;
  /** Yarn of the join itself, tails included, in metres. */
  readonly joinM: number;
  readonly yarn: JoinYarn;
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
  const onGrid = asGrid(plan);
  return joins.map((join): JoinComparison => {
    const result = estimate({ ...onGrid, join: { ...plan.join, key: join.key } });
    const { fits, words } = joinFit(join, plan.motifs[0] as Motif, result.sideStitches);
    const yarn = joinYarn(result);
    return {
      join,
      joinM: yarn.stitches.reduce((sum, { lengthM }) => sum + lengthM, yarn.sewnM + yarn.tailsM),
      yarn,
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

/**
 * The same for each of several hands on the one grid that the plan's own hand gives. Null is that
 * hand; a swatch is another's, of whose motifs nothing has been measured or weighed.
 */
export function compareTensions(
  plan: Plan,
  joins: readonly Join[],
  swatches: readonly (PlanSwatch | null)[],
): JoinComparison[][] {
  const onGrid = asGrid(plan);
  return swatches.map((swatch) =>
    compareJoins(swatch ? { ...onGrid, swatch, evidence: [], motifSideMm: null } : onGrid, joins),
  );
}

function asGrid(plan: Plan): Plan {
  if (plan.size.by === 'grid') return plan;
  const { rows, columns } = estimate(plan);
  return { ...plan, size: { by: 'grid', rows, columns } };
}

function joinYarn({ ledger }: Estimate): JoinYarn {
  const lines = ledger.filter(({ part }) => part === 'join');
  const tails = ledger.filter(({ part, label }) => part === 'tails' && label === 'join');
  const codes = [...new Set(lines.flatMap(({ stitch }) => (stitch === null ? [] : [stitch])))];
  const stitches = codes.map((stitch) => {
    const own = lines.filter((line) => line.stitch === stitch);
    return {
      stitch,
      count: total(own, 'count'),
      loops: total(own, 'loops'),
      lengthM: total(own, 'lengthM'),
    };
  });
  return {
    stitches: stitches.toSorted((left, right) => right.count - left.count),
    sewnM: total(
      lines.filter(({ stitch }) => stitch === null),
      'lengthM',
    ),
    tails: total(tails, 'count'),
    tailsM: total(tails, 'lengthM'),
  };
}

const total = (lines: readonly LedgerLine[], of: 'count' | 'loops' | 'lengthM'): number =>
  lines.reduce((sum, line) => sum + line[of], 0);
