/**
 * Inks of the rounds in turn, on a light and on a dark ground; 4.5:1 on the grounds of both. Deep and
 * paler inks take turns, so that rounds beside one another stay apart to whoever sees fewer colours.
 */
export const CHART_INKS = [
  { light: '#10292d', dark: '#f6fbfa' },
  { light: '#08767f', dark: '#3fa3b4' },
  { light: '#5e1d0c', dark: '#fbcdb2' },
  { light: '#6a55b5', dark: '#9384e2' },
  { light: '#333106', dark: '#efe8a6' },
  { light: '#a84f24', dark: '#d8775a' },
] as const;

export type ChartInk = (typeof CHART_INKS)[number];

/** The ink of a round, or of the yarn it is worked in where the pattern names its yarns. */
export function inkOf(index: number): ChartInk {
  const count = CHART_INKS.length;
  return CHART_INKS[((index % count) + count) % count] as ChartInk;
}
