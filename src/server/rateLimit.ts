import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';
import { AppError } from './errors';

/**
 * Calls allowed per key and seconds. In memory: one process serves the product, a restart is rare,
 * and no address or e-mail is written down for it. `RATE_LIMITS=off` is for load tools and browser
 * tests, which call from one address thousands of times.
 */
const LIMITS = {
  read: { points: 1200, duration: 60 },
  write: { points: 300, duration: 60 },
  heavy: { points: 60, duration: 60 },
  /** From one address: a whole class may register behind one router. */
  'sign-in': { points: 100, duration: 15 * 60 },
  /** Passwords tried from one address for one account: what stops guessing. */
  password: { points: 10, duration: 15 * 60 },
  /** Passwords tried for one account from anywhere: slows a spread attack, rarely an owner. */
  'password-anywhere': { points: 100, duration: 60 * 60 },
  /** Letters to one address. */
  mail: { points: 5, duration: 60 * 60 },
} as const;

export type LimitName = keyof typeof LIMITS;
export type CallLimit = 'read' | 'write' | 'heavy' | 'sign-in';

const limiters = new Map<LimitName, RateLimiterMemory>();

function limiterOf(name: LimitName): RateLimiterMemory {
  let limiter = limiters.get(name);
  if (!limiter) {
    limiter = new RateLimiterMemory({ ...LIMITS[name], keyPrefix: name });
    limiters.set(name, limiter);
  }
  return limiter;
}

/** Counts one call: null while the key has some left, else the seconds to wait. */
export async function countCall(name: LimitName, key: string): Promise<number | null> {
  if (process.env.RATE_LIMITS === 'off') return null;
  try {
    await limiterOf(name).consume(key);
    return null;
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    return Math.ceil(refusal.msBeforeNext / 1000);
  }
}

/** Counts one call; throws `too-many` with the seconds to wait once the key has none left. */
export async function limitCall(name: LimitName, key: string): Promise<void> {
  const retryAfterS = await countCall(name, key);
  if (retryAfterS === null) return;
  throw new AppError('too-many', `Too many tries. Wait ${inWords(retryAfterS)}.`, { retryAfterS });
}

/** Forgets a key's count, as after the right password. */
export async function forgetCalls(name: LimitName, key: string): Promise<void> {
  await limiterOf(name).delete(key);
}

function inWords(seconds: number): string {
  if (seconds < 60) return `${seconds} s`;
  const minutes = Math.ceil(seconds / 60);
  return minutes === 1 ? '1 minute' : `${minutes} minutes`;
}
