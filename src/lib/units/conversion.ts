/**
 * Exact definitions, each derived from the one before where there is a chain.
 * Source: international yard and pound agreement of 1959, as in NIST Handbook 44, appendix C.
 */
export const METRES_PER_YARD = 0.9144;
export const MM_PER_INCH = (METRES_PER_YARD * 1000) / 36;
export const GRAMS_PER_POUND = 453.59237;
export const GRAMS_PER_OUNCE = GRAMS_PER_POUND / 16;
/** Gauge is published per four inches. */
export const GAUGE_SPAN_MM = 4 * MM_PER_INCH;

/** `metresToYards(0.9144)` is 1. */
export const metresToYards = (valueM: number): number => valueM / METRES_PER_YARD;
/** `yardsToMetres(219)` is 200.2536. */
export const yardsToMetres = (valueYd: number): number => valueYd * METRES_PER_YARD;
/** `mmToInches(25.4)` is 1. */
export const mmToInches = (valueMm: number): number => valueMm / MM_PER_INCH;
/** `inchesToMm(4)` is 101.6. */
export const inchesToMm = (valueIn: number): number => valueIn * MM_PER_INCH;
/** `gramsToOunces(28.349523125)` is 1. */
export const gramsToOunces = (valueG: number): number => valueG / GRAMS_PER_OUNCE;
/** `ouncesToGrams(3.5)` is 99.223 to three decimals; a label of "100 g / 3.5 oz" stays 100 g. */
export const ouncesToGrams = (valueOz: number): number => valueOz * GRAMS_PER_OUNCE;
