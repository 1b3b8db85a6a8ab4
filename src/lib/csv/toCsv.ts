import Papa from 'papaparse';

/** Text that begins so would run as a formula in a spreadsheet (OWASP ASVS 5, 1.2.10). */
const FORMULA_START = /^[=+\-@\t\r\0]/;

/** A cell: numbers stay numbers, so that a negative one is not taken for a formula. */
export type CsvCell = string | number | null;

/**
 * Records as CSV after RFC 4180: CRLF after every record, quotes where they are needed, one header
 * line. Text that a spreadsheet would run is preceded by a single quote.
 *
 * Example: `toCsv(['colour', 'm'], [['=x', -1]])` is `colour,m` and `"'=x",-1`, each ended by CRLF.
 */
export const toCsv = (header: readonly string[], rows: readonly (readonly CsvCell[])[]): string => {
  const records = [[...header], ...rows.map((row) => [...row])];
  return `${Papa.unparse(records, { newline: '\r\n', escapeFormulae: FORMULA_START })}\r\n`;
};
