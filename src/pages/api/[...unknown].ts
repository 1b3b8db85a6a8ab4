import type { APIRoute } from 'astro';
import { errorResponse } from '../../server/errorResponse';
import { AppError } from '../../server/errors';

/** An address that no route has answers JSON too. */
export const ALL: APIRoute = ({ request, url }) =>
  errorResponse(new AppError('not-found', `There is nothing at ${url.pathname}.`), request);
