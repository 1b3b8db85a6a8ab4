import type { StitchCode } from '../../stitches/stitch';

type Words = readonly (readonly [code: StitchCode, ...written: string[]])[];

const BOTH: Words = [
  ['ch', 'ch', 'chs', 'chain', 'chains'],
  [
    'sl st',
    'sl st',
    'sl sts',
    'slst',
    'slsts',
    'sl',
    'slip stitch',
    'slip stitches',
    'slip st',
    'ss',
  ],
];

const US: Words = [
  ['sc', 'sc', 'scs', 'single crochet', 'single crochets'],
  ['esc', 'esc', 'exsc', 'extended single crochet'],
  ['hdc', 'hdc', 'hdcs', 'half double crochet', 'half double', 'half doubles'],
  ['ehdc', 'ehdc', 'exhdc', 'extended half double crochet'],
  ['dc', 'dc', 'dcs', 'double crochet', 'double crochets'],
  ['edc', 'edc', 'exdc', 'extended double crochet'],
  ['tr', 'tr', 'trs', 'trc', 'treble crochet', 'treble', 'trebles', 'triple crochet'],
  ['etr', 'etr', 'extended treble crochet', 'extended treble'],
  ['dtr', 'dtr', 'dtrs', 'double treble crochet', 'double treble', 'double trebles'],
  ['trtr', 'trtr', 'ttr', 'triple treble crochet', 'triple treble'],
];

const UK: Words = [
  ['sc', 'dc', 'dcs', 'double crochet', 'double crochets'],
  ['esc', 'edc', 'exdc', 'extended double crochet'],
  ['hdc', 'htr', 'htrs', 'half treble crochet', 'half treble', 'half trebles'],
  ['ehdc', 'ehtr', 'exhtr', 'extended half treble crochet', 'extended half treble'],
  ['dc', 'tr', 'trs', 'trc', 'treble crochet', 'treble', 'trebles'],
  ['edc', 'etr', 'extr', 'extended treble crochet', 'extended treble'],
  ['tr', 'dtr', 'dtrs', 'double treble crochet', 'double treble', 'double trebles'],
  ['etr', 'edtr', 'extended double treble crochet', 'extended double treble'],
  ['dtr', 'trtr', 'ttr', 'triple treble crochet', 'triple treble'],
  ['trtr', 'qtr', 'quadtr', 'quad treble', 'quadruple treble crochet', 'quadruple treble'],
];

const byWords = (words: Words): ReadonlyMap<string, StitchCode> =>
  new Map(words.flatMap(([code, ...written]) => written.map((each) => [each, code] as const)));

/** US code by what is written, in small letters, in each set of terms. */
export const STITCH_WORDS = {
  us: byWords([...BOTH, ...US]),
  uk: byWords([...BOTH, ...UK]),
} as const;

/** Words that begin a name of several words: "half" of "half double crochet". */
export const NAME_BEGINNINGS: ReadonlySet<string> = new Set(
  [...BOTH, ...US, ...UK].flatMap(([, ...written]) =>
    written.filter((each) => each.includes(' ')).map((each) => each.split(' ')[0] as string),
  ),
);

/** What several stitches make of themselves, by how it is written. */
export type Compound =
  'together' | 'cluster' | 'popcorn' | 'puff' | 'shell' | 'increase' | 'decrease';

const COMPOUNDS: Readonly<Record<Compound, readonly string[]>> = {
  together: ['tog', 'together'],
  cluster: ['cl', 'cls', 'cluster', 'clusters', 'bo', 'bobble', 'bobbles'],
  popcorn: ['pc', 'pcs', 'popcorn', 'popcorns', 'pop'],
  puff: ['puff', 'puffs', 'ps'],
  shell: ['sh', 'shell', 'shells', 'fan', 'fans'],
  increase: ['inc', 'increase'],
  decrease: ['dec', 'decrease'],
};

export const COMPOUND_WORDS: ReadonlyMap<string, Compound> = new Map(
  Object.entries(COMPOUNDS).flatMap(([compound, words]) =>
    words.map((word) => [word, compound as Compound] as const),
  ),
);

/** Legs of a compound stitch where the pattern does not say; common practice, no source. */
export const USUAL_LEGS: Readonly<Record<Compound, number>> = {
  together: 2,
  cluster: 3,
  popcorn: 5,
  puff: 3,
  shell: 5,
  increase: 2,
  decrease: 2,
};

/** Letters before a stitch, and words, that say where the hook goes in. */
export const INSERTION_WORDS: ReadonlyMap<string, string> = new Map([
  ['fp', 'FP'],
  ['bp', 'BP'],
  ['fl', 'FL'],
  ['flo', 'FL'],
  ['bl', 'BL'],
  ['blo', 'BL'],
  ['front post', 'FP'],
  ['back post', 'BP'],
  ['front loop', 'FL'],
  ['front loops', 'FL'],
  ['back loop', 'BL'],
  ['back loops', 'BL'],
]);
