import { createServer, type AddressInfo } from 'node:net';
import { expect, it } from 'vitest';
import { isFree, nextFreePort } from '../../src/run/ports.mjs';

it('passes over a port that is taken', async () => {
  const taken = createServer();
  await new Promise<void>((resolve) => taken.listen(0, '127.0.0.1', resolve));
  const { port } = taken.address() as AddressInfo;
  expect(await isFree(port)).toBe(false);
  expect(await nextFreePort(port)).toBeGreaterThan(port);
  await new Promise((resolve) => taken.close(resolve));
  expect(await nextFreePort(port)).toBe(port);
});
