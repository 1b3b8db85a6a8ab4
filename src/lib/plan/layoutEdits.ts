import { layoutFacts, layoutFor, type Layout } from '../layout/layouts';
import type { Motif } from '../motifs/motif';
import { plainSquare } from '../motifs/plainSquare';
import { mainMotif, type Plan } from './plan';
import { withoutMotif } from './withoutMotif';

/**
 * The plan with its motifs laid otherwise; null takes the usual layout of their shape. A layout with
 * second places gets a motif for them, and one without loses it.
 */
export function withLayout(plan: Plan, layout: Layout | null): Plan {
  const main = mainMotif(plan);
  const needsSecond = layoutFacts(layout ?? layoutFor(main.sides)).secondSides !== null;
  const bare = plan.secondMotif === null ? plan : withoutMotif(plan, plan.secondMotif);
  const laid: Plan = { ...bare, layout };
  return needsSecond ? withSecondMotif(laid, secondFor(laid, main)) : laid;
}

/** The plan with this motif in the second places, its rounds in the colours of the first colourway. */
export function withSecondMotif(plan: Plan, motif: Motif): Plan {
  const bare = plan.secondMotif === null ? plan : withoutMotif(plan, plan.secondMotif);
  const colours = bare.colourways[0]?.roundColours ?? [];
  return {
    ...bare,
    motifs: [...bare.motifs, motif],
    secondMotif: bare.motifs.length,
    colourways: [
      ...bare.colourways,
      {
        motifIndex: bare.motifs.length,
        roundColours: motif.rounds.map((_, i) => colours[i % colours.length] as string),
      },
    ],
  };
}

/** Between octagons a square with as many stitches on a side; beside large motifs the same, half as far. */
function secondFor({ layout }: Plan, main: Motif): Motif {
  if ((layout ?? layoutFor(main.sides)) === 'large-and-small') {
    return {
      ...main,
      rounds: main.rounds.slice(0, Math.max(1, Math.floor(main.rounds.length / 2))),
    };
  }
  const side = main.rounds.at(-1)?.perSide ?? 1;
  return plainSquare(Math.max(1, Math.round((side + 1) / 2)));
}
