import { borderRounds } from '../border/borderRounds';
import { edgeStitches } from '../border/edge';
import type { Join } from '../joins/join';
import { countsOnSide, outerSideStitches } from '../joins/joinCounts';
import type { SlotCounts } from '../colour/colourwayPlaces';
import { SLOT_FACTS, SLOTS, type Slot } from '../layout/face';
import type { GridCounts } from '../layout/gridCounts';
import type { Motif } from '../motifs/motif';
import { mainMotif, type BorderRound, type Colourway, type Plan } from '../plan/plan';
import { addCounts, scaleCounts, subtractCounts } from '../stitches/counts';
import type { StitchCounts } from '../stitches/stitch';
import type { Part } from './ledger';

/** One thing worked in a piece. */
export interface PieceLine {
  readonly part: Part;
  readonly label: string;
  readonly made: StitchCounts;
  /** Sewn seam, in mm. */
  readonly seamMm: number;
  readonly tails: number;
}

/** Like pieces in one colour: each differs a little from the next, independently. */
export interface PieceGroup {
  readonly colour: string;
  readonly count: number;
  readonly lines: readonly PieceLine[];
}

/** What the pieces of a blanket depend on besides its plan. */
export interface PieceContext {
  readonly plan: Plan;
  readonly join: Join;
  readonly counts: GridCounts;
  /** Whole, half and quarter motifs of each colourway. */
  readonly places: readonly SlotCounts[];
  /** Stitches of a side in the motif's own count, and where two circles touch. */
  readonly sideStitches: number;
  /** Length of one seam. */
  readonly seamMm: number;
  readonly cornerLinks: number;
}

/** Sides and corners that a join finds on one motif; a circle has four places to touch and no corner. */
export const joinSidesOf = (motif: Motif): number => (motif.sides === 0 ? 4 : motif.sides);

/** Stitches of a side where nothing touches it: a quarter of a circle, not only what would touch. */
const openSideStitches = (motif: Motif, sideStitches: number): number =>
  motif.sides === 0 ? (motif.rounds.at(-1)?.perSide ?? 0) / joinSidesOf(motif) : sideStitches;

const SLOT_WORDS: Readonly<Record<Slot, string>> = {
  motifs: '',
  fillers: '',
  halves: ' (half motifs)',
  halfFillers: ' (half motifs)',
  quarters: ' (quarter motifs)',
  quarterFillers: ' (quarter motifs)',
};

/** Motifs of a colourway, halves and quarters counted as such. */
export const wholeMotifs = (places: SlotCounts | undefined): number =>
  SLOTS.reduce((sum, slot) => sum + (places?.[slot] ?? 0) * SLOT_FACTS[slot].share, 0);

/** Every piece of the blanket, by colour; its cost grows with the colourways, not with the area. */
export function piecesOf(context: PieceContext): PieceGroup[] {
  return [
    ...context.plan.colourways.flatMap((colourway, i) =>
      SLOTS.flatMap((slot) =>
        motifPieces(context, colourway, context.places[i]?.[slot] ?? 0, slot),
      ),
    ),
    ...joinPieces(context),
    ...borderPieces(context),
  ];
}

const worked = (
  part: Part,
  label: string,
  made: StitchCounts,
  tails = 0,
  seamMm = 0,
): PieceLine => ({
  part,
  label,
  made,
  tails,
  seamMm,
});

/**
 * A motif's rounds in one colourway, one group for each of its colours. Half a motif is worked to
 * and fro with half the stitches of each round (ours: written half motifs differ a little).
 */
export function motifPieces(
  { plan }: Pick<PieceContext, 'plan'>,
  { motifIndex, roundColours }: Colourway,
  count: number,
  slot: Slot = 'motifs',
): PieceGroup[] {
  if (count === 0) return [];
  const { share } = SLOT_FACTS[slot];
  const motif = plan.motifs[motifIndex] as Motif;
  const lines = new Map<string, PieceLine[]>();
  motif.rounds.forEach((round, i) => {
    const colour = roundColours[i] as string;
    const attached = i === 0 || roundColours[i - 1] !== colour;
    const ring = i === 0 ? motif.ring.made : {};
    const whole = addCounts(ring, attached ? subtractCounts(round.made, round.travel) : round.made);
    const made = share === 1 ? whole : scaleCounts(whole, share);
    const ofColour = lines.get(colour) ?? [];
    ofColour.push(worked('rounds', round.label + SLOT_WORDS[slot], made, attached ? 2 : 0));
    lines.set(colour, ofColour);
  });
  return [...lines].map(([colour, ofColour]) => ({ colour, count, lines: ofColour }));
}

