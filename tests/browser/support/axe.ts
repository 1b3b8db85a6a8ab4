import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';
import { frames } from './open';

/** WCAG 2.2 A and AA, as axe-core names its rules. */
const WCAG_22_AA = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** Drawings have a label and hold nothing to read; their thousand stitches would each be checked. */
const DRAWN = '[role=img] svg';

/** No violation in light; in dark only colours differ. */
export async function expectAccessible(page: Page): Promise<void> {
  const axe = () =>
    new AxeBuilder({ page })
      .options({ rules: { 'target-size': { enabled: true } } })
      .exclude(DRAWN);
  await show(page, 'light');
  await expectNone(page, 'light', axe().withTags(WCAG_22_AA));
  await show(page, 'dark');
  await expectNone(page, 'dark', axe().withRules(['color-contrast', 'link-in-text-block']));
}

/** The theme, painted: the colours of the one before are gone after two frames. */
async function show(page: Page, colorScheme: 'light' | 'dark'): Promise<void> {
  await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
  await frames(page);
}

/** Each violation as one line: the rule, and where it is broken. */
async function expectNone(page: Page, theme: string, axe: AxeBuilder): Promise<void> {
  const { violations } = await axe.analyze();
  const lines = violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, any, all, none }) => {
      const why = [...any, ...all, ...none].map(({ message }) => message).join('; ');
      return `${id}: ${target.join(' ')}: ${why}`;
    }),
  );
  expect.soft(lines, `${page.url()} in ${theme}`).toEqual([]);
}

/** Nothing reaches past the right edge of the screen: the page scrolls one way only. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const { seen, whole } = await page.evaluate(() => ({
    seen: document.documentElement.clientWidth,
    whole: document.documentElement.scrollWidth,
  }));
  expect.soft(whole, `width of ${page.url()}`).toBeLessThanOrEqual(seen);
}

/** A finger's control; links, and buttons that look like them, are left to axe's own rule of size. */
const CONTROLS =
  'button:not(.link), select, summary, textarea, [role=radio], [role=tab], .btn, ' +
  'input:not([type=hidden], [type=checkbox], [type=radio])';
const FINGER_PX = 44;
const POINTER_PX = 24;

/** Whatever can be pressed is high enough for what presses it. */
export async function expectTouchable(page: Page): Promise<void> {
  const least = (await page.evaluate(() => matchMedia('(pointer: coarse)').matches))
    ? FINGER_PX
    : POINTER_PX;
  const low = await page.locator(CONTROLS).evaluateAll(
    (controls, px) =>
      controls.flatMap((control) => {
        // The box round a field is pressed for the field.
        const pressed = control.closest('.control') ?? control;
        const { height, width } = pressed.getBoundingClientRect();
        const isSeen = control.checkVisibility({ visibilityProperty: true }) && width > 1;
        if (!isSeen || height > px - 0.5) return [];
        return [`${control.outerHTML.slice(0, 140)} is ${height.toFixed(0)} px high`];
      }),
    least,
  );
  expect.soft(low, `at ${page.url()}`).toEqual([]);
}
