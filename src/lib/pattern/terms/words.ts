/** Words that give a pattern its structure, by the one they stand for. */
const SPELLINGS: Readonly<Record<string, readonly string[]>> = {
  round: ['rnd', 'rnds', 'round', 'rounds', 'rd', 'rds'],
  row: ['row', 'rows'],
  repeat: ['rep', 'reps', 'repeat', 'repeats', 'repeating'],
  from: ['from'],
  in: ['in', 'into', 'inside', 'on', 'over', 'through'],
  next: ['next', 'nxt', 'foll', 'following', 'subsequent'],
  same: ['same'],
  each: ['each', 'ea', 'every', 'all', 'both'],
  around: ['around'],
  across: ['across', 'along'],
  st: ['st', 'sts', 'stitch', 'stitches', 'stich', 'stiches'],
  sp: [
    'sp',
    'sps',
    'space',
    'spaces',
    'lp',
    'lps',
    'loop',
    'loops',
    'arch',
    'arches',
    'gap',
    'gaps',
  ],
  skip: ['sk', 'skip', 'skipping', 'miss', 'missing'],
  join: ['join', 'joining', 'joined', 'attach', 'rejoin'],
  between: ['between', 'bet', 'btw'],
  turn: ['turn', 'turning'],
  ring: ['ring', 'circle'],
  times: ['times', 'time', 'x'],
  more: ['more'],
  end: ['end'],
  last: ['last', 'final'],
  remaining: ['remaining', 'rem', 'remain', 'remains'],
  first: ['first', '1st'],
  beginning: ['beg', 'beginning', 'starting', 'initial', 'begin', 'start'],
  top: ['top'],
  corner: ['corner', 'corners', 'cnr'],
  middle: ['center', 'centre', 'middle', 'mid', 'ctr'],
  any: ['any'],
  with: ['with', 'using', 'w'],
  counts: ['counts', 'count', 'counted', 'counting'],
  as: ['as'],
  and: ['and'],
  to: ['to', 'until', 'till'],
  of: ['of'],
  previous: ['prev', 'previous', 'preceding'],
  hook: ['hook'],
  // Words that change nothing.
  filler: [
    'the',
    'a',
    'an',
    'work',
    'working',
    'make',
    'then',
    'now',
    'also',
    'your',
    'place',
    'worked',
    'made',
    'evenly',
    'loosely',
    'again',
  ],
};

const MEANING: ReadonlyMap<string, string> = new Map(
  Object.entries(SPELLINGS).flatMap(([meaning, words]) =>
    words.map((word) => [word, meaning] as const),
  ),
);

/** What a structure word stands for, or null when it is none. "around" is a preposition and a range. */
export const meaningOf = (word: string): string | null => MEANING.get(word) ?? null;

/** Every spelling of a structure word, for the nearest to a mistyped one. */
export const STRUCTURE_WORDS: readonly string[] = [...MEANING.keys()].filter(
  (word) => word.length > 2,
);

const TIMES: Readonly<Record<string, number>> = { once: 1, twice: 2, thrice: 3 };
const NUMBERS = 'one two three four five six seven eight nine ten eleven twelve'.split(' ');

/** "twice" is 2; null for any other word. */
export const timesWord = (word: string): number | null =>
  Object.hasOwn(TIMES, word) ? (TIMES[word] as number) : null;

/** "second" to "twelfth"; "first" is a word of its own. */
const ORDINALS =
  'second third fourth fifth sixth seventh eighth ninth tenth eleventh twelfth'.split(' ');

/** "third" is 3, from "second" to "twelfth"; null for any other word. */
export function ordinalWord(word: string): number | null {
  const index = ORDINALS.indexOf(word);
  return index < 0 ? null : index + 2;
}

/** "four" is 4, up to twelve; null for any other word. */
export function numberWord(word: string): number | null {
  const index = NUMBERS.indexOf(word);
  return index < 0 ? null : index + 1;
}

/** English words so short that they look like mistyped abbreviations. */
export const PLAIN_WORDS: ReadonlySet<string> = new Set(
  (
    'so do to is it as at be by on or he we my no up us if go am an the you your are was for not but ' +
    'can may will has had have this that these those when where what which then than they them their ' +
    'there here now one two off out too use used make made work sure keep place mark start stop stay ' +
    'do not see per side sides yarn hook tip tips note notes hint right wrong front back left'
  ).split(' '),
);

/** Words of the trade that tell the maker something and make no stitch: markers, "approx", "cont in pat". */
export const TOLD_WORDS: ReadonlySet<string> = new Set(
  'alt approx cont m marker markers pat patt pm sm'.split(' '),
);
