/** Ways to let colourways take turns by row and column, `width` motifs at a time. */
export const STRIPES = ['diagonals', 'rows', 'columns', 'checks'] as const;
export type Stripes = (typeof STRIPES)[number];

/** Which way a gradient goes. */
export const GRADIENT_WAYS = ['down', 'across', 'to the corner', 'outwards'] as const;
export type GradientWay = (typeof GRADIENT_WAYS)[number];

/** How colourways are placed where nothing is painted. Colourways are named by their number in the plan. */
export type PlacementRule =
  | { readonly by: Stripes; readonly width: number }
  /** A small arrangement that is repeated down and across. */
  | { readonly by: 'repeat'; readonly tile: readonly (readonly number[])[] }
  /** From the first of `order` to its last, mixed a little where one becomes the next. */
  | {
      readonly by: 'gradient';
      readonly towards: GradientWay;
      readonly order: readonly number[];
      readonly seed: number;
    }
  /** As many of each as of the others, or as `counts` has for each colourway of the plan, no two alike side by side. */
  | { readonly by: 'random'; readonly seed: number; readonly counts: readonly number[] | null };

/** So many motifs of a row in one colourway. */
export type PaintedRun = readonly [row: number, column: number, length: number, colourway: number];

/** A colourway for every motif: what is painted or locked stays, the rest follows the rule. */
export interface Placement {
  readonly rule: PlacementRule;
  readonly painted: readonly PaintedRun[];
  /** Colourways that lie only where they are painted: the rule leaves them out. */
  readonly byHand: readonly number[];
}

/** Colourways take turns along the diagonals. */
export const DIAGONALS: Placement = {
  rule: { by: 'diagonals', width: 1 },
  painted: [],
  byHand: [],
};
