import type { Transaction } from 'sequelize';
import { sequelize } from '../../db/models';
import { sendLetter, type Letter } from './mail';

const running = new Set<Promise<void>>();

/**
 * Does work that the answer must not wait for, because its length would tell what was found.
 * A failure is logged; there is nobody to tell.
 */
function inBackground(work: () => Promise<unknown>): void {
  const task = work().then(
    () => undefined,
    (error: unknown) => console.error('background work failed:', error),
  );
  running.add(task);
  void task.finally(() => running.delete(task));
}

/** Runs a command in a transaction of its own, then sends the letter it made, if it made one. */
export function mailInBackground(
  command: (transaction: Transaction) => Promise<Letter | null>,
): void {
  inBackground(async () => {
    const letter = await sequelize.transaction(command);
    if (letter) await sendLetter(letter);
  });
}

/** Resolves once all such work is done: for tests, and before the server stops. */
export async function backgroundDone(): Promise<void> {
  while (running.size > 0) await Promise.all(running);
}
