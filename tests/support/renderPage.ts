import reactRenderer from '@astrojs/react/server.js';
import { experimental_AstroContainer as AstroContainer } from 'astro/container';
import type { AstroComponentFactory } from 'astro/runtime/server/index.js';
import { DEFAULT_PREFERENCES, type Preferences } from '../../src/schemas/preferences';
import type { CurrentUser } from '../../src/schemas/user';
import { ORIGIN } from './callRoute';

interface PageVisit {
  /** Path and query. */
  url: string;
  user?: CurrentUser | null;
  preferences?: Preferences;
  params?: Record<string, string>;
  /** In place of what the middleware sets. */
  locals?: Partial<App.Locals>;
}

/** Answers a page as the server would, islands included, for whoever visits it. */
export async function renderPage(
  page: AstroComponentFactory,
  { url, user = null, preferences = DEFAULT_PREFERENCES, params, ...visit }: PageVisit,
): Promise<Response> {
  const container = await AstroContainer.create();
  container.addServerRenderer({ name: '@astrojs/react', renderer: reactRenderer });
  container.addClientRenderer({ name: '@astrojs/react', entrypoint: '@astrojs/react/client.js' });
  return container.renderToResponse(page, {
    request: new Request(new URL(url, ORIGIN)),
    params,
    locals: (visit.locals ?? { user, preferences }) as App.Locals,
  });
}
