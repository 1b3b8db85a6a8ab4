import { readFileSync } from 'node:fs';
import type { Download, Page } from '@playwright/test';
import { motifOf, motifGeometry, gaugeOf, readPattern, READY_PATTERNS } from '../../src/lib';
import { growingSquare } from '../bench/growingSquare';
import { expectAccessible, expectNoSidewaysScroll, expectTouchable } from './support/axe';
import { open } from './support/open';
import { expect, test } from './support/test';

const [PATTERN] = READY_PATTERNS;
if (!PATTERN) throw new Error('There is no ready pattern.');
const reading = readPattern(PATTERN.text, { terms: 'us', sides: PATTERN.sides });
const ringCount = Object.values(reading.ring.made).reduce((sum, count) => sum + count, 0);
const stitchCount = reading.rounds.reduce((sum, { stitches }) => sum + stitches.length, ringCount);

const chart = (page: Page) => page.getByRole('group', { name: /^Chart of / });
const drawing = (page: Page) => chart(page).locator('svg.keeps-colour');
const said = (page: Page) => page.getByRole('region', { name: 'Chart' }).locator('[aria-live]');
const zoomBar = (page: Page, name: string) => page.getByRole('button', { name, exact: true });
const viewBox = async (page: Page): Promise<number[]> =>
  ((await drawing(page).getAttribute('viewBox')) ?? '').split(' ').map(Number);
const widthMm = async (page: Page): Promise<number> => (await viewBox(page))[2] ?? NaN;
const litText = (page: Page) => page.locator('[data-begin].bg-amber\\/45');

/** The page with a pattern in it; on a phone its chart. */
async function openChart(page: Page, name = PATTERN?.name ?? '', text = PATTERN?.text ?? '') {
  const draft = { name, text, terms: 'us', sides: PATTERN?.sides };
  await page.addInitScript(
    (stored) => localStorage.setItem('ellwise.pattern', stored),
    JSON.stringify(draft),
  );
  await open(page, '/motifs/read');
  const panel = page.getByRole('radio', { name: 'Chart', exact: true });
  if (await panel.isVisible()) await panel.click();
  await expect(chart(page)).toBeVisible();
  await chart(page).scrollIntoViewIfNeeded();
}

/** Where a point of the drawing, in mm from its middle, is on the screen. */
const onScreen = (page: Page, xMm: number, yMm: number): Promise<[number, number]> =>
  drawing(page).evaluate(
    (svg, [x = 0, y = 0]): [number, number] => {
      const at = new DOMPoint(x, y).matrixTransform((svg as SVGSVGElement).getScreenCTM() ?? {});
      return [at.x, at.y];
    },
    [xMm, yMm],
  );

async function saved(page: Page, item: RegExp): Promise<Download> {
  await page.getByRole('button', { name: 'Download' }).click();
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('menuitem', { name: item }).click(),
  ]);
  return download;
}

test('a stitch is walked to with the keyboard, marked, said and lit in the text', async ({
  page,
}) => {
  await openChart(page);
  await chart(page).focus();
  await page.keyboard.press('ArrowLeft');
  await expect(said(page)).toContainText(/^Rnd 1, 1 of \d+: ch/);
  await expect(said(page)).toHaveAttribute('aria-live', 'polite');
  const mark = drawing(page).locator('path').first();
  const before = await mark.getAttribute('d');
  expect(before).not.toBe('');
  await page.keyboard.press('ArrowUp');
  await expect(said(page)).toContainText(/^Rnd 2/);
  await expect(mark).not.toHaveAttribute('d', before ?? '');
  await expect(litText(page)).not.toHaveCount(0);
  await page.keyboard.press('Escape');
  await expect(said(page)).toContainText('Point at a stitch');
  await expect(litText(page)).toHaveCount(0);
});

