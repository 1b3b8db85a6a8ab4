import { describe, expect, it } from 'vitest';
import { readSettings } from '../../src/server/entry/settings.mjs';

describe('readSettings', () => {
  it('serves this machine when nothing is set', () => {
    const settings = readSettings({});
    expect(settings.origin.href).toBe('http://127.0.0.1:4321/');
    expect(settings).toMatchObject({ port: 4321, isLocal: true, trustProxy: false });
  });

  it.each(['http://localhost:1', 'http://127.0.0.1', 'http://[::1]:8080', 'http://127.9.9.9'])(
    'knows %s for this machine',
    (ORIGIN) => expect(readSettings({ ORIGIN }).isLocal).toBe(true),
  );

  it.each(['https://ellwise.example', 'http://127.0.0.1.example', 'http://localhost.example'])(
    'knows %s for another',
    (ORIGIN) => expect(readSettings({ ORIGIN }).isLocal).toBe(false),
  );

  it.each(['ellwise.example', 'https://ellwise.example/path', 'ftp://ellwise.example', ''])(
    'refuses the origin "%s"',
    (ORIGIN) => expect(() => readSettings({ ORIGIN })).toThrow('ORIGIN must be like'),
  );

  it.each(['abc', '-1', '65536', '80.5'])('refuses the port "%s"', (PORT) =>
    expect(() => readSettings({ PORT })).toThrow('PORT must be'),
  );
});
