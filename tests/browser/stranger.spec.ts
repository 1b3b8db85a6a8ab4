import type { Page } from '@playwright/test';
import { PART_WORDS, percent } from '../../src/components/planner/words';
import {
  compareJoins,
  estimate,
  EXAMPLE_PLAN,
  lengthM,
  massG,
  PARTS,
  priceMinor,
  READY_JOINS,
  READY_MOTIFS,
  readyMotif,
  showYarn,
  widthMm,
  type Motif,
  type Plan,
} from '../../src/lib';
import {
  withBorder,
  withChangedColour,
  withMotif,
  withRoundColour,
} from '../../src/lib/plan/edits';
import { downloadCsv } from './support/csv';
import { open } from './support/open';
import {
  apiEstimate,
  expectFigures,
  field,
  group,
  readFigures,
  storedPlan,
} from './support/planner';
import { expect, test } from './support/test';

const asJson = (plan: Plan): unknown => JSON.parse(JSON.stringify(plan));

/** Makes a change on the page and the same change to the plan, and compares the two. */
function following(page: Page) {
  let plan = EXAMPLE_PLAN;
  return {
    plan: () => plan,
    async change(edit: (old: Plan) => Plan, act: () => Promise<unknown>): Promise<void> {
      const before = await readFigures(page);
      plan = edit(plan);
      await act();
      await expectFigures(page, plan);
      expect(await readFigures(page), 'the change shows').not.toEqual(before);
    },
  };
}

/** How many sheets of A4 the page makes. */
const printedPages = async (page: Page): Promise<number> =>
  (await page.pdf({ format: 'A4' })).toString('latin1').match(/\/Type \/Page\b/g)?.length ?? 0;

test.beforeEach(({ page }) => open(page, '/'));

test('opens with the example worked out', ({ page }) => expectFigures(page, EXAMPLE_PLAN));

test('recomputes at every change of yarn, swatch, weighed pieces and confidence', async ({
  page,
}) => {
  const { plan, change } = following(page);
  const yarn = (label: string) => field(page, 'Yarn', label);
  const swatch = (label: string) => field(page, 'Swatch', label);
  const putUp = (old: Plan, part: Partial<Plan['yarn']['putUp']>) => ({
    ...old,
    yarn: { ...old.yarn, putUp: { ...old.yarn.putUp, ...part } },
  });
  const swatchOf = (old: Plan, part: Partial<NonNullable<Plan['swatch']>>) => ({
    ...old,
    swatch: old.swatch && { ...old.swatch, ...part },
  });

  await change(
    (old) => putUp(old, { massG: massG(50) }),
    () => yarn('Skein').fill('50'),
  );
  await change(
    (old) => putUp(old, { lengthM: lengthM(92.5) }),
    () => yarn('holds').fill('92,5'),
  );
  await change(
    (old) => swatchOf(old, { stitches: 22 }),
    () => swatch('Stitches').fill('22'),
  );
  await change(
    (old) => swatchOf(old, { widthMm: widthMm(162) }),
    () => swatch('measure across').fill('16.2'),
  );
  await change(
    (old) => swatchOf(old, { rows: 17 }),
    () => swatch('Rows').fill('17'),
  );
  await change(
    (old) => swatchOf(old, { heightMm: widthMm(130) }),
    () => swatch('measure tall').fill('13'),
  );
  await change(
    (old) => swatchOf(old, { stitch: 'hdc' }),
    () => swatch('Worked in').selectOption('hdc'),
  );

  const weighed = (label: string) => field(page, 'Weighed so far', label);
  const motifs = (count: number, grams: number, resolutionG: number) => (old: Plan) => ({
    ...old,
    evidence: [
      {
        piece: 'motifs' as const,
        count,
        motifIndex: 0,
        reading: {
          by: 'weighing' as const,
          massG: massG(grams),
          resolutionG: massG(resolutionG),
        },
      },
    ],
  });
  await change(motifs(6, 40, 1), () => weighed('Piece').selectOption('6'));
  await change(motifs(6, 55, 1), () => weighed('took').fill('55'));
  await change(motifs(6, 55, 0.1), () => weighed('Scale reads').selectOption('0.1'));
  await change(
    (old) => ({ ...old, evidence: [] }),
    () => page.getByRole('button', { name: 'Remove' }).click(),
  );
  await change(
    (old) => ({ ...old, swatch: null }),
    () => page.getByRole('button', { name: 'No swatch' }).click(),
  );
  await change(
    (old) => ({ ...old, yarn: { ...old.yarn, weightCategory: 5 } }),
    () => yarn('Weight').selectOption('5'),
  );
  await change(
    (old) => ({ ...old, confidence: 0.99 }),
    () => page.getByRole('radio', { name: '99 %' }).click(),
  );
  await yarn('costs').fill('4.2');
  const priced = {
    ...plan(),
    yarn: { ...plan().yarn, price: { priceMinor: priceMinor(420), currency: 'EUR' } },
  };
  await expect.poll(() => storedPlan(page)).toEqual(asJson(priced));
  const { costMinor } = estimate(priced).totals;
  await expect(page.locator('[data-answer]')).toContainText(
    `€${((costMinor ?? 0) / 100).toFixed(2)}`,
  );
});

