import type { SwatchRecord, YarnChoice } from '../../../lib/swatches/swatchRecord';
import { stitch } from '../../../lib/stitches/stitchTable';
import {
  measurementSchema,
  swatchRows,
  swatchStitches,
  type Measurement,
  type SwatchInput,
} from '../../../schemas/swatch';

/** How the program draws yarn whose colour it does not know. */
export const PLAIN_YARN = '#b9a58a';

/** A new swatch: the usual one of the trade, 4 in and a little more, still to be measured. */
export function blankSwatch(today: string): SwatchInput {
  return {
    name: '',
    yarnId: null,
    stitch: 'sc',
    stitches: 20,
    rows: 20,
    hookMm: null,
    notes: '',
    measurements: [blankMeasurement('size', today)],
  };
}

/** A swatch to look at and change: counted, measured and unravelled. */
export function exampleSwatch(today: string): SwatchInput {
  return {
    ...blankSwatch(today),
    name: 'Example: sc with a 5 mm hook',
    rows: 18,
    hookMm: 5,
    measurements: [
      { kind: 'size', measuredOn: today, widthMm: 150, heightMm: 124, blocked: false },
      { kind: 'size', measuredOn: today, widthMm: 152, heightMm: 125, blocked: false },
      { kind: 'length', measuredOn: today, lengthM: 31.2, errorM: 0.3 },
    ],
  };
}

/** A number not yet measured: an empty field, which the schema says is missing. */
const NOT_YET = null as unknown as number;

export function blankMeasurement(kind: Measurement['kind'], measuredOn: string): Measurement {
  if (kind === 'size') {
    return { kind, measuredOn, widthMm: NOT_YET, heightMm: NOT_YET, blocked: false };
  }
  if (kind === 'weight') return { kind, measuredOn, massG: NOT_YET, resolutionG: 1 };
  return { kind, measuredOn, lengthM: NOT_YET, errorM: NOT_YET };
}

/**
 * What can be worked out of a form that may be half filled: the swatch without the measurements
 * that are not complete, or null while even its counts are not.
 */
export function readableSwatch(
  values: SwatchInput,
  yarns: readonly YarnChoice[],
): SwatchRecord | null {
  const isCounted =
    swatchStitches.safeParse(values.stitches).success && swatchRows.safeParse(values.rows).success;
  if (!isCounted || !stitch(values.stitch)) return null;
  return {
    stitch: values.stitch,
    stitches: values.stitches,
    rows: values.rows,
    yarn: yarns.find(({ id }) => id === values.yarnId) ?? null,
    measurements: values.measurements.filter((each) => measurementSchema.safeParse(each).success),
  };
}
