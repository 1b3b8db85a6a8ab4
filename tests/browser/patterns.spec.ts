import type { Page } from '@playwright/test';
import type { PresentedMotif } from '../../src/schemas/motif';
import { PLAN_EXAMPLE } from '../../src/server/examples';
import { send, signedUp } from './support/accounts';
import { expectAccessible, expectNoSidewaysScroll } from './support/axe';
import { open, ready } from './support/open';
import { group } from './support/planner';
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

/** Of a motif of two rounds. */
const COLOURWAYS = [{ motifIndex: 0, roundColours: ['c1', 'c2'] }];

const field = (page: Page) => page.getByLabel('Pattern text');
const problems = (page: Page) => page.getByRole('main').getByRole('listitem');
const terms = (page: Page, word: 'US' | 'UK') =>
  page.getByRole('radiogroup', { name: 'Terms of the text' }).getByRole('radio', { name: word });

/** On a phone one of text, chart and rounds is on the screen. */
async function panel(page: Page, name: 'Text' | 'Chart' | 'Rounds') {
  const choice = page.getByRole('radio', { name, exact: true });
  if (await choice.isVisible()) await choice.click();
}

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

test('a ready-made motif shows its pattern, is planned, and keeps its name there', async ({
  page,
}) => {
  await open(page, '/motifs/hexagon');
  await expect(field(page)).toHaveValue(/^Rnd 1: Ch 3 \(counts as dc\), dc in magic ring/);
  await expect(field(page)).not.toBeEditable();
  await page.getByRole('button', { name: /^Plan/ }).locator('visible=true').first().click();
  await page.waitForURL('/');
  await ready(page);
  const motif = group(page, 'Motif');
  await expect(motif.getByLabel('Pattern', { exact: true })).toHaveValue('hexagon');
  await expect(motif.getByLabel('Worked to')).toHaveValue('4');
  await motif.getByLabel('Worked to').selectOption('5');
  await expect(motif.getByLabel('Worked to')).toHaveValue('5');
});

test('a motif is kept, saved again, and its older version taken up', async ({ page }) => {
  await signedUp(page);
  await openWith(page, CIRCLE);
  await page.getByLabel('Name of the motif').fill('Capstan');
  await panel(page, 'Chart');
  await page.getByRole('button', { name: 'Keep in my motifs' }).click();
  await page.waitForURL(/\/motifs\/[0-9a-f-]{36}$/);
  await ready(page);
  await expect(page.getByText('Saved as version 1')).toBeVisible();
  await expect(field(page)).toHaveValue(CIRCLE);

  const more = `${CIRCLE}\nRnd 3: Ch 1, sc in each st around; join with sl st in first sc. (24 sc)`;
  await field(page).fill(more);
  await page.getByRole('button', { name: 'Save as version 2' }).click();
  await expect(page.getByText('Saved as version 2')).toBeVisible();

  await page.getByText('Versions: 2').click();
  await page.getByRole('button', { name: 'What has changed' }).click();
  await expect(page.getByRole('dialog').getByText(/Rnd 3: Ch 1/)).toBeVisible();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Take version 1 up again' }).click();
  await expect(page.getByText('Saved as version 3')).toBeVisible();
  await expect(field(page)).toHaveValue(CIRCLE);

  // The draft that it began as is gone: the motif holds the text.
  await open(page, '/motifs/read');
  await expect(field(page)).toHaveValue('');
});

test('a blanket keeps its version of a motif and says when there is a newer one', async ({
  page,
}) => {
  await signedUp(page);
  const pattern = { name: 'Capstan', text: CIRCLE, terms: 'us', sides: 0, size: 0, stitches: [] };
  const kept = await send<PresentedMotif>(page, 'POST', '/api/motifs', pattern, 201);
  const plan = { ...PLAN_EXAMPLE, motifs: [kept.motif], colourways: COLOURWAYS, evidence: [] };
  const join = { key: 'whip-stitch', colour: 'c1' };
  const blanket = await send<{ id: string }>(
    page,
    'POST',
    '/api/blankets',
    { title: 'Deck', plan: { ...plan, join } },
    201,
  );
  await open(page, `/blankets/${blanket.id}`);
  await expect(page.getByText(/^Version \d+ of/)).toHaveCount(0);

  const text = CIRCLE.replace('2 dc in each dc around', '2 tr in each dc around').replace(
    '(24 dc)',
    '(2 dc, 22 tr)',
  );
  await send(page, 'PUT', `/api/motifs/${kept.key}`, { ...pattern, text, version: 1 });
  await open(page, `/blankets/${blanket.id}`);
  await expect(page.getByText(/^Version 2 of Capstan, saved/)).toBeVisible();
  await expect(page.getByText(/Rnd 2 counts .*22\str instead of 24\sdc/)).toBeVisible();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Take version 2' }).click();
  await expect(page.getByText(/^Version 2 of Capstan/)).toHaveCount(0);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByText(/^Version 2 of Capstan/)).toBeVisible();
});

