import type { Terms } from '../reading';
import type { CountEntry, CountNote, PatternText, RoundText } from '../syntax';
import { ownStitchCode, type OwnStitch } from '../../stitches/ownStitch';
import { printAmount } from './printPlace';
import { printStandsFor, printSteps } from './printStep';
import { Vocabulary, type KeyLine } from './vocabulary';

export interface PrintOptions {
  readonly terms: Terms;
  /** Whole words instead of abbreviations: "double crochet". */
  readonly fullWords?: boolean;
  readonly ownStitches?: readonly OwnStitch[];
}

/** A pattern as a clean page: one line for each round, and the abbreviations it uses. */
export interface PrintedPattern {
  readonly lines: readonly string[];
  readonly key: readonly KeyLine[];
}

/**
 * Writes a pattern out again, in US or UK terms, in abbreviations or in words. Reading what was written
 * gives the same pattern; remarks are left out.
 *
 * Example: a round of one step "2 dc in next ch-2 sp" is "Rnd 1: 2 dc in next ch-2 sp." or, in UK
 * terms and words, "Round 1: 2 treble in next chain-2 space."
 */
export function printPattern(pattern: PatternText, options: PrintOptions): PrintedPattern {
  const own = new Map(options.ownStitches?.map((own) => [ownStitchCode(own), own.name]));
  const words = new Vocabulary(options.terms, options.fullWords ?? false, own);
  const lines = [
    ...pattern.chainRules.map(({ chains, standsFor }) => {
      const says = printStandsFor(standsFor, words).slice(2, -1);
      return `${capital(words.chain())} ${chains} at ${words.word('beg')} ${says} throughout.`;
    }),
    ...(pattern.foundation.length > 0 ? [sentence(printSteps(pattern.foundation, words))] : []),
    ...pattern.rounds.map((round) => printRound(round, words)),
  ];
  return { lines, key: words.key() };
}

function printRound(round: RoundText, words: Vocabulary): string {
  const parts = [printHeader(round, words)];
  if (round.again) {
    const { from, to } = round.again;
    const rounds = round.kind === 'row' ? 'row' : words.word(from === to ? 'rnd' : 'rnds');
    parts.push(
      sentence(`${words.word('rep')} ${rounds} ${from}${from === to ? '' : ` and ${to}`}`),
    );
  }
  if (round.steps.length > 0) parts.push(sentence(printSteps(round.steps, words)));
  if (round.note) parts.push(printNote(round.note, words));
  return parts.join(' ');
}

function printHeader({ kind, from, to, side, colour }: RoundText, words: Vocabulary): string {
  const many = to !== from;
  const noun = kind === 'row' ? (many ? 'rows' : 'row') : words.word(many ? 'rnds' : 'rnd');
  const aside = [
    ...(side ? [words.word(side)] : []),
    ...(colour === null ? [] : [`with ${colour}`]),
  ];
  return `${capital(noun)} ${from}${many ? `-${to}` : ''}${aside.length > 0 ? ` (${aside.join(', ')})` : ''}:`;
}

const printNote = ({ entries }: CountNote, words: Vocabulary): string =>
  `(${entries.map((entry) => printEntry(entry, words)).join(', ')})`;

function printEntry({ amount, byRound, of, perSide }: CountEntry, words: Vocabulary): string {
  const noun =
    of.kind === 'all'
      ? words.word('sts')
      : of.kind === 'stitch'
        ? words.stitch(of.code)
        : of.chains === null
          ? `${words.chain()}-${words.word('sps')}`
          : `${words.chain()}-${of.chains} ${words.word('sps')}`;
  const count = byRound ? byRound.join(', ') : printAmount(amount);
  return `${count} ${noun}${perSide ? ' on each side' : ''}`;
}

const sentence = (text: string): string => `${capital(text)}.`;
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
