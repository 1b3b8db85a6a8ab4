import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { User } from '../../db/models';
import { DomainError } from '../../src/lib/errors';
import { ROLES } from '../../src/schemas/roles';
import { nothingSchema } from '../../src/schemas/schema';
import { AppError } from '../../src/server/errors';
import { handle } from '../../src/server/handle';
import { callRoute, ORIGIN } from '../support/callRoute';
import { expectConsoleError } from '../support/consoleErrors';
import { buildUser, buildUserRow } from '../support/factories';

const skeinSchema = z.object({
  colour: z.string({ error: 'Name a colour.' }),
  putUp: z.object({ massG: z.number({ error: 'Enter grams.' }).positive('More than 0 g.') }),
});

const save = handle({
  summary: 'Save a skein',
  who: 'anyone',
  body: skeinSchema,
  response: skeinSchema,
  status: 201,
  example: { body: { colour: 'moss', putUp: { massG: 100 } } },
  run: ({ body }) => body,
});

const moss = { colour: 'moss', putUp: { massG: 100 } };

describe('handle: what a body must be', () => {
  it('answers with the status and the value of the route', async () => {
    const { status, json, headers } = await callRoute(save, { method: 'POST', body: moss });
    expect(status).toBe(201);
    expect(json).toEqual(moss);
    expect(headers.get('cache-control')).toBe('no-store');
  });

  it('names every failing field by its path', async () => {
    const body = { putUp: { massG: -1 } };
    const { status, json } = await callRoute(save, { method: 'POST', body });
    expect(status).toBe(400);
    expect(json).toEqual({
      error: {
        code: 'invalid',
        message: '2 fields need attention.',
        fields: { colour: 'Name a colour.', 'putUp.massG': 'More than 0 g.' },
      },
    });
  });

  it('refuses JSON that is not JSON', async () => {
    const { status, json } = await callRoute(save, { method: 'POST', body: '{"colour":' });
    expect(status).toBe(400);
    expect(json.error).toEqual({ code: 'malformed', message: 'The body is not valid JSON.' });
  });

  it('refuses bytes that are not UTF-8', async () => {
    const body = new Uint8Array([0x22, 0xff, 0x22]);
    const { status, json } = await callRoute(save, { method: 'POST', body });
    expect(status).toBe(400);
    expect(json.error.message).toBe('The body is not valid UTF-8.');
  });

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'application/jsonp', null])(
    'refuses the type %s',
    async (type) => {
      const call = {
        method: 'POST',
        body: JSON.stringify(moss),
        headers: { 'content-type': type },
      };
      const { status, json } = await callRoute(save, call);
      expect(status).toBe(415);
      expect(json.error.code).toBe('unsupported');
    },
  );

  it('takes application/json with a charset', async () => {
    const headers = { 'content-type': 'Application/JSON; charset=utf-8' };
    const { status } = await callRoute(save, { method: 'POST', body: moss, headers });
    expect(status).toBe(201);
  });

  it('refuses 10 MB by its length alone', async () => {
    const body = JSON.stringify({ ...moss, colour: 'x'.repeat(10_000_000) });
    const { status, json } = await callRoute(save, { method: 'POST', body });
    expect(status).toBe(413);
    expect(json.error.message).toBe('The body may hold at most 256 KiB.');
  });

  it('stops reading a stream of unstated length once it is over the limit', async () => {
    const chunk = new Uint8Array(64 * 1024).fill(0x20);
    let sentCount = 0;
    const body = new ReadableStream({
      pull(controller) {
        sentCount += 1;
        controller.enqueue(chunk);
      },
    });
    const { status } = await callRoute(save, { method: 'POST', body });
    expect(status).toBe(413);
    // 4 chunks are 256 KiB; the fifth is over; one more may have been pulled ahead.
    expect(sentCount).toBeLessThanOrEqual(6);
  });

  it('takes a body of exactly 256 KiB and not one byte more', async () => {
    const bodyOf = (byteCount: number) => JSON.stringify(moss).padEnd(byteCount, ' ');
    const exact = await callRoute(save, { method: 'POST', body: bodyOf(256 * 1024) });
    const over = await callRoute(save, { method: 'POST', body: bodyOf(256 * 1024 + 1) });
    expect([exact.status, over.status]).toEqual([201, 413]);
  });

  it('refuses the character that PostgreSQL cannot hold, and takes text that only spells it', async () => {
    const holds = await callRoute(save, { method: 'POST', body: { ...moss, colour: 'a\u0000b' } });
    const spells = await callRoute(save, {
      method: 'POST',
      body: { ...moss, colour: 'a\\u0000b' },
    });
    expect(holds.status).toBe(400);
    expect(holds.json.error.message).toBe('Text may not contain the character U+0000.');
    expect(spells.status).toBe(201);
  });
});

