import type { MotifSides } from '../motifs/motif';

/** The ways motifs can lie: each a plane map of faces that share sides and corners. */
export const LAYOUTS = [
  'square',
  'brick',
  'on-point',
  'large-and-small',
  'offset-hexagons',
  'triangles',
  'octagons',
] as const;
export type Layout = (typeof LAYOUTS)[number];

/** What the outline does where rows do not end alike: left as it is, or filled with half motifs. */
export const EDGES = ['toothed', 'straight'] as const;
export type Edge = (typeof EDGES)[number];

/** How the motifs of a blanket lie. */
export interface Arrangement {
  readonly layout: Layout;
  readonly edge: Edge;
}

export interface LayoutFacts {
  /** As a person chooses it: "offset rows". */
  readonly name: string;
  /** Shapes of its main motif. */
  readonly sides: readonly MotifSides[];
  /** Sides of the second motif that it needs between or beside the main ones, or null. */
  readonly secondSides: MotifSides | null;
  /** Whether half motifs can straighten its edge. */
  readonly hasTeeth: boolean;
  /** What `rows` and `columns` count: "motifs", or "blocks" where a block holds several. */
  readonly unit: 'motifs' | 'blocks';
}

const FACTS: Readonly<Record<Layout, LayoutFacts>> = {
  square: facts('square grid', [4, 0]),
  brick: facts('offset rows', [4], { hasTeeth: true }),
  'on-point': facts('on point', [4], { hasTeeth: true }),
  'large-and-small': facts('large and small', [4], { secondSides: 4, unit: 'blocks' }),
  'offset-hexagons': facts('hexagons', [6], { hasTeeth: true }),
  triangles: facts('triangles', [3], { hasTeeth: true }),
  octagons: facts('octagons and squares', [8], { hasTeeth: true, secondSides: 4 }),
};

function facts(
  name: string,
  sides: readonly MotifSides[],
  rest: Partial<LayoutFacts> = {},
): LayoutFacts {
  return { name, sides, secondSides: null, hasTeeth: false, unit: 'motifs', ...rest };
}

export const layoutFacts = (layout: Layout): LayoutFacts => FACTS[layout];

/** The layouts that motifs of this many sides can lie in, the usual one first. */
export const layoutsFor = (sides: MotifSides): Layout[] =>
  LAYOUTS.filter((layout) => FACTS[layout].sides.includes(sides));

/** The layout that motifs of this many sides are planned in unless another is chosen: `layoutFor(6)` is "offset-hexagons". */
export const layoutFor = (sides: MotifSides): Layout => layoutsFor(sides)[0] as Layout;
