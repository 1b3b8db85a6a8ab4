import { showMass, showSize, showYarn, type Units } from '../../../lib/units/display';
import { mmToInches } from '../../../lib/units/conversion';
import type { Measurement, SwatchInput } from '../../../schemas/swatch';
import { codeWord, type Terms } from '../../planner/stitchWord';
import type { Wording } from '../form/differences';
import type { YarnChoice } from '../../../lib/swatches/swatchRecord';

const NB = '\u00a0';

/** A gauge is told over 10 cm or 4 in. */
export const GAUGE_SPAN = {
  metric: { mm: 100, words: `10${NB}cm` },
  imperial: { mm: 101.6, words: `4${NB}in` },
} as const;

/** How many of this width fit the span: `perSpan(7.5, 'metric')` is "13.3". */
export const perSpan = (widthMm: number, units: Units): string =>
  (GAUGE_SPAN[units].mm / widthMm).toFixed(1);

/** A very small dimension: "7.50 mm" or "0.295 in". */
export const showFine = (valueMm: number, units: Units): string =>
  `${fineFigure(valueMm, units)}${NB}${units === 'metric' ? 'mm' : 'in'}`;

export const fineFigure = (valueMm: number, units: Units): string =>
  units === 'metric' ? valueMm.toFixed(2) : mmToInches(valueMm).toFixed(3);

/** Yarn of one loop: "39.3 mm" or "1.55 in". */
export const showLoop = (valueMm: number, units: Units): string =>
  units === 'metric' ? `${valueMm.toFixed(1)}${NB}mm` : `${mmToInches(valueMm).toFixed(2)}${NB}in`;

const dayFormat = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
});

/** A calendar day: "30 Nov 2026". Also of the beginning of an ISO moment. */
export const showDay = (day: string): string =>
  dayFormat.format(new Date(`${day.slice(0, 10)}T00:00:00Z`));

export function measurementWords(measurement: Measurement, units: Units): string {
  if (measurement.kind === 'size') {
    const { widthMm, heightMm, blocked } = measurement;
    return `${showSize(widthMm, heightMm, units)} ${blocked ? 'blocked' : 'before blocking'}`;
  }
  return measurement.kind === 'weight'
    ? `${showMass(measurement.massG, 'metric')} on a scale to ${measurement.resolutionG}${NB}g`
    : `${showYarn(measurement.lengthM, units)} unravelled`;
}

/** Each part of a swatch in words, to compare two saves of it. */
export const swatchWording = (
  units: Units,
  terms: Terms,
  yarns: readonly YarnChoice[],
): Wording<SwatchInput> => [
  ['Name', ({ name }) => name],
  ['Yarn', ({ yarnId }) => yarns.find(({ id }) => id === yarnId)?.name ?? ''],
  ['Worked in', ({ stitch }) => codeWord(stitch, terms)],
  ['Stitches', ({ stitches }) => String(stitches)],
  ['Rows', ({ rows }) => String(rows)],
  ['Hook', ({ hookMm }) => (hookMm === null ? '' : `${hookMm}${NB}mm`)],
  ['Measured', ({ measurements }) => measurementsWords(measurements, units)],
  ['Notes', ({ notes }) => notes],
];

const measurementsWords = (measurements: Measurement[], units: Units): string =>
  measurements.map((each) => measurementWords(each, units)).join('; ');
