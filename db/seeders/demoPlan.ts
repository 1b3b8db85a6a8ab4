import yarns from '../../data/demo/yarns.json';
import type { Motif } from '../../src/lib/motifs/motif';
import { readyMotif } from '../../src/lib/motifs/readyMotifs';

interface DemoBlanket {
  yarn: string;
  /** Colourways of the yarn; their keys are c1, c2 and so on. */
  colours: string[];
  /** A ready-made one, or a save of one's own. */
  motif: { ready: string; rounds: number } | { own: string; version: number };
  /** Colour keys of the rounds, a list for each colourway. */
  roundColours: string[][];
  [unchanged: string]: unknown;
}

/** A plan as the demo data writes it, with its yarn, colours and motif written out. */
export function demoPlan(
  { yarn, colours, motif, roundColours, ...unchanged }: DemoBlanket,
  ownMotifs: readonly (Motif | null)[],
) {
  const found = yarns.find(({ name }) => name === yarn);
  if (!found) throw new Error(`the demo data has no yarn named ${yarn}`);
  const { name, weightCategory, putUp, price, colourways } = found;
  return {
    ...unchanged,
    yarn: { name, weightCategory, putUp, price },
    colours: colours.map((colour, i) => ({
      key: `c${i + 1}`,
      name: colour,
      hex: colourways.find((colourway) => colourway.name === colour)?.hex,
    })),
    motifs: [
      'ready' in motif
        ? readyMotif(motif.ready, motif.rounds)
        : ownMotifs.find((own) => own?.name === motif.own && own.version === motif.version),
    ],
    colourways: roundColours.map((each) => ({ motifIndex: 0, roundColours: each })),
  };
}
