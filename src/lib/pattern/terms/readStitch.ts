import { ownStitchCode } from '../../stitches/ownStitch';
import type { StitchCode } from '../../stitches/stitch';
import { stitch } from '../../stitches/stitchTable';
import type { Token } from '../token';
import type { Lexicon } from './lexicon';
import {
  COMPOUND_WORDS,
  INSERTION_WORDS,
  NAME_BEGINNINGS,
  STITCH_WORDS,
  USUAL_LEGS,
  type Compound,
} from './stitchWords';

/** A stitch as it stands in the text. */
export interface StitchTerm {
  readonly code: StitchCode;
  /** How many of it go into one place: 2 of an increase. */
  readonly perPlace: number;
  /** Places that one of it takes up: 3 of "dc3tog". */
  readonly takes: number;
  /** Index of the token after it. */
  readonly next: number;
  /** Index of the token that belongs to the other set of terms; null where there is none. */
  readonly foreign: number | null;
}

/** The stitch that stands at a token, or null. Knows abbreviations, names, and compounds of them. */
export function readStitch(
  tokens: readonly Token[],
  at: number,
  lexicon: Lexicon,
): StitchTerm | null {
  const token = tokens[at];
  if (token?.kind === 'number') return countedLegs(tokens, at, lexicon);
  if (token?.kind !== 'word') return null;
  return (
    ownStitch(token, at, lexicon) ??
    inserted(tokens, at, lexicon) ??
    named(tokens, at, lexicon) ??
    loneCompound(tokens, at) ??
    ownStitch(token, at, lexicon, true)
  );
}

/** A stitch of one's own, or several of it: "lsts". */
function ownStitch(
  { text }: Token,
  at: number,
  lexicon: Lexicon,
  isPlural = false,
): StitchTerm | null {
  const singular = isPlural && text.endsWith('s') ? text.slice(0, -1) : text;
  const own = lexicon.own.get(singular);
  return own
    ? { code: ownStitchCode(own), perPlace: 1, takes: own.takes, next: at + 1, foreign: null }
    : null;
}

/** Letters that "front", "back" and their abbreviations begin with. */
const BEGIN_INSERTION: ReadonlySet<string> = new Set(['f', 'b']);

/** "FPdc", "BLO dc", "front post dc". */
function inserted(tokens: readonly Token[], at: number, lexicon: Lexicon): StitchTerm | null {
  const word = tokens[at]?.text ?? '';
  if (!BEGIN_INSERTION.has(word[0] ?? '')) return null;
  for (const letters of [3, 2]) {
    const letter = INSERTION_WORDS.get(word.slice(0, letters));
    const base = letter && baseWord(word.slice(letters), lexicon);
    if (base && letter) return one(letter + base.code, at + 1, base.foreign ? at : null);
  }
  const two = `${word} ${tokens[at + 1]?.text ?? ''}`;
  const width = INSERTION_WORDS.has(two) ? 2 : INSERTION_WORDS.has(word) ? 1 : 0;
  if (width === 0) return null;
  const only = tokens[at + width]?.text === 'only' ? 1 : 0;
  const base = baseName(tokens, at + width + only, lexicon);
  if (!base || base.code === 'ch' || base.code === 'sl st') return null;
  const letter = INSERTION_WORDS.get(width === 2 ? two : word) as string;
  return one(letter + base.code, base.next, base.foreign ? at + width : null);
}

const JOINED = /^([a-z]{1,6}?)(\d{1,2})(tog|cl|pc|together)$/;

/** A stitch by its abbreviation or name, and what may follow it: "dc", "dc3tog", "dc 3 tog", "dc cluster". */
function named(tokens: readonly Token[], at: number, lexicon: Lexicon): StitchTerm | null {
  const joined = JOINED.exec(tokens[at]?.text ?? '');
  if (joined) {
    const base = baseWord(joined[1] as string, lexicon);
    const compound = COMPOUND_WORDS.get(joined[3] as string);
    return base && compound
      ? compoundOf(base.code, Number(joined[2]), compound, at + 1, base.foreign ? at : null)
      : null;
  }
  const picot = chainPicot(tokens, at);
  if (picot) return picot;
  const base = baseName(tokens, at, lexicon);
  if (!base) return null;
  const foreign = base.foreign ? at : null;
  const number = tokens[base.next];
  if (number?.kind === 'number' && isTogether(tokens[base.next + 1])) {
    return compoundOf(base.code, number.value, 'together', base.next + 2, foreign);
  }
  const compound = compoundAt(tokens, base.next);
  if (compound && base.code !== 'ch' && base.code !== 'sl st') {
    return compoundOf(
      base.code,
      USUAL_LEGS[compound.compound],
      compound.compound,
      compound.next,
      foreign,
    );
  }
  return one(base.code, base.next, foreign);
}

/** "5-dc pc", "3 dc cluster": the number is of legs. */
function countedLegs(tokens: readonly Token[], at: number, lexicon: Lexicon): StitchTerm | null {
  const hyphen = tokens[at + 1]?.text === '-' ? 1 : 0;
  const base = baseName(tokens, at + 1 + hyphen, lexicon);
  const compound = base && compoundAt(tokens, base.next);
  if (!base || !compound || base.code === 'ch' || base.code === 'sl st') return null;
  if (compound.compound === 'increase' || compound.compound === 'decrease') return null;
  const foreign = base.foreign ? at + 1 + hyphen : null;
  return compoundOf(base.code, tokens[at]?.value ?? 0, compound.compound, compound.next, foreign);
}

