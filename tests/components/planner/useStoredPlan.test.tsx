// @vitest-environment jsdom
import { act, cleanup, renderHook, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { usePlan } from '../../../src/components/planner/usePlan';
import { useStoredPlan } from '../../../src/components/planner/useStoredPlan';
import { EXAMPLE_PLAN, type Plan } from '../../../src/lib';
// Loaded here, since the hook fetches it late and a busy machine takes its time over it.
import '../../../src/schemas/plan';

const KEY = 'ellwise.plan';
const OWN: Plan = { ...EXAMPLE_PLAN, confidence: 0.8 };
const asJson = (plan: Plan): unknown => JSON.parse(JSON.stringify(plan));

beforeEach(() => localStorage.clear());
afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
});

/** A visit of the front page. */
const visit = (initial = EXAMPLE_PLAN, asked = false) =>
  renderHook(() => {
    const editing = usePlan(initial);
    return { editing, own: useStoredPlan(editing, EXAMPLE_PLAN, asked) };
  });

const stored = (): unknown => JSON.parse(localStorage.getItem(KEY) ?? 'null');
/** Lets what is read from the device arrive. */
const settle = () => act(() => vi.dynamicImportSettled());

describe('useStoredPlan', () => {
  it('brings back what the last visit left', async () => {
    localStorage.setItem(KEY, JSON.stringify(OWN));
    const { result } = visit();
    expect(result.current.own).toBe(false);
    await waitFor(() => expect(result.current.editing.plan).toEqual(asJson(OWN)));
    expect(result.current.own).toBe(true);
  });

  it('keeps a plan that differs from the example, and forgets one that no longer does', async () => {
    const { result } = visit();
    await settle();
    expect(stored()).toBeNull();
    act(() => result.current.editing.change(() => OWN));
    await waitFor(() => expect(stored()).toEqual(asJson(OWN)));
    act(() => result.current.editing.undo());
    await waitFor(() => expect(stored()).toBeNull());
  });

  it('does not bring back over a plan that the address asks for', async () => {
    localStorage.setItem(KEY, JSON.stringify(OWN));
    const asked: Plan = { ...EXAMPLE_PLAN, corners: 'gathered' };
    const { result } = visit(asked, true);
    await settle();
    expect(result.current.editing.plan).toBe(asked);
    expect(stored()).toEqual(asJson(asked));
  });

  it.each([
    ['no JSON', '{"yarn":'],
    ['another thing', '[1, 2]'],
    ['a plan without its colours', JSON.stringify({ ...EXAMPLE_PLAN, colours: [] })],
  ])('opens with the example where the device stored %s', async (_, text) => {
    localStorage.setItem(KEY, text);
    const { result } = visit();
    await waitFor(() => expect(localStorage.getItem(KEY)).toBeNull());
    expect(result.current.editing.plan).toBe(EXAMPLE_PLAN);
  });

  it('estimates on where the browser keeps nothing', async () => {
    vi.spyOn(Storage.prototype, 'getItem').mockImplementation(() => {
      throw new DOMException('denied', 'SecurityError');
    });
    vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new DOMException('full', 'QuotaExceededError');
    });
    const { result } = visit();
    await settle();
    act(() => result.current.editing.change(() => OWN));
    expect(result.current.editing.plan).toBe(OWN);
  });
});
