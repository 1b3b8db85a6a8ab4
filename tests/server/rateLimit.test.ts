import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { countCall, forgetCalls, limitCall } from '../../src/server/rateLimit';

// The clock stands still, so that what is left of an hour is exact.
beforeEach(() => void vi.useFakeTimers({ toFake: ['Date'] }));
afterEach(() => {
  vi.unstubAllEnvs();
  vi.useRealTimers();
});

async function useUp(key: string): Promise<void> {
  // 5 letters an hour to one address: src/server/rateLimit.ts.
  for (let call = 0; call < 5; call += 1) expect(await countCall('mail', key)).toBeNull();
}

describe('countCall', () => {
  it('answers the seconds to wait once a key is used up', async () => {
    await useUp('a@example.com');
    expect(await countCall('mail', 'a@example.com')).toBe(3600);
  });

  it('counts each key and each limit by itself', async () => {
    await useUp('b@example.com');
    expect(await countCall('mail', 'c@example.com')).toBeNull();
    expect(await countCall('password', 'b@example.com')).toBeNull();
  });

  it('counts nothing when limits are off', async () => {
    await useUp('d@example.com');
    vi.stubEnv('RATE_LIMITS', 'off');
    expect(await countCall('mail', 'd@example.com')).toBeNull();
  });
});

describe('limitCall', () => {
  it('throws the wait in words and in seconds', async () => {
    await useUp('e@example.com');
    await expect(limitCall('mail', 'e@example.com')).rejects.toMatchObject({
      code: 'too-many',
      message: 'Too many tries. Wait 60 minutes.',
      retryAfterS: 3600,
    });
  });
});

describe('forgetCalls', () => {
  it('begins a key anew', async () => {
    await useUp('f@example.com');
    await forgetCalls('mail', 'f@example.com');
    expect(await countCall('mail', 'f@example.com')).toBeNull();
  });
});
