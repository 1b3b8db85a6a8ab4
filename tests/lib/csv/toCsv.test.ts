import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { toCsv } from '../../../src/lib/csv/toCsv';
import { FIXED_SEED } from '../../support/plans';

describe('toCsv', () => {
  it('parts records by CRLF and quotes what needs it (RFC 4180, 2)', () => {
    expect(
      toCsv(
        ['name', 'm'],
        [
          ['Rose, "old"', 12.5],
          ['two\nlines', null],
        ],
      ),
    ).toBe('name,m\r\n"Rose, ""old""",12.5\r\n"two\nlines",\r\n');
  });

  it('writes a header alone where there is no record', () => {
    expect(toCsv(['a', 'b'], [])).toBe('a,b\r\n');
  });

  // OWASP ASVS 5, 1.2.10, and its list of first characters.
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\tx', '\rx', '\0x'])(
    'leads text that a spreadsheet would run with a quote: %j',
    (text) => {
      const [, [cell]] = Papa.parse<string[]>(toCsv(['a'], [[text]]), { newline: '\r\n' }).data as [
        string[],
        string[],
      ];
      expect(cell).toBe(`'${text}`);
    },
  );

  it('leaves numbers as they are, to the last digit, negative ones among them', () => {
    const numbers = [-1, 0.1 + 0.2, 1e21, -2.5e-7];
    expect(
      toCsv(
        ['x'],
        numbers.map((x) => [x]),
      )
        .split('\r\n')
        .slice(1, -1)
        .map(Number),
    ).toEqual(numbers);
  });

  it('gives back every text that a spreadsheet would not run', () => {
    fc.assert(
      fc.property(
        fc.array(fc.string({ minLength: 1 }), { minLength: 2, maxLength: 4 }),
        (texts) => {
          const plain = texts.map((text) => text.replace(/^[=+\-@\t\r\0]+/, 'x'));
          const { data } = Papa.parse<string[]>(toCsv(['h', 'i'], [plain]).slice(0, -2), {
            newline: '\r\n',
            delimiter: ',',
          });
          expect(data[1]).toEqual(plain);
        },
      ),
      FIXED_SEED,
    );
  });
});
