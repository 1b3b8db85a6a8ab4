import * as z from './zod';

const PATH_MAX_LENGTH = 2000;

/**
 * A path of this site to go back to. Two slashes, or a slash and a backslash, would name another
 * host; browsers drop control characters, which could hide such a pair.
 */
export const sitePathSchema = z
  .string()
  .max(PATH_MAX_LENGTH)
  .regex(/^\/(?![/\\])[^\\\p{Cc}]*$/u);

/** The path, or the fallback for anything that is none. */
export function sitePathOr(fallback: string, text: unknown): string {
  const result = sitePathSchema.safeParse(text);
  return result.success ? result.data : fallback;
}
