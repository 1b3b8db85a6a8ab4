// @vitest-environment jsdom
import { act, cleanup, renderHook } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiError, put } from '../../../src/client/api';
import { WithQueries } from '../../../src/components/islands/WithQueries';
import { useAutosave, type Kept } from '../../../src/components/planner/useAutosave';
import { EXAMPLE_PLAN } from '../../../src/lib';

vi.mock('../../../src/client/api', async (original) => ({
  ...(await original<typeof import('../../../src/client/api')>()),
  put: vi.fn(),
}));

const ID = '6f0c0a3e-5d3b-4b0e-9b1f-0d9a4f1f2c11';
const START = { title: 'Porch', plan: EXAMPLE_PLAN };
const columns = (count: number): Kept => ({
  ...START,
  plan: { ...EXAMPLE_PLAN, size: { by: 'grid', rows: 10, columns: count } },
});
const PAUSE_MS = 700;

interface Asked {
  body: Kept & { version: number };
  answer: (row: unknown) => Promise<void>;
  refuse: (error: Error) => Promise<void>;
}

/** What a server was asked that answers when the test says so. */
const asked: Asked[] = [];

beforeEach(() => {
  vi.useFakeTimers();
  asked.length = 0;
  vi.mocked(put).mockImplementation(
    (_, body) =>
      new Promise((resolve, reject) => {
        const settle = (how: () => void) =>
          act(async () => {
            how();
            await vi.advanceTimersByTimeAsync(1);
          });
        asked.push({
          body: body as Asked['body'],
          answer: (row) => settle(() => resolve(row as never)),
          refuse: (error) => settle(() => reject(error)),
        });
      }),
  );
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
});

/** The blanket open on the screen, in its first version. */
const open = (now: Kept = START) =>
  renderHook((kept: Kept) => useAutosave({ ...START, id: ID, version: 1 }, kept), {
    initialProps: now,
    wrapper: WithQueries,
  });
const pass = (ms: number) => act(() => vi.advanceTimersByTimeAsync(ms));
/** Lets a call that was just made begin. */
const begin = () => pass(1);
const row = (kept: Kept, version: number) => ({
  ...kept,
  id: ID,
  version,
  createdAt: '2026-12-01T10:00:00.000Z',
  updatedAt: '2026-12-01T10:00:00.000Z',
  deletedAt: null,
});
const conflictWith = (kept: Kept, version: number) =>
  new ApiError(409, {
    code: 'conflict',
    message: 'Changed elsewhere',
    current: row(kept, version),
  });
const leaving = () => {
  const event = new Event('beforeunload', { cancelable: true });
  window.dispatchEvent(event);
  return event.defaultPrevented;
};

describe('useAutosave', () => {
  it('is saved until something changes, then waits for a rest and saves once', async () => {
    const { result, rerender } = open();
    expect(result.current.state).toEqual({ is: 'saved' });
    rerender(columns(1));
    expect(result.current.state).toEqual({ is: 'unsaved' });
    await pass(PAUSE_MS - 1);
    rerender(columns(12));
    await pass(PAUSE_MS - 1);
    expect(asked).toHaveLength(0);
    await pass(1);
    await begin();
    expect(asked.map(({ body }) => body)).toEqual([{ ...columns(12), version: 1 }]);
    expect(result.current.state).toEqual({ is: 'saving' });
    await asked[0]?.answer(row(columns(12), 2));
    expect(result.current.state).toEqual({ is: 'saved' });
    await pass(5 * PAUSE_MS);
    expect(asked).toHaveLength(1);
  });

  it('saves a change made while a save is under way afterwards, from the version that one made', async () => {
    const { result, rerender } = open();
    rerender(columns(9));
    await pass(PAUSE_MS);
    rerender(columns(12));
    await pass(5 * PAUSE_MS);
    expect(asked).toHaveLength(1);
    await asked[0]?.answer(row(columns(9), 2));
    expect(result.current.state).toEqual({ is: 'unsaved' });
    await pass(PAUSE_MS);
    expect(asked[1]?.body).toEqual({ ...columns(12), version: 2 });
  });

  it('saves nothing when a change is taken back in time', async () => {
    const { result, rerender } = open();
    rerender(columns(9));
    rerender(START);
    await pass(2 * PAUSE_MS);
    expect(asked).toHaveLength(0);
    expect(result.current.state).toEqual({ is: 'saved' });
  });

  it('says why a save failed, tries when asked and again with the next change', async () => {
    const { result, rerender } = open();
    rerender(columns(9));
    await pass(PAUSE_MS);
    await asked[0]?.refuse(new ApiError(0, { code: 'offline', message: 'No network.' }));
    expect(result.current.state).toEqual({ is: 'failed', why: 'No network.' });
    await pass(5 * PAUSE_MS);
    expect(asked).toHaveLength(1);

    act(() => result.current.retry());
    await begin();
    await asked[1]?.refuse(new ApiError(500, { code: 'internal', message: 'Not now.' }));
    expect(result.current.state).toEqual({ is: 'failed', why: 'Not now.' });

    rerender(columns(10));
    await pass(PAUSE_MS);
    expect(asked[2]?.body).toEqual({ ...columns(10), version: 1 });
  });

  it('stops at a conflict until it is settled, then goes on from the other version', async () => {
    const { result, rerender } = open();
    const theirs = { ...START, title: 'Porch, theirs' };
    rerender(columns(9));
    await pass(PAUSE_MS);
    await asked[0]?.refuse(conflictWith(theirs, 5));
    expect(result.current.state).toEqual({ is: 'failed', why: 'it was changed elsewhere' });
    expect(result.current.conflict).toMatchObject({ title: 'Porch, theirs', version: 5 });
    expect(result.current.base).toMatchObject(START);
    rerender(columns(11));
    await pass(5 * PAUSE_MS);
    expect(asked).toHaveLength(1);

    act(() => {
      if (result.current.conflict) result.current.settle(result.current.conflict);
    });
    expect(result.current.conflict).toBeNull();
    await pass(PAUSE_MS);
    expect(asked[1]?.body).toEqual({ ...columns(11), version: 5 });
  });

  it('has nothing to save when a conflict is settled with the other version', async () => {
    const { result, rerender } = open();
    const theirs = { ...START, title: 'Porch, theirs' };
    rerender(columns(9));
    await pass(PAUSE_MS);
    await asked[0]?.refuse(conflictWith(theirs, 5));
    act(() => {
      if (result.current.conflict) result.current.settle(result.current.conflict);
    });
    rerender({ title: theirs.title, plan: result.current.base.plan });
    await pass(5 * PAUSE_MS);
    expect(result.current.state).toEqual({ is: 'saved' });
    expect(asked).toHaveLength(1);
  });

  it('warns whoever leaves before all is saved, and nobody else', async () => {
    const { rerender } = open();
    expect(leaving()).toBe(false);
    rerender(columns(9));
    expect(leaving()).toBe(true);
    await pass(PAUSE_MS);
    await asked[0]?.answer(row(columns(9), 2));
    expect(leaving()).toBe(false);
  });
});
