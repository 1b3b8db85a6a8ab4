import { toCsv } from '../../lib/csv/toCsv';
import type { JoinComparison } from '../../lib/joins/compareJoins';

/** Joins as CSV: a line for each join of each tension. */
export const joinsCsv = (
  compared: readonly { tension: string; rows: readonly JoinComparison[] }[],
): string =>
  toCsv(
    [
      'tension',
      'join',
      'fits',
      'join_m',
      'all_m',
      'skeins',
      'seam_mm',
      'width_mm',
      'height_mm',
      'tails',
      'time_s',
      'cost_minor',
      'openness',
    ],
    compared.flatMap(({ tension, rows }) =>
      rows.map((row) => [
        tension,
        row.join.name,
        row.fits ? 'yes' : 'no',
        row.joinM,
        row.totalM,
        row.skeins,
        row.seamMm,
        row.widthMm,
        row.heightMm,
        row.tails,
        row.durationS,
        row.costMinor,
        row.join.openness,
      ]),
    ),
  );
