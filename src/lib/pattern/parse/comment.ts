import { PATTERN_LIMITS } from '../limits';
import { nearest } from '../terms/nearest';
import { COMPOUND_WORDS } from '../terms/stitchWords';
import { meaningOf, numberWord, PLAIN_WORDS, timesWord } from '../terms/words';
import type { ParseState } from './parseState';

const OPENERS: ReadonlySet<string> = new Set(
  'note notes tip tips hint hints nb optional remember gauge tension materials hook yarn size sizes abbreviations finished notions special finishing'.split(
    ' ',
  ),
);
/** Words by which a sentence without a stitch is still an instruction. */
const VERBS: ReadonlySet<string> = new Set(
  'turn join joining fasten rep repeat sk skip miss change cut break attach magic adjustable sliding with using rejoin rotate mr mc'.split(
    ' ',
  ),
);

/** A longer word is no abbreviation, mistyped or not. */
const LONGEST_SLIP = 14;

/** Where the sentence that begins here ends: the index of its full stop, end of line or end of text. */
export function sentenceEnd(state: ParseState): number {
  const from = state.at;
  if (from >= state.sentence.from && from <= state.sentence.end) return state.sentence.end;
  const end = findEnd(state, from);
  state.sentence = { from, end };
  return end;
}

function findEnd(state: ParseState, from: number): number {
  let at = from;
  const most = Math.min(state.tokens.length - 1, from + PATTERN_LIMITS.sentence);
  while (at < most) {
    const token = state.tokens[at];
    if (token?.kind === 'line') return at;
    if (token?.kind === 'mark' && token.text === '.' && endsHere(state, at)) return at;
    at += 1;
  }
  return at;
}

/** A full stop inside "sl. st" or "12.5" ends nothing. */
const endsHere = (state: ParseState, at: number): boolean => {
  const next = state.tokens[at + 1];
  return next === undefined || next.spaceBefore || next.kind === 'line' || next.kind === 'end';
};

/**
 * Whether the sentence that begins here is told to the reader and not to the hook: it opens as a note
 * or a tip, holds neither a stitch nor a verb of the trade, or begins in plain English.
 */
export function isComment(state: ParseState, end = sentenceEnd(state)): boolean {
  const first = state.peek();
  if (first.kind !== 'word') return false;
  if (OPENERS.has(first.text) && (state.isMark(':', 1) || !isKnown(state, state.at))) return true;
  let unknown = 0;
  let instructions = 0;
  for (let at = state.at; at < end; at += 1) {
    const token = state.tokens[at];
    if (token?.kind === 'mark' && /^[*([]/.test(token.text)) instructions += 1;
    if (token?.kind !== 'word') continue;
    if (isInstruction(state, at)) instructions += 1;
    else if (!isKnown(state, at) && meaningOf(token.text) === null) unknown += 1;
  }
  if (instructions === 0) return unknown > 0 && !isSlip(state);
  const filler = meaningOf(first.text) !== null;
  return unknown >= 2 && !filler && !isKnown(state, state.at) && !isSlip(state);
}

/** Whether the first word is a known one, mistyped. */
const isSlip = (state: ParseState): boolean => nearestKnown(state, state.peek().text) !== null;

/** The known word that this one is most likely a slip of; plain English never is. */
export function nearestKnown(state: ParseState, word: string): string | null {
  if (PLAIN_WORDS.has(word) || word.length > LONGEST_SLIP) return null;
  const known = state.nearest.get(word);
  if (known !== undefined) return known;
  const found = nearest(word, state.lexicon.known);
  // Part of a name, such as "single", which is not one on its own.
  const near = found === word ? null : found;
  state.nearest.set(word, near);
  return near;
}

const isInstruction = (state: ParseState, at: number): boolean =>
  VERBS.has(state.tokens[at]?.text ?? '') || state.stitchHere(at - state.at) !== null;

/** Whether a word is one of a pattern's own. */
export function isKnown(state: ParseState, at: number): boolean {
  const word = state.tokens[at]?.text ?? '';
  return (
    isInstruction(state, at) ||
    COMPOUND_WORDS.has(word) ||
    (meaningOf(word) !== null && meaningOf(word) !== 'filler') ||
    timesWord(word) !== null ||
    numberWord(word) !== null
  );
}

/** Steps over a comment; tells of it where it looks like an instruction, with a number and a stitch. */
export function skipComment(state: ParseState, end: number): { begin: number; end: number } {
  const first = state.at;
  let looks = false;
  while (state.at < end) {
    if (state.peek().kind === 'number' && state.stitchHere(1) !== null) looks = true;
    state.at += 1;
  }
  const span = state.spanFrom(first);
  if (looks) {
    state.report.say('note', 'comment', span, 'This sentence is read as a remark and not worked.');
  }
  return span;
}
