import { chainHalfMm } from './hull';
import { across, add, between, distance, middleOf, towards, type Point } from './point';
import { SIZES } from './sizes';
import type { ChartSymbol } from './symbol';

/** SVG path data of a symbol: what is drawn as a line, and what is filled. */
export interface SymbolPath {
  readonly line: string;
  readonly solid: string;
}

/** How far the outer legs of a stitch of many legs bow out, in stitch widths: ours. */
const LEG_BOW = { twoLegs: 0.22, legs: 0.34, puff: 0.36, popcorn: 0.42 } as const;

/** Path data of a symbol, in the coordinates of the chart. */
export function symbolPath(symbol: ChartSymbol): SymbolPath {
  const { glyph, feet, head, unitMm } = symbol;
  const foot = middleOf(feet);
  switch (glyph.body) {
    case 'chain':
      return { line: ellipse(foot, head, chainHalfMm(foot, head, unitMm)), solid: '' };
    case 'dot':
      return { line: '', solid: circle(head, SIZES.dot * unitMm) };
    case 'cross':
      return crossPath(symbol, foot);
    case 'picot':
      return picotPath(symbol, foot);
    case 'popcorn':
      return popcornPath(symbol, foot);
    case 'puff':
      return { line: bowedLegs(symbol, foot, head, LEG_BOW.puff), solid: '' };
    case 'legs':
      return legsPath(symbol, foot);
  }
}

function crossPath({ glyph, head, unitMm }: ChartSymbol, foot: Point): SymbolPath {
  const up = towards(foot, head);
  const side = across(up);
  const middle = between(foot, head, 0.5);
  const arm = SIZES.cross * unitMm;
  const line =
    segment(add(middle, up, -arm), add(middle, up, arm)) +
    segment(add(middle, side, -arm), add(middle, side, arm)) +
    insertionMark(glyph.insertion, add(middle, up, -arm), up, unitMm);
  return glyph.footChains > 0
    ? { line: line + footOval(add(middle, up, -arm), up, unitMm), solid: '' }
    : { line, solid: '' };
}

function legsPath({ glyph, feet, head, unitMm, ...rest }: ChartSymbol, foot: Point): SymbolPath {
  const symbol = { glyph, feet, head, unitMm, ...rest };
  const up = towards(foot, head);
  const side = across(up);
  const capHalf = (glyph.legs > 1 ? SIZES.cap * 0.8 : SIZES.cap) * unitMm;
  const cap = segment(add(head, side, -capHalf), add(head, side, capHalf));
  const bow = glyph.legs > 2 ? LEG_BOW.legs : LEG_BOW.twoLegs;
  if (glyph.legs > 1 && feet.length === 1)
    return { line: cap + bowedLegs(symbol, foot, head, bow), solid: '' };
  const legs = feet.map((each) => stem(each, head, glyph.bars, unitMm)).join('');
  const mark = insertionMark(glyph.insertion, foot, up, unitMm);
  const oval = glyph.footChains > 0 ? footOval(foot, up, unitMm) : '';
  return { line: cap + legs + mark + oval, solid: '' };
}

/** A stem with its strokes, which slant as they are printed. */
function stem(foot: Point, head: Point, bars: number, unitMm: number): string {
  return (
    segment(foot, head) + barsOn((share) => between(foot, head, share), foot, head, bars, unitMm)
  );
}

function barsOn(
  at: (share: number) => Point,
  foot: Point,
  head: Point,
  bars: number,
  unitMm: number,
): string {
  const up = towards(foot, head);
  const side = across(up);
  const lengthMm = distance(foot, head);
  const gap = Math.min(0.3 * unitMm, (0.62 * lengthMm) / Math.max(1, bars));
  return Array.from({ length: bars }, (_, i) => {
    const middle = at(0.54 + ((i - (bars - 1) / 2) * gap) / Math.max(1e-9, lengthMm));
    const slant = add(add([0, 0], side, SIZES.bar * unitMm), up, 0.5 * SIZES.bar * unitMm);
    return segment(add(middle, slant, -1), add(middle, slant));
  }).join('');
}

