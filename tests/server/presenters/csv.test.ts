import Papa from 'papaparse';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { toCsv } from '../../../src/server/presenters/csv';

describe('toCsv', () => {
  it('quotes commas, quotes and line breaks, and ends every record with CRLF (RFC 4180, 2)', () => {
    expect(
      toCsv(
        ['a', 'b'],
        [
          ['x,y', 'say "so"'],
          ['two\nlines', null],
        ],
      ),
    ).toBe('a,b\r\n"x,y","say ""so"""\r\n"two\nlines",\r\n');
  });

  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '\0=1'])(
    'puts a single quote before the text %j (OWASP ASVS 1.2.10)',
    (text) => {
      const [[cell]] = Papa.parse<string[]>(toCsv([text], []).slice(0, -2), {
        delimiter: ',',
      }).data as [[string]];
      expect(cell).toBe(`'${text}`);
    },
  );

  it('leaves numbers alone, negative ones too', () => {
    expect(toCsv(['n'], [[-3.5], [0], [1e-7]])).toBe('n\r\n-3.5\r\n0\r\n1e-7\r\n');
  });

  it('comes back as it was, but for the quotes', () => {
    const text = fc
      .string({ unit: 'grapheme', minLength: 1 })
      .filter((cell) => !/^['=+\-@\t\r\0]/.test(cell));
    const rows = fc.array(fc.tuple(text, text), { minLength: 1, maxLength: 6 });
    fc.assert(
      fc.property(rows, (records) => {
        const { data } = Papa.parse<string[]>(toCsv(['first', 'second'], records).slice(0, -2), {
          newline: '\r\n',
          delimiter: ',',
        });
        expect(data.slice(1)).toEqual(records);
      }),
      { seed: 20261201 },
    );
  });
});
