import { describe, expect, it } from 'vitest';
import { sitePathOr } from '../../src/schemas/address';

describe('sitePathOr', () => {
  it.each(['/', '/stash', '/blankets/7?part=border#ledger', '/a%20b', '/a//b'])(
    'takes %s',
    (path) => {
      expect(sitePathOr('/home', path)).toBe(path);
    },
  );

  it.each([
    '',
    'stash',
    'https://elsewhere.test',
    '//elsewhere.test',
    '/\\elsewhere.test',
    '/\t/elsewhere.test',
    '/\n/elsewhere.test',
    '/a\\b',
    'javascript:alert(1)',
    null,
    ['/stash'],
    `/${'x'.repeat(2000)}`,
  ])('takes the fallback for %j', (path) => {
    expect(sitePathOr('/home', path)).toBe('/home');
  });

  it('never names another host, as a browser reads it', () => {
    for (const path of ['/stash', '/a//b', '/@elsewhere.test', '/.//elsewhere.test']) {
      const { origin } = new URL(sitePathOr('/home', path), 'http://ellwise.test');
      expect(origin).toBe('http://ellwise.test');
    }
  });
});
