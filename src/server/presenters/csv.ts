import Papa from 'papaparse';

/** First characters that a spreadsheet could take for a formula. */
const FORMULA = /^[=+\-@\t\r\0]/;

export type Cell = string | number | null;

/**
 * A table as RFC 4180: CRLF after every record, quotes where they are needed. Text that could be a
 * formula gets a single quote in front; numbers are written as they are.
 */
export function toCsv(headings: readonly string[], rows: readonly (readonly Cell[])[]): string {
  const safe = (cell: Cell) => (typeof cell === 'string' && FORMULA.test(cell) ? `'${cell}` : cell);
  const records = [headings, ...rows].map((record) => record.map(safe));
  return `${Papa.unparse(records, { newline: '\r\n' })}\r\n`;
}

/** An answer that a browser saves under this name. */
export function csvResponse(csv: string, fileName: string): Response {
  return new Response(csv, {
    headers: {
      'content-type': 'text/csv; charset=utf-8; header=present',
      'content-disposition': `attachment; filename="${fileName}"`,
      'cache-control': 'no-store',
    },
  });
}
