import type { Motif } from '../motifs/motif';
import type { Plan } from './plan';
import { withoutColourway, withoutMotif } from './withoutMotif';

/** The plan with a further motif beside its main one, in a colourway of its own that takes its turn. */
export function withFurtherMotif(plan: Plan, motif: Motif): Plan {
  const colours = plan.colourways[0]?.roundColours ?? [];
  return {
    ...plan,
    motifs: [...plan.motifs, motif],
    colourways: [
      ...plan.colourways,
      {
        motifIndex: plan.motifs.length,
        roundColours: motif.rounds.map((_, i) => colours[i % colours.length] as string),
      },
    ],
  };
}

/** The plan without a colourway, and without its motif where no other is worked in it. */
export function withoutColourwayAndItsMotif(plan: Plan, index: number): Plan {
  const motifIndex = plan.colourways[index]?.motifIndex;
  const others = plan.colourways.filter((each, i) => i !== index && each.motifIndex === motifIndex);
  const mains = plan.motifs.filter((_, i) => i !== plan.secondMotif);
  const isLoose = others.length === 0 && motifIndex !== plan.secondMotif && mains.length > 1;
  return isLoose && motifIndex !== undefined
    ? withoutMotif(plan, motifIndex)
    : withoutColourway(plan, index);
}
