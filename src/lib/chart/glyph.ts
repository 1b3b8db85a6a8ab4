import { OWN_STITCH_LIMITS, type OwnStitch, type SymbolBody } from '../stitches/ownStitch';
import type { Moves, StitchCode } from '../stitches/stitch';
import { stitch } from '../stitches/stitchTable';

/** How a stitch is inserted, which its symbol shows at the foot. */
export type Insertion = 'both-loops' | 'front-loop' | 'back-loop' | 'front-post' | 'back-post';

/**
 * What the symbol of a stitch is made of.
 * chain: an oval; dot: a filled dot; cross: an upright cross; legs: stems under one cap;
 * popcorn: legs under an oval; puff: plain curved legs; picot: a small ring of ovals.
 */
export interface Glyph {
  readonly body: SymbolBody;
  /** Stems side by side; of a picot, its chains. */
  readonly legs: number;
  /** Strokes across each stem: the wraps that are drawn off one by one. */
  readonly bars: number;
  /** Small ovals at the foot: chains that lengthen an extended stitch. */
  readonly footChains: number;
  readonly insertion: Insertion;
}

const INSERTIONS: Readonly<Record<string, Insertion>> = {
  FP: 'front-post',
  BP: 'back-post',
  FL: 'front-loop',
  BL: 'back-loop',
};

/**
 * The symbol of a stitch: chain an oval, slip stitch a dot, sc a cross, hdc a T, and a T with one
 * stroke more for each step of height from dc on (published crochet chart symbols; JIS L 0201 draws
 * them alike). A stitch of one's own is drawn from its moves in the same way, or as it asks to be.
 *
 * Example: `glyphOf('tr').bars` is 2.
 */
export function glyphOf(code: StitchCode, own?: OwnStitch): Glyph {
  if (own?.symbol) return { ...PLAIN, ...own.symbol };
  const insertion = INSERTIONS[code.slice(0, 2)] ?? 'both-loops';
  const picot = /^picot-(\d+)$/.exec(code);
  if (picot) return { ...PLAIN, body: 'picot', legs: Number(picot[1]) };
  const glyph = glyphOfMoves(stitch(code) ?? UNKNOWN);
  // Extended half double and double crochet share their moves: the name tells them apart.
  if (/^e(sc|hdc|dc|tr)$/.test(code)) return { ...glyphOf(code.slice(1)), footChains: 1 };
  if (/ pc$/.test(code)) return { ...popcornOf(glyph, code), insertion };
  if (/ puff$/.test(code)) return { ...glyph, body: 'puff', bars: 0, insertion };
  return { ...glyph, insertion };
}

const PLAIN = { legs: 1, bars: 0, footChains: 0, insertion: 'both-loops' } as const;
const UNKNOWN: Moves = { wraps: 0, draws: 1, throughs: 1 };

function glyphOfMoves({ wraps, draws, throughs }: Moves): Glyph {
  if (draws === 0) return { ...PLAIN, body: 'chain' };
  if (throughs === 0) return { ...PLAIN, body: 'dot' };
  const wrapsEach = wraps / draws;
  if (draws > 1) {
    const bars = Math.max(0, Math.round((throughs - 1) / draws));
    return { ...PLAIN, body: 'legs', legs: draws, bars };
  }
  const footChains = Math.max(0, throughs - wrapsEach - 1);
  if (wraps === 0) return { ...PLAIN, body: 'cross', footChains };
  // A half double draws off its wrap with the rest, and so has no stroke.
  const bars = Math.min(wraps, throughs - 1, OWN_STITCH_LIMITS.bars);
  return { ...PLAIN, body: 'legs', bars, footChains };
}

/** A popcorn is whole stitches, closed by one more draw: its legs are those of the stitch it names. */
function popcornOf(glyph: Glyph, code: StitchCode): Glyph {
  const [, legs = '1', of = 'dc'] = /^(\d+)-(\w+) pc$/.exec(code) ?? [];
  return { ...glyph, body: 'popcorn', legs: Number(legs), bars: glyphOf(of).bars };
}
