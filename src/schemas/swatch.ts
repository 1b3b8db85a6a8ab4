import * as z from './zod';
import {
  counted,
  day,
  flag,
  line,
  list,
  measured,
  measuredOrZero,
  moment,
  name,
  notes,
  strict,
  uuid,
  version,
} from './fields';
import { KEPT_LIMITS, PLAN_LIMITS, POSSIBLE } from './limits';
import { checkStitchSize } from './possible';
import { knownStitch } from './stitchCounts';

export const swatchStitches = counted('Stitches across the swatch', 1, PLAN_LIMITS.swatchStitches);
export const swatchRows = counted('Rows of the swatch', 1, PLAN_LIMITS.swatchRows);
export const swatchWidthMm = measured('Width of the swatch', 'mm', PLAN_LIMITS.swatchSizeMm);
export const swatchHeightMm = measured('Height of the swatch', 'mm', PLAN_LIMITS.swatchSizeMm);
export const pieceMassG = measured(
  'Yarn weighed',
  'g',
  PLAN_LIMITS.pieceMassG,
  POSSIBLE.leastPieceMassG,
);
export const scaleResolutionG = measured(
  'Step of the scale',
  'g',
  PLAN_LIMITS.skeinMassG,
  POSSIBLE.leastScaleStepG,
);
export const pieceLengthM = measured(
  'Yarn unravelled',
  'm',
  PLAN_LIMITS.pieceLengthM,
  POSSIBLE.leastPieceLengthM,
);
export const lengthErrorM = measuredOrZero('Error of the length', 'm', PLAN_LIMITS.pieceLengthM);

/** A swatch can be measured again and again: its size, before and after blocking, and its yarn. */
export const measurementSchema = z.discriminatedUnion(
  'kind',
  [
    strict('Measurement', {
      kind: z.literal('size'),
      measuredOn: day,
      widthMm: swatchWidthMm,
      heightMm: swatchHeightMm,
      blocked: flag('Blocked'),
    }),
    strict('Measurement', {
      kind: z.literal('weight'),
      measuredOn: day,
      massG: pieceMassG,
      resolutionG: scaleResolutionG,
    }),
    strict('Measurement', {
      kind: z.literal('length'),
      measuredOn: day,
      lengthM: pieceLengthM,
      errorM: lengthErrorM,
    }),
  ],
  { error: 'Measurement must be of a kind: size, weight or length' },
);
export type Measurement = z.output<typeof measurementSchema>;

const swatchFields = {
  name: name('Swatch name'),
  yarnId: uuid.nullable(),
  stitch: knownStitch,
  stitches: swatchStitches,
  rows: swatchRows,
  hookMm: measured('Hook', 'mm', KEPT_LIMITS.hookMm).nullable(),
  notes: notes('Notes', KEPT_LIMITS.notesLength),
  measurements: list('Measurements', measurementSchema, 0, KEPT_LIMITS.measurementsPerSwatch),
};

export type SwatchInput = z.output<z.ZodObject<typeof swatchFields>>;
export const swatchInput = strict('Swatch', swatchFields).superRefine(checkSizes);
export const swatchUpdate = strict('Swatch', { ...swatchFields, version }).superRefine(checkSizes);

function checkSizes(swatch: SwatchInput, issues: z.RefinementCtx): void {
  swatch.measurements.forEach((measurement, index) => {
    if (measurement.kind === 'size') {
      checkStitchSize(swatch, measurement, issues, ['measurements', index]);
    }
  });
}

export const swatchSchema = z.strictObject({
  id: z.uuid(),
  version,
  updatedAt: moment,
  ...swatchFields,
  yarnName: line('Yarn name', PLAN_LIMITS.nameLength).nullable(),
});
export type PresentedSwatch = z.output<typeof swatchSchema>;
