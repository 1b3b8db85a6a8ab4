import { defineMiddleware } from 'astro:middleware';
import { noteClientAddress } from './server/clientAddress';
import { errorResponse } from './server/errorResponse';
import { AppError } from './server/errors';
import { readCaller } from './server/session';

/** Who is calling, for pages; API routes ask for themselves, since some need not know. */
export const onRequest = defineMiddleware(async (context, next) => {
  const { request, url, locals, isPrerendered } = context;
  if (isPrerendered) return next();
  noteClientAddress(request, context.clientAddress);

  if (url.pathname.startsWith('/api/')) {
    const response = await next();
    // Astro's own answer to a method that a route does not have.
    const isMethodMissing =
      response.status === 404 && response.body === null && request.method !== 'HEAD';
    if (!isMethodMissing) return response;
    const message = `${url.pathname} does not take ${request.method}.`;
    return errorResponse(new AppError('not-allowed', message), request);
  }
  Object.assign(locals, await readCaller(context));
  return next();
});
