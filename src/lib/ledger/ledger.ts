import type { FitResult } from '../joins/fit';
import type { GridCounts } from '../layout/gridCounts';
import type { Arrangement } from '../layout/layouts';
import type { MotifGeometry } from '../motifs/geometry';
import type { StitchCode } from '../stitches/stitch';

/** The parts that a blanket's yarn goes into, in the order they are worked. */
export const PARTS = ['rounds', 'join', 'border', 'tails', 'allowance'] as const;
export type Part = (typeof PARTS)[number];

/** Where the yarn per loop of a line comes from. */
export type LoopSource =
  /** A piece with this stitch was measured. */
  | 'measured'
  /** Other stitches of this maker were measured. */
  | 'carried over'
  /** Published proportions and the stitch width alone. */
  | 'published'
  /** The line is not made of loops. */
  | 'not loops';

/** One line of the ledger: what is worked, how much yarn that is, and why. */
export interface LedgerLine {
  readonly colour: string;
  readonly part: Part;
  /** What is worked: "Rnd 2", "Single crochet ridge", "Border round 1". */
  readonly label: string;
  /** Null for tails, sewn seams and the allowance. */
  readonly stitch: StitchCode | null;
  readonly count: number;
  readonly loopsEach: number;
  readonly loops: number;
  /** Yarn of one loop in mm; of one tail or one metre of seam where there are no loops. */
  readonly eachMm: number;
  readonly lengthM: number;
  /** This line's share of the variance of its colour. */
  readonly varianceM2: number;
  readonly source: LoopSource;
}

export interface ColourEstimate {
  readonly colour: string;
  readonly meanM: number;
  readonly sdM: number;
  /** What to own so that it suffices with the plan's confidence. */
  readonly neededM: number;
  readonly neededG: number;
  readonly skeins: number;
  /** Chance of running short with `skeins`, and with one more and fewer around it. */
  readonly chances: readonly { readonly skeins: number; readonly probabilityShort: number }[];
  readonly costMinor: number | null;
}

/** What makes the total uncertain. */
export const CAUSES = ['hand', 'stitch', 'sewing', 'motifs', 'tails', 'skeins'] as const;
export type Cause = (typeof CAUSES)[number];

export interface UncertaintyShare {
  readonly cause: Cause;
  readonly varianceM2: number;
  /** Share of the whole variance, 0 to 1. */
  readonly share: number;
}

/** A measurement not yet made, and what it would be worth. */
export interface NextMeasurement {
  readonly kind:
    'weigh the swatch' | 'unravel the swatch' | 'weigh motifs together' | 'read a finer scale';
  /** Motifs on the scale; 0 for a swatch. */
  readonly motifs: number;
  readonly resolutionG: number;
  /** Safety margin over the mean at the plan's confidence (at 80 % where that is lower), now and then. */
  readonly marginNow: number;
  readonly marginThen: number;
  readonly skeinsNow: number;
  readonly skeinsThen: number;
  /** Colours that would need fewer skeins. */
  readonly fewer: readonly {
    readonly colour: string;
    readonly now: number;
    readonly then: number;
  }[];
}

/** Something a person should know before trusting the figures. */
export interface Notice {
  readonly code: string;
  readonly severity: 'question' | 'note' | 'caution';
  readonly message: string;
}

export interface FinishedSize {
  readonly widthMm: number;
  readonly heightMm: number;
  readonly widthSdMm: number;
  readonly heightSdMm: number;
  readonly seamMm: number;
  /** Rounds that the join adds outside the outermost motifs, on one side. */
  readonly edgeMm: number;
  readonly borderMm: number;
}

export interface Estimate extends Arrangement {
  readonly rows: number;
  readonly columns: number;
  readonly counts: GridCounts;
  /** Whole motifs in each colourway of the plan. */
  readonly colourwayMotifs: readonly number[];
  readonly size: FinishedSize;
  readonly stitchWidthMm: number;
  readonly motifs: readonly MotifGeometry[];
  readonly fit: FitResult;
  /** Stitches between corner centres that the join works with. */
  readonly sideStitches: number;
  readonly colours: readonly ColourEstimate[];
  readonly parts: readonly {
    readonly part: Part;
    readonly colour: string;
    readonly lengthM: number;
  }[];
  readonly ledger: readonly LedgerLine[];
  readonly uncertainty: readonly UncertaintyShare[];
  readonly next: readonly NextMeasurement[];
  readonly notices: readonly Notice[];
  readonly totals: {
    readonly meanM: number;
    readonly sdM: number;
    readonly marginFraction: number;
    readonly skeins: number;
    readonly stitches: number;
    readonly tails: number;
    /** Working time, and the part of it that is the join and its tails. */
    readonly durationS: number;
    readonly joinDurationS: number;
    readonly massG: number;
    readonly costMinor: number | null;
  };
}
