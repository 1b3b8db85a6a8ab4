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
import type { Layout } from '../../../src/lib/layout/layouts';
import { blanketFaces } from '../../../src/lib/plan/blanketFaces';
import { withLayout } from '../../../src/lib/plan/layoutEdits';
import { ARRANGEMENTS } from '../../support/arrangements';
import { stubWidth } from '../resizeObserver';

beforeEach(() => stubWidth(420));
afterEach(cleanup);

const picture = (plan: Plan) => (
  <BlanketPicture plan={plan} estimate={estimate(plan)} units="metric" maxHeightPx={560} />
);
const drawn = (plan: Plan) => render(picture(plan)).container;
const withKey = (key: string) => withMotif(EXAMPLE_PLAN, readyMotif(key, 4) as Motif);

const LAYOUT_KEYS: Record<Layout, string> = {
  square: 'group-square',
  brick: 'group-square',
  'on-point': 'group-square',
  'large-and-small': 'group-square',
  'offset-hexagons': 'hexagon',
  triangles: 'triangle',
  octagons: 'octagon',
};

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

  it('draws each colourway once, and every motif as a use of it', () => {
    const container = drawn(EXAMPLE_PLAN);
    const uses = [...container.querySelectorAll('svg svg > use')].map((use) =>
      use.getAttribute('href'),
    );
    expect(uses).toHaveLength(80);
    expect(new Set(uses).size).toBe(3);
  });

  it('paints a large blanket as one image: no more elements for a hundred times the motifs', () => {
    const elements = (rows: number, columns: number) => {
      const plan: Plan = { ...EXAMPLE_PLAN, size: { by: 'grid', rows, columns } };
      return drawn(plan).querySelectorAll('svg svg *').length;
    };
    expect(elements(100, 100)).toBeLessThan(elements(10, 10));
  });

  it.each(ARRANGEMENTS)('lays every motif of $layout, $edge, inside the blanket', (arrangement) => {
    const { layout } = arrangement;
    const key = LAYOUT_KEYS[layout];
    const plan = { ...withLayout(withKey(key), layout), edge: arrangement.edge };
    const { size } = estimate(plan);
    const { motifs } = blanketFaces(plan, estimate(plan));
    for (const { outlineMm } of motifs) {
      for (const [x, y] of outlineMm) {
        expect(x).toBeGreaterThan(0);
        expect(y).toBeGreaterThan(0);
        expect(x).toBeLessThan(size.widthMm);
        expect(y).toBeLessThan(size.heightMm);
      }
    }
    const halves = motifs.filter(({ face }) => /half|quarter|halves/i.test(face.slot));
    expect(drawn(plan).querySelectorAll('clipPath')).toHaveLength(halves.length);
  });

  it('draws each border round in its colour round the outer motifs, the outermost first', () => {
    const rounds = (plan: Plan) =>
      [...drawn(plan).querySelectorAll('svg svg > g:first-child > use')].map((use) =>
        use.getAttribute('stroke'),
      );
    expect(rounds(withBorder(EXAMPLE_PLAN, 2, 'dc'))).toEqual(['#e6d9c2', '#2f5d73']);
    expect(rounds(withBorder(EXAMPLE_PLAN, 0, 'sc'))).toEqual([]);
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
