/** A source of numbers from 0 up to 1. */
export type Random = () => number;

/**
 * Seeded generator, so that a simulation gives the same answer every time (mulberry32, a public
 * domain generator by T. Ettinger; 2^32 steps long, ample for a few million draws).
 */
export function seeded(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** One standard normal value (Box and Muller, the cosine half). */
export const normalDraw = (random: Random): number =>
  Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());

/** One of `items`. */
export const pick = <T>(random: Random, items: readonly T[]): T =>
  items[Math.floor(random() * items.length)] as T;
