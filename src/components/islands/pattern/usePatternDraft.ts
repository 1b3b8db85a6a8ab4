import { useEffect, useState } from 'react';
import { MOTIF_SIDES, type MotifSides } from '../../../lib/motifs/motif';
import { PATTERN_LIMITS } from '../../../lib/pattern/limits';
import type { Terms } from '../../../lib/pattern/reading';

export interface PatternDraft {
  name: string;
  text: string;
  terms: Terms;
  sides: MotifSides;
  /** Which of the sizes "10 (12, 14)"; 0 is the first. */
  size: number;
}

const KEY = 'ellwise.pattern';

/**
 * A pattern that is kept on this device from one visit to the next while it differs from `kept`. One
 * that began as the motif `from` is a draft of its own, so that it takes no other's place.
 */
export function usePatternDraft(kept: PatternDraft, from: string | null) {
  const key = from === null ? KEY : `${KEY}.${from}`;
  const [draft, setDraft] = useState(kept);
  const [ready, setReady] = useState(false);
  useEffect(() => {
    const stored = storedDraft(key);
    if (stored) setDraft(stored);
    setReady(true);
  }, [key]);
  const isChanged = !isSame(draft, kept);
  useEffect(() => {
    if (!ready) return;
    try {
      if (isChanged) localStorage.setItem(key, JSON.stringify(draft));
      else localStorage.removeItem(key);
    } catch {
      // A browser without storage still reads; it only cannot remember.
    }
  }, [draft, key, ready, isChanged]);
  return { draft, setDraft, isChanged };
}

const isSame = (left: PatternDraft, right: PatternDraft): boolean =>
  left.name === right.name &&
  left.text === right.text &&
  left.terms === right.terms &&
  left.sides === right.sides &&
  left.size === right.size;

/** What is stored may be of an older edition or edited by hand. */
function storedDraft(key: string): PatternDraft | null {
  try {
    const draft: unknown = JSON.parse(localStorage.getItem(key) ?? 'null');
    if (typeof draft !== 'object' || draft === null) return null;
    const { name, text, terms, sides, size } = draft as Record<string, unknown>;
    const known = MOTIF_SIDES.find((each) => each === sides);
    if (typeof name !== 'string' || typeof text !== 'string' || known === undefined) return null;
    if (text.length > PATTERN_LIMITS.textLength) return null;
    const isSize =
      Number.isInteger(size) && Number(size) >= 0 && Number(size) < PATTERN_LIMITS.sizes;
    return {
      name: name.slice(0, 80),
      text,
      terms: terms === 'uk' ? 'uk' : 'us',
      sides: known,
      size: isSize ? Number(size) : 0,
    };
  } catch {
    return null;
  }
}