test(
  'pointing at the chart lights the text, and the other way round',
  { tag: '@desktop' },
  async ({ page }) => {
    await openChart(page);
    // The ring lies in the middle of the chart.
    const [x, y] = await onScreen(page, 0, -0.57 * gaugeOf(null, 4).stitchWidthMm);
    await page.mouse.move(x, y);
    await expect(said(page)).toContainText('Foundation');
    await expect(litText(page).first()).toHaveText(/ch 4/i);
    await page.mouse.move(0, 0);
    await expect(litText(page)).toHaveCount(0);

    const mark = drawing(page).locator('path').first();
    await expect(mark).toHaveAttribute('d', '');
    await page.getByLabel('Pattern text').focus();
    await page.getByLabel('Pattern text').evaluate((field: HTMLTextAreaElement) => {
      const at = field.value.indexOf('3 dc in ring') + 1;
      field.setSelectionRange(at, at);
    });
    await page.keyboard.press('ArrowRight');
    await expect(mark).not.toHaveAttribute('d', '');
  },
);

test('a tap says the stitch', { tag: '@touch' }, async ({ page }) => {
  await openChart(page);
  const [x, y] = await onScreen(page, 0, -0.57 * gaugeOf(null, 4).stitchWidthMm);
  await page.touchscreen.tap(x, y);
  await expect(said(page)).toContainText('Foundation');
});

test(
  'it is looked at closer and farther with buttons and wheel, and moved by dragging',
  { tag: '@desktop' },
  async ({ page }) => {
    await openChart(page);
    const whole = await widthMm(page);
    await zoomBar(page, 'Closer').click();
    await expect.poll(() => widthMm(page)).toBeCloseTo(whole / 1.5, 3);
    await zoomBar(page, 'Farther').click();
    await expect.poll(() => widthMm(page)).toBeCloseTo(whole, 3);

    // What is under the pointer stays there.
    const at = await onScreen(page, 20, -30);
    await page.mouse.move(...at);
    await page.keyboard.down('Control');
    await page.mouse.wheel(0, -100);
    await page.keyboard.up('Control');
    await expect.poll(() => widthMm(page)).toBeLessThan(whole / 2);
    const after = await onScreen(page, 20, -30);
    expect(Math.hypot(after[0] - at[0], after[1] - at[1])).toBeLessThan(1);

    await page.mouse.down();
    await page.mouse.move(at[0] - 40, at[1] - 25, { steps: 4 });
    await page.mouse.up();
    const dragged = await onScreen(page, 20, -30);
    expect(dragged[0] - at[0]).toBeCloseTo(-40, 0);
    expect(dragged[1] - at[1]).toBeCloseTo(-25, 0);

    await zoomBar(page, 'Whole').click();
    await expect.poll(() => widthMm(page)).toBeCloseTo(whole, 3);
  },
);

test('two fingers pinch it closer', { tag: '@touch' }, async ({ page }) => {
  await openChart(page, 'Twelve rounds', growingSquare(12, 'repeated'));
  const whole = await widthMm(page);
  const [x, y] = await onScreen(page, 0, 0);
  const session = await page.context().newCDPSession(page);
  const touch = (type: 'touchStart' | 'touchMove' | 'touchEnd', apart: number) =>
    session.send('Input.dispatchTouchEvent', {
      type,
      touchPoints:
        type === 'touchEnd'
          ? []
          : [
              { x: x - apart, y, id: 0 },
              { x: x + apart, y, id: 1 },
            ],
    });
  await touch('touchStart', 20);
  for (const apart of [30, 45, 60, 80]) await touch('touchMove', apart);
  await touch('touchEnd', 80);
  await expect.poll(() => widthMm(page)).toBeLessThan(whole / 2);
  const after = await onScreen(page, 0, 0);
  expect(Math.hypot(after[0] - x, after[1] - y)).toBeLessThan(12);
});

