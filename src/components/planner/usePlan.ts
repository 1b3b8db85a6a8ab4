import { useCallback, useEffect, useReducer } from 'react';
import type { Plan } from '../../lib/plan/plan';

/** Steps that can be undone. */
const MOST_STEPS = 200;

interface History {
  readonly past: readonly Plan[];
  readonly plan: Plan;
  readonly future: readonly Plan[];
  /** What the latest change was about: typing on in one field is one step. */
  readonly about: string | null;
}

type Act =
  | { type: 'change'; edit: (plan: Plan) => Plan; about: string | null }
  | { type: 'undo' }
  | { type: 'redo' };

/** Changes a plan step by step. Exported for its tests. */
export function planHistory(history: History, act: Act): History {
  const { past, plan, future, about } = history;
  if (act.type === 'undo') {
    const before = past.at(-1);
    return before
      ? { past: past.slice(0, -1), plan: before, future: [plan, ...future], about: null }
      : history;
  }
  if (act.type === 'redo') {
    const [after, ...later] = future;
    return after ? { past: [...past, plan], plan: after, future: later, about: null } : history;
  }
  const next = act.edit(plan);
  if (next === plan) return history;
  const sameStep = act.about !== null && act.about === about;
  return {
    past: sameStep ? past : [...past, plan].slice(-MOST_STEPS),
    plan: next,
    future: [],
    about: act.about,
  };
}

/** Makes a change; `about` names the field, so that typing in it is one step to undo. */
export type ChangePlan = (edit: (plan: Plan) => Plan, about?: string) => void;

export interface PlanEditing {
  /** What the page was opened with. */
  readonly initial: Plan;
  readonly plan: Plan;
  readonly change: ChangePlan;
  readonly undo: () => void;
  readonly redo: () => void;
  readonly canUndo: boolean;
  readonly canRedo: boolean;
}

/** A plan with undo and redo, also by Ctrl+Z and Ctrl+Shift+Z or Ctrl+Y. */
export function usePlan(initial: Plan): PlanEditing {
  const [history, act] = useReducer(planHistory, {
    past: [],
    plan: initial,
    future: [],
    about: null,
  });
  const undo = useCallback(() => act({ type: 'undo' }), []);
  const redo = useCallback(() => act({ type: 'redo' }), []);
  const change = useCallback<ChangePlan>(
    (edit, about) => act({ type: 'change', edit, about: about ?? null }),
    [],
  );
  useEffect(() => {
    function onKey(event: KeyboardEvent) {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      if (key !== 'z' && key !== 'y') return;
      // A title is no part of the plan: there the keys undo typing, as in any field.
      if (event.target instanceof Element && event.target.closest('[data-own-undo]')) return;
      event.preventDefault();
      if (key === 'y' || event.shiftKey) redo();
      else undo();
    }
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [undo, redo]);
  return {
    initial,
    plan: history.plan,
    change,
    undo,
    redo,
    canUndo: history.past.length > 0,
    canRedo: history.future.length > 0,
  };
}