describe('handle: where a change may come from', () => {
  it.each(['https://elsewhere.test', 'null', `${ORIGIN}.elsewhere.test`, 'http://ellwise.test:81'])(
    'refuses the origin %s',
    async (origin) => {
      const { status, json } = await callRoute(save, {
        method: 'POST',
        body: moss,
        headers: { origin },
      });
      expect(status).toBe(403);
      expect(json.error).toEqual({
        code: 'foreign-origin',
        message: 'The request comes from another site.',
      });
    },
  );

  it('refuses a change without an origin', async () => {
    const headers = { origin: null };
    const { status, json } = await callRoute(save, { method: 'POST', body: moss, headers });
    expect(status).toBe(403);
    expect(json.error.code).toBe('foreign-origin');
  });

  it('lets a stateless calculation come without an origin, yet not from another site', async () => {
    const calculate = handle({
      summary: 'Double',
      who: 'anyone',
      stateless: true,
      body: z.object({ massG: z.number() }),
      response: z.object({ massG: z.number() }),
      example: { body: { massG: 1 } },
      run: ({ body }) => ({ massG: body.massG * 2 }),
    });
    const call = { method: 'POST', body: { massG: 21 } };
    const without = await callRoute(calculate, { ...call, headers: { origin: null } });
    const foreign = await callRoute(calculate, { ...call, headers: { origin: 'http://a.test' } });
    expect(without.json).toEqual({ massG: 42 });
    expect(foreign.status).toBe(403);
  });
});

describe('handle: who may call', () => {
  const example = {};
  const response = z.object({ name: z.string() });
  const mine = handle({
    summary: 'My name',
    who: 'signed-in',
    response,
    example,
    run: ({ user }) => ({ name: user.name }),
  });
  const teach = handle({
    summary: 'A class',
    who: ['teacher', 'administrator'],
    response,
    example,
    run: ({ user }) => ({ name: user.name }),
  });

  it('answers 401 to nobody', async () => {
    for (const route of [mine, teach]) {
      const { status, json } = await callRoute(route);
      expect(status).toBe(401);
      expect(json).toEqual({ error: { code: 'unauthenticated', message: 'Sign in to do this.' } });
    }
  });

  it.each(ROLES.map((role) => ({ role, isLetIn: role === 'teacher' || role === 'administrator' })))(
    'lets a $role into a route for teachers and administrators: $isLetIn',
    async ({ role, isLetIn }) => {
      const user = await buildUser({ roles: [role] });
      const { status, json } = await callRoute(teach, { user });
      expect(status).toBe(isLetIn ? 200 : 403);
      if (!isLetIn) {
        expect(json.error).toEqual({
          code: 'forbidden',
          message: 'Only a person who works as teacher or administrator may do this.',
        });
      }
    },
  );

  it('asks who is calling before it reads what they sent', async () => {
    const route = handle({
      summary: 'Save',
      who: 'signed-in',
      body: skeinSchema,
      response: nothingSchema,
      status: 204,
      example: { body: moss },
      run: () => undefined,
    });
    const { status } = await callRoute(route, { method: 'POST', body: {} });
    expect(status).toBe(401);
  });
});

describe('handle: query and params', () => {
  const list = handle({
    summary: 'List',
    who: 'anyone',
    params: z.object({ id: z.uuid('That is not an id.') }),
    query: z.object({ page: z.string().regex(/^\d+$/, 'A page is a whole number.') }),
    response: z.object({ page: z.string() }),
    example: {},
    run: ({ query }) => query,
  });
  const id = '5f0c2a54-7c1e-4c52-9a39-5b2f0f6f0b11';

  it('parses both, and names the failing fields of both together', async () => {
    const good = await callRoute(list, { params: { id }, url: '/api/test?page=2' });
    const bad = await callRoute(list, { params: { id: '7' }, url: '/api/test?page=x' });
    expect(good.json).toEqual({ page: '2' });
    expect(bad.status).toBe(400);
    expect(bad.json.error.fields).toEqual({
      id: 'That is not an id.',
      page: 'A page is a whole number.',
    });
  });

  it('refuses U+0000 in the address', async () => {
    const { status } = await callRoute(list, { params: { id }, url: '/api/test?page=%00' });
    expect(status).toBe(400);
  });
});

