import { expect, type Locator, type Page } from '@playwright/test';
import { ruleEnd } from '../../../src/components/ui/ruleTicks';
import {
  estimate,
  showFabric,
  showSize,
  yarnFigure,
  type Estimate,
  type Plan,
  type Units,
} from '../../../src/lib';

/** What the estimator's page says about a plan. */
export interface Figures {
  skeins: string;
  colours: { name: string; mean: string; margin: string; skeins: string }[];
  /** The ends of the rule along the top and the left edge. */
  rule: string[];
  size: string;
  giveOrTake: string;
}

/** What it has to say, from the library. */
export function figuresOf(plan: Plan, units: Units = 'metric', result = estimate(plan)): Figures {
  const { size, totals } = result;
  return {
    skeins: `${totals.skeins} ${totals.skeins === 1 ? 'skein' : 'skeins'}`,
    colours: result.colours.map(({ colour, meanM, neededM, skeins }) => ({
      name: plan.colours.find(({ key }) => key === colour)?.name ?? '',
      mean: yarnFigure(meanM, units),
      margin: `± ${yarnFigure(Math.abs(neededM - meanM), units)}`,
      skeins: String(skeins),
    })),
    rule: [ruleEnd(size.widthMm, units), ruleEnd(size.heightMm, units)],
    size: showSize(size.widthMm, size.heightMm, units),
    giveOrTake: `${showFabric(1.96 * size.widthSdMm, units)} by ${showFabric(1.96 * size.heightSdMm, units)}`,
  };
}

export const readFigures = (page: Page): Promise<Figures> =>
  page.locator('[data-answer]').evaluate((answer): Figures => {
    const text = (element: Element | null | undefined) => element?.textContent?.trim() ?? '';
    const picture = answer.querySelector('svg[aria-label^="The blanket to scale"]');
    const sentence = picture?.closest('figure')?.nextElementSibling;
    return {
      skeins: text(answer.querySelector('[aria-live]')),
      colours: [...answer.querySelectorAll('table tbody tr')].map((row) => {
        const [mean, margin] = row.querySelectorAll('td:nth-of-type(1) span');
        return {
          name: text(row.querySelector('th b')),
          mean: text(mean),
          margin: text(margin),
          skeins: text(row.querySelector('td:nth-of-type(2)')),
        };
      }),
      rule: [...(picture?.querySelectorAll('g.font-bold > text') ?? [])].map(text),
      size: text(sentence?.querySelector('b')),
      giveOrTake: /Give or take ([\d.,]+\s\w+ by [\d.,]+\s\w+)/.exec(text(sentence))?.[1] ?? '',
    };
  });

/** The page shows what the library says about this plan. */
export const expectFigures = (page: Page, plan: Plan, units: Units = 'metric'): Promise<void> =>
  expect.poll(() => readFigures(page)).toEqual(figuresOf(plan, units));

/** The plan that this device keeps, as the page wrote it. */
export const storedPlan = (page: Page): Promise<unknown> =>
  page.evaluate(() => JSON.parse(localStorage.getItem('ellwise.plan') ?? 'null'));

/** The inputs, group by group: "Yarn", "Swatch", "Weighed so far", "Motif", "Blanket". */
export const group = (page: Page, title: string): Locator =>
  page.getByRole('form', { name: 'The plan' }).getByRole('group', { name: title, exact: true });

export const field = (page: Page, title: string, label: string): Locator =>
  group(page, title).getByLabel(label, { exact: true });

/** The answer of `POST /api/estimates`, as a program would get it. */
export async function apiEstimate(page: Page, plan: Plan): Promise<Estimate> {
  const answer = await page.request.post('/api/estimates', {
    data: plan,
    headers: await sameOrigin(page),
  });
  expect(answer.status()).toBe(200);
  return answer.json();
}

export async function sameOrigin(page: Page): Promise<{ origin: string }> {
  return { origin: new URL(page.url()).origin };
}
