import type { Reading, ReadOptions } from './reading';
import { PATTERN_LIMITS } from './limits';
import { ParseState } from './parse/parseState';
import { parsePattern } from './parse/parsePattern';
import { Report } from './report';
import { lexiconOf } from './terms/lexicon';
import { tokenize } from './tokenize';
import { workPattern } from './work/workPattern';

/**
 * Reads a pattern as it is published and works it as a hand would: every round with its stitches, and
 * everything that is wrong with the text, with its place. Never throws for any text; what is beyond
 * `PATTERN_LIMITS` is told and left out.
 *
 * Example: "Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join." makes { ch: 3, dc: 11, 'sl st': 1 }
 * and counts { dc: 12 }.
 */
export function readPattern(text: string, options: ReadOptions): Reading {
  const report = new Report(text);
  const within = withinLength(text, report);
  const tokens = tokenize(within);
  if (tokens.length > PATTERN_LIMITS.tokens) {
    const last = tokens.at(-2);
    if (last)
      report.say(
        'error',
        'limit',
        last,
        'The text is longer than is read here: the rest is left out.',
      );
  }
  const state = new ParseState(
    tokens,
    lexiconOf(options.terms, options.ownStitches),
    options.size ?? 0,
    report,
  );
  const pattern = parsePattern(state);
  const { ring, rounds, workSteps } = workPattern(pattern, options, report);
  return {
    text,
    terms: options.terms,
    sides: options.sides,
    pattern,
    ring,
    rounds,
    workSteps,
    diagnostics: report.diagnostics(),
  };
}

function withinLength(text: string, report: Report): string {
  const { textLength } = PATTERN_LIMITS;
  if (text.length <= textLength) return text;
  const message = `A pattern may have ${textLength} characters; the rest is not read.`;
  report.say('error', 'limit', { begin: textLength, end: text.length }, message);
  return text.slice(0, textLength);
}
