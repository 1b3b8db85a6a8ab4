import type { Page } from '@playwright/test';
import { EXAMPLE_PLAN, massG, readyMotif, type Motif, type Plan } from '../../src/lib';
import { withMotif, withRoundColour } from '../../src/lib/plan/edits';
import { downloadCsv } from './support/csv';
import { expectFocusSeen, tabTo } from './support/keyboard';
import { open } from './support/open';
import { expectFigures, field } from './support/planner';
import { expect, test } from './support/test';

const button = (page: Page, name: string) =>
  page.locator('[data-answer], form').getByRole('button', { name, exact: true }).first();

/** As long as a finger stays on a key: a choice follows the arrow only while it is down. */
const arrow = (page: Page, key: 'ArrowLeft' | 'ArrowRight') =>
  page.keyboard.press(key, { delay: 80 });

/** Opens a sheet from its button, does something in it, leaves by Escape: the focus is back. */
async function inSheet(page: Page, opener: string, work: () => Promise<void>): Promise<void> {
  await tabTo(page, button(page, opener));
  await page.keyboard.press('Enter');
  const sheet = page.getByRole('dialog');
  await expect(sheet).toBeVisible();
  await expect.poll(() => sheet.evaluate((it) => it.contains(document.activeElement))).toBe(true);
  await work();
  expect(await sheet.evaluate((it) => it.contains(document.activeElement))).toBe(true);
  await page.keyboard.press('Escape');
  await expect(sheet).toBeHidden();
  await expect(button(page, opener)).toBeFocused();
}

test('the whole job is done from the keyboard', async ({ page }) => {
  await open(page, '/');
  let plan: Plan = EXAMPLE_PLAN;
  const now = (next: Plan) => expectFigures(page, (plan = next));

  await page.keyboard.press('Tab');
  await expect(page.getByRole('link', { name: 'Skip to the main part' })).toBeFocused();
  await expectFocusSeen(page);
  await page.keyboard.press('Enter');
  await expect(page.getByRole('main')).toBeFocused();

  // A number is typed, then stepped with the arrows.
  await tabTo(page, field(page, 'Yarn', 'Skein'));
  await page.keyboard.press('Control+a');
  await page.keyboard.type('110');
  await page.keyboard.press('ArrowUp');
  await now({
    ...plan,
    yarn: { ...plan.yarn, putUp: { ...plan.yarn.putUp, massG: massG(115) } },
  });

  // A list takes the first letters of a word.
  await tabTo(page, field(page, 'Motif', 'Pattern'));
  await page.keyboard.type('Solid dc');
  await now(withMotif(plan, readyMotif('solid-square', 4) as Motif));

  await inSheet(page, 'Change colours', async () => {
    await tabTo(page, page.getByRole('dialog').getByLabel('Rnd 2').first());
    await page.keyboard.press('ArrowDown');
    // Rosehip is followed by Bracken.
    plan = withRoundColour(plan, 0, 1, 'c4');
  });
  await now(plan);

  await tabTo(page, page.getByRole('radio', { name: 'So many motifs' }));
  await arrow(page, 'ArrowRight');
  await expect(page.getByRole('radio', { name: 'A size wanted' })).toBeFocused();
  await expect(field(page, 'Blanket', 'Width')).toBeVisible();
  await expectFocusSeen(page);
  await arrow(page, 'ArrowLeft');
  await now({ ...plan, size: { by: 'grid', rows: 10, columns: 8 } });

  await tabTo(page, field(page, 'Blanket', 'Join'));
  await page.keyboard.type('Whip');
  await now({ ...plan, join: { ...plan.join, key: 'whip-stitch' } });

  await tabTo(page, page.getByRole('radio', { name: '95 %' }));
  await arrow(page, 'ArrowRight');
  await now({ ...plan, confidence: 0.99 });

  await tabTo(page, page.getByRole('button', { name: /Barley/ }).first());
  await page.keyboard.press('Space');
  await expect(page.getByRole('heading', { name: 'Barley: how sure' })).toBeVisible();

  const figure = page.getByRole('button', { name: 'how Barley is worked out' });
  await tabTo(page, figure);
  await page.keyboard.press('Enter');
  await expect(page.getByRole('dialog', { name: 'How this is worked out' })).toBeVisible();
  await page.keyboard.press('Escape');
  await expect(figure).toBeFocused();

  await inSheet(page, 'Shopping list', async () => {
    const download = page.getByRole('button', { name: 'Download CSV' });
    await tabTo(page, download);
    const { rows } = await downloadCsv(page, () => page.keyboard.press('Enter'));
    expect(rows).toHaveLength(5);
  });

  await inSheet(page, 'Compare joins', async () => {
    const dialog = page.getByRole('dialog');
    await tabTo(page, dialog.getByRole('button', { name: 'Skeins' }));
    await page.keyboard.press('Enter');
    await expect(dialog.getByRole('columnheader', { name: 'Skeins' })).toHaveAttribute(
      'aria-sort',
      /ending/,
    );
    await tabTo(page, dialog.getByRole('button', { name: 'Use flat braid' }));
    await page.keyboard.press('Enter');
    // The button is gone with its press; the keyboard stays in the sheet.
    await expect(dialog.getByRole('row').filter({ hasText: 'Flat braid' })).toContainText(
      'in this plan',
    );
  });
  await now({ ...plan, join: { ...plan.join, key: 'flat-braid' } });

  await inSheet(page, 'Open the ledger', async () => {
    await tabTo(page, page.getByRole('dialog').getByLabel('Colour', { exact: true }));
    await page.keyboard.type('Sloe');
    await expect(page.getByRole('dialog').getByRole('row').nth(1)).not.toContainText('Skerry');
  });

  await page.keyboard.press('Control+z');
  await expectFigures(page, { ...plan, join: { ...plan.join, key: 'whip-stitch' } });
  await page.keyboard.press('Control+y');
  await expectFigures(page, plan);
});
