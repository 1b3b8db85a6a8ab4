import { PATTERN_LIMITS } from './limits';
import { normalise, type PlainText } from './normalise';
import { ordinalWord } from './terms/words';
import type { Token, TokenKind } from './token';

const ORDINAL_ENDS: ReadonlySet<string> = new Set(['st', 'nd', 'rd', 'th']);
/** What may follow a number inside one word: "sc2tog", "dc3cl". */
const AFTER_LEGS: ReadonlySet<string> = new Set(['tog', 'cl', 'pc', 'together']);

/**
 * The words, numbers and marks of a pattern, each with its place in the person's own text, ended by
 * one token of kind "end". Reads at most `PATTERN_LIMITS.tokens`. Never throws.
 *
 * Example: `tokenize('Ch 3,')` is the word "ch", the number 3, the mark "," and the end.
 */
export function tokenize(text: string): Token[] {
  const scanner = new Scanner(normalise(text));
  while (scanner.scan() && scanner.tokens.length < PATTERN_LIMITS.tokens);
  scanner.end();
  return scanner.tokens;
}

class Scanner {
  readonly tokens: Token[] = [];
  private at = 0;
  private spaceBefore = true;

  constructor(private readonly source: PlainText) {}

  /** Reads one token; false at the end of the text. */
  scan(): boolean {
    const { plain } = this.source;
    while (plain[this.at] === ' ') {
      this.at += 1;
      this.spaceBefore = true;
    }
    if (this.at >= plain.length) return false;
    const character = plain[this.at] as string;
    if (character === '\n') this.push('line', this.at + 1);
    else if (isDigit(character)) this.scanNumber();
    else if (isLetter(character)) this.scanWord();
    else this.push('mark', this.at + (plain.startsWith('**', this.at) ? 2 : 1));
    return true;
  }

  end(): void {
    this.at = this.source.plain.length;
    this.push('end', this.at);
  }

  private scanNumber(): void {
    const digitsEnd = this.run(this.at, isDigit);
    const lettersEnd = this.run(digitsEnd, isLetter);
    const ending = this.source.plain.slice(digitsEnd, lettersEnd).toLowerCase();
    const isOrdinal = ORDINAL_ENDS.has(ending) && !isDigit(this.source.plain[lettersEnd]);
    // "1st" is an ordinal and "3st" three stitches.
    const value = Number(this.source.plain.slice(this.at, digitsEnd));
    const spoken = ending === 'st' ? value % 10 === 1 && value % 100 !== 11 : true;
    if (isOrdinal && spoken) this.push('ordinal', lettersEnd, value);
    else this.push('number', digitsEnd, value);
  }

  private scanWord(): void {
    const { plain } = this.source;
    const lettersEnd = this.run(this.at, (character) => isLetter(character) || character === "'");
    const digitsEnd = this.run(lettersEnd, isDigit);
    if (digitsEnd > lettersEnd && plain.slice(this.at, lettersEnd).toLowerCase() !== 'x') {
      const tailEnd = this.run(digitsEnd, isLetter);
      if (AFTER_LEGS.has(plain.slice(digitsEnd, tailEnd).toLowerCase())) {
        this.push('word', tailEnd);
        return;
      }
    }
    const ordinal = ordinalWord(plain.slice(this.at, lettersEnd).toLowerCase());
    if (ordinal === null) this.push('word', lettersEnd);
    else this.push('ordinal', lettersEnd, ordinal);
  }

  private run(from: number, belongs: (character: string) => boolean): number {
    let end = from;
    while (end < this.source.plain.length && belongs(this.source.plain[end] as string)) end += 1;
    return end;
  }

  private push(kind: TokenKind, end: number, value = 0): void {
    const { plain, offsets } = this.source;
    const written = plain.slice(this.at, end);
    const begin = offsets[this.at] ?? 0;
    this.tokens.push({
      kind,
      text: kind === 'word' || kind === 'ordinal' ? written.toLowerCase() : written,
      written,
      value: Number.isSafeInteger(value) ? value : Number.MAX_SAFE_INTEGER,
      begin,
      end: end > this.at ? (offsets[end - 1] ?? begin) + 1 : begin,
      spaceBefore: this.spaceBefore,
    });
    this.at = end;
    this.spaceBefore = false;
  }
}

const isDigit = (character = ''): boolean => character >= '0' && character <= '9';
const isLetter = (character: string): boolean =>
  character.toLowerCase() !== character.toUpperCase();