/** Legs from one foot to one head, bowed apart. */
function bowedLegs({ glyph, unitMm }: ChartSymbol, foot: Point, head: Point, bow: number): string {
  const side = across(towards(foot, head));
  return Array.from({ length: glyph.legs }, (_, i) => {
    const share = glyph.legs === 1 ? 0 : (2 * i) / (glyph.legs - 1) - 1;
    const offMm = share * bow * unitMm;
    const begin = add(between(foot, head, 0.3), side, 1.33 * offMm);
    const end = add(between(foot, head, 0.7), side, 1.33 * offMm);
    const at = (t: number): Point => {
      const u = 1 - t;
      const mix = (k: 0 | 1): number =>
        u ** 3 * foot[k] + 3 * u * u * t * begin[k] + 3 * u * t * t * end[k] + t ** 3 * head[k];
      return [mix(0), mix(1)];
    };
    // Of many legs only the outermost have room for strokes.
    const hasBars = glyph.legs <= 3 || i === 0 || i === glyph.legs - 1;
    const curve = `M${xy(foot)}C${xy(begin)} ${xy(end)} ${xy(head)}`;
    return curve + barsOn(at, foot, head, hasBars ? glyph.bars : 0, 0.6 * unitMm);
  }).join('');
}

function popcornPath(symbol: ChartSymbol, foot: Point): SymbolPath {
  const { head, unitMm } = symbol;
  const down = towards(head, foot);
  const side = across(down);
  const top = add(head, down, 0.26 * unitMm);
  const centre = add(head, down, 0.13 * unitMm);
  const half = 0.3 * unitMm;
  const oval = ellipse(add(centre, side, -half), add(centre, side, half), 0.14 * unitMm);
  return { line: oval + bowedLegs(symbol, foot, top, LEG_BOW.popcorn), solid: '' };
}

function picotPath({ glyph, head, unitMm }: ChartSymbol, foot: Point): SymbolPath {
  const centre = between(foot, head, 0.5);
  const radiusMm = 0.36 * distance(foot, head);
  const up = towards(foot, head);
  const side = across(up);
  const count = Math.min(glyph.legs, 12);
  const line = Array.from({ length: count }, (_, i) => {
    const on = (turn: number): Point => {
      const angle = 2 * Math.PI * turn;
      const out = add([0, 0], up, -Math.cos(angle) * radiusMm);
      return add(add(centre, out), side, Math.sin(angle) * radiusMm);
    };
    const [begin, end] = [on((i + 0.58) / (count + 1)), on((i + 1.42) / (count + 1))];
    return ellipse(begin, end, chainHalfMm(begin, end, 0.8 * unitMm));
  }).join('');
  return { line, solid: circle(add(centre, up, -radiusMm), 0.7 * SIZES.dot * unitMm) };
}

/** A hook round the post, to the right in front and to the left behind; half an oval under one loop. */
function insertionMark(
  insertion: ChartSymbol['glyph']['insertion'],
  foot: Point,
  up: Point,
  unitMm: number,
): string {
  if (insertion === 'both-loops') return '';
  const side = across(up);
  const isFront = insertion.startsWith('front');
  if (insertion.endsWith('post')) {
    const r = SIZES.hook * unitMm;
    const end = add(foot, side, (isFront ? 2 : -2) * r);
    return `M${xy(foot)}A${rounded(r)} ${rounded(r)} 0 0 ${isFront ? 0 : 1} ${xy(end)}`;
  }
  const r = 0.26 * unitMm;
  const at = add(foot, up, -0.06 * unitMm);
  const bow = add(at, up, (isFront ? -1 : 1) * 0.3 * unitMm);
  const level = add(at, up, (isFront ? 0.1 : -0.05) * unitMm);
  return `M${xy(add(level, side, -r))}Q${xy(bow)} ${xy(add(level, side, r))}`;
}

/** The chain at the foot of an extended stitch. */
function footOval(foot: Point, up: Point, unitMm: number): string {
  const side = across(up);
  const half = 0.2 * unitMm;
  const at = add(foot, up, 0.1 * unitMm);
  return ellipse(add(at, side, -half), add(at, side, half), 0.1 * unitMm);
}

function ellipse(begin: Point, end: Point, halfMm: number): string {
  const [x, y] = towards(begin, end);
  const angle = (Math.atan2(y, x) * 180) / Math.PI;
  const long = rounded(distance(begin, end) / 2);
  const arc = `A${long} ${rounded(halfMm)} ${rounded(angle)} 0 1 `;
  return `M${xy(begin)}${arc}${xy(end)}${arc}${xy(begin)}Z`;
}

function circle(centre: Point, radiusMm: number): string {
  return ellipse(add(centre, [-radiusMm, 0]), add(centre, [radiusMm, 0]), radiusMm);
}

const segment = (from: Point, to: Point): string => `M${xy(from)}L${xy(to)}`;
const xy = ([x, y]: Point): string => `${rounded(x)} ${rounded(y)}`;
/** Two decimals of a mm, and never "-0": server and browser must write the same text. */
const rounded = (value: number): string => String(Math.round(value * 100) / 100 + 0);
