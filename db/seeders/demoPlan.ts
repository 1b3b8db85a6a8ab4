import yarns from '../../data/demo/yarns.json';
import { readyMotif } from '../../src/lib/motifs/readyMotifs';

interface DemoBlanket {
  yarn: string;
  /** Colourways of the yarn; their keys are c1, c2 and so on. */
  colours: string[];
  motif: { ready: string; rounds: number };
  /** Colour keys of the rounds, a list for each colourway. */
  roundColours: string[][];
  [unchanged: string]: unknown;
}

/** A plan as the demo data writes it, with its yarn, colours and motif written out. */
export function demoPlan({ yarn, colours, motif, roundColours, ...unchanged }: DemoBlanket) {
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
    motifs: [readyMotif(motif.ready, motif.rounds)],
    colourways: roundColours.map((each) => ({ motifIndex: 0, roundColours: each })),
  };
}
