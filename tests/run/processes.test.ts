import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { describe, expect, it } from 'vitest';
import { endProcess, identify, isAlive, run } from '../../src/run/processes.mjs';

describe('a process', () => {
  it('is told from one that had its number before', () => {
    const own = identify(process.pid)!;
    expect(isAlive(own)).toBe(true);
    expect(isAlive({ ...own, started: `${own.started}0` })).toBe(false);
  });

  it('is not alive once it has ended, even when it ignores being asked to', async () => {
    const stubborn = spawn(process.execPath, [
      '-e',
      "process.on('SIGTERM', () => {}); console.log('on'); setInterval(() => {}, 1000)",
    ]);
    await once(stubborn.stdout, 'data');
    const identity = identify(stubborn.pid!)!;
    const ended = once(stubborn, 'exit');
    await endProcess(identity, 100);
    await ended;
    expect(isAlive(identity)).toBe(false);
  });
});

describe('run', () => {
  it('collects what is printed on both streams, and the exit code', async () => {
    const script = "console.log('out'); console.error('err'); process.exitCode = 3";
    const { code, output } = await run(process.execPath, ['-e', script]);
    expect(code).toBe(3);
    expect(output).toContain('out');
    expect(output).toContain('err');
  });
});
