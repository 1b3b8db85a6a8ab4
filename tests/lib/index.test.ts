import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import * as lib from '../../src/lib';

const folder = join(import.meta.dirname, '../../src/lib');
const sources = readdirSync(folder, { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.ts'))
  .map((name) => ({ name, text: readFileSync(join(folder, name), 'utf8') }));

describe('the library', () => {
  it('offers what the rest of the program is built on', () => {
    expect(lib).toMatchObject({
      estimate: expect.any(Function),
      compareJoins: expect.any(Function),
      shoppingList: expect.any(Function),
      EXAMPLE_PLAN: expect.any(Object),
    });
  });

  it('imports nothing but itself, arithmetic, seeded chance, colour and CSV', () => {
    const foreign = sources.flatMap(({ name, text }) =>
      [...text.matchAll(/(?:from|import)\s+'([^']+)'/g)]
        .map(([, from = '']) => `${name}: ${from}`)
        .filter((line) => !/: (\.|mathjs|@stdlib\/|pure-rand\/|culori|papaparse$)/.test(line)),
    );
    expect(foreign).toEqual([]);
  });

  it('reads no clock and draws no lots', () => {
    const impure = /Date\.now|new Date\(\)|Math\.random|performance\.|process\.|fetch\(/;
    expect(sources.filter(({ text }) => impure.test(text)).map(({ name }) => name)).toEqual([]);
  });

  it('has tests for every area that holds a function', () => {
    const tests = readdirSync(import.meta.dirname, { recursive: true, encoding: 'utf8' });
    const areaOf = (name: string): string => name.split('/')[0] as string;
    const tested = new Set(tests.filter((name) => name.endsWith('.test.ts')).map(areaOf));
    const untested = sources
      .filter(({ text }) => /^export (?:function|class|const [^=]*=[^=]*=>)/m.test(text))
      .map(({ name }) => areaOf(name).replace(/\.ts$/, '.test.ts'))
      .filter((area) => !tested.has(area));
    expect([...new Set(untested)]).toEqual([]);
  });
});
