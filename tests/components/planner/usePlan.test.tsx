// @vitest-environment jsdom
import { act, cleanup, fireEvent, renderHook } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { planHistory, usePlan } from '../../../src/components/planner/usePlan';
import { EXAMPLE_PLAN, type Confidence, type Plan } from '../../../src/lib';

afterEach(cleanup);

const sure = (confidence: Confidence) => (plan: Plan) => ({ ...plan, confidence });
const columns = (count: number) => (plan: Plan) => ({
  ...plan,
  size: { by: 'grid' as const, rows: 10, columns: count },
});

type History = Parameters<typeof planHistory>[0];
type Act = Parameters<typeof planHistory>[1];

const START: History = { past: [], plan: EXAMPLE_PLAN, future: [], about: null };
const change = (edit: (plan: Plan) => Plan, about: string | null = null): Act => ({
  type: 'change',
  edit,
  about,
});
const after = (...acts: Act[]) => acts.reduce(planHistory, START);
const UNDO: Act = { type: 'undo' };
const REDO: Act = { type: 'redo' };

describe('planHistory', () => {
  it('takes changes back one by one and does them again', () => {
    const done = after(change(sure(0.9)), change(columns(5)));
    const once = planHistory(done, UNDO);
    expect(once.plan).toEqual({ ...EXAMPLE_PLAN, confidence: 0.9 });
    expect(planHistory(once, UNDO).plan).toBe(EXAMPLE_PLAN);
    expect(planHistory(planHistory(planHistory(once, UNDO), REDO), REDO).plan).toBe(done.plan);
  });

  it('counts typing on in one field as one step', () => {
    const typed = after(change(columns(1), 'columns'), change(columns(12), 'columns'));
    expect(typed.past).toHaveLength(1);
    expect(planHistory(typed, UNDO).plan).toBe(EXAMPLE_PLAN);
  });

  it('begins a new step with another field, an unnamed change, and after an undo', () => {
    expect(after(change(columns(1), 'columns'), change(columns(2), 'rows')).past).toHaveLength(2);
    expect(after(change(columns(1)), change(columns(2))).past).toHaveLength(2);
    const again = after(change(columns(1), 'columns'), UNDO, change(columns(2), 'columns'));
    expect(planHistory(again, UNDO).plan).toBe(EXAMPLE_PLAN);
  });

  it('forgets what was undone once something else is done', () => {
    const other = after(change(sure(0.9)), UNDO, change(columns(3)));
    expect(other.future).toEqual([]);
    expect(planHistory(other, REDO)).toBe(other);
  });

  it('makes no step of a change that changes nothing, and none at either end', () => {
    expect(after(change((plan) => plan))).toBe(START);
    expect(after(UNDO)).toBe(START);
    expect(after(REDO)).toBe(START);
  });

  it('keeps the latest two hundred steps', () => {
    const many = Array.from({ length: 250 }, (_, i) => change(columns(i + 1)));
    const { past } = after(...many);
    expect(past).toHaveLength(200);
    expect(past[0]?.size).toMatchObject({ columns: 50 });
  });
});

describe('usePlan', () => {
  const press = (key: string, keys: object = { ctrlKey: true }) =>
    // False: the page took the key, and the browser does not.
    !fireEvent.keyDown(document.body, { key, ...keys });

  it('undoes with Ctrl+Z, and redoes with Ctrl+Shift+Z and Ctrl+Y', () => {
    const { result } = renderHook(() => usePlan(EXAMPLE_PLAN));
    act(() => result.current.change(sure(0.5)));
    expect([result.current.canUndo, result.current.canRedo]).toEqual([true, false]);
    expect(press('z')).toBe(true);
    expect(result.current.plan).toBe(EXAMPLE_PLAN);
    expect(press('Z', { metaKey: true, shiftKey: true })).toBe(true);
    expect(result.current.plan.confidence).toBe(0.5);
    press('z');
    press('y');
    expect(result.current.plan.confidence).toBe(0.5);
  });

  it('leaves a plain z, other keys and Ctrl+Alt+Z to whatever has the focus', () => {
    const { result } = renderHook(() => usePlan(EXAMPLE_PLAN));
    act(() => result.current.change(sure(0.5)));
    expect(press('z', {})).toBe(false);
    expect(press('x')).toBe(false);
    expect(press('z', { ctrlKey: true, altKey: true })).toBe(false);
    expect(result.current.plan.confidence).toBe(0.5);
  });

  it('leaves the undoing of a title to its field', () => {
    const { result } = renderHook(() => usePlan(EXAMPLE_PLAN));
    act(() => result.current.change(sure(0.5)));
    document.body.innerHTML = '<input data-own-undo>';
    const title = document.querySelector('input') as HTMLInputElement;
    expect(fireEvent.keyDown(title, { key: 'z', ctrlKey: true })).toBe(true);
    expect(result.current.plan.confidence).toBe(0.5);
    document.body.innerHTML = '';
  });

  it('listens no longer once it is gone', () => {
    const { unmount } = renderHook(() => usePlan(EXAMPLE_PLAN));
    unmount();
    expect(press('z')).toBe(false);
  });
});
