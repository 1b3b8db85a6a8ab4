import type { Page } from '@playwright/test';
import demo from '../../data/demo/people.json' with { type: 'json' };
import { EXAMPLE_PLAN } from '../../src/lib';
import { send, signedUp, signIn } from './support/accounts';
import { expectAccessible, expectNoSidewaysScroll, expectTouchable } from './support/axe';
import { open, ready } from './support/open';
import { field } from './support/planner';
import { expect, test } from './support/test';

/** The page as it stands, in light and in dark. */
async function expectGood(page: Page): Promise<void> {
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);
  await expectTouchable(page);
}

const STRANGERS = [
  '/',
  '/joins',
  '/motifs',
  '/motifs/group-square',
  '/how-it-works',
  '/sign-in',
  '/register',
  '/reset',
  '/confirm',
  '/preferences',
  '/swatches',
  '/stash',
  '/blankets',
  '/sign-out',
  '/no-such-page',
] as const;

for (const path of STRANGERS) {
  test(`a stranger at ${path}`, async ({ page, expectProblem }) => {
    if (path === '/no-such-page') expectProblem(/404/);
    await open(page, path);
    await expectGood(page);
  });
}

const SHEETS = {
  colours: 'Change colours',
  painting: 'Paint it',
  sizes: 'Several sizes',
  border: 'Border round by round',
  ledger: 'Open the ledger',
  joins: 'Compare joins',
  shopping: 'Shopping list',
} as const;

for (const [what, name] of Object.entries(SHEETS)) {
  test(`the sheet of ${what} over the front page`, async ({ page }) => {
    await open(page, '/');
    await page.getByRole('button', { name, exact: true }).locator('visible=true').first().click();
    await expect(page.getByRole('dialog')).toBeVisible();
    await expectGood(page);
  });
}

test('the front page with all that can be wrong', async ({ page }) => {
  await open(page, '/');
  await field(page, 'Yarn', 'Skein').fill('none');
  await field(page, 'Swatch', 'Stitches').fill('3');
  await page.getByRole('heading', { name: 'Where it goes' }).scrollIntoViewIfNeeded();
  await expect(page.locator('.recharts-surface').first()).toBeVisible();
  await expectGood(page);
});

test('the menus of the header', async ({ page, isMobile }) => {
  await open(page, '/joins');
  await page.getByRole('button', { name: isMobile ? 'Menu' : 'Theme' }).click();
  await expectGood(page);
});

test('forms that were refused', async ({ page, expectProblem }) => {
  expectProblem(/40[0-9]/);
  await open(page, '/register');
  await page.getByRole('button', { name: 'Register' }).click();
  await expect(page.getByText('Enter your name.')).toBeVisible();
  await expectGood(page);
  await open(page, '/sign-in');
  await page.getByLabel('E-mail').fill('nobody@example.com');
  await page.getByLabel('Password', { exact: true }).fill('not this one either');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert')).toBeVisible();
  await expectGood(page);
});

test('the pages of somebody with nothing kept yet', async ({ page }) => {
  await signedUp(page);
  for (const path of ['/worktable', '/swatches', '/stash', '/blankets', '/settings']) {
    await open(page, path);
    await expectGood(page);
  }
});

interface List {
  items: { id: string }[];
}

const ADMINISTRATOR = demo.people.find(({ roles }) => roles.includes('administrator'))?.name ?? '';

/** Somebody of the demonstration, who keeps much. */
async function signInAs(page: Page, first: string): Promise<void> {
  const email = demo.people.find((person) => person.name.startsWith(first))?.email ?? '';
  await signIn(page, { name: '', email, password: demo.password });
}

test('the pages of somebody with much kept', async ({ page }) => {
  // Seven pages in both themes: the longest test there is.
  test.slow();
  await signInAs(page, 'Isolde');
  const first = async (path: string) => (await send<List>(page, 'GET', path)).items[0]?.id ?? '';
  const blanket = await first('/api/blankets');
  const paths = [
    '/worktable',
    '/swatches',
    `/swatches/${await first('/api/swatches')}`,
    '/stash',
    '/blankets',
    `/blankets/${blanket}`,
    `/blankets/${blanket}/shopping-list`,
  ];
  for (const path of paths) {
    await open(page, path);
    await expectGood(page);
  }
});

test('the stash being filled, and its table', async ({ page }) => {
  await signInAs(page, 'Tamsin');
  await open(page, '/stash');
  await page.getByRole('radio', { name: 'Table' }).click();
  await expect(page.getByRole('table')).toBeVisible();
  await expectGood(page);
  await page.getByRole('button', { name: 'Add yarn' }).click();
  const sheet = page.getByRole('dialog');
  await sheet.getByLabel('Whole skeins').fill('some');
  await sheet.getByRole('button', { name: 'Add to the stash' }).click();
  await expect(sheet.getByLabel('Whole skeins')).toHaveAttribute('aria-invalid', 'true');
  await expectGood(page);
});

test('the pages of an administrator', async ({ page }) => {
  await signInAs(page, ADMINISTRATOR);
  for (const path of ['/admin', '/admin/changes']) {
    await open(page, path);
    await expectGood(page);
  }
});

test('a kept list, the sheet that keeps a blanket, and two saves that met', async ({
  page,
  expectProblem,
}) => {
  expectProblem(/409/);
  await signedUp(page);
  const blanket = { title: 'Porch blanket', plan: EXAMPLE_PLAN };
  const { id } = await send<{ id: string }>(page, 'POST', '/api/blankets', blanket, 201);
  const list = await send<{ id: string }>(
    page,
    'POST',
    '/api/shopping-lists',
    { blanketId: id },
    201,
  );
  await open(page, `/shopping-lists/${list.id}`);
  await expectGood(page);

  await open(page, '/');
  await page.getByRole('button', { name: 'Keep this blanket' }).click();
  await expect(page.getByLabel('Title')).toBeVisible();
  await expectGood(page);

  await open(page, `/blankets/${id}`);
  const later = { ...blanket, title: 'Porch', version: 1 };
  await send(page, 'PUT', `/api/blankets/${id}`, later);
  await field(page, 'Blanket', 'Border').selectOption('0');
  await expect(page.getByText('This blanket was changed elsewhere meanwhile')).toBeVisible();
  await expectGood(page);
});

test('a swatch being entered, and one refused', async ({ page }) => {
  await signedUp(page);
  await open(page, '/swatches/new?example');
  await expectGood(page);
  await open(page, '/swatches/new');
  await page.getByRole('button', { name: /^Save/ }).locator('visible=true').click();
  await expect(
    page.getByRole('alert').or(page.locator('[aria-invalid=true]')).first(),
  ).toBeVisible();
  await expectGood(page);
  await ready(page);
});
