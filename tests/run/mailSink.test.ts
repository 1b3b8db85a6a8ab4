import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { startMailSink } from '../../src/run/mailSink.mjs';
import { listMail } from '../../src/server/devMail.ts';

describe('mail in development', () => {
  let folder: string;
  let sink: Awaited<ReturnType<typeof startMailSink>>;

  beforeEach(async () => {
    folder = mkdtempSync(join(tmpdir(), 'ellwise-mail-'));
    sink = await startMailSink(folder);
    vi.stubEnv('ELLWISE_MAIL_FOLDER', folder);
    vi.stubEnv('ELLWISE_DEV_MAIL', '1');
  });
  afterEach(async () => {
    vi.unstubAllEnvs();
    await sink.close();
    rmSync(folder, { recursive: true });
  });

  const send = (subject: string, text = 'Guten Tag, Jürgen: 3,5 m') =>
    createTransport(sink.url).sendMail({
      from: 'ellwise@example.org',
      to: ['a@example.org', 'b@example.org'],
      subject,
      text,
    });

  it('is caught, decoded and listed, the newest letter first', async () => {
    await send('First');
    await send('Zweite – größer');
    const letters = await listMail();
    expect(letters.map(({ subject }) => subject)).toEqual(['Zweite – größer', 'First']);
    expect(letters[0]).toMatchObject({ to: 'a@example.org, b@example.org' });
    expect(letters[0]!.text.trim()).toBe('Guten Tag, Jürgen: 3,5 m');
    expect(new Date(letters[0]!.receivedAt).toISOString()).toBe(letters[0]!.receivedAt);
  });

  it('is kept to the newest 200 letters', async () => {
    mkdirSync(folder, { recursive: true });
    for (let n = 0; n < 200; n += 1) {
      writeFileSync(join(folder, `${1000 + n}.json`), JSON.stringify({ subject: String(n) }));
    }
    await send('Newest');
    const subjects = (await listMail()).map(({ subject }) => subject);
    expect(subjects).toHaveLength(200);
    expect(subjects[0]).toBe('Newest');
    expect(subjects.at(-1)).toBe('1');
  });

  it('refuses a letter that is too large and lives on', async () => {
    await expect(send('Huge', 'x'.repeat(2_000_000))).rejects.toThrow();
    await send('Small');
    expect((await listMail()).map(({ subject }) => subject)).toEqual(['Small']);
  });

  it('is shown to nobody unless the start scripts say so', async () => {
    await send('Secret link');
    vi.stubEnv('ELLWISE_DEV_MAIL', '');
    expect(await listMail()).toEqual([]);
  });
});
