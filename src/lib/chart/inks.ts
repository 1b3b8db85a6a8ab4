/** Inks of the rounds in turn, on a light and on a dark ground; 4.5:1 on the grounds of both. */
export const CHART_INKS = [
  { light: '#17353a', dark: '#e2eceb' },
  { light: '#0d6670', dark: '#6fc9cc' },
  { light: '#8a3a1e', dark: '#f0a581' },
  { light: '#4d3f86', dark: '#b7abf0' },
  { light: '#5d5a10', dark: '#cfc66a' },
] as const;

export type ChartInk = (typeof CHART_INKS)[number];

/** The ink of a round, or of the yarn it is worked in where the pattern names its yarns. */
export function inkOf(index: number): ChartInk {
  const count = CHART_INKS.length;
  return CHART_INKS[((index % count) + count) % count] as ChartInk;
}
