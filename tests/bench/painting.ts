import { chromium, type Page } from '@playwright/test';
import { EXAMPLE_PLAN } from '../../src/lib';
import { heading, line } from './report.ts';

const FRAME_MS = 16;
const SIDE = 40;
/** A phone of the middle sort is about so much slower than this machine. */
const SLOWER = 4;
const MOVES = 200;

/** A stroke over a blanket of 40 × 40 motifs on a phone's screen, as a share of a 16 ms frame, in Chromium. */
export async function benchPainting(baseUrl: string): Promise<void> {
  heading(
    `A move of the brush over ${SIDE} × ${SIDE} motifs, as a share of a ${FRAME_MS} ms frame`,
  );
  const browser = await chromium.launch({
    executablePath: process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu'],
  });
  try {
    const page = await browser.newPage({
      viewport: { width: 390, height: 844 },
      deviceScaleFactor: 2,
    });
    await openPaint(page, baseUrl);
    for (const slower of [1, SLOWER]) {
      const session = await page.context().newCDPSession(page);
      await session.send('Emulation.setCPUThrottlingRate', { rate: slower });
      const shares = (await stroked(page)).map((ms) => ms / FRAME_MS).sort((a, b) => a - b);
      const at = (q: number): number => shares[Math.floor(q * (shares.length - 1))] ?? 0;
      const what = slower === 1 ? 'here' : `${slower} times slower`;
      const inFrame = { most: 1, why: 'within its frame' };
      line(`${what}, median of ${shares.length}`, at(0.5), '', inFrame);
      line(`${what}, 95th percentile`, at(0.95), '', inFrame);
    }
  } finally {
    await browser.close();
  }
}

async function openPaint(page: Page, baseUrl: string): Promise<void> {
  const plan = { ...EXAMPLE_PLAN, size: { by: 'grid', rows: SIDE, columns: SIDE } };
  await page.addInitScript(
    (stored) => localStorage.setItem('ellwise.plan', stored),
    JSON.stringify(plan),
  );
  await page.goto(baseUrl, { waitUntil: 'networkidle' });
  await page.getByRole('button', { name: 'Paint it' }).click();
  await page.getByRole('radio', { name: /^Colourway 2:/ }).click();
  await page.locator('canvas').scrollIntoViewIfNeeded();
  await page.waitForTimeout(1_000);
}

/** How long the main thread is busy with each move of one stroke. */
async function stroked(page: Page): Promise<number[]> {
  const events = [
    ['pointerdown', 0] as const,
    ...Array.from({ length: MOVES }, (_, i) => ['pointermove', i / MOVES] as const),
    ['pointerup', 1] as const,
  ];
  const taken = await page.locator('canvas').evaluate((canvas, all) => {
    const box = canvas.getBoundingClientRect();
    // A made-up pointer cannot be captured.
    (canvas as HTMLCanvasElement).setPointerCapture = () => undefined;
    return all.map(([type, share]) => {
      const event = new PointerEvent(type, {
        bubbles: true,
        pointerId: 1,
        button: 0,
        clientX: box.left + box.width * (0.05 + 0.9 * ((share * 7) % 1)),
        clientY: box.top + box.height * (0.05 + 0.9 * share),
      });
      const startMs = performance.now();
      canvas.dispatchEvent(event);
      return performance.now() - startMs;
    });
  }, events);
  return taken.slice(1, -1);
}
