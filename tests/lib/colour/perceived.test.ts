import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN, type Plan } from '../../../src/lib';
import { touchingColours } from '../../../src/lib/colour/contrast';
import { gradientOrder } from '../../../src/lib/colour/gradientOrder';
import { apart, mixed, perceived } from '../../../src/lib/colour/perceived';
import { blanketFaces } from '../../../src/lib/plan/blanketFaces';

describe('perceived', () => {
  it('is OKLab as published: white, and pure red', () => {
    // published: Ottosson 2020; red is L 0.628, a 0.225, b 0.126 (from memory)
    expect(perceived('#ffffff').l).toBeCloseTo(1, 4);
    const red = perceived('#ff0000');
    expect([red.l, red.a, red.b].map((value) => value.toFixed(3))).toEqual([
      '0.628',
      '0.225',
      '0.126',
    ]);
    expect(apart(red, red)).toBe(0);
  });

  it('mixes two colours, all of the first or none of it', () => {
    expect(mixed('#bf4630', '#10181a', 1)).toBe('#bf4630');
    expect(mixed('#bf4630', '#10181a', 0)).toBe('#10181a');
    expect(perceived(mixed('#ffffff', '#000000', 0.5)).l).toBeCloseTo(0.5, 2);
  });
});

const laid = (plan: Plan) => blanketFaces(plan, estimate(plan));

describe('touchingColours', () => {
  it('lists what lies side by side, the hardest to tell apart in grey first', () => {
    const pairs = touchingColours(EXAMPLE_PLAN, laid(EXAMPLE_PLAN));
    const named = pairs.map(({ colours }) => colours.join(' '));
    expect(named).toContain('c1 c2'); // the braid and the last rounds
    expect(named).not.toContain('c1 c5'); // Sloe is never outermost
    const lightness = pairs.map((pair) => pair.lightness);
    expect(lightness).toEqual(lightness.toSorted((a, b) => a - b));
  });

  it('has last rounds touch one another where the join adds nothing between them', () => {
    const seam: Plan = {
      ...EXAMPLE_PLAN,
      join: { key: 'slip-stitch', colour: 'c1' },
      colourways: EXAMPLE_PLAN.colourways.map((each, i) => ({
        ...each,
        roundColours: each.roundColours.map((key, j) => (j === 3 ? `c${i + 2}` : key)),
      })),
    };
    const named = touchingColours(seam, laid(seam)).map(({ colours }) => colours.join(' '));
    expect(named).toContain('c2 c3');
    expect(named).not.toContain('c1 c2');
  });
});

describe('gradientOrder', () => {
  it('goes from the lightest end to the other along the line between the furthest', () => {
    const greys = ['#202020', '#e0e0e0', '#808080', '#b0b0b0'];
    const plan: Plan = {
      ...EXAMPLE_PLAN,
      colours: greys.map((hex, i) => ({ key: `c${i + 1}`, name: hex, hex })),
      colourways: greys.map((_, i) => ({
        motifIndex: 0,
        roundColours: [0, 1, 2, 3].map(() => `c${i + 1}`),
      })),
    };
    expect(gradientOrder(plan, [0, 1, 2, 3])).toEqual([1, 3, 2, 0]);
  });
});
