import { DomainError } from '../errors';
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
  /** US code of the stitch whose legs it is made of, which gives its height and its UK name. */
  readonly of: StitchCode;
  readonly moves: (n: number) => Moves;
  readonly us: (n: number) => string;
  readonly ukCode: (n: number) => string;
}

const FAMILIES: readonly Family[] = [
  {
    pattern: /^sc(\d{1,2})tog$/,
    of: 'sc',
    moves: (n) => ({ wraps: 0, draws: n, throughs: 1 }),
    us: (n) => `${n} single crochet together`,
    ukCode: (n) => `dc${n}tog`,
  },
  {
    pattern: /^dc(\d{1,2})(?:tog|cl)$/,
    of: 'dc',
    moves: (n) => ({ wraps: n, draws: n, throughs: n + 1 }),
    us: (n) => `${n} double crochet together`,
    ukCode: (n) => `tr${n}tog`,
  },
  {
    pattern: /^(\d{1,2})-dc pc$/,
    of: 'dc',
    moves: (n) => ({ wraps: n, draws: n + 1, throughs: 2 * n }),
    us: (n) => `popcorn of ${n} double crochet`,
    ukCode: (n) => `${n}-tr pc`,
  },
  {
    pattern: /^(\d{1,2})-hdc puff$/,
    of: 'hdc',
    moves: (n) => ({ wraps: n, draws: n, throughs: 1 }),
    us: (n) => `puff of ${n} half double crochet`,
    ukCode: (n) => `${n}-htr puff`,
  },
  {
    pattern: /^picot-(\d{1,2})$/,
    of: 'sl st',
    moves: (n) => ({ wraps: 0, draws: 1, throughs: n }),
    us: (n) => `picot of ${n} chains`,
    ukCode: (n) => `picot-${n}`,
  },
];

/**
 * The stitch with this US abbreviation, or null when it is not in the table.
 * Knows the basic stitches, decreases ("sc2tog"), clusters and bobbles ("dc3cl"), popcorns ("5-dc pc"),
 * puffs ("3-hdc puff") and picots ("picot-3") of up to 20 legs.
 *
 * Example: `stitch('dc')?.throughs` is 2.
 */
export function stitch(code: StitchCode): Stitch | null {
  return BASIC.get(code) ?? compoundStitch(code);
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

function compoundStitch(code: StitchCode): Stitch | null {
  for (const family of FAMILIES) {
    const n = Number(family.pattern.exec(code)?.[1]);
    if (!(n >= 2 && n <= MOST_IN_ONE)) continue;
    const base = BASIC.get(family.of);
    if (!base) continue;
    const ukCode = family.ukCode(n);
    return {
      ...base,
      code,
      us: family.us(n),
      ukCode,
      uk: ukCode,
      turningChains: 0,
      ...family.moves(n),
    };
  }
  return null;
}
