import type { Edging, FourSides } from '../border/edging';
import type { Placement } from '../colour/placement';
import type { Edge, Layout } from '../layout/layouts';
import type { Motif } from '../motifs/motif';
import type { StitchCode, StitchCounts } from '../stitches/stitch';
import type { LengthM, MassG, PriceMinor, WidthMm } from '../units/quantities';

/** Published yarn weight category, 0 lace to 7 jumbo. */
export type WeightCategory = 0 | 1 | 2 | 3 | 4 | 5 | 6 | 7;

export interface PutUp {
  readonly massG: MassG;
  readonly lengthM: LengthM;
}

export interface PlanYarn {
  readonly name: string;
  readonly weightCategory: WeightCategory;
  readonly putUp: PutUp;
  /** Price of one skein, null when not known. */
  readonly price: { readonly priceMinor: PriceMinor; readonly currency: string } | null;
}

export interface PlanColour {
  /** Short address inside the plan: "c1". */
  readonly key: string;
  readonly name: string;
  /** sRGB "#rrggbb", for drawing only. */
  readonly hex: string;
}

/** A flat piece worked to find the gauge. */
export interface PlanSwatch {
  readonly stitch: StitchCode;
  readonly stitches: number;
  readonly rows: number;
  readonly widthMm: WidthMm;
  readonly heightMm: WidthMm;
}

/** How much yarn a piece took: weighed, or unravelled and measured. */
export type YarnReading =
  | { readonly by: 'weighing'; readonly massG: MassG; readonly resolutionG: MassG }
  | { readonly by: 'unravelling'; readonly lengthM: LengthM; readonly errorM: LengthM };

/** A weighed or unravelled piece: the plan's swatch, some of its motifs, or any counted piece. */
export type PlanEvidence = { readonly reading: YarnReading } & (
  | { readonly piece: 'swatch' }
  | { readonly piece: 'motifs'; readonly count: number; readonly motifIndex: number }
  | {
      readonly piece: 'counted';
      readonly label: string;
      readonly made: StitchCounts;
      readonly tails: number;
    }
);

export interface Colourway {
  /** Which of `motifs` is worked in these colours. */
  readonly motifIndex: number;
  /** Colour key of each round of that motif. */
  readonly roundColours: readonly string[];
}

export type PlanSize =
  | { readonly by: 'grid'; readonly rows: number; readonly columns: number }
  | {
      readonly by: 'target';
      readonly widthMm: WidthMm;
      readonly heightMm: WidthMm;
      readonly rule: 'nearest' | 'at-least';
    };

export interface BorderRound {
  /** Worked in every stitch; of an edging the stitch that stands for its height. */
  readonly stitch: StitchCode;
  readonly colour: string;
  /** Worked from a text of its own instead. */
  readonly edging?: Edging;
  /** More stitches, or fewer, along each side of the blanket than there are below. */
  readonly adjust?: FourSides;
}

/** Chance of not running short, for each colour. */
export const CONFIDENCES = [0.5, 0.8, 0.9, 0.95, 0.99] as const;
export type Confidence = (typeof CONFIDENCES)[number];

/** Everything an estimate depends on. */
export interface Plan {
  readonly yarn: PlanYarn;
  readonly colours: readonly PlanColour[];
  readonly swatch: PlanSwatch | null;
  readonly evidence: readonly PlanEvidence[];
  readonly motifs: readonly Motif[];
  readonly colourways: readonly Colourway[];
  /** Measured side of a finished motif (flat to flat for a hexagon, across for a circle); null to compute it. */
  readonly motifSideMm: WidthMm | null;
  readonly size: PlanSize;
  /** How the motifs lie; null as motifs of this shape usually do. */
  readonly layout: Layout | null;
  readonly edge: Edge;
  /** Which of `motifs` lies in the second places of a layout that has them, else null. */
  readonly secondMotif: number | null;
  /** Which colourway lies where. */
  readonly placement: Placement;
  readonly join: { readonly key: string; readonly colour: string };
  readonly corners: 'gathered' | 'crossed';
  readonly border: readonly BorderRound[];
  readonly confidence: Confidence;
  /** The maker's own timing; null takes the program's. */
  readonly secondsPerMove: number | null;
}

/** The main motif of a plan: the first that does not lie in second places. */
export const mainMotif = ({ motifs, secondMotif }: Pick<Plan, 'motifs' | 'secondMotif'>): Motif =>
  motifs.find((_, i) => i !== secondMotif) as Motif;
