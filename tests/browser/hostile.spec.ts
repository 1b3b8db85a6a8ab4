import type { Page } from '@playwright/test';
import { EXAMPLE_PLAN, lengthM } from '../../src/lib';
import { open } from './support/open';
import { expectFigures, field, readFigures } from './support/planner';
import { expect, test } from './support/test';

/** What is no number, or none that could be one of these: nothing changes, and the field says why. */
const UNREADABLE = [
  '',
  'abc',
  '-5',
  '1e309',
  '-1e309',
  'NaN',
  '12 parsecs',
  '<b>7</b>',
  '9'.repeat(400),
];

/** Every number of the front page: its group and its label. */
const NUMBERS = [
  ['Yarn', 'Skein'],
  ['Yarn', 'holds'],
  ['Swatch', 'Stitches'],
  ['Swatch', 'measure across'],
  ['Swatch', 'Rows'],
  ['Swatch', 'measure tall'],
  ['Weighed so far', 'took'],
  ['Blanket', 'Motifs across'],
  ['Blanket', 'down'],
] as const;

/** The figures of the page are figures, whatever they are. */
async function expectRealFigures(page: Page): Promise<void> {
  const answer = page.locator('[data-answer]');
  await expect(answer).toBeVisible();
  await expect(answer).not.toContainText(/NaN|Infinity|∞|undefined|null/);
  expect((await readFigures(page)).skeins).toMatch(/^\d+ skeins?$/);
}

test.beforeEach(({ page }) => open(page, '/'));

for (const [title, label] of NUMBERS) {
  test(`${title}, ${label}: keeps the last answer and says what is wrong`, async ({ page }) => {
    const input = field(page, title, label);
    const before = await input.inputValue();
    for (const typed of UNREADABLE) {
      await input.fill(typed);
      await expect(input, typed).toHaveAttribute('aria-invalid', 'true');
      const id = (await input.getAttribute('aria-describedby'))?.split(' ').at(-1);
      await expect(page.locator(`[id="${id}"]`)).not.toHaveText('');
      await expect(input).toHaveValue(typed);
    }
    await expectFigures(page, EXAMPLE_PLAN);
    await input.fill(before);
    await expect(input).not.toHaveAttribute('aria-invalid');
    await expectFigures(page, EXAMPLE_PLAN);
  });
}

test('an empty price is no price, and an empty side is computed', async ({ page }) => {
  await field(page, 'Yarn', 'costs').fill('');
  await expect(page.locator('[data-answer]')).not.toContainText('€');
  await field(page, 'Motif', 'Side, measured').fill('12');
  await field(page, 'Motif', 'Side, measured').fill('');
  await expectFigures(page, EXAMPLE_PLAN);
});

test('every number at its least and at its most still gives an answer or says that it cannot', async ({
  page,
}) => {
  for (const extreme of ['1', '999999999', '0.1', '0.0001', '10000', '400', '100000']) {
    for (const [title, label] of NUMBERS) await field(page, title, label).fill(extreme);
    await expectRealFigures(page);
  }
  await page.getByRole('button', { name: 'Compare joins' }).click();
  await expect(page.getByRole('dialog')).toContainText(/Whip stitch|cannot/);
  await expect(page.getByRole('dialog')).not.toContainText(/NaN|Infinity|∞/);
});

test('a swatch that no yarn could give is questioned, not refused', async ({ page }) => {
  await field(page, 'Swatch', 'Stitches').fill('3');
  await expect(page.getByText('Please check').first()).toBeVisible();
  await expectRealFigures(page);
});

test('a colour without a name says so, and the name typed is kept as text', async ({ page }) => {
  await page.getByRole('button', { name: 'Change colours' }).click();
  const name = page.getByRole('dialog').getByLabel('Name').first();
  await name.fill('');
  await expect(name).toHaveAttribute('aria-invalid', 'true');
  await expect(page.getByText('A colour needs a name')).toBeVisible();
  await name.fill('<img src=x onerror=alert(1)>');
  await page.keyboard.press('Escape');
  expect((await readFigures(page)).colours[0]?.name).toBe('<img src=x onerror=alert(1)>');
  await expectRealFigures(page);
});

for (const [what, stored] of [
  ['no JSON', '{"yarn":'],
  ['another thing', '[1,2,3]'],
  ['a plan with a number too large', JSON.stringify(EXAMPLE_PLAN).replace('200', '1e999')],
  [
    'a plan of another edition',
    JSON.stringify({ ...EXAMPLE_PLAN, join: { key: 'glue', colour: 'c1' } }),
  ],
] as const) {
  test(`a device that stored ${what} opens with the example`, async ({ page }) => {
    await page.evaluate((text) => localStorage.setItem('ellwise.plan', text), stored);
    await open(page, '/');
    await expectFigures(page, EXAMPLE_PLAN);
    await field(page, 'Yarn', 'holds').fill('150');
    await expectFigures(page, {
      ...EXAMPLE_PLAN,
      yarn: { ...EXAMPLE_PLAN.yarn, putUp: { ...EXAMPLE_PLAN.yarn.putUp, lengthM: lengthM(150) } },
    });
  });
}

test('an address that asks for what there is not opens with the example', async ({ page }) => {
  for (const query of [
    'swatch=<script>',
    'swatch=../../etc',
    'swatch=hexagon%00',
    `swatch=${'x'.repeat(2000)}`,
  ]) {
    await open(page, `/?${query}`);
    await expectFigures(page, EXAMPLE_PLAN);
  }
});
