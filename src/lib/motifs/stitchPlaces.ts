import type { Gauge } from '../gauge/gauge';
import { roundHeightMm, ringRadiusMm } from './geometry';
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
 * `acrossMm` flat to flat.
 *
 * Example: the first round of the group square has 12 stitches, 3 to each side.
 */
export function placedRounds(motif: Motif, gauge: Gauge, acrossMm: number): PlacedRound[] {
  let apothemMm = ringRadiusMm(motif, gauge);
  const heights = motif.rounds.map((round) => roundHeightMm(round, gauge));
  const scale = acrossMm / (2 * heights.reduce((sum, height) => sum + height, apothemMm));
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
  const offsets = sideOffsets(motif, round);
  const halfTurn = Math.tan(Math.PI / motif.sides);
  return Array.from({ length: motif.sides }, (_, side) => {
    const turn = (2 * Math.PI * side) / motif.sides;
    const onSide = offsets.map((offset): StitchPlace => {
      const headX = offset * outerMm * halfTurn;
      const spread = Math.atan2(headX, outerMm);
      const foot: [number, number] = fromCircle
        ? [innerMm * Math.sin(spread), -innerMm * Math.cos(spread)]
        : [offset * innerMm * halfTurn, -innerMm];
      return { foot: rotated(foot, turn), head: rotated([headX, -outerMm], turn) };
    });
    const atCorner = Array.from({ length: corner }, (): StitchPlace => {
      const angle = turn + Math.PI / motif.sides;
      const reach = 1 / Math.cos(Math.PI / motif.sides);
      return { foot: polar(innerMm * reach, angle), head: polar(outerMm * reach, angle) };
    });
    return [...onSide, ...atCorner];
  }).flat();
}

/** Positions of the stitches of one side, -1 to 1 between its corners, leaving out its chain spaces. */
function sideOffsets(motif: Motif, round: MotifRound): number[] {
  const spaces = Object.entries(round.spaces)
    .filter(([kind]) => kind !== round.cornerSpace)
    .reduce((sum, [, count]) => sum + count / motif.sides, 0);
  const stitches = round.perSide - spaces;
  const perGroup = stitches / (spaces + 1);
  const cornerGap = round.cornerSpace === null ? 0.5 : 0.9;
  const places = round.perSide + 2 * cornerGap;
  return Array.from({ length: round.perSide }, (_, j) => j)
    .filter((j) => spaces === 0 || j % (perGroup + 1) !== perGroup)
    .map((j) => (2 * (j + cornerGap + 0.5)) / places - 1);
}

const polar = (radiusMm: number, angle: number): [number, number] => [
  radiusMm * Math.sin(angle),
  -radiusMm * Math.cos(angle),
];

const rotated = ([x, y]: readonly [number, number], angle: number): [number, number] => [
  x * Math.cos(angle) - y * Math.sin(angle),
  x * Math.sin(angle) + y * Math.cos(angle),
];
