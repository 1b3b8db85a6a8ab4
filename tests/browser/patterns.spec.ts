import type { Page } from '@playwright/test';
import { signedUp } from './support/accounts';
import { expectAccessible, expectNoSidewaysScroll } from './support/axe';
import { open, ready } from './support/open';
import { expect, test } from './support/test';

/**
 * Three things wrong: "dcc" is no abbreviation; the note of round 1 says 13 of its 12 dc (by hand: a
 * chain that counts and 11 dc, one of them misspelt, leave 11); round 2 leaves stitches of round 1.
 */
const WRONG = `Rnd 1: Ch 3 (counts as dc), 10 dc in magic ring, dcc in ring; join with sl st in top of beg ch-3. (13 dc)
Rnd 2: Ch 1, sc in each of next 5 sts; join with sl st in first sc.`;
/** Two rounds of a circle: 12 dc by the chain and 11, then two in each. */
const CIRCLE = `Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join with sl st in top of beg ch-3. (12 dc)
Rnd 2: Ch 3, dc in same st, 2 dc in each dc around; join with sl st in top of beg ch-3. (24 dc)`;

const field = (page: Page) => page.getByLabel('Pattern text');
const problems = (page: Page) => page.getByRole('main').getByRole('listitem');
const terms = (page: Page, word: 'US' | 'UK') =>
  page.getByRole('radiogroup', { name: 'Terms of the text' }).getByRole('radio', { name: word });

/** The page with a text in it, read as a circle. */
async function openWith(page: Page, text: string) {
  await open(page, '/motifs/read');
  await page.getByLabel('Shape').selectOption({ label: 'circle' });
  await field(page).fill(text);
}

test('every problem is listed and underlined, mended by a press and unmended by a key', async ({
  page,
}) => {
  await openWith(page, WRONG);
  await expect(page.getByRole('heading', { name: /^3 errors/ })).toBeVisible();
  await expect(problems(page).filter({ hasText: '"dcc" is not an abbreviation' })).toHaveCount(1);
  await expect(problems(page).filter({ hasText: 'the note says 13 dc' })).toHaveCount(1);
  await expect(problems(page).filter({ hasText: /^Error.*line 2/ })).not.toHaveCount(0);
  await expect(page.locator('[data-begin].decoration-madder')).not.toHaveCount(0);

  await page.getByRole('button', { name: 'Write "dc"' }).click();
  await expect(field(page)).toHaveValue(WRONG.replace('dcc', 'dc'));
  await expect(problems(page).filter({ hasText: 'dcc' })).toHaveCount(0);
  await field(page).focus();
  await page.keyboard.press('Control+z');
  await expect(field(page)).toHaveValue(WRONG);
  await page.keyboard.press('Control+Shift+z');
  await expect(field(page)).toHaveValue(WRONG.replace('dcc', 'dc'));
});

test('rewriting in UK terms and taking it back keep text and terms together', async ({ page }) => {
  await openWith(page, CIRCLE);
  await page.getByRole('button', { name: 'Rewrite in UK terms' }).click();
  await expect(field(page)).toHaveValue(CIRCLE.replaceAll('dc', 'tr').replaceAll('sl st', 'ss'));
  await expect(terms(page, 'UK')).toBeChecked();
  await field(page).focus();
  await page.keyboard.press('Control+z');
  await expect(field(page)).toHaveValue(CIRCLE);
  await expect(terms(page, 'US')).toBeChecked();
  await expect(page.getByRole('heading', { name: 'Reads without a problem' })).toBeVisible();
});

test('a stitch of one’s own is added where the text needs it, and read at once', async ({
  page,
}) => {
  const text = CIRCLE.replace('11 dc in magic ring', '11 lst in magic ring').replace(
    '(12 dc)',
    '(1 dc, 11 lst)',
  );
  await openWith(page, text.replace('each dc around', 'each st around'));
  await page.getByRole('button', { name: 'Add it as a stitch of your own' }).first().click();
  const form = page.getByRole('dialog');
  await expect(form.getByLabel('Abbreviation')).toHaveValue('lst');
  await form.getByLabel('Name').fill('long stitch');
  await expectAccessible(page);
  await form.getByRole('button', { name: 'Add the stitch' }).click();
  await expect(page.getByRole('heading', { name: 'Reads without a problem' })).toBeVisible();
  await page.reload();
  await expect(page.getByText('Stitches of your own: 1')).toBeVisible();
  await expect(page.getByRole('heading', { name: 'Reads without a problem' })).toBeVisible();
});

test('a stitch kept in the account is there on another device', async ({ page, newDevice }) => {
  const { email, password } = await signedUp(page);
  await open(page, '/motifs/read');
  await page.getByText('Stitches of your own').click();
  await page.getByRole('button', { name: 'Add a stitch' }).click();
  const form = page.getByRole('dialog');
  await form.getByLabel('Abbreviation').fill('dc');
  await form.getByLabel('Name').fill('long stitch');
  await form.getByRole('button', { name: 'Add the stitch' }).click();
  await expect(form.getByLabel('Abbreviation')).toHaveAttribute('aria-invalid', 'true');
  await form.getByLabel('Abbreviation').fill('lst');
  await form.getByRole('button', { name: 'Add the stitch' }).click();
  await expect(form).toBeHidden();

  const other = await newDevice();
  await open(other, '/sign-in');
  await other.getByLabel('E-mail').fill(email);
  await other.getByLabel('Password', { exact: true }).fill(password);
  await other.getByRole('main').getByRole('button', { name: 'Sign in' }).click();
  await other.waitForURL((url) => !url.pathname.includes('sign-in'));
  await open(other, '/motifs/read');
  await expect(other.getByText('Stitches of your own: 1')).toBeVisible();
});

test('a ready-made motif is opened as its pattern, and planned', async ({ page }) => {
  await open(page, '/motifs/hexagon');
  await page.getByRole('link', { name: 'Pattern and chart' }).click();
  await page.waitForURL('/motifs/read?from=hexagon');
  await ready(page);
  await expect(field(page)).toHaveValue(/^Rnd 1: Ch 3 \(counts as dc\), dc in magic ring/);
  await expect(page.getByRole('heading', { name: 'Reads without a problem' })).toBeVisible();
  await page.getByRole('button', { name: /^Plan/ }).locator('visible=true').first().click();
  await page.waitForURL('/');
  await expect(page.getByLabel('Pattern', { exact: true })).toHaveValue('read-pattern');
});

test('the draft of a ready-made motif does not take the place of one’s own', async ({ page }) => {
  await openWith(page, CIRCLE);
  await open(page, '/motifs/read?from=solid-square');
  await expect(field(page)).not.toHaveValue(CIRCLE);
  await open(page, '/motifs/read');
  await expect(field(page)).toHaveValue(CIRCLE);
});

for (const colorScheme of ['light', 'dark'] as const) {
  test(`the page is accessible, empty and with problems, ${colorScheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme });
    await open(page, '/motifs/read');
    await expectAccessible(page);
    await field(page).fill(WRONG);
    await expect(page.getByRole('heading', { name: /errors/ })).toBeVisible();
    await expectAccessible(page);
    await expectNoSidewaysScroll(page);
  });
}
