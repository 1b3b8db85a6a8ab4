import type { Blanket } from '../../../db/models';
import { estimate } from '../../lib/ledger/estimate';
import type { BlanketFigures } from '../../schemas/blanket';
import { planSchema } from '../../schemas/plan';

/** A saved version never changes, so its figures are worked out once. */
const known = new Map<string, BlanketFigures | null>();
const MOST_KNOWN = 2_000;

/** The figures that head a blanket in a list; null for a plan that can no longer be estimated. */
export function blanketFigures(
  row: Pick<Blanket, 'id' | 'version' | 'plan'>,
): BlanketFigures | null {
  const key = `${row.id} ${row.version}`;
  const found = known.get(key);
  if (found !== undefined) return found;
  if (known.size >= MOST_KNOWN) known.clear();
  const figures = workOut(row.plan);
  known.set(key, figures);
  return figures;
}

function workOut(stored: unknown): BlanketFigures | null {
  const plan = planSchema.safeParse(stored);
  if (!plan.success) return null;
  const { rows, columns, size, totals } = estimate(plan.data);
  return {
    rows,
    columns,
    widthMm: size.widthMm,
    heightMm: size.heightMm,
    skeins: totals.skeins,
    meanM: totals.meanM,
    costMinor: totals.costMinor,
  };
}
