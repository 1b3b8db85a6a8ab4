import type { Page } from '@playwright/test';
import { EXAMPLE_PLAN, lengthM, type Plan } from '../../src/lib';
import { linkSentTo, signedUp, somebody, type Person } from './support/accounts';
import { open, ready } from './support/open';
import { expectFigures, field } from './support/planner';
import { expect, test } from './support/test';

/** The example in a yarn of another length, on a smaller grid. */
const PLAN: Plan = {
  ...EXAMPLE_PLAN,
  yarn: { ...EXAMPLE_PLAN.yarn, putUp: { ...EXAMPLE_PLAN.yarn.putUp, lengthM: lengthM(175) } },
  size: { by: 'grid', rows: 6, columns: 5 },
};

async function planIt(page: Page): Promise<void> {
  await open(page, '/');
  await field(page, 'Yarn', 'holds').fill('175');
  await field(page, 'Blanket', 'Motifs across').fill('5');
  await field(page, 'Blanket', 'down').fill('6');
  await expectFigures(page, PLAN);
}

async function signInByForm(page: Page, { email, password }: Person): Promise<void> {
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

test('a stranger registers, confirms, signs in, keeps the blanket and finds it on another device', async ({
  page,
  newDevice,
}) => {
  const person = somebody('Maren Holt');
  await planIt(page);
  await page.getByRole('link', { name: 'Sign up to keep it' }).click();
  await ready(page);
  await page.getByLabel('Name').fill(person.name);
  await page.getByLabel('E-mail').fill(person.email);
  await page.getByLabel('Password', { exact: true }).fill(person.password);
  await page.getByRole('button', { name: 'Register' }).click();
  await expect(page.getByText('A letter is on its way')).toContainText(person.email);

  await page.goto(await linkSentTo(page, person.email, 'Confirm your e-mail address'));
  await page.getByRole('button', { name: 'Confirm the address' }).click();
  await page.getByRole('main').getByRole('link', { name: 'Sign in' }).first().click();
  await ready(page);
  await expect(page.getByLabel('E-mail')).toHaveValue(person.email);
  await signInByForm(page, person);
  await page.waitForURL((url) => url.pathname !== '/sign-in');

  await open(page, '/');
  await expectFigures(page, PLAN);
  await page.getByRole('button', { name: 'Keep this blanket' }).click();
  await page.getByLabel('Title').fill('For the reading chair');
  await page.getByRole('button', { name: 'Keep it' }).click();
  await page.waitForURL('**/blankets/*');
  await ready(page);
  await expectFigures(page, PLAN);
  await expect(page.getByText('Saved', { exact: true })).toBeVisible();
  const address = new URL(page.url()).pathname;

  const second = await newDevice();
  // Asked for signed out, the blanket is shown after signing in.
  await open(second, address);
  await signInByForm(second, person);
  await second.waitForURL(`**${address}`);
  await ready(second);
  await expectFigures(second, PLAN);
  await expect(second.getByLabel('Blanket', { exact: true })).toHaveValue('For the reading chair');

  await field(second, 'Blanket', 'Border').selectOption('0');
  await expect(second.getByText('Saved', { exact: true })).toBeVisible();
  await open(page, address);
  await expectFigures(page, { ...PLAN, border: [] });
});

test('a forgotten password is replaced, which ends every other session', async ({
  page,
  newDevice,
}) => {
  const person = await signedUp(page);
  const second = await newDevice();
  await open(second, '/sign-in');
  await second.getByRole('link', { name: 'Forgotten the password?' }).click();
  await ready(second);
  await second.getByLabel('E-mail').fill(person.email);
  await second.getByRole('button', { name: 'Send me a link' }).click();
  await expect(second.getByText('Look into your mail')).toBeVisible();

  const link = await linkSentTo(second, person.email, 'Choose a new password');
  await open(second, link);
  const renewed = { ...person, password: 'six more skeins of sloe' };
  await second.getByLabel('New password').fill(renewed.password);
  await second.getByRole('button', { name: 'Change the password' }).click();
  await second.getByRole('main').getByRole('link', { name: 'Sign in' }).click();
  await ready(second);
  await signInByForm(second, person);
  await expect(second.getByRole('alert')).toBeVisible();
  await signInByForm(second, renewed);
  await second.waitForURL((url) => url.pathname !== '/sign-in');

  // The session of before is over, and the link works once only.
  await page.goto('/settings');
  await expect(page).toHaveURL(/\/sign-in/);
});

test('signing out ends the session of this browser', async ({ page, isMobile }) => {
  const person = await signedUp(page, somebody('Joost Lind'));
  await page.goto('/settings');
  await expect(page).toHaveURL(/\/settings$/);
  await openAccountMenu(page, isMobile, person.name);
  await page.getByRole('button', { name: 'Sign out' }).click();
  await page.waitForURL('**/');
  if (isMobile) await openAccountMenu(page, isMobile, person.name);
  await expect(page.getByRole('link', { name: 'Sign in' })).toBeVisible();
  await page.goto('/settings');
  await expect(page).toHaveURL(/\/sign-in/);
});

/** On a phone the person's menu is part of the site's. */
const openAccountMenu = (page: Page, isMobile: boolean, name: string): Promise<void> =>
  page
    .getByRole('banner')
    .getByText(isMobile ? 'Menu' : name, { exact: true })
    .first()
    .click();
