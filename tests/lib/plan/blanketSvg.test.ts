// @vitest-environment jsdom
import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN } from '../../../src/lib';
import { blanketSvg } from '../../../src/lib/plan/blanketSvg';
import { withLayout } from '../../../src/lib/plan/layoutEdits';

const drawn = (plan: typeof EXAMPLE_PLAN) =>
  new DOMParser().parseFromString(blanketSvg(plan, estimate(plan)), 'image/svg+xml');

describe('blanketSvg', () => {
  it('is to scale in millimetres, each colourway once and every motif a use of it', () => {
    const svg = drawn(EXAMPLE_PLAN);
    const { size } = estimate(EXAMPLE_PLAN);
    expect(svg.querySelector('parsererror')).toBeNull();
    expect(parseFloat(svg.documentElement.getAttribute('width') ?? '')).toBeCloseTo(
      size.widthMm,
      1,
    );
    expect(svg.querySelectorAll('defs > g')).toHaveLength(3);
    expect(svg.querySelectorAll('use')).toHaveLength(80);
    // nothing that only a browser understands
    expect(svg.documentElement.outerHTML).not.toMatch(/color-mix|class=|NaN|undefined/);
  });

  it('cuts half motifs to their outline', () => {
    const svg = drawn({ ...withLayout(EXAMPLE_PLAN, 'brick'), edge: 'straight' });
    expect(svg.querySelectorAll('clipPath')).toHaveLength(10);
  });
});
