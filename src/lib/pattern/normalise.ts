/** Text in plain typography, with the way back to the text it came from. */
export interface PlainText {
  readonly plain: string;
  /** Offset in the person's own text of each character of `plain`, and of its end. */
  readonly offsets: Int32Array;
}

const SPACES =
  '\u00a0\u1680\u2000\u2001\u2002\u2003\u2004\u2005\u2006\u2007\u2008\u2009\u200a\u202f\u205f\u3000\t\v\f';
const INVISIBLE = '\u00ad\u200b\u200c\u200d\u2060\ufeff';
const LINES = '\r\u0085\u2028\u2029';

const SAME: ReadonlyMap<string, string> = new Map([
  ...each(SPACES, ' '),
  ...each(INVISIBLE, ''),
  ...each(LINES, '\n'),
  ...each('\u2010\u2011\u2012\u2013\u2014\u2015\u2212\ufe58\ufe63', '-'),
  ...each('\u2018\u2019\u201a\u201b\u2032\u00b4`', "'"),
  ...each('\u201c\u201d\u201e\u201f\u2033\u00ab\u00bb', '"'),
  ...each('\u2217\u204e\u2731\u2732\u2733\u273b\uff0a\ufe61', '*'),
  ...each('\u00d7\u2715\u2716\u2a2f', 'x'),
  ...each('#\u2022\u25e6\u25aa\u25cf\u00b7', ' '),
  ['\u2051', '**'],
  ['\u2026', '...'],
  ['\ufb00', 'ff'],
  ['\ufb01', 'fi'],
  ['\ufb02', 'fl'],
  ['\ufb03', 'ffi'],
  ['\ufb04', 'ffl'],
  ['\ufb05', 'st'],
  ['\ufb06', 'st'],
]);

/**
 * Undoes what a typesetter or a PDF does to a pattern: curly quotes, dashes, narrow and unbreakable
 * spaces, ligatures, soft hyphens, words broken at a line's end, × for x, full-width characters.
 * Nothing is lost: every character knows where it stood.
 *
 * Example: `normalise('Ch\u00a03 – 2 dc').plain` is `Ch 3 - 2 dc`.
 */
export function normalise(text: string): PlainText {
  const plain: string[] = [];
  const offsets: number[] = [];
  const bold = boldMarks(text);
  for (let i = 0; i < text.length; i += 1) {
    if (bold.has(i)) {
      push(plain, offsets, ' ', i);
      continue;
    }
    if (text[i] === '\r' && text[i + 1] === '\n') continue;
    const broken = brokenWord(text, i);
    if (broken > 0) {
      if (broken > i + 1 && keepsHyphen(text, i, broken)) push(plain, offsets, '-', i);
      i = broken - 1;
      continue;
    }
    push(plain, offsets, plainOf(text, i), i);
  }
  offsets.push(text.length);
  return { plain: plain.join(''), offsets: Int32Array.from(offsets) };
}

function push(plain: string[], offsets: number[], characters: string, at: number): void {
  for (const character of characters) {
    plain.push(character);
    offsets.push(at);
  }
}

function plainOf(text: string, i: number): string {
  const character = text[i] ?? '';
  const code = character.charCodeAt(0);
  if (code >= 0xff01 && code <= 0xff5e && code !== 0xff0a)
    return String.fromCharCode(code - 0xfee0);
  const same = SAME.get(character);
  if (same !== undefined) return same;
  return code < 32 && code !== 10 ? ' ' : character;
}

/** Where the text goes on after a hyphen that ends a line inside a word; 0 where there is none. */
function brokenWord(text: string, i: number): number {
  if (plainOf(text, i) !== '-' || !isLetterOrDigit(text[i - 1])) return 0;
  let next = i + 1;
  while (next < text.length && plainOf(text, next) === ' ') next += 1;
  if (plainOf(text, next) !== '\n') return 0;
  while (next < text.length && ' \n'.includes(plainOf(text, next) || ' ')) next += 1;
  return isLetterOrDigit(text[next]) && isSmall(text[next]) ? next : 0;
}

/** "ch-" before a number keeps its hyphen, and so does a number before a stitch: "3-dc". */
const keepsHyphen = (text: string, hyphen: number, next: number): boolean =>
  isDigit(text[next]) || isDigit(text[hyphen - 1]);

const isDigit = (character = ''): boolean => character >= '0' && character <= '9';
const isLetterOrDigit = (character = ''): boolean =>
  isDigit(character) || character.toLowerCase() !== character.toUpperCase();
const isSmall = (character = ''): boolean => character === character.toLowerCase();

function each(characters: string, same: string): [string, string][] {
  return [...characters].map((character) => [character, same]);
}

const BOLD_HEADER = /^[ \t]*\*\*(?=(?:rnd|round|rd|row)s?\b)/i;

/** "**Rnd 1:** …", as notes are written down: the stars round a header are no repeat marks. */
function boldMarks(text: string): ReadonlySet<number> {
  const marks = new Set<number>();
  let from = 0;
  for (const line of text.split('\n')) {
    const opening = BOLD_HEADER.exec(line)?.[0].length ?? 0;
    const closing = opening > 0 ? line.indexOf('**', opening) : -1;
    if (closing > 0)
      for (const at of [opening - 2, opening - 1, closing, closing + 1]) marks.add(from + at);
    from += line.length + 1;
  }
  return marks;
}
