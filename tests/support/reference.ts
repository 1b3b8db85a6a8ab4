import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import Papa from 'papaparse';

const folder = join(import.meta.dirname, '../../data/reference');
const textOf = (file: string): string => readFileSync(join(folder, file), 'utf8');

/** The records of a table of data/reference; data/reference/README.md names its source. */
export function referenceRows<Column extends string>(file: string): Record<Column, string>[] {
  const { data, errors } = Papa.parse<Record<Column, string>>(textOf(file), {
    header: true,
    skipEmptyLines: true,
  });
  if (errors.length > 0) throw new Error(`${file}: ${errors[0]?.message}`);
  return data;
}

/** A JSON file of data/reference. */
export const referenceJson = <T>(file: string): T => JSON.parse(textOf(file)) as T;

/** Digits to which `actual` agrees with a published figure. */
export const digitsAlike = (actual: number, published: number): number =>
  actual === published ? 16 : -Math.log10(Math.abs(actual - published) / Math.abs(published));
