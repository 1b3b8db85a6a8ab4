import { motifOf } from '../pattern/motifOf';
import { readPattern } from '../pattern/readPattern';
import type { Motif } from './motif';
import type { ReadyPattern } from './ready/readyPattern';
import { READY_PATTERNS } from './ready/readyPatterns';

/** A motif whose pattern is read when its rounds are first asked for: a page shows one, and names many. */
function readWhenAsked({ key, name, sides, text }: ReadyPattern): Motif {
  let read: Motif | null = null;
  const motif = (): Motif =>
    (read ??= motifOf(readPattern(text, { terms: 'us', sides }), key, name));
  return {
    key,
    version: null,
    name,
    sides,
    get ring() {
      return motif().ring;
    },
    get rounds() {
      return motif().rounds;
    },
  };
}

/** Every ready-made motif, each with every round it can be worked to. */
export const READY_MOTIFS: readonly Motif[] = READY_PATTERNS.map(readWhenAsked);

/** The ready-made motif of this key, worked to `rounds` rounds at most; null when there is none. */
export function readyMotif(key: string, rounds = Infinity): Motif | null {
  const motif = READY_MOTIFS.find((each) => each.key === key);
  return motif ? { ...motif, rounds: motif.rounds.slice(0, rounds) } : null;
}
