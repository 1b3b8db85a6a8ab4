import { useMutation } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import { ApiError, put } from '../../client/api';
import type { Plan } from '../../lib/plan/plan';
import { blanketSchema } from '../../schemas/blanket';
import type { SaveState } from '../ui/SaveStatus';

/** Rest after a change before it is saved. */
const PAUSE_MS = 700;

/** What is kept of a blanket: its title and its plan. */
export interface Kept {
  readonly title: string;
  readonly plan: Plan;
}

/** A blanket as some save left it. */
export interface KeptVersion extends Kept {
  readonly version: number;
}

interface Autosave {
  readonly state: SaveState;
  readonly conflict: KeptVersion | null;
  /** What both sides began from. */
  readonly base: Kept;
  /** Goes on from the other's version, with whatever is on the screen by then. */
  readonly settle: (conflict: KeptVersion) => void;
  readonly retry: () => void;
}

const same = (left: Kept, right: Kept): boolean =>
  left.title === right.title && JSON.stringify(left.plan) === JSON.stringify(right.plan);

/** Saves title and plan as they change, one save at a time, and stops at a conflict until it is settled. */
export function useAutosave(blanket: KeptVersion & { id: string }, now: Kept): Autosave {
  const [base, setBase] = useState<Kept>(blanket);
  const [version, setVersion] = useState(blanket.version);
  const [conflict, setConflict] = useState<KeptVersion | null>(null);
  const latest = useRef(now);
  latest.current = now;

  const { mutate, isPending, error, reset } = useMutation({
    mutationFn: (kept: Kept) =>
      put(`/api/blankets/${blanket.id}`, { ...kept, version }, blanketSchema),
    onSuccess: (saved, kept) => {
      setBase(kept);
      setVersion(saved.version);
    },
    onError: (failure) => {
      if (!(failure instanceof ApiError) || failure.code !== 'conflict') return;
      const current = blanketSchema.safeParse(failure.current);
      if (current.success) setConflict(current.data);
    },
  });

  const isSaved = same(base, now);
  useEffect(() => {
    if (isSaved || isPending || conflict || error) return;
    const timer = setTimeout(() => mutate(latest.current), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [isSaved, isPending, conflict, error, mutate, now]);

  // A failed save is tried again with the next change; one under way is left to end.
  const failed = useRef(false);
  failed.current = error !== null;
  useEffect(() => {
    if (failed.current) reset();
  }, [now.plan, now.title, reset]);

  useEffect(() => {
    if (isSaved) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [isSaved]);

  return {
    state: stateOf(isSaved, isPending, conflict, error),
    conflict,
    base,
    settle: (theirs: KeptVersion) => {
      setBase(theirs);
      setVersion(theirs.version);
      setConflict(null);
      reset();
    },
    retry: () => mutate(latest.current),
  };
}

function stateOf(
  isSaved: boolean,
  isPending: boolean,
  conflict: KeptVersion | null,
  error: Error | null,
): SaveState {
  if (conflict) return { is: 'failed', why: 'it was changed elsewhere' };
  if (error) return { is: 'failed', why: error.message };
  if (isPending) return { is: 'saving' };
  return { is: isSaved ? 'saved' : 'unsaved' };
}
