const small = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
] as const;

/** Counts up to twelve as words, the rest in figures: 7 is "seven", 14 is "14". */
export function countInWords(count: number): string {
  return small[count] ?? String(count);
}

const NO_BREAK = '\u00a0';

/**
 * A chance as a person reads it: whole per cents from 10 to 90, tenths outside, never "0 %" or "100 %".
 * `percentInWords(0.41)` is "41 %", `percentInWords(0.00004)` is "less than 0.1 %".
 */
export function percentInWords(probability: number): string {
  const percent = 100 * probability;
  if (percent < 0.05) return `less than 0.1${NO_BREAK}%`;
  if (percent > 99.95) return `more than 99.9${NO_BREAK}%`;
  const decimals = percent < 9.95 || percent >= 90 ? 1 : 0;
  return `${Number(percent.toFixed(decimals))}${NO_BREAK}%`;
}

export function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