test('the library is narrowed by an address', async ({ page }) => {
  await page.goto('/motifs');
  await page.getByLabel('Shape').selectOption('hexagon');
  await page.getByLabel('Fabric').selectOption('openwork');
  await page.getByRole('button', { name: 'Show', exact: true }).click();
  await expect(page).toHaveURL(/sides=6&kind=openwork/);
  const names = page.getByRole('main').getByRole('heading', { level: 3 });
  await expect(names).toHaveText(['Lattice hexagon']);
  await expectAccessible(page);
  await page.getByRole('link', { name: 'All motifs' }).click();
  await expect(names).toHaveCount(17);
});

test('the draft of a ready-made motif does not take the place of one’s own', async ({ page }) => {
  await openWith(page, CIRCLE);
  await open(page, '/motifs/read?from=solid-square');
  await expect(field(page)).not.toHaveValue(CIRCLE);
  await open(page, '/motifs/read');
  await expect(field(page)).toHaveValue(CIRCLE);
});

test(
  'with the keyboard alone: to each problem, its mending, the chart and the rounds',
  {
    tag: '@desktop',
  },
  async ({ page }) => {
    await openWith(page, WRONG);
    await expect(page.getByRole('heading', { name: /^3 errors/ })).toBeVisible();
    const selected = () =>
      field(page).evaluate((area: HTMLTextAreaElement) =>
        area.value.slice(area.selectionStart, area.selectionEnd),
      );
    await field(page).press('Control+Home');
    await page.keyboard.press('F8');
    await expect.poll(selected).toBe('dcc');
    await page.keyboard.press('F8');
    await expect.poll(selected).toContain('13 dc');
    await page.keyboard.press('Shift+F8');
    await expect.poll(selected).toBe('dcc');
    await page.keyboard.type('dc');
    await expect(problems(page).filter({ hasText: 'dcc' })).toHaveCount(0);

    const chart = page.getByRole('group', { name: /^Chart of/ });
    await chart.focus();
    await page.keyboard.press('ArrowLeft');
    await expect(page.locator('[data-begin].bg-amber\\/45')).not.toHaveCount(0);

    // A round of the table lights its stitches, and leads to its text.
    const mark = chart.locator('svg.keeps-colour path').first();
    await page.keyboard.press('Escape');
    await page.getByRole('button', { name: 'Rnd 2', exact: true }).focus();
    await expect(mark).not.toHaveAttribute('d', '');
    await page.keyboard.press('Enter');
    await expect.poll(selected).toMatch(/^Rnd 2/);
  },
);

test('the clean page writes it out in full words and other terms', async ({ page }) => {
  await openWith(page, CIRCLE);
  await panel(page, 'Rounds');
  const clean = page.getByRole('region', { name: 'Clean pattern page' });
  await clean.getByRole('radio', { name: 'Full words' }).click();
  await expect(clean).toContainText('11 double crochet in magic ring');
  await clean.getByRole('radio', { name: 'UK terms' }).click();
  await expect(clean).toContainText('11 treble in magic ring');
  await clean.getByRole('radio', { name: 'Abbreviations' }).click();
  await expect(clean.getByRole('term').filter({ hasText: /^tr$/ })).toBeVisible();
});

test(
  'a printed pattern holds its name, its rounds and its key, and nothing else',
  {
    tag: '@desktop',
  },
  async ({ page }) => {
    await open(page, '/motifs/hexagon');
    await page.evaluate(() => (window.print = () => undefined));
    await page.getByRole('button', { name: 'Print the pattern' }).click();
    await page.emulateMedia({ media: 'print' });
    const text = await page.getByRole('main').innerText();
    expect(text).toMatch(/^Solid hexagon\n/);
    expect(text).toContain('Rnd 1: Ch 3 (counts as dc)');
    expect(text).toContain('double crochet');
    expect(text).not.toContain('Whip stitch');
    expect(text).not.toContain('Copy');
    await page.evaluate(() => window.dispatchEvent(new Event('afterprint')));
    await expect(page.getByText('Whip stitch', { exact: false }).first()).toBeVisible();
  },
);

for (const colorScheme of ['light', 'dark'] as const) {
  test(`the page is accessible, empty and with problems, ${colorScheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme });
    await open(page, '/motifs/read');
    await expectAccessible(page);
    await field(page).fill(WRONG);
    await expect(page.getByRole('heading', { name: /errors/ })).toBeVisible();
    await expectAccessible(page);
    await expectNoSidewaysScroll(page);
    await open(page, '/motifs/hexagon');
    await expectAccessible(page);
    await panel(page, 'Rounds');
    await expectAccessible(page);
    await expectNoSidewaysScroll(page);
  });
}
