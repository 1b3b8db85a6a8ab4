// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { RuledFrame } from '../../../src/components/ui/RuledFrame';
import { stubWidth } from '../resizeObserver';

beforeEach(() => stubWidth(400));
afterEach(cleanup);

function draw(props: Partial<Parameters<typeof RuledFrame>[0]> = {}) {
  render(
    <RuledFrame widthMm={1180} heightMm={1470} units="metric" label="Blanket" {...props}>
      <rect width="1180" height="1470" />
    </RuledFrame>,
  );
  const frame = screen.getByRole('img');
  const inner = frame.querySelector('svg');
  const px = (name: string) => Number(inner?.getAttribute(name));
  return { frame, inner, px };
}

describe('RuledFrame', () => {
  it('gives its content the millimetres of the thing itself', () => {
    expect(draw().inner?.getAttribute('viewBox')).toBe('0 0 1180 1470');
  });

  it('draws both directions at the same scale, in the width it has', () => {
    const { px } = draw();
    expect(px('width') / 1180).toBeCloseTo(px('height') / 1470, 9);
    expect(px('x') + px('width')).toBeLessThanOrEqual(400);
  });

  it('draws a tall thing smaller rather than taller than it may be', () => {
    const { px } = draw({ maxHeightPx: 200 });
    expect(px('y') + px('height')).toBeLessThanOrEqual(200);
    expect(px('width') / 1180).toBeCloseTo(px('height') / 1470, 9);
  });

  it('ends both rules with the size in the units of the person', () => {
    expect(draw().frame.textContent).toContain('118');
    cleanup();
    expect(draw({ units: 'imperial' }).frame.textContent).toMatch(/^in.*46\.5.*58$/);
  });
});