export function joinPieces(context: PieceContext): PieceGroup[] {
  const { plan, join, counts, sideStitches, seamMm } = context;
  const { colour } = plan.join;
  const seam = countsOnSide(join, join.perSeam, sideStitches);
  const links = scaleCounts(join.perLink, context.cornerLinks);
  if (join.attached === 'not')
    return lastRoundLinks(context, addCounts(scaleCounts(seam, counts.joinedSides), links));

  const groups: PieceGroup[] = [
    {
      colour,
      count: counts.joinedSides,
      lines: [worked('join', join.name, seam, 0, join.sewn ? seamMm : 0)],
    },
    { colour, count: 1, lines: [worked('join', `${join.name}: corners`, links)] },
  ];
  if (join.attached === 'line') {
    groups.push({ colour, count: counts.seamLines, lines: [worked('join', join.name, {}, 2)] });
  } else {
    groups.push(...addedRounds(context));
  }
  return groups.filter(({ count }) => count > 0);
}

/** Rounds that a join adds to every motif, and the tails of attaching its yarn there. */
function addedRounds({ plan, join, places, sideStitches }: PieceContext): PieceGroup[] {
  return plan.colourways.flatMap(({ motifIndex, roundColours }, i) => {
    const motif = plan.motifs[motifIndex] as Motif;
    const side = motifIndex === plan.secondMotif ? joinStitches(motif) : sideStitches;
    const n = openSideStitches(motif, side);
    const made = addCounts(
      scaleCounts(countsOnSide(join, join.perMotifSide, n), joinSidesOf(motif)),
      scaleCounts(join.perMotifCorner, motif.sides),
    );
    const carriesOn = roundColours.at(-1) === plan.join.colour;
    return SLOTS.map((slot): PieceGroup => ({
      colour: plan.join.colour,
      count: places[i]?.[slot] ?? 0,
      lines: [
        worked(
          'join',
          `${join.name}: added rounds${SLOT_WORDS[slot]}`,
          scaleCounts(made, SLOT_FACTS[slot].share),
          carriesOn ? 0 : 2,
        ),
      ],
    }));
  });
}

/** Links worked in the yarn of each motif's last round: shared out over the motifs. */
function lastRoundLinks({ plan, join, places }: PieceContext, links: StitchCounts): PieceGroup[] {
  const all = places.reduce((sum, each) => sum + wholeMotifs(each), 0);
  if (all === 0) return [];
  return plan.colourways.map(({ roundColours }, i) => ({
    colour: roundColours.at(-1) as string,
    count: wholeMotifs(places[i]),
    lines: [worked('join', join.name, scaleCounts(links, 1 / all))],
  }));
}

/** Stitches of a side between corner centres; an eighth of a circle touches each neighbour (ours). */
export function joinStitches(motif: Motif): number {
  const perSide = motif.rounds.at(-1)?.perSide ?? 0;
  return motif.sides === 0 ? Math.floor(perSide / (2 * joinSidesOf(motif))) : perSide;
}

function borderPieces({ plan, join, counts, sideStitches }: PieceContext): PieceGroup[] {
  const sides = counts.outerSides;
  // Shared out alike: only their sum is counted here.
  const side = edgeStitches(counts, outerStitches(plan, join, sideStitches)) / 4;
  return borderRounds(plan.border, [side, side, side, side]).map(({ made }, i) => {
    const { colour, edging } = plan.border[i] as BorderRound;
    const attached = i === 0 || plan.border[i - 1]?.colour !== colour;
    return {
      colour,
      count: sides,
      lines: [
        worked(
          'border',
          `Border round ${i + 1}${edging ? `: ${edging.name}` : ''}`,
          scaleCounts(made, 1 / sides),
          attached ? 2 / sides : 0,
        ),
      ],
    };
  });
}

/** Stitches that a border finds on one outer side of the blanket's motifs. */
export const outerStitches = (plan: Plan, join: Join, sideStitches: number): number =>
  outerSideStitches(join, openSideStitches(mainMotif(plan), sideStitches));