/** "cl", "puff st", "picot", "inc" on their own, with their usual legs. */
function loneCompound(tokens: readonly Token[], at: number): StitchTerm | null {
  const compound = compoundAt(tokens, at);
  if (!compound || compound.compound === 'together') return null;
  const base = compound.compound === 'increase' || compound.compound === 'decrease' ? 'sc' : 'dc';
  const legs = compound.compound === 'cluster' && /^bo/.test(tokens[at]?.text ?? '') ? 5 : null;
  return compoundOf(
    base,
    legs ?? USUAL_LEGS[compound.compound],
    compound.compound,
    compound.next,
    null,
  );
}

/** "ch-3 picot", "picot-4", "picot", which has three chains. */
function chainPicot(tokens: readonly Token[], at: number): StitchTerm | null {
  const word = tokens[at]?.text;
  if (word === 'picot' || word === 'picots') {
    const legs = tokens[at + 1]?.text === '-' && tokens[at + 2]?.kind === 'number';
    return legs ? picotOf(tokens[at + 2]?.value ?? 3, at + 3) : picotOf(3, at + 1);
  }
  if (word !== 'ch') return null;
  const hyphen = tokens[at + 1]?.text === '-' ? 1 : 0;
  const number = tokens[at + 1 + hyphen];
  const then = tokens[at + 2 + hyphen]?.text;
  return number?.kind === 'number' && (then === 'picot' || then === 'picots')
    ? picotOf(number.value, at + 3 + hyphen)
    : null;
}

const picotOf = (chains: number, next: number): StitchTerm | null =>
  stitch(`picot-${chains}`) && { ...one(`picot-${chains}`, next, null), takes: 0 };

function compoundOf(
  base: StitchCode,
  legs: number,
  compound: Compound,
  next: number,
  foreign: number | null,
): StitchTerm | null {
  if (compound === 'increase' || compound === 'shell') {
    return { code: base, perPlace: Math.max(1, Math.min(legs, 20)), takes: 1, next, foreign };
  }
  const gathers = compound === 'together' || compound === 'decrease';
  const code = gathers
    ? `${base}${legs}tog`
    : compound === 'cluster'
      ? `${base}${legs}cl`
      : compound === 'popcorn'
        ? `${legs}-${base} pc`
        : `${legs}-hdc puff`;
  return stitch(code) && { code, perPlace: 1, takes: gathers ? legs : 1, next, foreign };
}

function compoundAt(
  tokens: readonly Token[],
  at: number,
): { compound: Compound; next: number } | null {
  const compound = COMPOUND_WORDS.get(tokens[at]?.text ?? '');
  if (!compound) return null;
  const ends = tokens[at + 1]?.text ?? '';
  return { compound, next: at + (/^(st|sts|stitch|stitches)$/.test(ends) ? 2 : 1) };
}

const isTogether = (token: Token | undefined): boolean =>
  token?.text === 'tog' || token?.text === 'together';

interface BaseName {
  readonly code: StitchCode;
  readonly next: number;
  readonly foreign: boolean;
}

/** A plain stitch by its abbreviation or its name of up to four words. */
function baseName(tokens: readonly Token[], at: number, lexicon: Lexicon): BaseName | null {
  const first = tokens[at];
  if (first?.kind !== 'word') return null;
  if (NAME_BEGINNINGS.has(first.text)) {
    for (let words = 4; words >= 2; words -= 1) {
      const phrase = phraseAt(tokens, at, words);
      const found = phrase && baseWord(phrase.text, lexicon);
      if (found) return { ...found, next: phrase.next };
    }
  }
  const found = baseWord(first.text, lexicon);
  return found && { ...found, next: at + 1 };
}

function phraseAt(
  tokens: readonly Token[],
  at: number,
  words: number,
): { text: string; next: number } | null {
  const parts: string[] = [];
  let next = at;
  while (parts.length < words) {
    const token = tokens[next];
    const between =
      token?.kind === 'mark' && parts.length > 0 && (token.text === '-' || token.text === '.');
    // "sl. st" has a full stop inside, and "half-double" a hyphen.
    if (between && !token.spaceBefore) {
      next += 1;
      continue;
    }
    if (token?.kind !== 'word') return null;
    parts.push(token.text);
    next += 1;
  }
  return { text: parts.join(' '), next };
}

function baseWord(
  written: string,
  { terms }: Lexicon,
): { code: StitchCode; foreign: boolean } | null {
  const code = STITCH_WORDS[terms].get(written);
  if (code) return { code, foreign: false };
  const foreign = STITCH_WORDS[terms === 'us' ? 'uk' : 'us'].get(written);
  return foreign ? { code: foreign, foreign: true } : null;
}

const one = (code: StitchCode, next: number, foreign: number | null): StitchTerm => ({
  code,
  perPlace: 1,
  takes: 1,
  next,
  foreign,
});
