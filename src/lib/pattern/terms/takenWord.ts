import { tokenize } from '../tokenize';
import { lexiconOf } from './lexicon';
import { readStitch } from './readStitch';
import { COMPOUND_WORDS, INSERTION_WORDS, NAME_BEGINNINGS, STITCH_WORDS } from './stitchWords';
import { meaningOf, numberWord, ordinalWord, PLAIN_WORDS, timesWord, TOLD_WORDS } from './words';

/** Words that the parser asks for by themselves, beside those of `words.ts`. */
const PARSER_WORDS: ReadonlySet<string> = new Set(
  (
    'acts adjustable at back break by change chsp chsps close color colour crochet cut does fasten ' +
    'facing finish form forming front group groups have magic making mc cc mr new off only petal ' +
    'petals picot picots post posts right rs should side sides skip standing stands sts tbl tch tog total ' +
    'throughout turning wrong ws yarn yo yoh'
  ).split(' '),
);

const LEXICONS = [lexiconOf('us'), lexiconOf('uk')] as const;

/**
 * Whether patterns have this word already, in US or UK terms: it can then not be the abbreviation of
 * a stitch of one's own. Capitals count as small letters.
 *
 * Example: `isTakenWord('htr')` and `isTakenWord('rnd')` are true, `isTakenWord('lst')` is not.
 */
export function isTakenWord(abbreviation: string): boolean {
  const word = abbreviation.trim().toLowerCase();
  return isKnownWord(word) || isKnownWord(`${word}s`) || isStitchWord(word.replace(/s$/, ''));
}

const isKnownWord = (word: string): boolean =>
  PARSER_WORDS.has(word) ||
  PLAIN_WORDS.has(word) ||
  TOLD_WORDS.has(word) ||
  meaningOf(word) !== null ||
  numberWord(word) !== null ||
  ordinalWord(word) !== null ||
  timesWord(word) !== null ||
  INSERTION_WORDS.has(word) ||
  NAME_BEGINNINGS.has(word) ||
  isStitchWord(word);

/** What the reader takes for a stitch, whole: "dc", "fpdc", "puff". */
function isStitchWord(word: string): boolean {
  if (STITCH_WORDS.us.has(word) || STITCH_WORDS.uk.has(word) || COMPOUND_WORDS.has(word))
    return true;
  const tokens = tokenize(word);
  return tokens.length === 2 && LEXICONS.some((each) => readStitch(tokens, 0, each) !== null);
}