test('works out each of the six motifs', async ({ page }) => {
  expect(READY_MOTIFS.length).toBeGreaterThanOrEqual(6);
  const { plan, change } = following(page);
  const rounds = () => plan().motifs[0]?.rounds.length ?? 0;
  for (const { key } of READY_MOTIFS.toReversed()) {
    await change(
      (old) => withMotif(old, readyMotif(key, rounds()) as Motif),
      () => field(page, 'Motif', 'Pattern').selectOption(key),
    );
    const name = plan().motifs[0]?.name.toLowerCase();
    await expect(page.getByRole('img', { name: `of ${name}` })).toBeVisible();
  }
  await change(
    (old) => withMotif(old, readyMotif('group-square', 3) as Motif),
    () => field(page, 'Motif', 'Worked to').selectOption('3'),
  );
  await change(
    (old) => ({ ...old, motifSideMm: widthMm(105) }),
    () => field(page, 'Motif', 'Side, measured').fill('10.5'),
  );
});

test('recomputes at every change of size, colours, join and border', async ({ page }) => {
  const { change } = following(page);
  const blanket = (label: string) => field(page, 'Blanket', label);
  await change(
    (old) => ({ ...old, size: { by: 'grid', rows: 10, columns: 6 } }),
    () => blanket('Motifs across').fill('6'),
  );
  await change(
    (old) => ({ ...old, size: { by: 'grid', rows: 7, columns: 6 } }),
    () => blanket('down').fill('7'),
  );
  await change(
    (old) => ({ ...old, join: { ...old.join, key: 'sc-ridge' } }),
    () => blanket('Join').selectOption('sc-ridge'),
  );
  await change(
    (old) => ({ ...old, join: { ...old.join, colour: 'c3' } }),
    () => blanket('Joined in').selectOption('c3'),
  );
  await change(
    (old) => ({ ...old, corners: 'gathered' }),
    () => blanket('Corners').selectOption('gathered'),
  );
  await change(
    (old) => withBorder(old, 5, 'sc'),
    () => blanket('Border').selectOption('5'),
  );
  await change(
    (old) => withBorder(old, 5, 'hdc'),
    () => blanket('of').selectOption('hdc'),
  );

  await page.getByRole('radio', { name: 'A size wanted' }).click();
  const target = (width: number, height: number, rule: 'nearest' | 'at-least') => (old: Plan) => ({
    ...old,
    size: { by: 'target' as const, widthMm: widthMm(width), heightMm: widthMm(height), rule },
  });
  await blanket('Width').fill('142');
  await change(target(1420, 1830, 'nearest'), () => blanket('height').fill('183'));
  await change(target(1420, 1830, 'at-least'), () =>
    blanket('Motifs for').selectOption('at-least'),
  );

  await page.getByRole('button', { name: 'Change colours' }).click();
  const sheet = page.getByRole('dialog', { name: 'Colours' });
  await change(
    (old) => withRoundColour(old, 0, 1, 'c5'),
    () => sheet.getByLabel('Rnd 2').first().selectOption('c5'),
  );
  await change(
    (old) => ({
      ...old,
      border: old.border.map((each, i) => (i === 4 ? { ...each, colour: 'c4' } : each)),
    }),
    () => sheet.getByLabel('Round 5').selectOption('c4'),
  );
  await change(
    (old) => withChangedColour(old, 'c2', { name: 'Oatmeal' }),
    () => sheet.getByLabel('Name').nth(1).fill('Oatmeal'),
  );
});

