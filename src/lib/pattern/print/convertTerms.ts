import { stitch } from '../../stitches/stitchTable';
import type { Terms } from '../reading';
import { INSERTION_WORDS, NAME_BEGINNINGS, STITCH_WORDS } from '../terms/stitchWords';
import type { Token } from '../token';
import { tokenize } from '../tokenize';

interface Replacement {
  readonly begin: number;
  readonly end: number;
  readonly text: string;
}

/** Words other than stitches: "sk" is "miss" in UK terms, "yo" is "yoh". */
const OTHER_WORDS = { us: { miss: 'sk', yoh: 'yo' }, uk: { sk: 'miss', yo: 'yoh' } } as const;

/**
 * A pattern in the other terms: only the names of stitches change, everything else of the text stays
 * as it was written, to the last space. There and back is the same text, for the usual spellings.
 *
 * Example: `convertTerms('2 dc in next sc', 'us', 'uk')` is "2 tr in next dc".
 */
export function convertTerms(text: string, from: Terms, to: Terms): string {
  if (from === to) return text;
  const tokens = tokenize(text);
  const parts: string[] = [];
  let written = 0;
  for (let at = 0; at < tokens.length;) {
    const found = replacementAt(tokens, at, from, to);
    if (found) {
      parts.push(text.slice(written, found.begin), found.text);
      written = found.end;
    }
    at = found ? found.next : at + 1;
  }
  return parts.join('') + text.slice(written);
}

function replacementAt(
  tokens: readonly Token[],
  at: number,
  from: Terms,
  to: Terms,
): (Replacement & { next: number }) | null {
  const token = tokens[at];
  if (token?.kind !== 'word') return null;
  const phrase = phraseAt(tokens, at, from);
  if (phrase) {
    const last = tokens[phrase.next - 1] as Token;
    const name = nameOf(phrase.code, phrase.words, to);
    return {
      begin: token.begin,
      end: last.end,
      text: likeWritten(token.written, name),
      next: phrase.next,
    };
  }
  const word = wordIn(token, from, to);
  return word === null ? null : { begin: token.begin, end: token.end, text: word, next: at + 1 };
}

/** A name or abbreviation of several words: "half double crochet", "sl st". */
function phraseAt(tokens: readonly Token[], at: number, from: Terms) {
  if (!NAME_BEGINNINGS.has(tokens[at]?.text ?? '')) return null;
  for (let count = 4; count >= 2; count -= 1) {
    const slice = tokens.slice(at, at + count);
    if (slice.length < count || slice.some(({ kind }) => kind !== 'word')) continue;
    const words = slice.map(({ text }) => text).join(' ');
    const code = STITCH_WORDS[from].get(words);
    if (code) return { code, words, next: at + count };
  }
  return null;
}

function nameOf(code: string, words: string, to: Terms): string {
  const found = stitch(code);
  if (!found) return words;
  if (words.startsWith('slip')) return words;
  if (words.startsWith('sl ')) return to === 'uk' ? 'ss' : 'sl st';
  const name = to === 'us' ? found.us : found.uk;
  return /[^s]s$/.test(words) ? `${name}s` : name;
}

/** One word: an abbreviation with what is written in one with it, or a name such as "treble". */
function wordIn({ text, written }: Token, from: Terms, to: Terms): string | null {
  const other = (OTHER_WORDS[to] as Readonly<Record<string, string>>)[text];
  if (other !== undefined && Object.hasOwn(OTHER_WORDS[to], text))
    return likeWritten(written, other);
  if (text === 'ss') return to === 'us' ? likeWritten(written, 'sl st') : null;
  const [, base = '', tail = ''] = /^([a-z]+?)(\d+[a-z]+)?$/.exec(text) ?? [];
  const plain = convertedBase(base, from, to);
  if (plain !== null)
    return (
      likeWritten(written.slice(0, base.length), plain) +
      written.slice(written.length - tail.length)
    );
  for (const letters of [3, 2]) {
    const inner = INSERTION_WORDS.has(base.slice(0, letters))
      ? convertedBase(base.slice(letters), from, to)
      : null;
    if (inner === null) continue;
    const stem = written.slice(letters, base.length);
    return written.slice(0, letters) + likeWritten(stem, inner) + written.slice(base.length);
  }
  return null;
}

function convertedBase(base: string, from: Terms, to: Terms): string | null {
  const code = STITCH_WORDS[from].get(base);
  const found = code === undefined || code === 'ch' || code === 'sl st' ? null : stitch(code);
  if (!found) return null;
  const isName = base.startsWith('treble');
  const plural = base.endsWith('s') ? 's' : '';
  return (
    (isName ? (to === 'us' ? found.us : found.uk) : to === 'us' ? found.code : found.ukCode) +
    plural
  );
}

/** In capitals, with a capital, or in small letters, as the word it stands for. */
function likeWritten(written: string, text: string): string {
  const letters = written.replace(/[^\p{L}]/gu, '');
  if (letters.length > 1 && letters === letters.toUpperCase()) return text.toUpperCase();
  const first = written.charAt(0);
  return first !== first.toLowerCase() ? text.charAt(0).toUpperCase() + text.slice(1) : text;
}
