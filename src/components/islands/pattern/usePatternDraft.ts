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

/**
 * A pattern that is kept on this device from one visit to the next. One that began as the ready-made
 * motif `from` is a draft of its own, so that it takes no other's place.
 */
export function usePatternDraft(initial: PatternDraft, from: string | null) {
  const key = from === null ? KEY : `${KEY}.${from}`;
  const [draft, setDraft] = useState(initial);
  const [ready, setReady] = useState(false);
  useEffect(() => {
    const stored = storedDraft(key);
    if (stored) setDraft(stored);
    setReady(true);
  }, [key]);
  useEffect(() => {
    if (!ready) return;
    try {
      if (draft.text.trim() === '') localStorage.removeItem(key);
      else localStorage.setItem(key, JSON.stringify(draft));
    } catch {
      // A browser without storage still reads; it only cannot remember.
    }
  }, [draft, key, ready]);
  return [draft, setDraft] as const;
}

/** What is stored may be of an older edition or edited by hand. */
function storedDraft(key: string): PatternDraft | null {
  try {
    const draft: unknown = JSON.parse(localStorage.getItem(key) ?? 'null');
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