test('agrees with the library and the API to the last digit', async ({ page }) => {
  await field(page, 'Yarn', 'holds').fill('187');
  await field(page, 'Motif', 'Pattern').selectOption('hexagon');
  await field(page, 'Blanket', 'Join').selectOption('slip-stitch');
  const motif = readyMotif('hexagon', 4) as Motif;
  const plan: Plan = {
    ...withMotif(EXAMPLE_PLAN, motif),
    yarn: { ...EXAMPLE_PLAN.yarn, putUp: { massG: massG(100), lengthM: lengthM(187) } },
    join: { key: 'slip-stitch', colour: 'c1' },
  };
  await expectFigures(page, plan);
  const result = estimate(plan);
  expect(await apiEstimate(page, plan)).toEqual(JSON.parse(JSON.stringify(result)));

  await page.getByRole('button', { name: 'Open the ledger' }).click();
  const { rows } = await downloadCsv(page, () =>
    page.getByRole('button', { name: 'Export CSV' }).click(),
  );
  const nameOf = (key: string) => plan.colours.find((colour) => colour.key === key)?.name;
  const line = (each: (typeof result.ledger)[number]) => [
    nameOf(each.colour),
    each.part,
    each.label,
    each.stitch ?? '',
    each.lengthM,
    each.varianceM2,
  ];
  const read = rows.map((row) => [
    ...[row.colour, row.part, row.what, row.stitch_us],
    Number(row.length_m),
    Number(row.variance_m2),
  ]);
  const byText = (left: unknown[], right: unknown[]) => (String(left) < String(right) ? -1 : 1);
  expect(read.toSorted(byText)).toEqual(result.ledger.map(line).toSorted(byText));
});

test('opens a figure to its ledger lines', async ({ page }) => {
  const result = estimate(EXAMPLE_PLAN);
  const lines = result.ledger.filter(({ colour }) => colour === 'c3');
  await page.getByRole('button', { name: 'how Rosehip is worked out' }).click();
  const sheet = page.getByRole('dialog', { name: 'How this is worked out' });
  await expect(sheet.getByRole('row')).toHaveCount(lines.length + 1);
  const needed = lines.reduce((sum, each) => sum + each.lengthM, 0);
  expect(needed).toBeCloseTo(result.colours[2]?.neededM ?? 0, 9);
  await expect(sheet).toContainText(`${showYarn(needed, 'metric')} in ${lines.length} lines`);
  await expect(sheet.getByText('from a piece you measured').first()).toBeVisible();
  await sheet.getByLabel('Colour', { exact: true }).selectOption('all');
  await expect(sheet.getByRole('row')).toHaveCount(Math.min(50, result.ledger.length) + 1);
  await page.keyboard.press('Escape');
  await expect(sheet).toBeHidden();
});

test('shows the parts when they come into view, the doubt and what would narrow it', async ({
  page,
}) => {
  const { parts, next, uncertainty } = estimate(EXAMPLE_PLAN);
  const panel = page
    .locator('section')
    .filter({ has: page.getByRole('heading', { name: 'Where it goes' }) });
  await expect(panel.locator('figcaption')).toHaveCount(0);
  await panel.scrollIntoViewIfNeeded();
  const words = PARTS.map((part) => {
    const ofPart = parts.filter((each) => each.part === part);
    const metres = ofPart.reduce((sum, each) => sum + each.lengthM, 0);
    return `${PART_WORDS[part]}: ${showYarn(metres, 'metric')}`;
  });
  await expect(panel.locator('figcaption')).toHaveText(words.join('; '));
  await expect(panel.locator('svg path').first()).toBeVisible();

  const [best] = next;
  const advice = page.locator('section').filter({ hasText: 'Narrow it further' });
  await expect(advice).toContainText(
    `the margin falls from ±${percent(best?.marginNow ?? 0)} to ±${percent(best?.marginThen ?? 0)}`,
  );
  const doubt = page.locator('section').filter({ hasText: 'What the doubt is made of' });
  const [largest] = uncertainty.toSorted((left, right) => right.share - left.share);
  await expect(doubt.getByRole('listitem').first()).toContainText(
    `${Math.round(100 * (largest?.share ?? 0))} %`,
  );
});

