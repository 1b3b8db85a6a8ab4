import { DomainError } from '../errors';
import { ownStitchOf } from './ownStitch';
import type { Moves, Stitch, StitchCode } from './stitch';

type Row = readonly [
  code: StitchCode,
  us: string,
  ukCode: string,
  uk: string,
  wraps: number,
  draws: number,
  throughs: number,
  turningChains: number,
  heightOverWidth: number,
];

/**
 * Heights over width: sc, hdc, dc, tr, dtr from published swatches and row heights (windchilde.com
 * strips; joannascrochet.com guide, Nov 2025); chain, slip stitch, trtr and the extended stitches are ours.
 */
const ROWS: readonly Row[] = [
  ['ch', 'chain', 'ch', 'chain', 0, 0, 1, 0, 0.9],
  ['sl st', 'slip stitch', 'ss', 'slip stitch', 0, 1, 0, 0, 0.18],
  ['sc', 'single crochet', 'dc', 'double crochet', 0, 1, 1, 1, 0.92],
  ['esc', 'extended single crochet', 'edc', 'extended double crochet', 0, 1, 2, 2, 1.3],
  ['hdc', 'half double crochet', 'htr', 'half treble', 1, 1, 1, 2, 1.35],
  ['ehdc', 'extended half double crochet', 'ehtr', 'extended half treble', 1, 1, 2, 3, 1.75],
  ['dc', 'double crochet', 'tr', 'treble', 1, 1, 2, 3, 1.85],
  ['edc', 'extended double crochet', 'etr', 'extended treble', 1, 1, 3, 4, 2.3],
  ['tr', 'treble crochet', 'dtr', 'double treble', 2, 1, 3, 4, 2.6],
  ['etr', 'extended treble crochet', 'edtr', 'extended double treble', 2, 1, 4, 5, 3],
  ['dtr', 'double treble crochet', 'trtr', 'triple treble', 3, 1, 4, 5, 3.4],
  ['trtr', 'triple treble crochet', 'qtr', 'quadruple treble', 4, 1, 5, 6, 4.2],
];

const BASIC: ReadonlyMap<StitchCode, Stitch> = new Map(
  ROWS.map(([code, us, ukCode, uk, wraps, draws, throughs, turningChains, heightOverWidth]) => [
    code,
    { code, us, ukCode, uk, wraps, draws, throughs, turningChains, heightOverWidth },
  ]),
);

/** Most stitches, chains or legs that one compound stitch may gather. */
const MOST_IN_ONE = 20;

interface Family {
  readonly pattern: RegExp;
  /** US code of the stitch whose legs it is made of where the pattern names none. */
  readonly of?: StitchCode;
  readonly moves: (base: Moves, n: number) => Moves;
  readonly us: (base: Stitch, n: number) => string;
  readonly ukCode: (base: Stitch, n: number) => string;
}

/** Legs left unfinished on the hook, then one through all of them. */
const gathered = ({ wraps, draws, throughs }: Moves, n: number): Moves => ({
  wraps: n * wraps,
  draws: n * draws,
  throughs: n * (throughs - 1) + 1,
});

const FAMILIES: readonly Family[] = [
  {
    pattern: /^(?<of>sc|hdc|dc|tr|dtr|trtr)(?<n>\d{1,2})(?:tog|cl)$/,
    moves: gathered,
    us: ({ us }, n) => `${n} ${us} together`,
    ukCode: ({ ukCode }, n) => `${ukCode}${n}tog`,
  },
  {
    pattern: /^(?<n>\d{1,2})-(?<of>hdc|dc|tr|dtr) pc$/,
    moves: ({ wraps, draws, throughs }, n) => ({
      wraps: n * wraps,
      draws: n * draws + 1,
      throughs: n * throughs,
    }),
    us: ({ us }, n) => `popcorn of ${n} ${us}`,
    ukCode: ({ ukCode }, n) => `${n}-${ukCode} pc`,
  },
  {
    pattern: /^(?<n>\d{1,2})-(?<of>hdc) puff$/,
    moves: gathered,
    us: ({ us }, n) => `puff of ${n} ${us}`,
    ukCode: ({ ukCode }, n) => `${n}-${ukCode} puff`,
  },
  {
    pattern: /^picot-(?<n>\d{1,2})$/,
    of: 'sl st',
    moves: (_, n) => ({ wraps: 0, draws: 1, throughs: n }),
    us: (_, n) => `picot of ${n} chains`,
    ukCode: (_, n) => `picot-${n}`,
  },
];

/** Where the hook goes in, by the letters before the stitch: "FPdc" is worked round the post, from the front. */
const INSERTIONS: Readonly<Record<string, string>> = {
  FP: 'front post',
  BP: 'back post',
  FL: 'front loop',
  BL: 'back loop',
};

/**
 * The stitch with this US abbreviation, or null when it is not in the table.
 * Knows the basic stitches, decreases ("sc2tog"), clusters and bobbles ("dc3cl"), popcorns ("5-dc pc"),
 * puffs ("3-hdc puff") and picots ("picot-3") of up to 20 legs, and any basic stitch worked round the
 * post or into one loop ("FPdc", "BPtr", "BLsc", "FLdc"), and stitches of one's own by their code.
 *
 * Example: `stitch('dc')?.throughs` is 2.
 */
export function stitch(code: StitchCode): Stitch | null {
  return BASIC.get(code) ?? insertedStitch(code) ?? compoundStitch(code) ?? ownStitchOf(code);
}

/** Like `stitch`, for codes already checked. Throws DomainError for one that is not in the table. */
export function knownStitch(code: StitchCode): Stitch {
  const found = stitch(code);
  if (!found)
    throw new DomainError(
      'unknown-stitch',
      `knownStitch requires a stitch of the table, got "${code}"`,
    );
  return found;
}

/** The stitches of the table that have a name of their own, in order of height. */
export const BASIC_STITCHES: readonly Stitch[] = [...BASIC.values()];

/** A post or loop stitch: made of the moves of its base, and as tall. */
function insertedStitch(code: StitchCode): Stitch | null {
  const letters = code.slice(0, 2);
  const base = BASIC.get(code.slice(2));
  if (!base || base.draws === 0 || !Object.hasOwn(INSERTIONS, letters)) return null;
  const words = INSERTIONS[letters] as string;
  const { ukCode, us, uk } = base;
  return {
    ...base,
    code,
    us: `${words} ${us}`,
    ukCode: `${letters}${ukCode}`,
    uk: `${words} ${uk}`,
  };
}

function compoundStitch(code: StitchCode): Stitch | null {
  for (const family of FAMILIES) {
    const groups = family.pattern.exec(code)?.groups;
    const n = Number(groups?.n);
    if (!(n >= 2 && n <= MOST_IN_ONE)) continue;
    const base = BASIC.get(groups?.of ?? family.of ?? '');
    if (!base) continue;
    const ukCode = family.ukCode(base, n);
    return {
      ...base,
      code,
      us: family.us(base, n),
      ukCode,
      uk: ukCode,
      turningChains: 0,
      ...family.moves(base, n),
    };
  }
  return null;
}
