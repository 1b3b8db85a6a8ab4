import { across, add, between, distance, middleOf, towards, type Point } from './point';
import { SIZES } from './sizes';
import type { ChartSymbol } from './symbol';

/** The box of a symbol: the narrowest four-sided shape that holds it, as wide at the foot as it is there. */
export function hullOf({ glyph, feet, head, unitMm }: ChartSymbol): Point[] {
  const foot = middleOf(feet);
  switch (glyph.body) {
    case 'dot':
      return squareRound(head, SIZES.dot * unitMm);
    case 'cross':
      return squareRound(between(foot, head, 0.5), SIZES.cross * unitMm);
    case 'chain':
      return quad(foot, head, chainHalfMm(foot, head, unitMm), chainHalfMm(foot, head, unitMm));
    default: {
      const spreadMm = feet.length > 1 ? distance(feet[0] as Point, feet.at(-1) as Point) / 2 : 0;
      const stand = glyph.insertion.endsWith('post') ? 2 * SIZES.hook : SIZES.footHalf;
      const top = glyph.legs > 1 ? SIZES.thickHalf : SIZES.cap;
      return quad(foot, head, spreadMm + stand * unitMm, top * unitMm);
    }
  }
}

/** Half the thickness of an oval: flatter where it is short. */
export const chainHalfMm = (foot: Point, head: Point, unitMm: number): number =>
  Math.min(SIZES.chainHalf * unitMm, 0.36 * distance(foot, head));

function quad(foot: Point, head: Point, footHalfMm: number, headHalfMm: number): Point[] {
  const side = across(towards(foot, head));
  return [
    add(foot, side, -footHalfMm),
    add(foot, side, footHalfMm),
    add(head, side, headHalfMm),
    add(head, side, -headHalfMm),
  ];
}

const squareRound = ([x, y]: Point, halfMm: number): Point[] => [
  [x - halfMm, y - halfMm],
  [x + halfMm, y - halfMm],
  [x + halfMm, y + halfMm],
  [x - halfMm, y + halfMm],
];
