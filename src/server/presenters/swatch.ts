import type { Swatch, SwatchMeasurement } from '../../../db/models';
import { measurementSchema, type Measurement, type PresentedSwatch } from '../../schemas/swatch';

/** A swatch loaded with its yarn and measurements. */
export function presentSwatch(row: Swatch): PresentedSwatch {
  return {
    id: row.id,
    version: row.version,
    updatedAt: row.updatedAt.toISOString(),
    name: row.name,
    yarnId: row.yarnId,
    yarnName: row.yarn?.name ?? null,
    stitch: row.stitch,
    stitches: row.stitches,
    rows: row.rows,
    hookMm: row.hookMm,
    notes: row.notes,
    measurements: (row.measurements ?? []).map(presentMeasurement),
  };
}

/** The columns that its kind fills; the database leaves the others null. */
function presentMeasurement(row: SwatchMeasurement): Measurement {
  const { id: _id, swatchId: _swatchId, position: _position, ...columns } = row.get();
  const filled = Object.entries(columns).filter(([, value]) => value !== null);
  return measurementSchema.parse(Object.fromEntries(filled));
}
