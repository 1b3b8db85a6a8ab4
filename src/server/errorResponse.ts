import { DomainError } from '../lib/errors';
import { AppError, STATUS_OF_CODE } from './errors';

/** Any failure as JSON: what the caller may know, and nothing of what they may not. */
export function errorResponse(error: unknown, request: Request): Response {
  const known = knownError(error);
  if (!known) {
    console.error(`${request.method} ${new URL(request.url).pathname}`, error);
    return toJson(new AppError('internal', 'Something failed on our side. Nothing was changed.'));
  }
  return toJson(known);
}

function knownError(error: unknown): AppError | null {
  if (error instanceof AppError) return error;
  if (error instanceof DomainError) return new AppError('invalid', error.message);
  return null;
}

function toJson({ code, message, fields, current, retryAfterS }: AppError): Response {
  const headers = new Headers({ 'cache-control': 'no-store' });
  if (retryAfterS !== undefined) headers.set('retry-after', String(retryAfterS));
  return Response.json(
    { error: { code, message, fields, current } },
    { status: STATUS_OF_CODE[code], headers },
  );
}
