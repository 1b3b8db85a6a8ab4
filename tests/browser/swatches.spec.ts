import { EXAMPLE_PLAN, lengthM, widthMm, type Plan } from '../../src/lib';
import { send, signedUp } from './support/accounts';
import { open, ready } from './support/open';
import { expectFigures } from './support/planner';
import { expect, test } from './support/test';

/** The example with this swatch as its gauge, and what it unravelled to as its only evidence. */
const PLAN: Plan = {
  ...EXAMPLE_PLAN,
  swatch: { stitch: 'hdc', stitches: 18, rows: 14, widthMm: widthMm(141), heightMm: widthMm(132) },
  evidence: [
    {
      piece: 'swatch',
      reading: { by: 'unravelling', lengthM: lengthM(24.5), errorM: lengthM(0.2) },
    },
  ],
};

test('a swatch is measured, kept, found again and planned with', async ({ page }) => {
  await signedUp(page);
  await open(page, '/swatches/new');
  const form = page.getByRole('form', { name: 'The swatch' });
  const type = (label: string, value: string) =>
    form.getByLabel(label, { exact: true }).fill(value);
  await type('Name', 'Half doubles, 5 mm');
  await form.getByLabel('Worked in').selectOption('hdc');
  await type('Stitches', '18');
  await type('Rows', '14');
  await type('across', '14.1');
  await type('tall', '13,2');
  await form.getByRole('button', { name: 'Unravelled length' }).click();
  await type('unravels to', '24.5');
  await type('give or take', '0.2');
  await expect(
    page.getByRole('img', { name: '18 stitches by 14 rows of hdc, 14.1 × 13.2 cm' }),
  ).toBeVisible();
  await page.getByRole('button', { name: 'Save swatch' }).click();
  await page.waitForURL(/\/swatches\/[0-9a-f-]{36}$/);

  await open(page, '/swatches');
  await page.getByRole('link', { name: 'Half doubles, 5 mm' }).click();
  await ready(page);
  await expect(page.getByLabel('across')).toHaveValue('14.1');
  await expect(page.getByLabel('unravels to')).toHaveValue('24.5');
  await page.getByRole('link', { name: 'Plan a blanket with this swatch' }).click();
  await ready(page);
  await expectFigures(page, PLAN);
});

test('a swatch without a name is not kept, and says so where the cursor is', async ({ page }) => {
  await signedUp(page);
  await open(page, '/swatches/new');
  await page.getByLabel('across').fill('0');
  await page.getByRole('button', { name: 'Save swatch' }).click();
  const name = page.getByLabel('Name', { exact: true });
  await expect(name).toHaveAttribute('aria-invalid', 'true');
  await expect(page.getByLabel('across')).toHaveAttribute('aria-invalid', 'true');
  await expect(page).toHaveURL(/\/swatches\/new$/);
  const { total } = await send<{ total: number }>(page, 'GET', '/api/swatches');
  expect(total).toBe(0);
});
