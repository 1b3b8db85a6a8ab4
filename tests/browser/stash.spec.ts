import type { Page } from '@playwright/test';
import { EXAMPLE_PLAN, estimate, shoppingList } from '../../src/lib';
import { send, signedUp, somebody } from './support/accounts';
import { parseCsv } from './support/csv';
import { open } from './support/open';
import { expect, test } from './support/test';

interface Row {
  id: string;
}

const blanket = { title: 'Eighty squares', plan: EXAMPLE_PLAN };

/** Two whole skeins of Skerry in one lot, and a part skein of 35 g. */
const LOT = { lotCode: 'K 114', wholeSkeins: 2, partMassesG: [35] };
const LIST = shoppingList({
  plan: EXAMPLE_PLAN,
  estimate: estimate(EXAMPLE_PLAN),
  stash: [{ colour: 'c1', ...LOT, putUpMassG: 100, putUpLengthM: 200 }],
});
const [SKERRY, BARLEY] = LIST.lines;

/** Puts the lot in by the form: a yarn, a colour and a lot that are all new. */
async function addLot(page: Page): Promise<void> {
  await open(page, '/stash');
  await page.getByRole('button', { name: 'Add yarn' }).click();
  const sheet = page.getByRole('dialog', { name: 'Add yarn to the stash' });
  const type = (label: string, value: string) =>
    sheet.getByLabel(label, { exact: true }).fill(value);
  await type('Yarn name', 'Lindry Aran');
  await sheet.getByLabel('Weight', { exact: true }).selectOption('4');
  await type('Skein', '100');
  await type('holds', '200');
  await type('Colour name', 'Skerry');
  await type('Dye lot', LOT.lotCode);
  await type('Whole skeins', String(LOT.wholeSkeins));
  await sheet.getByRole('button', { name: 'Part skein', exact: true }).click();
  await type('Part skein 1', '35');
  await expect(sheet.getByRole('status').filter({ hasText: '470' })).toContainText('235 g');
  await sheet.getByRole('button', { name: 'Add to the stash' }).click();
  await expect(sheet).toBeHidden();
  await expect(page.getByRole('main')).toContainText(LOT.lotCode);
}

test('what is put into the stash is taken off the shopping list', async ({ page }) => {
  await signedUp(page);
  await addLot(page);
  const { id } = await send<Row>(page, 'POST', '/api/blankets', blanket, 201);
  await open(page, `/blankets/${id}/shopping-list`);
  const row = (name: string) => page.getByRole('row').filter({ hasText: name });
  await expect(row('Skerry')).toContainText('470 m');
  await expect(row('Skerry').locator('td').nth(2)).toContainText(String(SKERRY?.toBuySkeins));
  await expect(row('Barley').locator('td').nth(2)).toContainText(String(BARLEY?.toBuySkeins));
  await expect(row('In all')).toContainText(String(LIST.toBuySkeins));
  await expect(page.getByText('lot K 114: 470 m (235 g)')).toBeVisible();

  // The file that the link gives says the same.
  const href = await page.getByRole('link', { name: 'Download CSV' }).getAttribute('href');
  const { rows } = parseCsv(await (await page.request.get(href ?? '')).text());
  expect(rows.map((row) => Number(row['To buy (skeins)']))).toEqual(
    LIST.lines.map(({ toBuySkeins }) => toBuySkeins),
  );
  expect(rows[0]).toMatchObject({
    Colour: 'Skerry',
    'Have (m)': '470',
    'Have (g)': '235',
    'Dye lots': LOT.lotCode,
  });

  // Kept out of it, the whole need is to buy again.
  await page.getByLabel('Skerry is served by').selectOption('none');
  await expect(page.getByText('Kept out of the stash.')).toBeVisible();
  const whole = estimate(EXAMPLE_PLAN).totals.skeins;
  await expect(row('In all')).toContainText(String(whole));
});

test('a list that is kept is ticked off, and the ticks stay', async ({ page }) => {
  await signedUp(page);
  const { id } = await send<Row>(page, 'POST', '/api/blankets', blanket, 201);
  await open(page, `/blankets/${id}/shopping-list`);
  await page.getByRole('button', { name: 'Keep it to tick off' }).click();
  await page.waitForURL('**/shopping-lists/*');
  await open(page, page.url());
  const count = (words: string) =>
    expect(page.getByRole('status').filter({ hasText: words })).toBeVisible();
  await page.getByRole('checkbox', { name: /^Barley/ }).check();
  await count('1 of 5 colours bought');
  await page.getByRole('checkbox', { name: /^Sloe/ }).check();
  await count('2 of 5 colours bought');
  await count('Saved');

  await open(page, page.url());
  await count('2 of 5 colours bought');
  await expect(page.getByRole('checkbox', { name: /^Barley/ })).toBeChecked();
  await expect(page.getByRole('checkbox', { name: /^Skerry/ })).not.toBeChecked();
});

test("another person's addresses look like addresses of nothing", async ({
  page,
  newDevice,
  expectProblem,
}) => {
  expectProblem(/404 \(Not Found\)/);
  await signedUp(page);
  const { id } = await send<Row>(page, 'POST', '/api/blankets', blanket, 201);
  const list = await send<Row>(page, 'POST', '/api/shopping-lists', { blanketId: id }, 201);
  const swatch = await send<Row>(
    page,
    'POST',
    '/api/swatches',
    {
      name: 'Mine',
      yarnId: null,
      stitch: 'sc',
      stitches: 20,
      rows: 20,
      hookMm: null,
      notes: '',
      measurements: [],
    },
    201,
  );
  const other = await newDevice();
  await signedUp(other, somebody('Piet Wold'));
  const nobodys = '00000000-0000-4000-8000-000000000000';
  for (const [path, own] of [
    ['/blankets/ID', id],
    ['/blankets/ID/shopping-list', id],
    ['/shopping-lists/ID', list.id],
    ['/swatches/ID', swatch.id],
  ] as const) {
    const answers = [];
    for (const each of [own, nobodys, 'not-an-id']) {
      const address = path.replace('ID', each);
      const answer = await other.goto(address);
      await expect(other.getByRole('heading', { level: 1 })).toHaveText(
        'There is nothing at this address',
      );
      answers.push(answer?.status());
      if (each === own) expect((await page.request.get(address)).status()).toBe(200);
    }
    expect(answers, path).toEqual([404, 404, 404]);
  }
});
