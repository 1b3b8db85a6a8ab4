import type { WeightCategory } from '../plan/plan';
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

/** A flat swatch as kept: its counts, every measurement of it, and its yarn when that is known. */
export interface SwatchRecord {
  readonly stitch: StitchCode;
  readonly stitches: number;
  readonly rows: number;
  readonly measurements: readonly SwatchMeasurement[];
  readonly yarn: SwatchYarn | null;
}
