import { describe, expect, it } from 'vitest';
import { themeColour } from '../../../src/components/theme';
import { CHART_INKS, inkOf } from '../../../src/lib/chart/inks';
import { apart, contrast, VISIONS } from '../../support/colourVision';

const SCHEMES = ['light', 'dark'] as const;
/** Least distance of the inks of neighbouring rounds, in OKLab: ours; about 0.02 is just seen side by side. */
const APART = 0.15;

describe('the inks of a chart', () => {
  // published: WCAG 2.2, 1.4.3; 4.5:1, though what is drawn needs only 3:1, for its lines are thin.
  it.each(SCHEMES.flatMap((scheme) => CHART_INKS.map((ink) => [scheme, ink[scheme]] as const)))(
    'stands out on the %s ground: %s',
    (scheme, ink) => {
      expect(contrast(ink, themeColour[scheme])).toBeGreaterThanOrEqual(4.5);
    },
  );

  it.each(SCHEMES.flatMap((scheme) => VISIONS.map((vision) => [scheme, vision] as const)))(
    'keeps neighbouring rounds apart on the %s ground with %s vision',
    (scheme, vision) => {
      const distances = CHART_INKS.map((ink, i) =>
        apart(ink[scheme], inkOf(i + 1)[scheme], vision),
      );
      expect(Math.min(...distances)).toBeGreaterThanOrEqual(APART);
    },
  );
});
