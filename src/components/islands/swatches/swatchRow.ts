import type { SwatchYarnFindings } from '../../../lib/swatches/swatchYarn';
import type { SwatchGauge } from '../../../lib/swatches/swatchGauge';
import type { PresentedSwatch } from '../../../schemas/swatch';
import { findingsOf } from './SwatchFindings';
import type { YarnChoice } from '../../../lib/swatches/swatchRecord';
import { readableSwatch } from './swatchForm';

/** A swatch as the list shows it. */
export interface SwatchRow {
  swatch: PresentedSwatch;
  hex: string | null;
  gauge: SwatchGauge | null;
  yarn: SwatchYarnFindings | null;
}

export function swatchRow(swatch: PresentedSwatch, yarns: readonly YarnChoice[]): SwatchRow {
  const findings = findingsOf(readableSwatch(swatch, yarns));
  return {
    swatch,
    hex: yarns.find(({ id }) => id === swatch.yarnId)?.hex ?? null,
    gauge: findings?.gauge ?? null,
    yarn: findings?.yarn ?? null,
  };
}
