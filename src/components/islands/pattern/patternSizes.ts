import type { PatternText } from '../../../lib/pattern/syntax';

/** The sizes a pattern gives anywhere as "10 (12, 14)": how many, at most. */
export function sizeCount(pattern: PatternText): number {
  let most = 1;
  const look = (value: unknown): void => {
    if (Array.isArray(value)) value.forEach(look);
    else if (value !== null && typeof value === 'object') {
      const { sizes } = value as { sizes?: unknown };
      if (Array.isArray(sizes)) most = Math.max(most, sizes.length);
      Object.values(value).forEach(look);
    }
  };
  look(pattern.foundation);
  look(pattern.rounds);
  return most;
}
