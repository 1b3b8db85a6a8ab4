import type { PatternText } from '../../src/lib';

const PLACES: ReadonlySet<string> = new Set(['begin', 'end', 'header', 'amountSpan', 'comments']);

/** A pattern without its places in the text: what two texts that say the same have in common. */
export function modelOf(pattern: PatternText): unknown {
  return JSON.parse(
    JSON.stringify(pattern, (key, value: unknown) => (PLACES.has(key) ? undefined : value)),
  );
}
