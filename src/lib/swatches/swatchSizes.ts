import type { SwatchMeasurement, SwatchSize } from './swatchRecord';

/**
 * The sizes that count: those taken after blocking where there are any, else those before.
 * Finished sizes follow the blocked fabric, so the two are never averaged together.
 */
export function swatchSizes(measurements: readonly SwatchMeasurement[]): SwatchSize[] {
  const sizes = measurements.filter((each) => each.kind === 'size');
  const blocked = sizes.filter((size) => size.blocked);
  return blocked.length > 0 ? blocked : sizes;
}
