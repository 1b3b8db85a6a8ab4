import type { MotifSides } from './motif';
import { READY_MOTIFS } from './readyMotifs';

/** A motif to choose, without its rounds, which are fetched only once it is chosen. */
export interface MotifChoice {
  readonly key: string;
  readonly name: string;
  readonly sides: MotifSides;
  /** Rounds it can be worked to. */
  readonly rounds: number;
  /** Its newest save, of one's own; null of a ready-made one. */
  readonly version: number | null;
}

/** The ready-made motifs: the first is the group square of 8 rounds. */
export const motifChoices = (): MotifChoice[] =>
  READY_MOTIFS.map(({ key, name, sides, rounds }) => ({
    key,
    name,
    sides,
    rounds: rounds.length,
    version: null,
  }));
