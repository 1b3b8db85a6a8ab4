import type { PlanSwatch, WeightCategory } from '../../../lib/plan/plan';
import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import { expectedStitchWidthMm, YARN_CATEGORIES } from '../../../lib/yarnCategories';
import type { Units } from '../../../lib/units/display';
import { GAUGE_SPAN, perSpan } from '../swatches/swatchWords';

export interface GaugeChoice {
  key: string;
  word: string;
  swatch: PlanSwatch | null;
  category: WeightCategory;
}

/** One's own swatches, then the usual gauge of each yarn weight. */
export function gaugeChoices(swatches: readonly GaugeSwatch[], units: Units): GaugeChoice[] {
  const span = GAUGE_SPAN[units].words;
  return [
    ...swatches.map(({ id, name, swatch, weightCategory }): GaugeChoice => ({
      key: id,
      word: `my swatch: ${name}`,
      swatch,
      category: weightCategory ?? 4,
    })),
    ...YARN_CATEGORIES.map(({ category, name }): GaugeChoice => ({
      key: `weight-${category}`,
      word: `${category} ${name} yarn: ${perSpan(expectedStitchWidthMm(category), units)} in ${span}`,
      swatch: null,
      category,
    })),
  ];
}
