import type { JoinComparison } from '../../lib/joins/compareJoins';
import { whyCheapest } from '../../lib/joins/whyCheapest';
import { whyInWords } from '../../lib/joins/whyInWords';
import type { PresentedComparison } from '../../schemas/compareJoins';

/** What one tension makes of the joins, with the reason in metric units and US terms. */
export function presentTension(
  swatch: number | null,
  comparisons: readonly JoinComparison[],
): PresentedComparison['tensions'][number] {
  const why = whyCheapest(comparisons);
  return {
    swatch,
    joins: comparisons.map(({ join: { key, name, openness }, yarn: _, ...figures }) => ({
      key,
      name,
      openness,
      ...figures,
    })),
    why: why && whyInWords(why, 'metric', 'us'),
  };
}
