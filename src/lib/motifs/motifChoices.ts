import { READY_MOTIFS } from './readyMotifs';

/** A ready-made motif to choose, without its pattern, which is read only once it is chosen. */
export interface MotifChoice {
  readonly key: string;
  readonly name: string;
  /** Rounds it can be worked to. */
  readonly rounds: number;
}

/** The motifs that a blanket can be laid out of: the first is the group square of 8 rounds. */
export const motifChoices = (): MotifChoice[] =>
  READY_MOTIFS.map(({ key, name, rounds }) => ({ key, name, rounds: rounds.length }));
