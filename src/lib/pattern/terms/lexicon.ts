import type { Terms } from '../reading';
import { NAME_BEGINNINGS, STITCH_WORDS, COMPOUND_WORDS } from './stitchWords';
import type { OwnStitch } from '../../stitches/ownStitch';
import { STRUCTURE_WORDS } from './words';

/** The words of one reading: a set of terms, and the stitches of one's own. */
export interface Lexicon {
  readonly terms: Terms;
  readonly own: ReadonlyMap<string, OwnStitch>;
  /** Every single word that is known, for the nearest to one that is not. */
  readonly known: readonly string[];
}

const KNOWN = { us: knownIn('us'), uk: knownIn('uk') } as const;

export function lexiconOf(terms: Terms, ownStitches: readonly OwnStitch[] = []): Lexicon {
  const own = new Map(ownStitches.map((each) => [each.abbreviation, each]));
  return { terms, own, known: own.size === 0 ? KNOWN[terms] : [...KNOWN[terms], ...own.keys()] };
}

function knownIn(terms: Terms): string[] {
  const stitches = [...STITCH_WORDS[terms].keys()].filter((word) => !word.includes(' '));
  const compounds = [...COMPOUND_WORDS.keys()].filter((word) => word.length > 2);
  return [...stitches, ...NAME_BEGINNINGS, ...compounds, ...STRUCTURE_WORDS, 'picot', 'crochet'];
}