test('compares the joins and takes one over', async ({ page }) => {
  const joins = compareJoins(EXAMPLE_PLAN, READY_JOINS).toSorted((a, b) => a.joinM - b.joinM);
  expect(joins.length).toBeGreaterThanOrEqual(6);
  await page.getByRole('button', { name: 'Compare joins' }).click();
  const sheet = page.getByRole('dialog', { name: 'Compare joins' });
  const names = sheet.getByRole('rowheader').locator('b');
  await expect(names).toHaveText(joins.map(({ join }) => join.name));
  const { rows, fileName } = await downloadCsv(page, () =>
    sheet.getByRole('button', { name: 'Export CSV' }).click(),
  );
  expect(fileName).toBe('joins.csv');
  expect(rows.map(({ join_m }) => Number(join_m))).toEqual(joins.map(({ joinM }) => joinM));
  expect(rows.map(({ skeins }) => Number(skeins))).toEqual(joins.map(({ skeins }) => skeins));

  await sheet.getByRole('button', { name: 'Tails' }).click();
  const tails = () => sheet.getByRole('row').locator('td:nth-last-of-type(2)').allTextContents();
  await expect
    .poll(async () => {
      const found = (await tails()).map((text) => Number(text.replaceAll(',', '')));
      return JSON.stringify(found) === JSON.stringify(found.toSorted((a, b) => b - a));
    })
    .toBe(true);

  await sheet.getByRole('button', { name: 'Use whip stitch' }).click();
  await expect(sheet.getByRole('row').filter({ hasText: 'Whip stitch' })).toContainText(
    'in this plan',
  );
  await sheet.getByRole('button', { name: 'Close' }).click();
  await expectFigures(page, { ...EXAMPLE_PLAN, join: { key: 'whip-stitch', colour: 'c1' } });
});

test('gives the shopping list as a file and on paper', async ({ page, isMobile }) => {
  const name = '=1+1';
  const plan = withChangedColour(EXAMPLE_PLAN, 'c4', { name });
  await page.getByRole('button', { name: 'Change colours' }).click();
  await page.getByRole('dialog').getByLabel('Name').nth(3).fill(name);
  await page.keyboard.press('Escape');
  const place = page.locator(isMobile ? '.answer-bar' : '[data-answer]');
  await place.getByRole('button', { name: 'Shopping list' }).click();
  const sheet = page.getByRole('dialog', { name: 'Shopping list' });
  await expect(sheet.getByRole('rowheader')).toHaveText([
    ...plan.colours.map((colour) => colour.name),
    'In all',
  ]);

  const { header, rows, fileName } = await downloadCsv(page, () =>
    sheet.getByRole('button', { name: 'Download CSV' }).click(),
  );
  expect(fileName).toBe('shopping-list.csv');
  expect(header.slice(0, 4)).toEqual(['Yarn', 'Colour', 'Needed (m)', 'Needed (g)']);
  const tenth = (value = 0) => Math.round(value * 10) / 10;
  const wanted = estimate(plan).colours.map((colour, i) => [
    plan.yarn.name,
    // What a spreadsheet would run is led by a quote.
    i === 3 ? "'=1+1" : plan.colours[i]?.name,
    ...[tenth(colour.neededM), tenth(colour.neededG), 0, 0, colour.skeins],
    ((colour.costMinor ?? 0) / 100).toFixed(2),
    ...['EUR', '', ''],
  ]);
  expect(rows.map((row) => Object.values(row))).toEqual(wanted.map((row) => row.map(String)));

  await page.emulateMedia({ media: 'print' });
  await expect(sheet.getByRole('table')).toBeVisible();
  await expect(sheet.getByRole('button', { name: 'Download CSV' })).toBeHidden();
  await expect(page.locator('form[aria-label="The plan"]')).toBeHidden();
  expect(await printedPages(page)).toBe(1);
});