describe('handle: what fails inside', () => {
  const failing = (error: unknown) =>
    handle({
      summary: 'Fail',
      who: 'anyone',
      response: nothingSchema,
      example: {},
      run: () => {
        throw error;
      },
    });

  it('answers an unexpected failure as JSON 500 without any detail, and logs it', async () => {
    expectConsoleError(/GET \/api\/test.*secret place/s);
    const { status, json, headers } = await callRoute(failing(new Error('secret place 10.0.0.1')));
    expect(status).toBe(500);
    expect(headers.get('content-type')).toContain('application/json');
    expect(json).toEqual({
      error: { code: 'internal', message: 'Something failed on our side. Nothing was changed.' },
    });
  });

  it('answers an AppError with its status, fields and current row', async () => {
    const error = new AppError('conflict', 'Saved elsewhere.', { current: { version: 3 } });
    const { status, json } = await callRoute(failing(error));
    expect(status).toBe(409);
    expect(json).toEqual({
      error: { code: 'conflict', message: 'Saved elsewhere.', current: { version: 3 } },
    });
  });

  it("answers the library's DomainError as invalid", async () => {
    const error = new DomainError('out-of-range', 'massG must be more than 0, not -1');
    const { status, json } = await callRoute(failing(error));
    expect(status).toBe(400);
    expect(json.error).toEqual({ code: 'invalid', message: 'massG must be more than 0, not -1' });
  });

  it('never lets more out than the response schema names', async () => {
    const leaky = handle({
      summary: 'Leak',
      who: 'anyone',
      response: z.object({ name: z.string() }),
      example: {},
      run: () => ({ name: 'Tamsin', passwordHash: '$argon2id$' }) as { name: string },
    });
    const { text } = await callRoute(leaky);
    expect(text).toBe('{"name":"Tamsin"}');
  });

  it('answers 500 when the route breaks the promise of its response schema', async () => {
    expectConsoleError(/ZodError/);
    const broken = handle({
      summary: 'Break',
      who: 'anyone',
      response: z.object({ name: z.string() }),
      example: {},
      run: () => ({}) as { name: string },
    });
    expect((await callRoute(broken)).status).toBe(500);
  });
});

describe('handle: transaction', () => {
  const rename = (fail: boolean) =>
    handle({
      summary: 'Rename',
      who: 'signed-in',
      response: nothingSchema,
      status: 204,
      example: {},
      async run({ user, transaction }) {
        await User.update({ name: 'Renamed' }, { where: { id: user.id }, transaction });
        if (fail) throw new AppError('conflict', 'No.');
      },
    });

  it('keeps what a route did, and nothing of it when the route fails', async () => {
    const kept = await buildUser();
    const undone = await buildUser();
    expect((await callRoute(rename(false), { method: 'PATCH', user: kept })).status).toBe(204);
    expect((await callRoute(rename(true), { method: 'PATCH', user: undone })).status).toBe(409);
    expect((await User.findByPk(kept.id))?.name).toBe('Renamed');
    expect((await User.findByPk(undone.id))?.name).toBe('Tamsin Okafor');
  });

  it('calls a returned function after the commit, and answers its value', async () => {
    const user = await buildUser();
    const route = handle({
      summary: 'Rename and tell',
      who: 'signed-in',
      response: z.object({ seenOutside: z.string() }),
      example: {},
      async run({ transaction }) {
        await User.update({ name: 'Told' }, { where: { id: user.id }, transaction });
        return async () => ({ seenOutside: (await User.findByPk(user.id))!.name });
      },
    });
    const { json } = await callRoute(route, { method: 'POST', user });
    expect(json).toEqual({ seenOutside: 'Told' });
  });

  it('has none for a reading route, and says so at once', async () => {
    expectConsoleError(/runs outside any transaction/);
    const route = handle({
      summary: 'Read',
      who: 'anyone',
      response: nothingSchema,
      example: {},
      run: ({ transaction }) => void transaction,
    });
    expect((await callRoute(route)).status).toBe(500);
  });
});

describe('handle: limits', () => {
  it('answers 429 with the seconds to wait once the calls are used up, per caller', async () => {
    const heavy = handle({
      summary: 'Work hard',
      who: 'anyone',
      limit: 'heavy',
      response: nothingSchema,
      status: 204,
      example: {},
      run: () => undefined,
    });
    const clientAddress = 'handle.test heavy';
    const statuses = [];
    // 60 calls a minute: the limit of heavy routes in src/server/rateLimit.ts.
    for (let call = 0; call < 61; call += 1) {
      statuses.push((await callRoute(heavy, { clientAddress })).status);
    }
    const refused = await callRoute(heavy, { clientAddress });
    const elsewhere = await callRoute(heavy, { clientAddress: 'elsewhere' });

    expect(statuses.filter((status) => status === 204)).toHaveLength(60);
    expect(refused.status).toBe(429);
    expect(refused.json.error.message).toMatch(/^Too many tries\. Wait (\d+ s|1 minute)\.$/);
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0);
    expect(elsewhere.status).toBe(204);
  });

  it('counts a signed-in caller by account, wherever they call from', async () => {
    const { id } = await buildUserRow();
    const user = { id, name: 'Tamsin', email: 't@example.com', roles: [] };
    const route = handle({
      summary: 'Work hard',
      who: 'signed-in',
      limit: 'heavy',
      response: nothingSchema,
      status: 204,
      example: {},
      run: () => undefined,
    });
    let status = 0;
    for (let call = 0; call < 61; call += 1) status = (await callRoute(route, { user })).status;
    expect(status).toBe(429);
  });
});

describe('handle: stateless', () => {
  it('reads no session and opens no transaction', async () => {
    const route = handle({
      summary: 'Calculate',
      who: 'anyone',
      stateless: true,
      response: z.object({ knowsUser: z.boolean() }),
      example: {},
      run: (call) => ({ knowsUser: call.user !== undefined }),
    });
    const { json } = await callRoute(route, { method: 'POST', user: await buildUser() });
    expect(json).toEqual({ knowsUser: false });
  });
});
