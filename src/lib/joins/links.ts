import type { GridCounts } from '../layout/gridCounts';
import type { Layout } from '../layout/layouts';
import type { Plan } from '../plan/plan';

/**
 * How often a corner links to another in the whole blanket: once where two motifs meet on the outer
 * edge; inside, each corner after the first links once when gathered, and two pairs link across
 * when crossed (three corners of hexagons cannot cross and are gathered).
 *
 * Example: 10 × 8 squares crossed: 63 × 2 + 32 × 1 = 158; gathered: 63 × 3 + 32 = 221.
 */
export function cornerLinks(layout: Layout, counts: GridCounts, corners: Plan['corners']): number {
  const inside = layout === 'offset-hexagons' || corners === 'crossed' ? 2 : 3;
  return counts.insideJunctions * inside + counts.edgeJunctions;
}
