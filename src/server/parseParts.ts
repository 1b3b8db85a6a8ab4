import { fieldErrors, type Schema } from '../schemas/schema';
import { AppError } from './errors';

interface PartSchemas {
  params?: Schema;
  query?: Schema;
  body?: Schema;
}

/** Parses what a call carries; all failing fields of all parts are named together. */
export function parseParts(
  schemas: PartSchemas,
  given: { params: Record<string, string | undefined>; url: URL; body: unknown },
): { params: unknown; query: unknown; body: unknown } {
  if (given.url.search.includes('%00')) {
    throw new AppError('invalid', 'Text may not contain the character U+0000.');
  }
  const fields: Record<string, string> = {};
  const parse = (schema: Schema | undefined, read: () => unknown): unknown => {
    if (!schema) return undefined;
    const result = schema.safeParse(read());
    if (!result.success) Object.assign(fields, fieldErrors(result.error));
    return result.data;
  };
  const parts = {
    params: parse(schemas.params, () => given.params),
    query: parse(schemas.query, () => Object.fromEntries(given.url.searchParams)),
    body: parse(schemas.body, () => given.body),
  };
  if (Object.keys(fields).length > 0) throw invalid(fields);
  return parts;
}

/** The error of a call whose fields did not pass, also for rules that only the server can check. */
export function invalid(fields: Record<string, string>): AppError {
  const count = Object.keys(fields).length;
  const message = count === 1 ? 'One field needs attention.' : `${count} fields need attention.`;
  return new AppError('invalid', message, { fields });
}