test(
  'it is saved as SVG, to scale, with a symbol for each stitch',
  { tag: '@desktop' },
  async ({ page }) => {
    await openChart(page);
    const download = await saved(page, /SVG/);
    expect(download.suggestedFilename()).toBe('classic-group-square.svg');
    const text = readFileSync(await download.path(), 'utf8');
    const found = await page.evaluate((source) => {
      const svg = new DOMParser().parseFromString(source, 'image/svg+xml').documentElement;
      return {
        name: svg.localName,
        title: svg.querySelector('title')?.textContent,
        size: ['width', 'height', 'viewBox'].map((name) => svg.getAttribute(name) ?? ''),
        symbols: svg.querySelectorAll('[id^=stitch-]').length,
      };
    }, text);
    expect(found).toMatchObject({ name: 'svg', title: PATTERN.name, symbols: stitchCount });
    const [width = '', height = '', box = ''] = found.size;
    expect([width, height]).toEqual([
      expect.stringMatching(/^[\d.]+mm$/),
      expect.stringMatching(/^[\d.]+mm$/),
    ]);
    // One unit of the drawing is a millimetre, and the motif is as wide as its geometry says, within its margin.
    const { acrossMm } = motifGeometry(motifOf(reading, '', ''), gaugeOf(null, 4), null);
    expect(parseFloat(width)).toBeCloseTo(Number(box.split(' ')[2]), 2);
    expect(parseFloat(width)).toBeGreaterThan(acrossMm);
    expect(parseFloat(width)).toBeLessThan(acrossMm + 20);
  },
);

test('it is saved as a PNG large enough to print', { tag: '@desktop' }, async ({ page }) => {
  await openChart(page);
  const download = await saved(page, /PNG/);
  const png = readFileSync(await download.path()).toString('base64');
  const seen = await page.evaluate(async (data) => {
    const bytes = Uint8Array.from(atob(data), (char) => char.charCodeAt(0));
    const image = await createImageBitmap(new Blob([bytes], { type: 'image/png' }));
    const canvas = new OffscreenCanvas(image.width, image.height);
    const context = canvas.getContext('2d');
    context?.drawImage(image, 0, 0);
    const pixels = context?.getImageData(0, 0, image.width, image.height).data ?? [];
    let dark = 0;
    for (let i = 0; i < pixels.length; i += 4) if ((pixels[i] ?? 255) < 200) dark += 1;
    return { width: image.width, height: image.height, dark: dark / (pixels.length / 4) };
  }, png);
  expect(Math.min(seen.width, seen.height)).toBeGreaterThan(1000);
  expect(seen.dark).toBeGreaterThan(0.02);
  expect(seen.dark).toBeLessThan(0.5);
});

test(
  'on paper it keeps its key, in inks that are dark enough without colour',
  { tag: '@desktop' },
  async ({ page }) => {
    await page.emulateMedia({ colorScheme: 'dark' });
    await openChart(page);
    await page.emulateMedia({ media: 'print' });
    await expect(drawing(page)).toBeVisible();
    await expect(page.getByRole('list', { name: 'Symbols of this chart' })).toBeVisible();
    await expect(zoomBar(page, 'Closer')).toBeHidden();
    // A4 between its margins: paper does not scroll sideways.
    await page.setViewportSize({ width: 672, height: 1000 });
    await expectNoSidewaysScroll(page);
    const inks = await drawing(page)
      .locator('path[stroke=currentColor]')
      .evaluateAll((paths) => paths.map((path) => getComputedStyle(path).color));
    expect(inks.length).toBeGreaterThan(reading.rounds.length - 1);
    for (const ink of inks) {
      const [red = 255, green = 255, blue = 255] = (ink.match(/[\d.]+/g) ?? []).map(Number);
      // A grey of half the brightness or less: at least 4:1 on white.
      expect(0.299 * red + 0.587 * green + 0.114 * blue).toBeLessThan(128);
    }
  },
);

test(
  'the table says as many stitches as the chart draws',
  { tag: '@desktop' },
  async ({ page }) => {
    await openChart(page);
    await page.getByText('The chart as a table').click();
    const tables = page.getByRole('region', { name: 'Chart' }).getByRole('table');
    await expect(tables).toHaveCount(reading.rounds.length);
    const counts = await tables
      .getByRole('rowheader')
      .evaluateAll((cells) => cells.map((cell) => parseInt(cell.textContent ?? '', 10)));
    expect(counts.reduce((sum, count) => sum + count, ringCount)).toBe(stitchCount);
  },
);

test('a chart of twelve rounds works on any screen and for everybody', async ({ page }) => {
  await openChart(page, 'Twelve rounds', growingSquare(12, 'repeated'));
  await expectNoSidewaysScroll(page);
  await expectTouchable(page);
  await zoomBar(page, 'Closer').click();
  await zoomBar(page, 'Closer').click();
  await expectNoSidewaysScroll(page);
  await expectAccessible(page);
});
