import { describe, expect, it } from 'vitest';
import { CHART_INKS } from '../../../src/lib/chart/inks';
import { themeColour } from '../../../src/components/theme';

/** WCAG 2.2, relative luminance. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const value = parseInt(hex.slice(at, at + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
const contrast = (one: string, other: string): number => {
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (light + 0.05) / (dark + 0.05);
};

describe('the inks of a chart', () => {
  // published: WCAG 2.2, 1.4.3; 4.5:1, though what is drawn needs only 3:1, for its lines are thin.
  it.each(
    CHART_INKS.flatMap(
      ({ light, dark }) =>
        [
          ['light', light],
          ['dark', dark],
        ] as const,
    ),
  )('stands out on the %s ground: %s', (scheme, ink) => {
    expect(contrast(ink, themeColour[scheme])).toBeGreaterThanOrEqual(4.5);
  });
});
