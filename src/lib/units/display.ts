import {
  gramsToOunces,
  METRES_PER_YARD,
  metresToYards,
  MM_PER_INCH,
  mmToInches,
} from './conversion';

export type Units = 'metric' | 'imperial';

/** No-break space: a figure stays with its unit. */
const NB = '\u00a0';

const grouped = (value: number, decimals: number): string =>
  new Intl.NumberFormat('en', { maximumFractionDigits: decimals }).format(value);

/** Yarn: `showYarn(1184.2, 'metric')` is "1,184 m"; under 10 it keeps a decimal. */
export function showYarn(lengthM: number, units: Units): string {
  return `${yarnFigure(lengthM, units)}${NB}${YARN_UNIT[units].word}`;
}

/** The figure of `showYarn` alone, for columns whose heading gives the unit. */
export function yarnFigure(lengthM: number, units: Units): string {
  const value = units === 'metric' ? lengthM : metresToYards(lengthM);
  return grouped(value, Math.abs(value) < 10 ? 1 : 0);
}

/** Fabric: `showFabric(1181, 'metric')` is "118 cm", `showFabric(142, 'imperial')` is "5.6 in". */
export function showFabric(widthMm: number, units: Units): string {
  return `${fabricFigure(widthMm, units)}${NB}${FABRIC_UNIT[units].word}`;
}

/** Two sides: `showSize(1181, 1472, 'metric')` is "118 × 147 cm". */
export const showSize = (widthMm: number, heightMm: number, units: Units): string =>
  `${fabricFigure(widthMm, units)} × ${showFabric(heightMm, units)}`;

function fabricFigure(widthMm: number, units: Units): string {
  const value = units === 'metric' ? widthMm / 10 : mmToInches(widthMm);
  return grouped(value, value < (units === 'metric' ? 30 : 20) ? 1 : 0);
}

/** Mass: `showMass(1242, 'metric')` is "1,242 g", `showMass(1242, 'imperial')` is "43.8 oz". */
export function showMass(massG: number, units: Units): string {
  return units === 'metric'
    ? `${grouped(massG, massG < 10 ? 1 : 0)}${NB}g`
    : `${grouped(gramsToOunces(massG), 1)}${NB}oz`;
}

/** Time: `showDuration(96_338)` is "27 h", `showDuration(2_700)` is "45 min". */
export function showDuration(durationS: number): string {
  const hours = durationS / 3600;
  return hours < 1.5 ? `${Math.round(durationS / 60)}${NB}min` : `${grouped(hours, 0)}${NB}h`;
}

/** Money: `showPrice(10_240, 'EUR')` is "€102.40", by the currency's own decimals (ISO 4217). */
export function showPrice(priceMinor: number, currency: string): string {
  return new Intl.NumberFormat('en', { style: 'currency', currency }).format(
    priceMinor / 10 ** currencyDecimals(currency),
  );
}

/** Decimals of a currency: 2 for EUR, 0 for JPY, 3 for KWD. */
export const currencyDecimals = (currency: string): number =>
  new Intl.NumberFormat('en', { style: 'currency', currency }).resolvedOptions()
    .maximumFractionDigits ?? 2;

/** Fabric field: the unit's word and how many mm one is. */
export const FABRIC_UNIT = {
  metric: { word: 'cm', mm: 10 },
  imperial: { word: 'in', mm: MM_PER_INCH },
} as const;

/** Yarn field: the unit's word and how many m one is. */
export const YARN_UNIT = {
  metric: { word: 'm', m: 1 },
  imperial: { word: 'yd', m: METRES_PER_YARD },
} as const;