test('undoes and redoes by button and by key, and keeps the plan over a reload', async ({
  page,
}) => {
  const wide: Plan = { ...EXAMPLE_PLAN, size: { by: 'grid', rows: 10, columns: 12 } };
  const plain: Plan = { ...wide, border: [] };
  const undo = page.getByRole('button', { name: 'Undo' });
  const redo = page.getByRole('button', { name: 'Redo' });
  await expect(undo).toBeDisabled();
  // Typing in one field is one step.
  await field(page, 'Blanket', 'Motifs across').selectText();
  await page.keyboard.type('12');
  await field(page, 'Blanket', 'Border').selectOption('0');
  await expectFigures(page, plain);

  await undo.click();
  await expectFigures(page, wide);
  await page.keyboard.press('Control+z');
  await expectFigures(page, EXAMPLE_PLAN);
  await expect(undo).toBeDisabled();
  await expect(field(page, 'Blanket', 'Motifs across')).toHaveValue('8');
  await page.keyboard.press('Control+Shift+z');
  await expectFigures(page, wide);
  await redo.click();
  await expectFigures(page, plain);
  await expect(redo).toBeDisabled();

  await expect.poll(() => storedPlan(page)).toEqual(asJson(plain));
  await open(page, '/');
  await expectFigures(page, plain);
  await expect(page.getByText('Your plan, kept on this device.')).toBeVisible();
  await page.getByRole('button', { name: 'Example' }).click();
  await expectFigures(page, EXAMPLE_PLAN);
  await expect.poll(() => storedPlan(page)).toBeNull();
});

test('shows inches and back without changing a figure', async ({ page }) => {
  const unit = (title: string) =>
    page.getByRole('group', { name: 'Units' }).getByRole('button', { name: title });
  await field(page, 'Swatch', 'measure across').fill('14.9');
  const plan = {
    ...EXAMPLE_PLAN,
    swatch: EXAMPLE_PLAN.swatch && { ...EXAMPLE_PLAN.swatch, widthMm: widthMm(149) },
  };
  await expectFigures(page, plan);
  const kept = page.waitForResponse((response) => response.url().endsWith('/preferences'));
  await unit('in: imperial').click();
  await kept;
  await expectFigures(page, plan, 'imperial');
  const shown = async (title: string, label: string) =>
    Number(await field(page, title, label).inputValue());
  // 149 mm of 25.4 to the inch, 200 m of 0.9144 to the yard (exact by the 1959 agreement).
  expect(await shown('Swatch', 'measure across')).toBeCloseTo(149 / 25.4, 1);
  expect(await shown('Yarn', 'holds')).toBeCloseTo(200 / 0.9144, 0);

  await open(page, '/');
  await expectFigures(page, plan, 'imperial');
  await unit('cm: metric').click();
  await expectFigures(page, plan);
  await expect(field(page, 'Swatch', 'measure across')).toHaveValue('14.9');
  await expect.poll(() => storedPlan(page)).toEqual(asJson(plan));
});

test('speaks UK terms to whoever asks for them', async ({ page }) => {
  await expect(field(page, 'Swatch', 'Worked in')).toHaveValue('sc');
  await open(page, '/preferences');
  await page.getByText('UK', { exact: false }).first().click();
  await page.getByRole('button', { name: 'Save' }).click();
  await open(page, '/');
  const chosen = (label: string, title: string) =>
    field(page, title, label).evaluate(
      (select: HTMLSelectElement) => select.selectedOptions[0]?.text,
    );
  await expect(group(page, 'Tension square')).toBeVisible();
  expect(await chosen('Worked in', 'Tension square')).toBe('dc');
  expect(await chosen('of', 'Blanket')).toBe('dc');
  await expectFigures(page, EXAMPLE_PLAN);
});
