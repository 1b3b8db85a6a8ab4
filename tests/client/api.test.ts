import { afterEach, describe, expect, it, vi } from 'vitest';
import * as z from 'zod';
import { ApiError, get, post, remove } from '../../src/client/api';
import { nothingSchema } from '../../src/schemas/schema';

const skeinSchema = z.object({ massG: z.number() });
const answer = (body: unknown, status = 200) =>
  vi.fn<typeof fetch>(async () =>
    status === 204 ? new Response(null, { status }) : Response.json(body, { status }),
  );
const stub = (fetch: typeof globalThis.fetch) => vi.stubGlobal('fetch', fetch);
afterEach(() => vi.unstubAllGlobals());

describe('get', () => {
  it('answers what the schema makes of the body, and no more', async () => {
    stub(answer({ massG: 100, secret: 1 }));
    expect(await get('/api/skein', skeinSchema)).toEqual({ massG: 100 });
  });

  it('sends neither body nor content type', async () => {
    const fetch = answer({ massG: 1 });
    stub(fetch);
    await get('/api/skein', skeinSchema);
    expect(fetch).toHaveBeenCalledWith('/api/skein', {
      method: 'GET',
      headers: {},
      body: undefined,
      signal: undefined,
    });
  });

  it('passes an abort on as it is', async () => {
    const controller = new AbortController();
    stub(async () => {
      controller.abort();
      throw new DOMException('aborted', 'AbortError');
    });
    const call = get('/api/skein', skeinSchema, { signal: controller.signal });
    await expect(call).rejects.toBeInstanceOf(DOMException);
  });
});

describe('post', () => {
  it('sends JSON', async () => {
    const fetch = answer({ massG: 1 }, 201);
    stub(fetch);
    await post('/api/skeins', { massG: 1 }, skeinSchema, { headers: { 'x-a': 'b' } });
    expect(fetch.mock.calls[0]?.[1]).toMatchObject({
      method: 'POST',
      headers: { 'content-type': 'application/json', 'x-a': 'b' },
      body: '{"massG":1}',
    });
  });

  it('turns an error body into a map from field to message', async () => {
    const fields = { massG: 'More than 0 g.' };
    stub(answer({ error: { code: 'invalid', message: 'One field.', fields } }, 400));
    const error = await post('/api/skeins', {}, skeinSchema).catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(ApiError);
    expect(error).toMatchObject({ status: 400, code: 'invalid', message: 'One field.', fields });
  });

  it('hands over the row of a conflict', async () => {
    stub(answer({ error: { code: 'conflict', message: 'Late.', current: { version: 2 } } }, 409));
    await expect(post('/api/skeins', {}, skeinSchema)).rejects.toMatchObject({
      code: 'conflict',
      current: { version: 2 },
    });
  });

  it.each([
    ['a page of a proxy', new Response('<h1>Bad gateway</h1>', { status: 502 })],
    ['JSON of another shape', Response.json({ error: 'no' }, { status: 502 })],
  ])('makes an error of %s too', async (_, response) => {
    stub(async () => response);
    await expect(post('/api/skeins', {}, skeinSchema)).rejects.toMatchObject({
      status: 502,
      code: 'internal',
      message: 'The server answered 502. Try again.',
      fields: {},
    });
  });

  it('says that the server could not be reached', async () => {
    stub(async () => {
      throw new TypeError('Failed to fetch');
    });
    await expect(post('/api/skeins', {}, skeinSchema)).rejects.toMatchObject({
      status: 0,
      code: 'offline',
      message: 'The server could not be reached. What you typed is kept; try again.',
    });
  });
});

describe('remove', () => {
  it('takes an answer without a body', async () => {
    const fetch = answer(null, 204);
    stub(fetch);
    expect(await remove('/api/skeins/1', nothingSchema)).toBeUndefined();
    expect(fetch.mock.calls[0]?.[1]?.method).toBe('DELETE');
  });
});
