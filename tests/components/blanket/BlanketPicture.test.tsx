// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { renderToString } from 'react-dom/server';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { BlanketPicture } from '../../../src/components/blanket/BlanketPicture';
import {
  estimate,
  EXAMPLE_PLAN,
  READY_MOTIFS,
  readyMotif,
  type Motif,
  type Plan,
} from '../../../src/lib';
import { withBorder, withMotif } from '../../../src/lib/plan/edits';
import { stubWidth } from '../resizeObserver';

beforeEach(() => stubWidth(420));
afterEach(cleanup);

const picture = (plan: Plan) => (
  <BlanketPicture plan={plan} estimate={estimate(plan)} units="metric" maxHeightPx={560} />
);
const drawn = (plan: Plan) => render(picture(plan)).container;
const withKey = (key: string) => withMotif(EXAMPLE_PLAN, readyMotif(key, 4) as Motif);

describe('BlanketPicture', () => {
  it('says in words what it shows', () => {
    drawn(EXAMPLE_PLAN);
    expect(
      screen.getByRole('img', { name: /8 by 10 of classic group square, 114 × 142\scm finished/ }),
    ).toBeTruthy();
  });

  it.each(READY_MOTIFS.map(({ key }) => key))(
    'draws %s inside its own size, in real numbers',
    (key) => {
      const plan = withKey(key);
      const { size } = estimate(plan);
      const container = drawn(plan);
      expect(container.innerHTML).not.toMatch(/NaN|Infinity|undefined/);
      const inner = container.querySelector('svg svg');
      expect(inner?.getAttribute('viewBox')).toBe(`0 0 ${size.widthMm} ${size.heightMm}`);
    },
  );

  it('costs no more for a blanket of a hundred times the motifs', () => {
    const elements = (rows: number, columns: number) => {
      const plan: Plan = { ...EXAMPLE_PLAN, size: { by: 'grid', rows, columns } };
      return drawn(plan).querySelectorAll('svg svg *').length;
    };
    // A row is two elements, whatever it holds.
    expect(elements(10, 200)).toBe(elements(10, 2));
    expect(elements(100, 100) - elements(10, 10)).toBeLessThanOrEqual(2 * 90);
  });

  it('draws each border round in its colour, the outermost first', () => {
    const plan = withBorder(EXAMPLE_PLAN, 2, 'dc');
    const fills = [...drawn(plan).querySelectorAll('svg svg > g:first-child > rect')].map((rect) =>
      rect.getAttribute('fill'),
    );
    expect(fills).toEqual(['#e6d9c2', '#2f5d73']);
    expect(
      drawn(withBorder(EXAMPLE_PLAN, 0, 'sc')).querySelectorAll('svg svg > g:first-child > rect'),
    ).toHaveLength(0);
  });

  it('is the same text from the server and in the browser', () => {
    for (const { key } of READY_MOTIFS) {
      const plan = withKey(key);
      const onServer = document.createElement('div');
      onServer.innerHTML = renderToString(picture(plan));
      const numbers = (root: Element) =>
        [...root.querySelectorAll('svg svg [d]')].map((path) => path.getAttribute('d'));
      expect(numbers(drawn(plan))).toEqual(numbers(onServer));
      cleanup();
    }
  });
});
