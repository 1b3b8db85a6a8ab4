import { defineConfig, type PlaywrightTestConfig } from '@playwright/test';

const { BASE_URL, CHROMIUM_PATH = '/usr/bin/chromium' } = process.env;
if (!BASE_URL) throw new Error('BASE_URL must be the address of a built site: npm test -- browser');

/** Chromium in a container as root, without any of its own errands over the network. */
const CHROMIUM_ARGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

type Project = NonNullable<PlaywrightTestConfig['projects']>[number];

const desktop: Project = {
  name: 'desktop',
  grepInvert: /@touch/,
  use: { viewport: { width: 1280, height: 800 } },
};

/**
 * Only what the width or a finger changes is tried again on a phone: of these files all but the tests
 * tagged @desktop. A test tagged @touch needs fingers.
 */
const phone: Project = {
  name: 'phone',
  testMatch: /(stranger|accessibility|accounts|stash|chart|patterns|making|painting)\.spec\.ts$/,
  grepInvert: /@desktop/,
  use: { viewport: { width: 390, height: 844 }, isMobile: true, hasTouch: true },
};

export default defineConfig({
  testDir: '.',
  fullyParallel: true,
  workers: 2,
  // A test that passes only the second time has found something.
  retries: 0,
  forbidOnly: !!process.env.CI,
  // Against hanging; generous because the machine may be busy with something else.
  timeout: 90_000,
  expect: { timeout: 15_000 },
  use: {
    baseURL: BASE_URL,
    locale: 'en-GB',
    timezoneId: 'UTC',
    acceptDownloads: true,
    launchOptions: { executablePath: CHROMIUM_PATH, args: CHROMIUM_ARGS },
    screenshot: 'only-on-failure',
  },
  projects: [desktop, phone],
});
