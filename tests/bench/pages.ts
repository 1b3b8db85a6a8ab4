import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { ScriptReader } from './pageScripts.ts';
import { heading, line } from './report.ts';

const ESTIMATOR_KB = 200;
const PLAIN_KB = 5;
const MOST_PAGES = 60;
/** Pages of development, and addresses that change something or are no page. */
const NOT_A_PAGE = /^\/(api|dev|sign-out|preferences)(\/|$)|\.[a-z0-9]+$/;
const ID = /[0-9a-f]{8}-[0-9a-f-]{27}|(?<=^\/motifs\/)[^/]+/g;

/** JavaScript that each page sends: a stranger's pages first, then those of somebody signed in. */
export async function benchPages(baseUrl: string): Promise<void> {
  heading('JavaScript of each page, compressed: at once, and later when seen or asked for');
  const reader = new ScriptReader(baseUrl);
  const known = new Set<string>();
  for (const cookie of ['', await signedIn(baseUrl)]) {
    for (const [path, html] of await crawl(baseUrl, cookie, known)) {
      const scripts = await reader.read(new URL(path, baseUrl).href, html);
      const limit =
        path === '/'
          ? { most: ESTIMATOR_KB, why: 'the estimator before its charts are in view' }
          : scripts.islands === 0
            ? { most: PLAIN_KB, why: 'a page without an island' }
            : undefined;
      const name = `${patternOf(path)}${cookie === '' ? '' : ', signed in'}`;
      line(name, scripts.now / 1000, `kB, later ${(scripts.later / 1000).toFixed(1)} kB`, limit);
    }
  }
}

const patternOf = (path: string): string => path.replace(ID, '[…]');

/** Pages that links lead to from the front page, one of each kind. */
async function crawl(
  baseUrl: string,
  cookie: string,
  known: Set<string>,
): Promise<Map<string, string>> {
  const pages = new Map<string, string>();
  const queue = ['/'];
  for (let path = queue.shift(); path !== undefined; path = queue.shift()) {
    const name = `${patternOf(path)}${path === '/' ? cookie : ''}`;
    if (known.has(name) || pages.size >= MOST_PAGES) continue;
    const response = await fetch(new URL(path, baseUrl), {
      headers: { cookie },
      redirect: 'manual',
    });
    if (response.status !== 200) continue;
    known.add(name);
    const html = await response.text();
    pages.set(path, html);
    for (const [, href = ''] of html.matchAll(/<a\b[^>]*\shref="(\/[^"#?]*)/g)) {
      if (!NOT_A_PAGE.test(href)) queue.push(href);
    }
  }
  return pages;
}

/** Cookies of the first person of the demo who signs in. */
async function signedIn(baseUrl: string): Promise<string> {
  const demo = join(import.meta.dirname, '../../data/demo/people.json');
  const { password, people } = JSON.parse(readFileSync(demo, 'utf8')) as {
    password: string;
    people: { email: string }[];
  };
  const csrf = await fetch(new URL('/api/auth/csrf', baseUrl));
  const { csrfToken } = (await csrf.json()) as { csrfToken: string };
  const answer = await fetch(new URL('/api/auth/callback/credentials', baseUrl), {
    method: 'POST',
    headers: {
      'content-type': 'application/json',
      origin: new URL(baseUrl).origin,
      cookie: cookiesOf(csrf),
      'x-auth-return-redirect': '1',
    },
    body: JSON.stringify({ email: people[0]?.email, password, csrfToken, callbackUrl: '/' }),
  });
  const cookies = cookiesOf(answer);
  if (!answer.ok || cookies === '') throw new Error(`Signing in answered ${answer.status}`);
  return cookies;
}

const cookiesOf = (response: Response): string =>
  response.headers
    .getSetCookie()
    .map((each) => each.split(';')[0])
    .join('; ');
