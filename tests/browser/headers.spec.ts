import { open } from './support/open';
import { expect, test } from './support/test';

const PATHS = ['/', '/joins', '/sign-in', '/favicon.svg', '/api/openapi.json', '/no-such-page'];

for (const path of PATHS) {
  test(`${path} is sent with the headers that protect it`, async ({ request }) => {
    const headers = (await request.get(path)).headers();
    const policy = headers['content-security-policy'] ?? '';
    expect(policy).toContain("default-src 'self'");
    expect(policy).toContain("object-src 'none'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy.match(/script-src[^;]*/)?.[0]).not.toMatch(/unsafe|\*|https?:/);
    expect(headers).toMatchObject({
      'x-content-type-options': 'nosniff',
      'referrer-policy': 'strict-origin-when-cross-origin',
      'cross-origin-opener-policy': 'same-origin',
    });
    expect(headers['x-powered-by']).toBeUndefined();
  });
}

test('a script that is not ours does not run', async ({ page, expectProblem }) => {
  expectProblem(/Content Security Policy/);
  await open(page, '/');
  const ran = await page.evaluate(() => {
    const script = document.createElement('script');
    script.textContent = 'window.intruder = true';
    document.body.append(script);
    return 'intruder' in window;
  });
  expect(ran).toBe(false);
});

const SHEETS = [
  'Change colours',
  'Paint it',
  'Open the ledger',
  'Compare joins',
  'Several sizes',
  'Border round by round',
  'Shopping list',
] as const;

test('everything the front page opens keeps to the policy', async ({ page }) => {
  await page.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', ({ violatedDirective, blockedURI }) => {
      console.error(`breach of ${violatedDirective}: ${blockedURI}`);
    });
  });
  await open(page, '/');
  for (const name of SHEETS) {
    await page.getByRole('button', { name, exact: true }).first().click();
    await expect(page.getByRole('dialog')).toBeVisible();
    await page.keyboard.press('Escape');
  }
  await page.getByRole('heading', { name: 'Where it goes' }).scrollIntoViewIfNeeded();
  await expect(page.locator('.recharts-surface').first()).toBeVisible();
});
