import type { Fix } from '../diagnostic';
import { PATTERN_LIMITS } from '../limits';
import type { Report } from '../report';
import type { Span } from '../span';
import type { Amount, ChainRule, CountNote } from '../syntax';
import type { Lexicon } from '../terms/lexicon';
import { readStitch, type StitchTerm } from '../terms/readStitch';
import { meaningOf } from '../terms/words';
import type { Token } from '../token';

/** Where the parser stands in the tokens, and what it knows of the text round it. */
export class ParseState {
  at = 0;
  /** Brackets and stars that are open here. */
  depth = 0;
  openStars = 0;
  /** How many steps of the open star stand before its "**"; null before it is read. */
  endMark: number | null = null;
  /** The sentence that was looked at last. */
  sentence = { from: 0, end: -1 };
  /** Stitches looked up already, by the token they begin at. */
  private readonly stitches: (StitchTerm | null)[] = [];
  /** Words looked up already, with the known word nearest to each. */
  readonly nearest = new Map<string, string | null>();
  /** Remarks that were stepped over. */
  comments: Span[] = [];
  /** Chains that the whole pattern counts alike. */
  chainRules: ChainRule[] = [];
  /** The count note of the line that is being read. */
  note: CountNote | null = null;
  /** Letters of "work in back loops only", for every stitch of the round. */
  insertion = '';
  /** The same for the stitch that is being read: "dc in BLO of next st". */
  insertionHere = '';
  /** How many rounds the line that is being read stands for. */
  roundsOfLine = 1;

  constructor(
    readonly tokens: Token[],
    readonly lexicon: Lexicon,
    readonly size: number,
    readonly report: Report,
  ) {}

  /** The token `ahead` of here; the end token where there is none. */
  peek(ahead = 0): Token {
    return this.tokens[Math.min(this.at + ahead, this.tokens.length - 1)] as Token;
  }

  /** The last token that was read. */
  last(): Token {
    return this.tokens[Math.max(0, this.at - 1)] as Token;
  }

  isMark(text: string, ahead = 0): boolean {
    const token = this.peek(ahead);
    return token.kind === 'mark' && token.text === text;
  }

  isWord(text: string, ahead = 0): boolean {
    const token = this.peek(ahead);
    return token.kind === 'word' && token.text === text;
  }

  /** Whether a word of this meaning stands here. */
  means(meaning: string, ahead = 0): boolean {
    const token = this.peek(ahead);
    return (token.kind === 'word' || token.kind === 'ordinal') && meaningOf(token.text) === meaning;
  }

  /** What the word that stands here stands for, or null. */
  meaningHere(): string | null {
    const { kind, text } = this.peek();
    return kind === 'word' || kind === 'ordinal' ? meaningOf(text) : null;
  }

  /** Steps over a word of this meaning, if it stands here. */
  take(meaning: string): boolean {
    const found = this.means(meaning);
    if (found) this.at += 1;
    return found;
  }

  takeMark(text: string): boolean {
    const found = this.isMark(text);
    if (found) this.at += 1;
    return found;
  }

  /** Steps over words that change nothing. */
  skipFillers(): void {
    while (this.means('filler')) this.at += 1;
  }

  /** Steps over ends of lines, which may stand anywhere inside an instruction. */
  skipLines(): void {
    while (this.peek().kind === 'line') this.at += 1;
  }

  stitchHere(ahead = 0): StitchTerm | null {
    const at = this.at + ahead;
    const known = this.stitches[at];
    if (known !== undefined) return known;
    const found = readStitch(this.tokens, at, this.lexicon);
    this.stitches[at] = found;
    return found;
  }

  /** Reads this token as another from now on. */
  replace(at: number, token: Token): void {
    this.tokens[at] = token;
    this.stitches.length = 0;
  }

  /** The stretch from a token to the last one that was read. */
  spanFrom(first: number): Span {
    const begin = this.tokens[first]?.begin ?? 0;
    return { begin, end: Math.max(begin, this.last().end) };
  }

  error(code: Parameters<Report['say']>[1], span: Span, message: string, fix?: Fix): void {
    this.report.say('error', code, span, message, fix);
  }

  /** A number that the text may write, or the largest, which is told. */
  checked(value: number, span: Span): number {
    if (value <= PATTERN_LIMITS.amount) return value;
    const message = `${value} is more than this reader works: at most ${PATTERN_LIMITS.amount}.`;
    this.error('limit', span, message);
    return PATTERN_LIMITS.amount;
  }
}

export const amountOf = (value: number): Amount => ({ value, sizes: null });
