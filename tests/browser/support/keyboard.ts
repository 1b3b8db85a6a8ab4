import { expect, type Locator, type Page } from '@playwright/test';

const MOST_TABS = 160;

/** Tabs forward until the control has the focus, as somebody without a mouse would, and sees it. */
export async function tabTo(page: Page, target: Locator): Promise<void> {
  for (let pressed = 0; pressed < MOST_TABS; pressed += 1) {
    if (await hasFocus(target)) return expectFocusSeen(page);
    await page.keyboard.press('Tab');
  }
  throw new Error(`Tab does not reach ${String(target)}`);
}

const hasFocus = async (target: Locator): Promise<boolean> =>
  (await target.count()) === 1 &&
  (await target.evaluate((element) => element === document.activeElement));

/** What has the focus is drawn round, itself or the box it stands in, and is on the screen. */
export async function expectFocusSeen(page: Page): Promise<void> {
  const seen = await page.evaluate(() => {
    const focused = document.activeElement;
    if (!focused || focused === document.body) return 'nothing has the focus';
    const box = focused.closest('.control') ?? focused;
    const isDrawnRound = [focused, box].some((element) => {
      const { outlineStyle, outlineWidth, outlineColor } = getComputedStyle(element);
      const isClear = outlineColor === 'transparent' || / 0\)$/.test(outlineColor);
      return outlineStyle !== 'none' && parseFloat(outlineWidth) >= 2 && !isClear;
    });
    if (!isDrawnRound) return `no outline round ${focused.outerHTML.slice(0, 160)}`;
    const { top, bottom, left, right } = focused.getBoundingClientRect();
    const isOn = bottom > 0 && right > 0 && top < innerHeight && left < innerWidth;
    return isOn ? '' : `off the screen: ${focused.outerHTML.slice(0, 160)}`;
  });
  expect(seen).toBe('');
}
