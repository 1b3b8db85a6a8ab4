import { readyJoin } from '../joins/readyJoins';
import type { LaidBlanket } from '../plan/blanketFaces';
import type { Plan } from '../plan/plan';
import { perceived } from './perceived';

/** Two colours that lie side by side, and how much lighter one is, 0 to 1. */
export interface ColourPair {
  readonly colours: readonly [string, string];
  readonly lightness: number;
}

/**
 * Colours that touch somewhere in the blanket (rounds on rounds, last rounds on the join or, where
 * the join adds nothing, on one another), the least contrast in grey first.
 */
export function touchingColours(plan: Plan, { motifs, map }: LaidBlanket): ColourPair[] {
  const lightness = new Map(plan.colours.map(({ key, hex }) => [key, perceived(hex).l]));
  const pairs = new Map<string, ColourPair>();
  const touch = (one: string | undefined, other: string | undefined): void => {
    if (one === undefined || other === undefined || one === other) return;
    const colours = one < other ? ([one, other] as const) : ([other, one] as const);
    const difference = Math.abs((lightness.get(one) ?? 0) - (lightness.get(other) ?? 0));
    pairs.set(colours.join(' '), { colours, lightness: difference });
  };
  const outermost = (motif: number): string | undefined =>
    plan.colourways[motifs[motif]?.colourway ?? -1]?.roundColours.at(-1);
  for (const colourway of new Set(motifs.map((motif) => motif.colourway))) {
    const rounds = plan.colourways[colourway]?.roundColours ?? [];
    rounds.forEach((colour, i) => touch(colour, rounds[i + 1]));
  }
  const join = readyJoin(plan.join.key);
  if (join && join.roundsAdded > 0) {
    motifs.forEach((_, motif) => touch(outermost(motif), plan.join.colour));
  } else {
    for (const { motifs: pair } of map().sides) {
      if (pair.length === 2) touch(outermost(pair[0] as number), outermost(pair[1] as number));
    }
  }
  return [...pairs.values()].sort((left, right) => left.lightness - right.lightness);
}
