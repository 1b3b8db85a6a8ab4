import type { PlanSwatch, WeightCategory } from '../plan/plan';
import type { StitchCode } from '../stitches/stitch';

export interface SwatchSize {
  readonly kind: 'size';
  readonly widthMm: number;
  readonly heightMm: number;
  readonly blocked: boolean;
}

export interface SwatchWeight {
  readonly kind: 'weight';
  readonly massG: number;
  readonly resolutionG: number;
}

export interface SwatchLength {
  readonly kind: 'length';
  readonly lengthM: number;
  readonly errorM: number;
}

export type SwatchMeasurement = SwatchSize | SwatchWeight | SwatchLength;

/** The yarn a swatch is worked in, as far as its numbers go. */
export interface SwatchYarn {
  readonly weightCategory: WeightCategory;
  readonly putUp: { readonly massG: number; readonly lengthM: number };
}

/** One's own yarn, to choose for a swatch. */
export interface YarnChoice extends SwatchYarn {
  readonly id: string;
  readonly name: string;
  /** Colour to draw a swatch of it in. */
  readonly hex: string | null;
}

/** One's own swatch that has a size, to take a gauge from. */
export interface GaugeSwatch {
  readonly id: string;
  readonly name: string;
  readonly swatch: PlanSwatch;
  /** Of the yarn it is worked in; null where that is not known. */
  readonly weightCategory: WeightCategory | null;
}

/** A flat swatch as kept: its counts, every measurement of it, and its yarn when that is known. */
export interface SwatchRecord {
  readonly stitch: StitchCode;
  readonly stitches: number;
  readonly rows: number;
  readonly measurements: readonly SwatchMeasurement[];
  readonly yarn: SwatchYarn | null;
}
