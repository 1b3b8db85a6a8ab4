import type { StitchCode } from '../stitches/stitch';
import { addCounts, scaleCounts } from '../stitches/counts';
import type { Motif } from '../motifs/motif';
import { motifPieces } from '../ledger/pieces';
import { layoutFacts } from '../layout/layouts';
import { withLayout } from './layoutEdits';
import {
  mainMotif,
  type BorderRound,
  type Colourway,
  type Plan,
  type PlanColour,
  type PlanEvidence,
} from './plan';

/**
 * The plan with its main motif replaced. Colours of rounds stay where there is such a round; new
 * rounds begin the colours again. Motifs already weighed stay as evidence of what they were. A
 * layout that does not suit the new shape gives way to its usual one.
 */
export function withMotif(plan: Plan, motif: Motif): Plan {
  const main = plan.motifs.indexOf(mainMotif(plan));
  const colourways = plan.colourways.map((colourway): Colourway => {
    if (colourway.motifIndex !== main) return colourway;
    const old = colourway.roundColours;
    return {
      ...colourway,
      roundColours: motif.rounds.map((_, i) => old[i % old.length] as string),
    };
  });
  const changed: Plan = {
    ...plan,
    motifs: plan.motifs.map((each, i) => (i === main ? motif : each)),
    colourways,
    motifSideMm: null,
    evidence: plan.evidence.map((item) => asCounted(plan, main, item)),
  };
  if (motif.sides === plan.motifs[main]?.sides) return changed;
  const suits = plan.layout !== null && layoutFacts(plan.layout).sides.includes(motif.sides);
  return withLayout(changed, suits ? plan.layout : null);
}

/** Weighed motifs as a counted piece, so that the reading survives a change of motif. */
function asCounted(plan: Plan, main: number, item: PlanEvidence): PlanEvidence {
  const colourway = plan.colourways.find(({ motifIndex }) => motifIndex === main);
  if (item.piece !== 'motifs' || item.motifIndex !== main || !colourway) return item;
  const lines = motifPieces({ plan }, colourway, item.count).flatMap((group) => group.lines);
  const made = lines.reduce((sum, line) => addCounts(sum, line.made), {});
  return {
    piece: 'counted',
    label: `${item.count} × ${plan.motifs[main]?.name ?? 'motif'}`.slice(0, 80),
    made: scaleCounts(made, item.count),
    tails: item.count * lines.reduce((sum, { tails }) => sum + tails, 0),
    reading: item.reading,
  };
}

/** The plan with one round of one colourway in another colour. */
export function withRoundColour(
  plan: Plan,
  colourway: number,
  round: number,
  colour: string,
): Plan {
  return {
    ...plan,
    colourways: plan.colourways.map((each, i) =>
      i === colourway
        ? { ...each, roundColours: each.roundColours.map((old, j) => (j === round ? colour : old)) }
        : each,
    ),
  };
}

/** The plan with a further colourway of the main motif, like the last of them. */
export const withColourway = (plan: Plan): Plan => ({
  ...plan,
  colourways: [
    ...plan.colourways,
    plan.colourways.findLast(({ motifIndex }) => motifIndex !== plan.secondMotif) as Colourway,
  ],
});

/** The plan with a further colour, under a key that no other has. */
export function withColour(plan: Plan, colour: Omit<PlanColour, 'key'>): Plan {
  let number = plan.colours.length + 1;
  while (plan.colours.some(({ key }) => key === `c${number}`)) number += 1;
  return { ...plan, colours: [...plan.colours, { ...colour, key: `c${number}` }] };
}

/** The plan with one colour renamed or drawn otherwise. */
export const withChangedColour = (
  plan: Plan,
  key: string,
  change: Partial<Omit<PlanColour, 'key'>>,
): Plan => ({
  ...plan,
  colours: plan.colours.map((colour) => (colour.key === key ? { ...colour, ...change } : colour)),
});

/** The plan without a colour; whatever was worked in it is worked in the first that is left. */
export function withoutColour(plan: Plan, key: string): Plan {
  const colours = plan.colours.filter((colour) => colour.key !== key);
  const heir = colours[0]?.key;
  if (heir === undefined) return plan;
  const kept = (colour: string): string => (colour === key ? heir : colour);
  return {
    ...plan,
    colours,
    colourways: plan.colourways.map((each) => ({
      ...each,
      roundColours: each.roundColours.map(kept),
    })),
    join: { ...plan.join, colour: kept(plan.join.colour) },
    border: plan.border.map((round) => ({ ...round, colour: kept(round.colour) })),
  };
}

/**
 * The plan with a border of so many rounds. While the stitch is that of its first round, rounds there
 * are stay as they are; another stitch is for all of them, in their colours. New ones take the join's.
 */
export const withBorder = (plan: Plan, rounds: number, stitch: StitchCode): Plan => ({
  ...plan,
  border: Array.from({ length: rounds }, (_, i): BorderRound => {
    const old = plan.border[i];
    if (old && stitch === plan.border[0]?.stitch) return old;
    return { stitch, colour: old?.colour ?? plan.join.colour };
  }),
});

/** The plan with one piece of evidence replaced, added (past the end) or, given null, taken out. */
export function withEvidence(plan: Plan, index: number, item: PlanEvidence | null): Plan {
  const evidence = [...plan.evidence];
  if (item) evidence.splice(index, 1, item);
  else evidence.splice(index, 1);
  return { ...plan, evidence };
}
