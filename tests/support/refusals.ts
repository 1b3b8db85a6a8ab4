import type { APIRoute } from 'astro';
import { expect } from 'vitest';
import type { CurrentUser } from '../../src/schemas/user';
import { callRoute } from './callRoute';

interface Refusal {
  /** What is changed in a good body; `undefined` leaves the field out. */
  change: Record<string, unknown>;
  fields: Record<string, string>;
}

/** Sends a good body with one change each, and expects 400 with exactly these messages. */
export async function expectFieldErrors(
  route: APIRoute,
  call: { method: string; user?: CurrentUser; body: object; params?: Record<string, string> },
  refusals: readonly Refusal[],
): Promise<void> {
  for (const { change, fields } of refusals) {
    const { status, json } = await callRoute(route, { ...call, body: { ...call.body, ...change } });
    expect({ change, status, fields: json?.error?.fields }).toEqual({
      change,
      status: 400,
      fields,
    });
  }
}
