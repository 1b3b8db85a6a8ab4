import { EXAMPLE_PLAN, type Plan } from '../../src/lib';
import { send, signedUp } from './support/accounts';
import { expectAccessible, expectNoSidewaysScroll } from './support/axe';
import { open } from './support/open';
import { field } from './support/planner';
import { expect, test } from './support/test';

const counts = 'Colourway 1: 27 · Colourway 2: 27 · Colourway 3: 26';

test('motifs are painted by a stroke, one step to undo, and kept with the blanket', async ({
  page,
}) => {
  await signedUp(page);
  const blanket = { title: 'Painted', plan: EXAMPLE_PLAN };
  const { id } = await send<{ id: string }>(page, 'POST', '/api/blankets', blanket, 201);
  await open(page, `/blankets/${id}`);
  await page.getByRole('button', { name: 'Paint it' }).click();
  const sheet = page.getByRole('dialog');
  await expect(sheet).toContainText(counts);
  await sheet.getByRole('radio', { name: /^Colourway 2:/ }).click();
  const canvas = sheet.locator('canvas');
  await canvas.scrollIntoViewIfNeeded();
  const box = (await canvas.boundingBox())!;
  const at = (column: number, row: number) =>
    [
      box.x + (box.width * (column + 0.5)) / 8,
      box.y + box.width * 0.07 + (box.width * row) / 8,
    ] as const;
  await page.mouse.move(...at(0, 0));
  await page.mouse.down();
  await page.mouse.move(...at(4, 0), { steps: 4 });
  await page.mouse.up();
  // The first row was 1 2 3 1 2: three of the five change.
  await expect(sheet).toContainText('Colourway 1: 25 · Colourway 2: 30 · Colourway 3: 25');
  await sheet.getByRole('button', { name: 'Undo' }).click();
  await expect(sheet).toContainText(counts);
  await sheet.getByRole('button', { name: 'Redo' }).click();
  await sheet.getByRole('button', { name: 'Close', exact: true }).click();
  await expect(page.getByText('Saved', { exact: true })).toBeVisible();
  const { plan } = await send<{ plan: Plan }>(page, 'GET', `/api/blankets/${id}`);
  expect(plan.placement.painted).toEqual([[0, 0, 5, 1]]);
});

test('painting works by keyboard alone, round by round, and says where it is', async ({ page }) => {
  await open(page, '/');
  await page.getByRole('button', { name: 'Paint it' }).focus();
  await page.keyboard.press('Enter');
  const sheet = page.getByRole('dialog');
  await sheet.getByRole('radio', { name: 'One round' }).press(' ');
  await sheet.getByRole('radio', { name: 'Sloe' }).press(' ');
  await sheet.locator('canvas').focus();
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('ArrowDown');
  await expect(sheet.getByRole('status').filter({ hasText: 'Row 2, motif 2' })).toBeAttached();
  await page.keyboard.press('Enter');
  await expect(sheet).toContainText('Colourway 4: 1');
  await expectAccessible(page);
  await expectNoSidewaysScroll(page);
});

test('a rule places what is not painted: at random no two alike lie side by side', async ({
  page,
}) => {
  await open(page, '/');
  await page.getByRole('button', { name: 'Paint it' }).click();
  const sheet = page.getByRole('dialog');
  await sheet.getByLabel('What is not painted lies').selectOption('random');
  await expect(sheet).toContainText('No two alike lie side by side.');
  await expect(sheet).toContainText(/Colourway 1: 2[67] · Colourway 2: 2[67] · Colourway 3: 2[67]/);
  await sheet.getByText('From the yarn in hand').click();
  await sheet.getByRole('textbox', { name: 'Rosehip' }).fill('100');
  await expect(sheet).toContainText('It makes all 80');
  await sheet.getByRole('button', { name: 'Place so many of each' }).click();
  await expect(sheet).not.toContainText('Colourway 1: 26');
});

test('motifs lie in other layouts, and the answer follows', async ({ page }) => {
  await open(page, '/');
  const picture = page.getByRole('img', { name: /^The blanket to scale/ });
  await field(page, 'Blanket', 'Motifs lie in').selectOption('on-point');
  await field(page, 'Blanket', 'Edge').selectOption('straight');
  await expect(page.getByText(/half and 2 quarter motifs straighten the edge/)).toBeVisible();
  await expect(picture).toBeVisible();
  await field(page, 'Blanket', 'Motifs lie in').selectOption('large-and-small');
  await expect(page.getByLabel('Small ones')).toBeVisible();
  await expect(picture).toHaveAttribute('aria-label', /blocks of classic group square/);
});
