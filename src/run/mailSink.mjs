import { mkdirSync, readdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { LOOPBACK } from './ports.mjs';

const LETTERS_KEPT = 200;
const LETTER_MAX_BYTES = 1024 * 1024;

/**
 * An SMTP server that delivers nothing: letters become files for the page of development mail
 * (src/server/devMail.ts reads them). Its packages are loaded late, being installed by the start.
 * @param {string} folder
 * @returns {Promise<{ url: string, close: () => Promise<void> }>}
 */
export async function startMailSink(folder) {
  const { SMTPServer } = await import('smtp-server');
  const { simpleParser } = await import('mailparser');
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  let count = 0;
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    size: LETTER_MAX_BYTES,
    onData(stream, session, done) {
      simpleParser(stream).then(
        ({ subject = '', text = '' }) => {
          if (stream.sizeExceeded) return done(new Error('The letter is too large'));
          const receivedAt = new Date().toISOString();
          const id = `${receivedAt.replaceAll(/\D/g, '')}-${String((count += 1)).padStart(6, '0')}`;
          const to = session.envelope.rcptTo.map(({ address }) => address).join(', ');
          keep(folder, { id, to, subject, text, receivedAt });
          done();
        },
        (error) => done(error),
      );
    },
  });
  await new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(0, LOOPBACK, resolve);
  });
  // A caller that hangs up in the middle of a letter is no reason to stop.
  server.removeAllListeners('error').on('error', () => undefined);
  return {
    url: `smtp://${LOOPBACK}:${server.server.address().port}`,
    close: () => new Promise((resolve) => server.close(resolve)),
  };
}

/** Ids sort by time. @param {string} folder @param {{ id: string }} letter */
function keep(folder, letter) {
  const unfinished = join(folder, `${letter.id}.unfinished`);
  writeFileSync(unfinished, JSON.stringify(letter), { mode: 0o600 });
  renameSync(unfinished, join(folder, `${letter.id}.json`));
  const names = readdirSync(folder).filter((name) => name.endsWith('.json'));
  for (const name of names.sort().slice(0, -LETTERS_KEPT)) rmSync(join(folder, name));
}
