import type { Gauge } from '../gauge/gauge';
import { apothemsAcross, roundHeightMm, ringRadiusMm } from './geometry';
import type { Motif, MotifRound } from './motif';
import { totalCount } from '../stitches/counts';

/** Where one stitch stands in a drawing: from its foot to its head, in mm from the motif's centre. */
export interface StitchPlace {
  readonly foot: readonly [xMm: number, yMm: number];
  readonly head: readonly [xMm: number, yMm: number];
}

/** A round as drawn. */
export interface PlacedRound {
  readonly label: string;
  readonly shape: 'circle' | 'polygon';
  readonly innerMm: number;
  readonly outerMm: number;
  readonly stitches: readonly StitchPlace[];
}

/**
 * Places every counted stitch of a motif for drawing: along its sides with a gap at every chain
 * space, or round a circle where the round has no corners. Scaled so that the motif is
 * `acrossMm` across, as `motifGeometry` means it. The first side is at the top.
 *
 * Example: the first round of the group square has 12 stitches, 3 to each side.
 */
export function placedRounds(motif: Motif, gauge: Gauge, acrossMm: number): PlacedRound[] {
  let apothemMm = ringRadiusMm(motif, gauge);
  const heights = motif.rounds.map((round) => roundHeightMm(round, gauge));
  const scale =
    acrossMm /
    heights.reduce((sum, height) => sum + height, apothemMm) /
    apothemsAcross(motif.sides);
  let wasCircle = true;
  return motif.rounds.map((round, i): PlacedRound => {
    const innerMm = apothemMm * scale;
    apothemMm += heights[i] ?? 0;
    const outerMm = apothemMm * scale;
    const isCircle =
      motif.sides === 0 || (round.cornerSpace === null && cornerStitches(motif, round) === 0);
    const stitches = isCircle
      ? aroundCircle(totalCount(round.tally), innerMm, outerMm)
      : alongSides(motif, round, innerMm, outerMm, wasCircle);
    wasCircle = isCircle;
    return {
      label: round.label,
      shape: isCircle ? 'circle' : 'polygon',
      innerMm,
      outerMm,
      stitches,
    };
  });
}

/** Stitches that are themselves the corners: all but those of the sides, shared out. */
const cornerStitches = (motif: Motif, round: MotifRound): number =>
  Math.max(0, Math.round(totalCount(round.tally) / motif.sides - round.perSide));

function aroundCircle(count: number, innerMm: number, outerMm: number): StitchPlace[] {
  return Array.from({ length: count }, (_, j) => {
    const angle = (2 * Math.PI * (j + 0.5)) / count;
    return { foot: polar(innerMm, angle), head: polar(outerMm, angle) };
  });
}

function alongSides(
  motif: Motif,
  round: MotifRound,
  innerMm: number,
  outerMm: number,
  fromCircle: boolean,
): StitchPlace[] {
  const corner = cornerStitches(motif, round);
  const halfTurn = Math.tan(Math.PI / motif.sides);
  const innerHalfMm = innerMm * halfTurn;
  const places = sidePlaces(motif, round, outerMm * halfTurn, innerHalfMm);
  return Array.from({ length: motif.sides }, (_, side) => {
    const turn = (2 * Math.PI * side) / motif.sides;
    const onSide = places.map(({ headMm, footMm }): StitchPlace => {
      const spread = Math.atan2(headMm, outerMm);
      const foot = fromCircle ? polar(innerMm, spread) : ([footMm, -innerMm] as const);
      return { foot: rotated(foot, turn), head: rotated([headMm, -outerMm], turn) };
    });
    const atCorner = Array.from({ length: corner }, (): StitchPlace => {
      const angle = turn + Math.PI / motif.sides;
      const reach = 1 / Math.cos(Math.PI / motif.sides);
      return { foot: polar(innerMm * reach, angle), head: polar(outerMm * reach, angle) };
    });
    return [...onSide, ...atCorner];
  }).flat();
}

/** How far the feet of one group stand apart, next to its heads: they share one space. */
const GROUP_FEET = 0.4;

/**
 * Heads and feet along one side, in mm from its middle. Where the side has chain spaces its stitches
 * stand in groups, each gathered in one space below, the outermost in the corner; elsewhere each
 * stands on the stitch below, and only those at the corners lean.
 */
function sidePlaces(
  motif: Motif,
  round: MotifRound,
  outerHalfMm: number,
  innerHalfMm: number,
): { headMm: number; footMm: number }[] {
  const spaces = Object.entries(round.spaces)
    .filter(([kind]) => kind !== round.cornerSpace)
    .reduce((sum, [, count]) => sum + count / motif.sides, 0);
  const perGroup = (round.perSide - spaces) / (spaces + 1);
  const cornerGap = round.cornerSpace === null ? 0.5 : 0.9;
  const head = (j: number): number =>
    outerHalfMm * ((2 * (j + cornerGap + 0.5)) / (round.perSide + 2 * cornerGap) - 1);
  const grouped = spaces > 0 && Number.isInteger(perGroup);
  return Array.from({ length: round.perSide }, (_, j) => j)
    .filter((j) => (grouped ? j % (perGroup + 1) !== perGroup : !isSpace(j, spaces, round.perSide)))
    .map((j) => {
      const headMm = head(j);
      if (!grouped) return { headMm, footMm: within(headMm, innerHalfMm) };
      const group = Math.floor(j / (perGroup + 1));
      const middle = group * (perGroup + 1) + (perGroup - 1) / 2;
      const below = group === 0 ? -innerHalfMm : group === spaces ? innerHalfMm : head(middle);
      return { headMm, footMm: within(below + GROUP_FEET * (headMm - head(middle)), innerHalfMm) };
    });
}

/** Whether place `j` is one of the chain spaces of a side without groups, which are spread evenly. */
const isSpace = (j: number, spaces: number, places: number): boolean =>
  Math.round(((j + 1) * spaces) / places) > Math.round((j * spaces) / places);

const within = (value: number, most: number): number => Math.max(-most, Math.min(most, value));

const polar = (radiusMm: number, angle: number): [number, number] => [
  radiusMm * Math.sin(angle),
  -radiusMm * Math.cos(angle),
];

const rotated = ([x, y]: readonly [number, number], angle: number): [number, number] => [
  x * Math.cos(angle) - y * Math.sin(angle),
  x * Math.sin(angle) + y * Math.cos(angle),
];
