import type { Page } from '@playwright/test';
import { EXAMPLE_PLAN, type Plan } from '../../src/lib';
import type { Making } from '../../src/schemas/making';
import { send, signedUp, signIn } from './support/accounts';
import { expectAccessible, expectNoSidewaysScroll, expectTouchable } from './support/axe';
import { open } from './support/open';
import { expect, test } from './support/test';

/** Nine squares braided together: the fifth links on all four corners' way. */
const PLAN: Plan = { ...EXAMPLE_PLAN, size: { by: 'grid', rows: 3, columns: 3 } };

async function begun(page: Page): Promise<string> {
  const blanket = { title: 'Nine for the porch', plan: PLAN };
  const { id } = await send<{ id: string }>(page, 'POST', '/api/blankets', blanket, 201);
  return id;
}
const kept = (page: Page, id: string) => send<Making>(page, 'GET', `/api/blankets/${id}/making`);
const doneOf = ({ ticks }: Making): string[] =>
  ticks.flatMap(({ motif, done }) => (done ? [motif] : []));
const made = (page: Page) => page.getByRole('button', { name: 'Made', exact: true });
const count = (page: Page, number: number) =>
  expect(page.getByRole('heading', { name: `${number} of 9 motifs made` })).toBeVisible();
const place = (page: Page, words: string) =>
  expect(page.getByRole('heading', { name: words, level: 2 })).toBeVisible();

test('a blanket is made motif by motif: what to link, ticks, weights and a warning', async ({
  page,
}) => {
  await signedUp(page);
  const id = await begun(page);
  await open(page, `/blankets/${id}/making`);
  await place(page, 'Row 1, motif 1');
  for (let i = 0; i < 4; i += 1) await made(page).click();
  await place(page, 'Row 2, motif 2');
  const main = page.getByRole('main');
  await expect(main).toContainText('Top side: link to row 1, motif 2');
  await expect(main).toContainText('Top left corner: link to row 1, motif 1');
  await expect(main).toContainText('Bottom right corner: leave open');
  await count(page, 4);

  // By the scale far more Barley is gone than should be: there is still time to buy.
  await page.getByRole('button', { name: 'Weigh what is left of Barley' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByLabel('Begun with').fill('100');
  await dialog.getByLabel('Left now').fill('20');
  await dialog.getByRole('button', { name: 'Take the weight' }).click();
  await expect(page.getByText('Barley may run short')).toBeVisible();

  await page.getByLabel('In which order').selectOption('outwards');
  await place(page, 'Row 2, motif 2');
  await expect(page.getByText('Saved', { exact: true })).toBeVisible();
  const now = await kept(page, id);
  expect(doneOf(now)).toHaveLength(4);
  expect(now.weighings).toHaveLength(2);
  expect(now.order).toBe('outwards');
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);
  await expectTouchable(page);
});

test('two devices make one blanket together', async ({ page, browser }) => {
  const person = await signedUp(page);
  const id = await begun(page);
  const phone = await (await browser.newContext()).newPage();
  await signIn(phone, person);
  await open(page, `/blankets/${id}/making`);
  await open(phone, `/blankets/${id}/making`);
  await made(page).click();
  await phone.getByRole('button', { name: 'Skip' }).click();
  await made(phone).click();
  // The same motif ticked on both is one tick.
  await phone.getByRole('button', { name: 'Back' }).click();
  await expect.poll(async () => doneOf(await kept(page, id))).toEqual(['m0:0', 'm0:1']);
  // Each hears of the other's when it is looked at again.
  await page.reload();
  await count(page, 2);
  await place(page, 'Row 1, motif 3');
  await phone.context().close();
});

test('nothing is lost without a connection: ticks are kept, the page opens, and all is sent later', async ({
  page,
  expectProblem,
}) => {
  expectProblem(/ERR_INTERNET_DISCONNECTED|Failed to fetch/);
  await signedUp(page);
  const id = await begun(page);
  await open(page, `/blankets/${id}/making`);
  await made(page).click();
  await expect(page.getByText('Saved', { exact: true })).toBeVisible();
  await page.waitForFunction(async () => {
    const cache = await caches.open('ellwise-making');
    return (await cache.match(location.href)) !== undefined && (await cache.keys()).length > 5;
  });

  // A page that is loaded anew may reach the server for a moment before it is cut off again.
  await page.context().route('**/api/**', (route) => route.abort('internetdisconnected'));
  await page.context().setOffline(true);
  await made(page).click();
  await made(page).click();
  await count(page, 3);
  await expect(page.getByText('2 marks are kept on this device')).toBeVisible();
  await page.reload();
  await count(page, 3);
  await made(page).click();
  await count(page, 4);
  expect(doneOf(await kept(page, id))).toEqual(['m0:0']);

  await page.context().unroute('**/api/**');
  await page.context().setOffline(false);
  await expect(page.getByText('Saved', { exact: true })).toBeVisible({ timeout: 30_000 });
  expect(doneOf(await kept(page, id))).toEqual(['m0:0', 'm0:1', 'm0:2', 'm1:0']);
});
