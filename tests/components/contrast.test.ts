import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { themeColour } from '../../src/components/theme';

const css = readFileSync('src/styles/global.css', 'utf8');
type Oklch = readonly [lightness: number, chroma: number, hueDeg: number];
type Scheme = 'light' | 'dark';

function token(name: string, scheme: Scheme): Oklch {
  const pair = new RegExp(
    `--color-${name}: light-dark\\(oklch\\(([\\d. ]+)\\), oklch\\(([\\d. ]+)\\)\\)`,
  ).exec(css.replace(/\(\s+/g, '(').replace(/,\s+/g, ', ').replace(/\s+\)/g, ')'));
  const values = pair?.[scheme === 'light' ? 1 : 2]?.split(' ').map(Number);
  if (values?.length !== 3) throw new Error(`no token ${name} in ${scheme}`);
  return values as unknown as Oklch;
}

/** Oklab to linear sRGB: the matrices of CSS Color Module Level 4, section 10, clipped to the gamut. */
function linearRgb([lightness, chroma, hueDeg]: Oklch): [number, number, number] {
  const a = chroma * Math.cos((hueDeg * Math.PI) / 180);
  const b = chroma * Math.sin((hueDeg * Math.PI) / 180);
  const l = (lightness + 0.3963377774 * a + 0.2158037573 * b) ** 3;
  const m = (lightness - 0.1055613458 * a - 0.0638541728 * b) ** 3;
  const s = (lightness - 0.0894841775 * a - 1.291485548 * b) ** 3;
  const clip = (value: number) => Math.min(1, Math.max(0, value));
  return [
    clip(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s),
    clip(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s),
    clip(-0.0041960863 * l - 0.7034186147 * m + 1.707614701 * s),
  ];
}

function hex(colour: Oklch): string {
  const encode = (v: number) => (v <= 0.0031308 ? 12.92 * v : 1.055 * v ** (1 / 2.4) - 0.055);
  const byte = (v: number) =>
    Math.round(255 * encode(v))
      .toString(16)
      .padStart(2, '0');
  return `#${linearRgb(colour).map(byte).join('')}`;
}

/** WCAG 2.2, relative luminance and contrast ratio. */
function contrast(one: Oklch, other: Oklch): number {
  const luminance = (colour: Oklch) => {
    const [r, g, b] = linearRgb(colour);
    return 0.2126 * r + 0.7152 * g + 0.0722 * b;
  };
  const [dark, light] = [luminance(one), luminance(other)].sort((x, y) => x - y);
  return ((light ?? 0) + 0.05) / ((dark ?? 0) + 0.05);
}

const grounds = ['ground', 'surface', 'sunk'];
// published: WCAG 2.2, success criteria 1.4.3 (4.5:1 for text) and 1.4.11 (3:1 for what is drawn).
const TEXT = 4.5;
const DRAWN = 3;

const pairs: [colour: string, on: string, least: number][] = [
  ...['ink', 'ink-2', 'teal', 'teal-strong', 'madder'].flatMap((colour) =>
    grounds.map((on): [string, string, number] => [colour, on, TEXT]),
  ),
  ...['edge', 'card-edge'].flatMap((colour) =>
    grounds.map((on): [string, string, number] => [colour, on, DRAWN]),
  ),
  ['ink', 'teal-soft', TEXT],
  ['ink-2', 'teal-soft', TEXT],
  ['ink', 'amber-soft', TEXT],
  ['amber-ink', 'amber-soft', TEXT],
  ['amber-ink', 'sunk', DRAWN],
  ['ink', 'madder-soft', TEXT],
  ['madder', 'madder-soft', TEXT],
  ['on-teal', 'teal', TEXT],
  ['on-teal', 'teal-strong', TEXT],
  ['on-madder', 'madder', TEXT],
  ['on-madder', 'madder-strong', TEXT],
  ['surface', 'ink', TEXT],
];

describe.each<Scheme>(['light', 'dark'])('the colours in %s', (scheme) => {
  it.each(pairs)('%s on %s has a contrast of at least %s', (colour, on, least) => {
    expect(contrast(token(colour, scheme), token(on, scheme))).toBeGreaterThanOrEqual(least);
  });

  it('give the browser frame the colour of the header', () => {
    expect(themeColour[scheme]).toBe(hex(token('surface', scheme)));
  });
});

describe('the contrast of this test', () => {
  it('is 21 between black and white', () => {
    // published: WCAG 2.2, definition of contrast ratio.
    expect(contrast([0, 0, 0], [1, 0, 0])).toBeCloseTo(21, 2);
  });
});
