import { describe, expect, it } from 'vitest';
import { isTakenWord, readPattern } from '../../../../src/lib/pattern';

/**
 * Published: the Craft Yarn Council's master list of crochet abbreviations
 * (craftyarncouncil.com/standards/crochet-abbreviations), each with what the reader makes of it; a
 * cluster, bobble, popcorn, puff or shell without a number is of as many legs as common practice has.
 */
const STITCHES: Readonly<Record<string, string>> = {
  BPdc: 'BPdc',
  BPdtr: 'BPdtr',
  BPhdc: 'BPhdc',
  BPsc: 'BPsc',
  BPtr: 'BPtr',
  FPdc: 'FPdc',
  FPdtr: 'FPdtr',
  FPhdc: 'FPhdc',
  FPsc: 'FPsc',
  FPtr: 'FPtr',
  bo: 'dc5cl',
  CL: 'dc3cl',
  dc: 'dc',
  dc2tog: 'dc2tog',
  dtr: 'dtr',
  edc: 'edc',
  ehdc: 'ehdc',
  esc: 'esc',
  etr: 'etr',
  hdc: 'hdc',
  hdc2tog: 'hdc2tog',
  pc: '5-dc pc',
  ps: '3-hdc puff',
  puff: '3-hdc puff',
  sc: 'sc',
  sc2tog: 'sc2tog',
  sh: 'dc',
  'sl st': 'sl st',
  tr: 'tr',
  tr2tog: 'tr2tog',
  trtr: 'trtr',
};
/** The rest of that list: words of structure, of where the hook goes, and what is told to the maker. */
const WORDS =
  'alt approx beg bet BL BLO BP CC ch cont dec FL FLO foll FP inc lp m MC pat patt pm prev rem rep ' +
  'rnd RS sk sm sp st tbl tch tog WS yo yoh';

const ROUND_1 = 'Rnd 1: Ch 1, 12 sc in magic ring; join with sl st in first sc. (12 sc)\n';
const secondRound = (text: string) =>
  readPattern(`${ROUND_1}Rnd 2: Ch 1, ${text}`, { terms: 'us', sides: 0 });

describe('the published master list of abbreviations', () => {
  it.each(Object.entries(STITCHES))('%s is the stitch %s', (written, code) => {
    const { rounds } = secondRound(`${written} in next st.`);
    expect(Object.keys(rounds[1]?.made ?? {})).toContain(code);
  });

  it.each(WORDS.split(' '))('%s is a word of patterns', (word) => {
    expect(isTakenWord(word)).toBe(true);
  });

  it.each(['pm in first st', 'sm', 'cont in pat', 'm'])(
    '“%s” makes no stitch and no error',
    (told) => {
      const { rounds, diagnostics } = secondRound(`sc in each st around, ${told}; join.`);
      expect(rounds[1]?.made).toEqual({ ch: 1, sc: 12, 'sl st': 1 });
      expect(diagnostics.filter(({ severity }) => severity !== 'note')).toEqual([]);
    },
  );

  it.each(['sc tbl in each st around', 'sc in each st around tbl', 'sc in each st around in BLO'])(
    '“%s” goes through the back loop',
    (text) => {
      expect(secondRound(`${text}; join.`).rounds[1]?.made).toEqual({
        ch: 1,
        BLsc: 12,
        'sl st': 1,
      });
    },
  );

  it('knows the chain space with its number: "ch-3 sp"', () => {
    const text = `${ROUND_1}Rnd 2: Ch 1, [sc in next st, ch 3, sk next 2 sts] 4 times; join.\nRnd 3: Sl st in ch-3 sp, ch 1, 5 sc in same sp, 5 sc in each ch-3 sp around; join.`;
    const { rounds, diagnostics } = readPattern(text, { terms: 'us', sides: 4 });
    expect(rounds[1]?.spaces).toEqual({ 'ch-3': 4 });
    expect(rounds[2]?.tally).toEqual({ sc: 20 });
    expect(diagnostics.filter(({ severity }) => severity === 'error')).toEqual([]);
  });
});
