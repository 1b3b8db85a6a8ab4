export interface Limit {
  readonly most: number;
  readonly why: string;
}

const number = new Intl.NumberFormat('en', { maximumSignificantDigits: 4 });

/** Prints a result as `name value unit (limit …)`; every result of `npm run bench` is one such line. */
export function line(name: string, value: number, unit: string, limit?: Limit): void {
  const verdict = limit
    ? ` (limit ${number.format(limit.most)}: ${limit.why}) ${value <= limit.most ? 'PASS' : 'OVER'}`
    : '';
  console.log(`${name.padEnd(58)} ${number.format(value).padStart(8)} ${unit}${verdict}`);
}

export function heading(text: string): void {
  console.log(`\n${text}`);
}

/** Prints columns of text, the first to the left and the others to the right. */
export function table(header: readonly string[], rows: readonly (readonly string[])[]): void {
  const widths = header.map((title, column) =>
    Math.max(title.length, ...rows.map((row) => row[column]?.length ?? 0)),
  );
  for (const row of [header, ...rows]) {
    const cells = row.map((cell, column) =>
      column === 0 ? cell.padEnd(widths[column] ?? 0) : cell.padStart(widths[column] ?? 0),
    );
    console.log(`  ${cells.join('  ')}`);
  }
}

/** A share as "4.6 %". */
export const percent = (share: number): string => `${(100 * share).toFixed(1)} %`;
