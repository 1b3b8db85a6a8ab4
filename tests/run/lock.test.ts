import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { withLock } from '../../src/run/lock.mjs';
import { identify } from '../../src/run/processes.mjs';

describe('withLock', () => {
  let folder: string;
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'ellwise-lock-'));
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  it('lets one in at a time', async () => {
    let inside = 0;
    let most = 0;
    const work = async () => {
      most = Math.max(most, (inside += 1));
      await new Promise((resolve) => setTimeout(resolve, 5));
      inside -= 1;
    };
    await Promise.all([1, 2, 3].map(() => withLock('x', work, { folder })));
    expect(most).toBe(1);
  });

  it('takes over from a process that is gone', async () => {
    writeFileSync(join(folder, 'x'), JSON.stringify({ pid: 2 ** 22 + 1, started: '1' }));
    expect(await withLock('x', async () => 'in', { folder })).toBe('in');
  });

  it('takes over when the number of the holder now belongs to another process', async () => {
    writeFileSync(join(folder, 'x'), JSON.stringify({ pid: process.pid, started: 'earlier' }));
    expect(await withLock('x', async () => 'in', { folder })).toBe('in');
  });

  it('waits for a holder that is alive', async () => {
    const path = join(folder, 'x');
    writeFileSync(path, JSON.stringify(identify(process.pid)));
    let entered = false;
    const waiting = withLock('x', async () => (entered = true), { folder });
    await new Promise((resolve) => setTimeout(resolve, 250));
    expect(entered).toBe(false);
    rmSync(path);
    expect(await waiting).toBe(true);
  });

  it('is free again when the work fails', async () => {
    const failing = withLock('x', () => Promise.reject(new Error('no')), { folder });
    await expect(failing).rejects.toThrow('no');
    expect(existsSync(join(folder, 'x'))).toBe(false);
  });
});
