import AxeBuilder from '@axe-core/playwright';
import { expect, type Page } from '@playwright/test';

/** WCAG 2.2 A and AA, as axe-core names its rules. */
const WCAG_22_AA = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** Each violation as one line: the rule, and where it is broken. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).withTags(WCAG_22_AA).analyze();
  const lines = violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, any, all, none }) => {
      const why = [...any, ...all, ...none].map(({ message }) => message).join('; ');
      return `${id}: ${target.join(' ')}: ${why}`;
    }),
  );
  expect(lines, `at ${page.url()}`).toEqual([]);
}

/** Nothing reaches past the right edge of the screen: the page scrolls one way only. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const { seen, whole } = await page.evaluate(() => ({
    seen: document.documentElement.clientWidth,
    whole: document.documentElement.scrollWidth,
  }));
  expect(whole, `width of ${page.url()}`).toBeLessThanOrEqual(seen);
}

const TARGET_PX = 24;

/**
 * Whatever can be pressed is 24 px or more each way (WCAG 2.5.8), unless it is a link in a sentence
 * or hidden from everybody but a screen reader.
 */
export async function expectTouchable(page: Page): Promise<void> {
  const small = await page.evaluate((least) => {
    const targets = document.querySelectorAll<HTMLElement>(
      'a[href], button, select, input:not([type=hidden]), summary, [role=radio], [role=tab]',
    );
    return [...targets].flatMap((target) => {
      if (!target.checkVisibility({ visibilityProperty: true }) || target.closest('p, li p, dd'))
        return [];
      // A label is part of what can be pressed.
      const labels = target instanceof HTMLInputElement ? [...(target.labels ?? [])] : [];
      const boxes = [target, ...labels].map((each) => each.getBoundingClientRect());
      const width = Math.max(...boxes.map((box) => box.width));
      const height = Math.max(...boxes.map((box) => box.height));
      const clipped = width <= 1 || height <= 1;
      if (clipped || (width >= least && height >= least)) return [];
      return [`${target.outerHTML.slice(0, 120)} is ${width.toFixed(0)} × ${height.toFixed(0)} px`];
    });
  }, TARGET_PX);
  expect(small, `at ${page.url()}`).toEqual([]);
}
