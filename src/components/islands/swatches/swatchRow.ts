import type { SwatchFigures } from '../../../lib/swatches/swatchFigures';
import type { YarnChoice } from '../../../lib/swatches/swatchRecord';
import type { PresentedSwatch } from '../../../schemas/swatch';
import { saveKey, type FiguresBySave } from './useSwatchFigures';

/** A swatch as the list shows it. */
export interface SwatchRow {
  swatch: PresentedSwatch;
  hex: string | null;
  figures: SwatchFigures | null;
}

export function swatchRow(
  swatch: PresentedSwatch,
  yarns: readonly YarnChoice[],
  figures: FiguresBySave,
): SwatchRow {
  return {
    swatch,
    hex: yarns.find(({ id }) => id === swatch.yarnId)?.hex ?? null,
    figures: figures[saveKey(swatch)] ?? null,
  };
}
