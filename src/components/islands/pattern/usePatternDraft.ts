import { useEffect, useState } from 'react';
import { MOTIF_SIDES, type MotifSides } from '../../../lib/motifs/motif';
import { PATTERN_LIMITS } from '../../../lib/pattern/limits';
import type { Terms } from '../../../lib/pattern/reading';

export interface PatternDraft {
  name: string;
  text: string;
  terms: Terms;
  sides: MotifSides;
}

const KEY = 'ellwise.pattern';

/** A pattern that is kept on this device from one visit to the next. */
export function usePatternDraft(initial: PatternDraft) {
  const [draft, setDraft] = useState(initial);
  const [ready, setReady] = useState(false);
  useEffect(() => {
    const stored = storedDraft();
    if (stored) setDraft(stored);
    setReady(true);
  }, []);
  useEffect(() => {
    if (!ready) return;
    try {
      if (draft.text.trim() === '') localStorage.removeItem(KEY);
      else localStorage.setItem(KEY, JSON.stringify(draft));
    } catch {
      // A browser without storage still reads; it only cannot remember.
    }
  }, [draft, ready]);
  return [draft, setDraft] as const;
}

/** What is stored may be of an older edition or edited by hand. */
function storedDraft(): PatternDraft | null {
  try {
    const draft: unknown = JSON.parse(localStorage.getItem(KEY) ?? 'null');
    if (typeof draft !== 'object' || draft === null) return null;
    const { name, text, terms, sides } = draft as Record<string, unknown>;
    const known = MOTIF_SIDES.find((each) => each === sides);
    if (typeof name !== 'string' || typeof text !== 'string' || known === undefined) return null;
    if (text.length > PATTERN_LIMITS.textLength) return null;
    return { name: name.slice(0, 80), text, terms: terms === 'uk' ? 'uk' : 'us', sides: known };
  } catch {
    return null;
  }
}
