import { beforeEach, describe, expect, it } from 'vitest';
import blankets from '../../src/pages/blankets/index.astro';
import stash from '../../src/pages/stash.astro';
import swatch from '../../src/pages/swatches/[id].astro';
import swatches from '../../src/pages/swatches/index.astro';
import newSwatch from '../../src/pages/swatches/new.astro';
import worktable from '../../src/pages/worktable.astro';
import { emptyDatabase } from '../support/database';
import { buildBlanket, buildLot, buildSwatch, buildUser } from '../support/factories';
import { renderPage } from '../support/renderPage';

beforeEach(emptyDatabase);

const textOf = async (response: Response) => (await response.text()).replace(/\s+/g, ' ');

describe('for a stranger', () => {
  it.each([
    { url: '/worktable', page: worktable },
    { url: '/swatches/new?example', page: newSwatch },
    { url: '/swatches/3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41', page: swatch },
  ])('$url leads to signing in, and back', async ({ url, page }) => {
    const response = await renderPage(page, { url });
    expect(response.status).toBe(302);
    expect(response.headers.get('location')).toBe(`/sign-in?returnTo=${encodeURIComponent(url)}`);
  });

  it.each([
    { url: '/swatches', page: swatches },
    { url: '/stash', page: stash },
    { url: '/blankets', page: blankets },
  ])('$url says why it takes an account', async ({ url, page }) => {
    const response = await renderPage(page, { url });
    expect(response.status).toBe(200);
    const text = await textOf(response);
    expect(text).toContain('account');
    expect(text).toContain(`/sign-in?returnTo=${encodeURIComponent(url)}`);
  });
});

describe('for whoever is signed in', () => {
  it('the worktable of a new account says where to begin', async () => {
    const user = await buildUser();
    const text = await textOf(await renderPage(worktable, { url: '/worktable', user }));
    expect(text).toContain('Nothing is on the hook yet');
  });

  it('the worktable says what the latest blankets are short of', async () => {
    const user = await buildUser({ name: 'Tamsin' });
    await buildBlanket(user, { title: 'For the sofa' });
    const text = await textOf(await renderPage(worktable, { url: '/worktable', user }));
    expect(text).toContain('Hello, Tamsin');
    expect(text).toContain('For the sofa');
    expect(text).toContain('Short of');
  });

  it('shows nothing of anybody else’s', async () => {
    const other = await buildUser();
    await buildBlanket(other, { title: 'Not yours' });
    await buildLot(other, { location: 'Their chest' });
    await buildSwatch(other, { name: 'Their swatch' });
    const user = await buildUser();
    for (const [url, page] of [
      ['/worktable', worktable],
      ['/blankets', blankets],
      ['/stash', stash],
      ['/swatches', swatches],
    ] as const) {
      const text = await textOf(await renderPage(page, { url, user }));
      expect(text).not.toMatch(/Not yours|Their chest|Their swatch/);
    }
  });

  it('an own swatch opens in its editor', async () => {
    const user = await buildUser();
    const { id } = await buildSwatch(user, { name: 'Sc on the train' });
    const response = await renderPage(swatch, { url: `/swatches/${id}`, user, params: { id } });
    expect(response.status).toBe(200);
    expect(await textOf(response)).toContain('Sc on the train');
  });
});
