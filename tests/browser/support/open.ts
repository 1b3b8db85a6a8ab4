import type { Page } from '@playwright/test';

/** Opens a page and waits until its islands take presses and keys. */
export async function open(page: Page, path: string): Promise<void> {
  await page.goto(path);
  await ready(page);
}

/**
 * Waits until every island of the page is hydrated. Astro drops `ssr` when it has handed an island
 * to React, React leaves its mark on each element it has taken over, and the effects that listen
 * for keys run before the second frame after that.
 */
export async function ready(page: Page): Promise<void> {
  await page.waitForFunction(() =>
    [...document.querySelectorAll('astro-island')].every((island) => {
      if (island.hasAttribute('ssr')) return false;
      const first = island.querySelector('*');
      return !first || Object.keys(first).some((key) => key.startsWith('__reactFiber$'));
    }),
  );
  await frames(page);
}

/** Until what was just changed is painted, and whatever waits for the painting has run. */
export const frames = (page: Page): Promise<void> =>
  page.evaluate(
    () =>
      new Promise((done) => {
        requestAnimationFrame(() => requestAnimationFrame(() => setTimeout(done)));
      }),
  );
