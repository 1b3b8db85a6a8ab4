import { abbreviationOf, ownStitchOf } from '../../stitches/ownStitch';
import { movesInWords } from '../../stitches/movesInWords';
import type { Stitch } from '../../stitches/stitch';
import { stitch } from '../../stitches/stitchTable';
import type { Terms } from '../reading';

/** One line of a pattern's key: "dc: double crochet". */
export interface KeyLine {
  readonly abbreviation: string;
  readonly meaning: string;
}

const STRUCTURE = {
  rnd: ['rnd', 'round'],
  rnds: ['rnds', 'rounds'],
  rep: ['rep', 'repeat'],
  st: ['st', 'stitch'],
  sts: ['sts', 'stitches'],
  sp: ['sp', 'space'],
  sps: ['sps', 'spaces'],
  beg: ['beg', 'beginning'],
  RS: ['RS', 'RS'],
  WS: ['WS', 'WS'],
} as const;

const IN_KEY: Readonly<Record<string, string>> = {
  rnd: 'round',
  rep: 'repeat',
  st: 'stitch',
  sp: 'space',
  beg: 'beginning',
  sk: 'skip',
  RS: 'right side',
  WS: 'wrong side',
};

/** The words of one printing, which remembers the abbreviations it has used. */
export class Vocabulary {
  private readonly used = new Map<string, string>();

  constructor(
    readonly terms: Terms,
    readonly fullWords: boolean,
    private readonly ownNames: ReadonlyMap<string, string>,
  ) {}

  word(word: keyof typeof STRUCTURE): string {
    if (this.fullWords && word !== 'RS' && word !== 'WS') return STRUCTURE[word][1];
    const single = word.replace(/^(rnd|st|sp)s$/, '$1');
    this.used.set(single, IN_KEY[single] ?? single);
    return STRUCTURE[word][0];
  }

  /** "sk" in US terms; UK patterns miss stitches. */
  skip(): string {
    if (this.terms === 'uk') return 'miss';
    if (this.fullWords) return 'skip';
    this.used.set('sk', 'skip');
    return 'sk';
  }

  chain(): string {
    if (this.fullWords) return 'chain';
    this.used.set('ch', 'chain');
    return 'ch';
  }

  /** A stitch by its US code. */
  stitch(code: string): string {
    if (code === 'ch') return this.chain();
    const own = ownStitchOf(code);
    if (own) return this.own(own);
    const compound = /^(\w+?)(\d+)(tog|cl)$/.exec(code) ?? /^(\d+)-(\w+) (pc|puff)$/.exec(code);
    if (compound) return this.compound(code, compound);
    const found = stitch(code);
    if (!found) return code;
    const name = this.terms === 'us' ? found.us : found.uk;
    if (this.fullWords && !code.startsWith('picot')) return name;
    return this.remember(this.terms === 'us' ? found.code : found.ukCode, name);
  }

  /** Nobody knows a stitch of one's own by its name: the key says how it is made, whole words or not. */
  private own(own: Stitch): string {
    const abbreviation = abbreviationOf(own.code);
    const name = this.ownNames.get(own.code) ?? abbreviation;
    const moves = movesInWords(own);
    if (this.fullWords) return this.remember(name, moves);
    return this.remember(abbreviation, name === abbreviation ? moves : `${name} (${moves})`);
  }

  private compound(
    code: string,
    [, first = '', second = '', ending = '']: RegExpExecArray,
  ): string {
    const [base, legs] = ending === 'tog' || ending === 'cl' ? [first, second] : [second, first];
    const found = stitch(base);
    const name = (this.terms === 'us' ? found?.us : found?.uk) ?? base;
    const short = (this.terms === 'us' ? found?.code : found?.ukCode) ?? base;
    const full =
      ending === 'tog'
        ? `${name} ${legs} together`
        : `${legs}-${name} ${{ cl: 'cluster', pc: 'popcorn', puff: 'puff' }[ending] ?? ending}`;
    if (this.fullWords) return full;
    const written =
      ending === 'tog' || ending === 'cl'
        ? `${short}${legs}${ending}`
        : `${legs}-${short} ${ending}`;
    return this.remember(written, full);
  }

  private remember(abbreviation: string, meaning: string): string {
    if (abbreviation !== meaning) this.used.set(abbreviation, meaning);
    return abbreviation;
  }

  /** The abbreviations used so far, in the order of the alphabet. */
  key(): KeyLine[] {
    return [...this.used]
      .map(([abbreviation, meaning]) => ({ abbreviation, meaning }))
      .sort((a, b) => (a.abbreviation.toLowerCase() < b.abbreviation.toLowerCase() ? -1 : 1));
  }
}
