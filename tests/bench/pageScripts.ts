import { gzipSync } from 'node:zlib';

/** JavaScript of a page in bytes, compressed: what it loads at once, and what it may load later. */
export interface PageScripts {
  readonly now: number;
  readonly later: number;
  readonly islands: number;
}

/** Imports of a built module: `from"./x.js"`, `import"./x.js"`; dynamic ones `import("./x.js")`. */
const STATIC = /(?:\bfrom|\bimport)\s*["']([^"'\n]+\.js)["']/g;
const DYNAMIC = /\bimport\(\s*["'`]([^"'`\n]+\.js)["'`]/g;
const ATTRIBUTE = (name: string): RegExp => new RegExp(`\\s${name}="([^"]*)"`);
/** Islands that wait until they are seen or a media query holds. */
const WAITS = /^(visible|media)$/;

/** Fetches modules of one site, each once. */
export class ScriptReader {
  readonly #texts = new Map<string, Promise<string>>();

  constructor(readonly baseUrl: string) {}

  /** Reads the scripts that a page's HTML names, and those that they import. */
  async read(pageUrl: string, html: string): Promise<PageScripts> {
    const tags = html.match(/<(?:script|astro-island|link)\b[^>]*>/g) ?? [];
    const attribute = (tag: string, name: string): string =>
      (ATTRIBUTE(name).exec(tag)?.[1] ?? '').replaceAll('&amp;', '&');
    const islands = tags.filter((tag) => tag.startsWith('<astro-island'));
    const ofIslands = (waiting: boolean): string[] =>
      islands
        .filter((tag) => WAITS.test(attribute(tag, 'client')) === waiting)
        .flatMap((tag) => ['component-url', 'renderer-url'].map((name) => attribute(tag, name)));
    const ofPage = tags.flatMap((tag) =>
      tag.startsWith('<script') ? attribute(tag, 'src') : modulePreload(tag, attribute),
    );
    const inline = [...html.matchAll(/<script\b(?![^>]*\ssrc=)([^>]*)>([\s\S]*?)<\/script>/g)]
      .filter(([, attributes = '']) => !/type="(?!module|text\/javascript)/.test(attributes))
      .map(([, , text = '']) => text)
      .join('\n');

    const urls = (paths: readonly string[]): string[] =>
      paths.filter((path) => path !== '').map((path) => new URL(path, pageUrl).href);
    const now = await this.#reach(urls([...ofPage, ...ofIslands(false)]), [STATIC], new Set());
    const all = await this.#reach(urls(ofIslands(true)), [STATIC, DYNAMIC], new Set(now), now);
    const size = async (modules: Iterable<string>): Promise<number> => {
      const sizes = await Promise.all([...modules].map(async (url) => gzip(await this.#text(url))));
      return sizes.reduce((sum, each) => sum + each, 0);
    };
    const nowSize = (await size(now)) + (inline === '' ? 0 : gzip(inline));
    const later = [...all].filter((url) => !now.has(url));
    return { now: nowSize, later: await size(later), islands: islands.length };
  }

  /** Every module that `from` reaches by such imports, itself among them. */
  async #reach(
    from: readonly string[],
    imports: readonly RegExp[],
    seen: Set<string>,
    through: Iterable<string> = [],
  ): Promise<Set<string>> {
    let next = [...new Set([...from.filter((url) => !seen.has(url)), ...through])];
    while (next.length > 0) {
      for (const url of next) seen.add(url);
      const found = await Promise.all(
        next.map(async (url) => {
          const text = await this.#text(url);
          return imports.flatMap((pattern) =>
            [...text.matchAll(pattern)].map(([, path = '']) => new URL(path, url).href),
          );
        }),
      );
      next = [...new Set(found.flat())].filter((url) => !seen.has(url));
    }
    return seen;
  }

  #text(url: string): Promise<string> {
    const known = this.#texts.get(url);
    if (known) return known;
    const text = fetch(url).then((response) => {
      if (!response.ok) throw new Error(`${url} answered ${response.status}`);
      return response.text();
    });
    this.#texts.set(url, text);
    return text;
  }
}

const modulePreload = (tag: string, attribute: (tag: string, name: string) => string): string =>
  attribute(tag, 'rel') === 'modulepreload' ? attribute(tag, 'href') : '';

const gzip = (text: string): number => gzipSync(text).length;
