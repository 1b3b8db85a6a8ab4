import { expectedM } from '../hand/hand';
import { blanketOf } from './blanketOf';
import { useOfGroup } from './colourLedger';
import { handOf } from './handOf';
import type { Estimate } from './ledger';
import { motifPieces, piecesOf, wholeMotifs } from './pieces';
import type { Plan } from '../plan/plan';

type MetresOf = Record<string, number>;

/**
 * Metres of each colour in one motif of each colourway, and in everything besides the motifs' own
 * rounds, to own so that they suffice with the plan's confidence. `estimate` must be that of the plan.
 */
export function colourwayYarn(
  plan: Plan,
  { colours }: Estimate,
): { perMotifM: MetresOf[]; besidesM: MetresOf } {
  const blanket = blanketOf(plan);
  const hand = handOf(blanket, piecesOf(blanket));
  const surely = new Map(
    colours.map(({ colour, meanM, neededM }) => [colour, meanM > 0 ? neededM / meanM : 1]),
  );
  const perMotifM = plan.colourways.map((colourway) => {
    const metres: MetresOf = {};
    for (const group of motifPieces(blanket, colourway, 1)) {
      const lengthM = expectedM(hand, useOfGroup(group)) * (surely.get(group.colour) ?? 1);
      metres[group.colour] = (metres[group.colour] ?? 0) + lengthM;
    }
    return metres;
  });
  const besidesM = Object.fromEntries(
    colours.map(({ colour, neededM }) => {
      const inMotifsM = perMotifM.reduce(
        (sum, metres, i) => sum + (metres[colour] ?? 0) * wholeMotifs(blanket.places[i]),
        0,
      );
      return [colour, Math.max(0, neededM - inMotifsM)];
    }),
  );
  return { perMotifM, besidesM };
}
