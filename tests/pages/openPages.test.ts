import { describe, expect, it } from 'vitest';
import notFound from '../../src/pages/404.astro';
import failed from '../../src/pages/500.astro';
import howItWorks from '../../src/pages/how-it-works.astro';
import motif from '../../src/pages/motifs/[key].astro';
import motifs from '../../src/pages/motifs/index.astro';
import { READY_MOTIFS } from '../../src/lib/motifs/readyMotifs';
import { METHOD_SECTIONS } from '../../src/components/method/methodSections';
import { renderPage } from '../support/renderPage';

describe('/motifs', () => {
  it('shows every ready-made motif without an account', async () => {
    const text = await (await renderPage(motifs, { url: '/motifs' })).text();
    for (const { key, name } of READY_MOTIFS) {
      expect(text).toContain(`/motifs/${key}`);
      expect(text).toContain(name);
    }
  });

  it('opens one of them', async () => {
    const response = await renderPage(motif, {
      url: '/motifs/hexagon',
      params: { key: 'hexagon' },
    });
    expect(response.status).toBe(200);
    expect(await response.text()).toContain('Solid hexagon');
  });
});

describe('/how-it-works', () => {
  it('has every section that its contents name, and no script of its own', async () => {
    const text = await (await renderPage(howItWorks, { url: '/how-it-works' })).text();
    for (const { id } of METHOD_SECTIONS) expect(text).toContain(`id="${id}"`);
    expect(text).not.toContain('<astro-island');
  });
});

describe('/404', () => {
  it('answers 404', async () => {
    const response = await renderPage(notFound, { url: '/nowhere' });
    expect(response.status).toBe(404);
    expect(await response.text()).toContain('There is nothing at this address');
  });
});

describe('/500', () => {
  it('answers 500 when the middleware never told who is calling, and tells no detail', async () => {
    const response = await renderPage(failed, { url: '/swatches', locals: {} });
    expect(response.status).toBe(500);
    const text = await response.text();
    expect(text).toContain('Something failed on our side');
    expect(text).not.toMatch(/stack|node_modules/);
  });
});
