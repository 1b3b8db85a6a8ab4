import type { Moves, Stitch, StitchCode } from './stitch';

/** Symbols that a stitch of one's own can be drawn with instead of the one its moves give. */
export const SYMBOL_BODIES = ['chain', 'dot', 'cross', 'legs', 'popcorn', 'puff', 'picot'] as const;
export type SymbolBody = (typeof SYMBOL_BODIES)[number];

export interface OwnSymbol {
  readonly body: SymbolBody;
  /** Stems side by side; of a picot, its chains. */
  readonly legs: number;
  /** Strokes across each stem. */
  readonly bars: number;
}

/** A stitch that somebody has added, by its moves. */
export interface OwnStitch {
  /** As patterns write it, small letters only: "lst". */
  readonly abbreviation: string;
  readonly name: string;
  readonly moves: Moves;
  /** Row height over stitch width; null takes what its moves usually come to. */
  readonly heightOverWidth: number | null;
  /** Stitches of the round below that it takes up. */
  readonly takes: number;
  /** Null draws it from its moves. */
  readonly symbol: OwnSymbol | null;
}

export const OWN_STITCH_LIMITS = {
  abbreviation: 12,
  wraps: 20,
  draws: 20,
  throughs: 60,
  takes: 20,
  legs: 20,
  bars: 12,
  heightOverWidth: { least: 0.05, most: 20 },
} as const;

/**
 * The code of a stitch of one's own. It carries the moves, so that counts, motifs and plans stay whole
 * wherever they go, and two stitches of one abbreviation are never taken for each other.
 *
 * Example: a "lst" of 1 wrap, 1 draw and 3 throughs is "lst{1,1,3}"; 2.2 widths tall, "lst{1,1,3,2.2}".
 */
export function ownStitchCode({
  abbreviation,
  moves: { wraps, draws, throughs },
  heightOverWidth,
}: Pick<OwnStitch, 'abbreviation' | 'moves' | 'heightOverWidth'>): StitchCode {
  const figures = [wraps, draws, throughs, ...(heightOverWidth === null ? [] : [heightOverWidth])];
  return `${abbreviation}{${figures.join(',')}}`;
}

const CODE = /^([a-z]{2,12})\{(\d{1,2}),(\d{1,2}),(\d{1,2})(?:,(\d{1,2}(?:\.\d{1,4})?))?\}$/;

/** What a code of `ownStitchCode` says, or null where it is none or beyond `OWN_STITCH_LIMITS`. */
export function ownStitchOf(code: StitchCode): Stitch | null {
  const found = CODE.exec(code);
  if (!found) return null;
  const [, abbreviation = '', ...figures] = found;
  const [wraps = 0, draws = 0, throughs = 0, height] = figures.map((figure) =>
    figure === undefined ? undefined : Number(figure),
  );
  const moves = { wraps, draws, throughs };
  const { wraps: w, draws: d, throughs: t, heightOverWidth: tall } = OWN_STITCH_LIMITS;
  if (wraps > w || draws > d || throughs > t || draws + throughs === 0) return null;
  if (height !== undefined && (height < tall.least || height > tall.most)) return null;
  // "lst{01,1,3}" would be a second code of the same stitch.
  if (ownStitchCode({ abbreviation, moves, heightOverWidth: height ?? null }) !== code) return null;
  return {
    ...moves,
    code,
    us: abbreviation,
    uk: abbreviation,
    ukCode: abbreviation,
    turningChains: height === undefined ? usualTurningChains(moves) : chainsAsTall(moves, height),
    heightOverWidth: height ?? usualHeightOverWidth(moves),
  };
}

/**
 * Height over width that moves usually come to: 0.52 and 0.43 a wrap and 0.40 a through of each leg,
 * which meets the heights of the stitch table within 7 % (a fit; ours). Wraps that are drawn off many
 * at once, as of a bullion, lie flat: 0.1 each (from memory).
 *
 * Example: 1 wrap, 1 draw and 2 throughs, a dc, come to 1.75; the table says 1.85.
 */
export function usualHeightOverWidth({ wraps, draws, throughs }: Moves): number {
  if (draws === 0) return 0.9;
  if (throughs === 0) return 0.18;
  const legThroughs = (throughs - 1) / draws + 1;
  const standing = Math.min(wraps / draws, legThroughs);
  const fit = 0.52 + 0.43 * standing + 0.1 * (wraps / draws - standing) + 0.4 * legThroughs;
  return Math.min(OWN_STITCH_LIMITS.heightOverWidth.most, Math.round(fit * 100) / 100);
}

/** Chains that reach as high: those of sc, hdc, dc and on, and one more for each chain that lengthens it. */
function usualTurningChains(moves: Moves): number {
  const { wraps, draws, throughs } = moves;
  if (draws === 0 || throughs === 0) return 0;
  const legWraps = Math.round(wraps / draws);
  const legThroughs = Math.round((throughs - 1) / draws + 1);
  if (legWraps > legThroughs) return chainsAsTall(moves, usualHeightOverWidth(moves));
  if (legThroughs === 1 || legWraps === 0) return legWraps + legThroughs;
  return legWraps + 2 + Math.max(0, legThroughs - legWraps - 1);
}

/** A chain that begins a round adds 0.65 of a stitch width to its height: what the whole stitch table agrees with (ours). */
const WIDTHS_A_CHAIN = 0.65;

const chainsAsTall = ({ draws }: Moves, heightOverWidth: number): number =>
  draws === 0 ? 0 : Math.round(heightOverWidth / WIDTHS_A_CHAIN);

/** The abbreviation in a code of one's own stitch, or the code itself: "lst" of "lst{1,1,3}". */
export const abbreviationOf = (code: StitchCode): string => code.split('{', 1)[0] ?? code;
