import { readFile } from 'node:fs/promises';
import { expect, type Page } from '@playwright/test';
import Papa from 'papaparse';

export interface DownloadedCsv {
  fileName: string;
  header: string[];
  rows: Record<string, string>[];
  text: string;
}

/** Presses what starts a download and reads the file after RFC 4180. */
export async function downloadCsv(page: Page, press: () => Promise<void>): Promise<DownloadedCsv> {
  const waiting = page.waitForEvent('download');
  await press();
  const download = await waiting;
  const text = await readFile(await download.path(), 'utf8');
  return { fileName: download.suggestedFilename(), text, ...parseCsv(text) };
}

/** Records are parted by CRLF, the last may end in it; each has as many fields as the header. */
export function parseCsv(text: string): Pick<DownloadedCsv, 'header' | 'rows'> {
  expect(text.replaceAll('\r\n', ''), 'line breaks are CRLF').not.toMatch(/[\r\n]/);
  const { data, errors } = Papa.parse<string[]>(text.replace(/\r\n$/, ''), {
    newline: '\r\n',
    delimiter: ',',
  });
  expect(errors).toEqual([]);
  const [header = [], ...records] = data;
  const rows = records.map((record) => {
    expect(record).toHaveLength(header.length);
    return Object.fromEntries(header.map((name, i) => [name, record[i] ?? '']));
  });
  return { header, rows };
}
