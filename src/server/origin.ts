import { AppError } from './errors';

/**
 * Refuses a change asked for by a page of another origin. Browsers name the origin of every POST,
 * so only a caller with no session to abuse (`optional`) may leave it out.
 */
export function requireOwnOrigin(request: Request, url: URL, { optional = false } = {}): void {
  const origin = request.headers.get('origin');
  if (origin === null && optional) return;
  if (origin === url.origin) return;
  throw new AppError(
    'foreign-origin',
    origin === null
      ? 'The request must carry an Origin header with the address of this site.'
      : 'The request comes from another site.',
  );
}
