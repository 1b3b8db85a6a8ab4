import { test as base, expect, type BrowserContext, type Page } from '@playwright/test';

export { expect };

interface Fixtures {
  /** Lets this test log errors that match; any other error on a page's console fails it. */
  expectProblem: (pattern: RegExp) => void;
  /** A browser of its own with nothing stored: another device of the same person, or a stranger. */
  newDevice: () => Promise<Page>;
}

interface Watched extends Fixtures {
  problems: { found: string[]; expected: RegExp[] };
}

/**
 * Every page of a test is watched: an error on its console (React's about hydration among them), an
 * exception nobody caught and a breach of the content policy each fail the test.
 */
export const test = base.extend<Watched>({
  // eslint-disable-next-line no-empty-pattern -- how Playwright is told that nothing is needed
  problems: async ({}, use) => {
    const problems: Watched['problems'] = { found: [], expected: [] };
    await use(problems);
    const unexpected = problems.found.filter(
      (message) => !problems.expected.some((pattern) => pattern.test(message)),
    );
    expect(unexpected, 'errors on the console').toEqual([]);
  },

  context: async ({ context, problems }, use) => {
    watch(context, problems.found);
    await use(context);
  },

  expectProblem: async ({ problems }, use) => {
    await use((pattern) => problems.expected.push(pattern));
  },

  newDevice: async ({ browser, contextOptions, problems }, use) => {
    const contexts: BrowserContext[] = [];
    await use(async () => {
      const context = await browser.newContext(contextOptions);
      watch(context, problems.found);
      contexts.push(context);
      return context.newPage();
    });
    await Promise.all(contexts.map((context) => context.close()));
  },
});

function watch(context: BrowserContext, found: string[]): void {
  context.on('weberror', (error) => found.push(`exception: ${error.error().message}`));
  // Breaches of the content policy are written to the console as errors too.
  context.on('console', (message) => {
    if (message.type() === 'error') found.push(`${message.text()} (${message.location().url})`);
  });
}
