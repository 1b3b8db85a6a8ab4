import { chromium, type CDPSession, type Page } from '@playwright/test';
import { growingSquare } from './growingSquare.ts';
import { heading, line } from './report.ts';

const FRAME_MS = 16;
const ROUNDS = 40;
/** Typed into the middle of the text, so that all that follows moves; begins a remark and a round's words. */
const TYPED = ' Tip: keep dc loose, ch 2 snug in sps.';
/** Keys before those that count, while the browser compiles. */
const WARM_UP = 6;
/** Long enough for what a key leaves for later. */
const PAUSE_MS = 700;

interface Key {
  /** Handlers, React and layout, until the next frame could be painted. */
  readonly untilPaintMs: number;
  /** All that the main thread did for the key, reading and drawing after it included. */
  readonly allMs: number;
}

/** What a key typed into a motif of 40 rounds costs, as a share of a frame of 16 ms, in Chromium. */
export async function benchTyping(baseUrl: string): Promise<void> {
  heading(`A key typed into a motif of ${ROUNDS} rounds, as a share of a ${FRAME_MS} ms frame`);
  const browser = await chromium.launch({
    executablePath: process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu'],
  });
  try {
    const page = await browser.newPage({ viewport: { width: 1280, height: 800 } });
    await openPattern(page, baseUrl, growingSquare(ROUNDS, 'repeated'));
    const keys = (await typed(page, await page.context().newCDPSession(page))).slice(WARM_UP);
    const inFrame = { most: 1, why: 'within its frame' };
    const untilPaint = keys.map(({ untilPaintMs }) => untilPaintMs / FRAME_MS);
    const later = keys.map(({ untilPaintMs, allMs }) => (allMs - untilPaintMs) / FRAME_MS);
    line(
      `until it can be painted, median of ${keys.length}`,
      quantile(untilPaint, 0.5),
      '',
      inFrame,
    );
    line('until it can be painted, 95th percentile', quantile(untilPaint, 0.95), '', inFrame);
    line('read and drawn after it, waiting for the keys, median', quantile(later, 0.5), '');
    line('read and drawn after it, 95th percentile', quantile(later, 0.95), '');
  } finally {
    await browser.close();
  }
}

async function openPattern(page: Page, baseUrl: string, text: string): Promise<void> {
  await page.addInitScript(
    (draft) => localStorage.setItem('ellwise.pattern', draft),
    draftOf(text),
  );
  await page.goto(new URL('/motifs/read', baseUrl).href);
  const field = page.getByLabel('Pattern text');
  await page.waitForFunction(
    (length) => document.querySelector('textarea')?.value.length === length,
    text.length,
  );
  await field.focus();
  await field.evaluate((area) => {
    const middle = (area as HTMLTextAreaElement).value.indexOf(
      '\n',
      (area as HTMLTextAreaElement).value.length / 2,
    );
    (area as HTMLTextAreaElement).setSelectionRange(middle, middle);
  });
  await page.waitForTimeout(2 * PAUSE_MS);
}

const draftOf = (text: string): string =>
  JSON.stringify({ name: 'A square', text, terms: 'us', sides: 4 });

async function typed(page: Page, session: CDPSession): Promise<Key[]> {
  await page.evaluate(() => {
    const taken: number[] = [];
    Object.assign(window, { takenMs: taken });
    const { port1, port2 } = new MessageChannel();
    let startMs = 0;
    // Comes after all that the key's own task does, and before what was put off.
    port1.onmessage = () => {
      document.body.getBoundingClientRect();
      taken.push(performance.now() - startMs);
    };
    document.addEventListener(
      'beforeinput',
      () => {
        startMs = performance.now();
        port2.postMessage(null);
      },
      { capture: true },
    );
  });
  await session.send('Performance.enable', { timeDomain: 'threadTicks' });
  const keys: Key[] = [];
  for (const key of TYPED) {
    const before = await busyMs(session);
    await page.keyboard.insertText(key);
    await page.waitForTimeout(PAUSE_MS);
    const allMs = (await busyMs(session)) - before;
    const untilPaintMs = await page.evaluate(
      () => (window as unknown as { takenMs: number[] }).takenMs.at(-1) ?? NaN,
    );
    keys.push({ untilPaintMs, allMs });
  }
  return keys;
}

/** What the main thread has done so far. */
async function busyMs(session: CDPSession): Promise<number> {
  const { metrics } = await session.send('Performance.getMetrics');
  return 1000 * (metrics.find(({ name }) => name === 'TaskDuration')?.value ?? NaN);
}

function quantile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? NaN;
}
