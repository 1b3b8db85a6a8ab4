import { EDGES, LAYOUTS, layoutFacts, type Arrangement } from '../../src/lib/layout/layouts';

export const SQUARES: Arrangement = { layout: 'square', edge: 'toothed' };
export const HEXAGONS: Arrangement = { layout: 'offset-hexagons', edge: 'toothed' };

/** Every layout with every edge that it can have. */
export const ARRANGEMENTS: readonly Arrangement[] = LAYOUTS.flatMap((layout) =>
  EDGES.filter((edge) => edge === 'toothed' || layoutFacts(layout).hasTeeth).map((edge) => ({
    layout,
    edge,
  })),
);
