import type { Page } from '@playwright/test';
import { EXAMPLE_PLAN, widthMm, type Plan } from '../../src/lib';
import { withBorder } from '../../src/lib/plan/edits';
import { send, signedUp } from './support/accounts';
import { open } from './support/open';
import { expectFigures, field } from './support/planner';
import { expect, test } from './support/test';

interface Kept {
  id: string;
  title: string;
  version: number;
  plan: Plan;
}

const saved = (page: Page) => expect(page.getByText('Saved', { exact: true })).toBeVisible();
const notice = (page: Page) =>
  page.getByRole('status').filter({ hasText: 'This blanket was changed elsewhere meanwhile' });
const kept = (page: Page, id: string) => send<Kept>(page, 'GET', `/api/blankets/${id}`);

// What the browser itself logs of the answer that tells a later save.
test.beforeEach(({ expectProblem }) => expectProblem(/409 \(Conflict\)/));

/** The same blanket in two tabs: the first takes the border off, the second then makes it wider. */
async function twoTabs(page: Page): Promise<{ id: string; first: Page; second: Page }> {
  await signedUp(page);
  const blanket = { title: 'Porch blanket', plan: EXAMPLE_PLAN };
  const { id } = await send<Kept>(page, 'POST', '/api/blankets', blanket, 201);
  const second = await page.context().newPage();
  await open(page, `/blankets/${id}`);
  await open(second, `/blankets/${id}`);
  await field(page, 'Blanket', 'Border').selectOption('0');
  await saved(page);
  await field(second, 'Blanket', 'Motifs across').fill('11');
  await expect(notice(second)).toContainText('There: the border. Here: the size.');
  return { id, first: page, second };
}

const THEIRS = withBorder(EXAMPLE_PLAN, 0, 'sc');
const WIDE = { by: 'grid', rows: 10, columns: 11 } as const;
const MINE: Plan = { ...EXAMPLE_PLAN, size: WIDE };
const BOTH: Plan = { ...THEIRS, size: WIDE };

/** Every save that was made is still among the versions, whatever was chosen. */
async function expectVersions(page: Page, id: string, plans: readonly Plan[]): Promise<void> {
  const { items } = await send<{ items: { version: number }[] }>(
    page,
    'GET',
    `/api/blankets/${id}/revisions`,
  );
  const all = await Promise.all(
    items.map(({ version }) => send<Kept>(page, 'GET', `/api/blankets/${id}/revisions/${version}`)),
  );
  const oldestFirst = all.toSorted((left, right) => left.version - right.version);
  expect(oldestFirst.map(({ plan }) => plan)).toEqual(JSON.parse(JSON.stringify(plans)));
}

test('the later save is told what changed, and both changes can be kept', async ({ page }) => {
  const { id, first, second } = await twoTabs(page);
  // Nothing was overwritten while the question stands.
  expect((await kept(page, id)).plan.border).toEqual([]);
  await second.getByRole('button', { name: 'Keep both changes' }).click();
  await saved(second);
  await expect(notice(second)).toBeHidden();
  await expectFigures(second, BOTH);
  expect((await kept(page, id)).plan).toMatchObject({ border: [], size: WIDE });
  await expectVersions(page, id, [EXAMPLE_PLAN, THEIRS, BOTH]);

  // The first tab, now behind, is told in its turn.
  await first.getByLabel('Blanket', { exact: true }).fill('Porch blanket, wide');
  await expect(notice(first)).toContainText('There: the size. Here: the title.');
  await first.getByRole('button', { name: 'Keep both changes' }).click();
  await saved(first);
  await expectFigures(first, BOTH);
  expect((await kept(page, id)).title).toBe('Porch blanket, wide');
});

test('the later save can be kept over the earlier, which stays among the versions', async ({
  page,
}) => {
  const { id, second } = await twoTabs(page);
  await second.getByRole('button', { name: 'Keep mine' }).click();
  await saved(second);
  await expectFigures(second, MINE);
  expect((await kept(page, id)).plan).toEqual(JSON.parse(JSON.stringify(MINE)));
  await expectVersions(page, id, [EXAMPLE_PLAN, THEIRS, MINE]);
});

test('the earlier save can be taken over, and the own change undone to again', async ({ page }) => {
  const { id, second } = await twoTabs(page);
  await second.getByRole('button', { name: 'Take theirs' }).click();
  await saved(second);
  await expectFigures(second, THEIRS);
  await expectVersions(page, id, [EXAMPLE_PLAN, THEIRS]);
  await second.getByRole('button', { name: 'Undo' }).click();
  await expectFigures(second, MINE);
  await saved(second);
  await expectVersions(page, id, [EXAMPLE_PLAN, THEIRS, MINE]);
});

test('two changes of one part cannot be merged: one of them is chosen', async ({ page }) => {
  const { second } = await twoTabs(page);
  await second.getByRole('button', { name: 'Keep both changes' }).click();
  await saved(second);
  await field(second, 'Swatch', 'measure across').fill('16');
  await saved(second);
  await field(page, 'Swatch', 'measure across').fill('14');
  await expect(notice(page)).toContainText('There: the swatch, the size. Here: the swatch.');
  await expect(page.getByRole('button', { name: 'Keep both changes' })).toHaveCount(0);
  await page.getByRole('button', { name: 'Keep mine' }).click();
  await saved(page);
  const { swatch } = EXAMPLE_PLAN;
  await expectFigures(page, { ...THEIRS, swatch: swatch && { ...swatch, widthMm: widthMm(140) } });
});

test('typing on while a slow save is under way is no conflict with oneself', async ({ page }) => {
  await signedUp(page);
  const blanket = { title: 'Slow', plan: EXAMPLE_PLAN };
  const { id } = await send<Kept>(page, 'POST', '/api/blankets', blanket, 201);
  await open(page, `/blankets/${id}`);
  await page.route(`**/api/blankets/${id}`, async (route) => {
    await new Promise((done) => setTimeout(done, 1800));
    await route.continue();
  });
  const across = field(page, 'Blanket', 'Motifs across');
  const sending = page.waitForRequest((request) => request.method() === 'PUT');
  await across.fill('9');
  await sending;
  await across.fill('12');
  await saved(page);
  await expect(notice(page)).toBeHidden();
  expect((await kept(page, id)).plan.size).toEqual({ by: 'grid', rows: 10, columns: 12 });
});

test('a save that fails is said, kept on the screen and tried again', async ({
  page,
  expectProblem,
}) => {
  expectProblem(/ERR_INTERNET_DISCONNECTED/);
  await signedUp(page);
  const blanket = { title: 'Train journey', plan: EXAMPLE_PLAN };
  const { id } = await send<Kept>(page, 'POST', '/api/blankets', blanket, 201);
  await open(page, `/blankets/${id}`);
  await page.context().setOffline(true);
  await field(page, 'Blanket', 'Border').selectOption('0');
  await expect(page.getByText('Not saved: The server could not be reached.')).toBeVisible();
  await expectFigures(page, THEIRS);
  await page.context().setOffline(false);
  await page.getByRole('button', { name: 'Try again' }).click();
  await saved(page);
  expect((await kept(page, id)).plan.border).toEqual([]);
});
