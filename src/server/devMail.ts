import { readFile, readdir } from 'node:fs/promises';
import { join } from 'node:path';

export interface DevLetter {
  id: string;
  to: string;
  subject: string;
  text: string;
  /** ISO 8601, UTC. */
  receivedAt: string;
}

/** Whether letters go to the local mail server that the start scripts run, and may be read here. */
export function isDevMail(): boolean {
  return process.env.ELLWISE_DEV_MAIL === '1';
}

/** The letters caught so far, newest first; none outside development. */
export async function listMail(): Promise<DevLetter[]> {
  const folder = process.env.ELLWISE_MAIL_FOLDER;
  if (!isDevMail() || !folder) return [];
  const names = (await readdir(folder)).filter((name) => name.endsWith('.json'));
  const newestFirst = names.sort().reverse();
  return Promise.all(
    newestFirst.map(async (name) => JSON.parse(await readFile(join(folder, name), 'utf8'))),
  );
}
