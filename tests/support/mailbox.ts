import { vi } from 'vitest';
import * as mail from '../../src/server/mail';
import type { Letter } from '../../src/server/mail';

export interface Mailbox {
  letters: Letter[];
  /** Makes every letter fail from now on, as when the mail server is down. */
  breakDown(): void;
  lettersTo(address: string): Letter[];
  /** The token in the link of the newest letter to the address. */
  tokenTo(address: string): string;
}

/** Catches letters instead of sending them. Needs `vi.mock('…/src/server/mail', { spy: true })`. */
export function catchMail(): Mailbox {
  const letters: Letter[] = [];
  let isBroken = false;
  vi.mocked(mail.sendLetter).mockImplementation(async (letter) => {
    if (!isBroken) letters.push(letter);
    return !isBroken;
  });
  const lettersTo = (address: string) => letters.filter(({ to }) => to === address);
  return {
    letters,
    breakDown: () => void (isBroken = true),
    lettersTo,
    tokenTo(address) {
      const token = /[\w-]{43}$/.exec(lettersTo(address).at(-1)?.link?.url ?? '')?.[0];
      if (!token) throw new Error(`no letter with a token was sent to ${address}`);
      return token;
    },
  };
}
