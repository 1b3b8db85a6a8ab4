import { describe, expect, it } from 'vitest';
import { skeinWord, sureWord } from '../../../src/components/planner/Answer';
import { codeWord } from '../../../src/components/planner/stitchWord';
import {
  CAUSE_WORDS,
  colourUse,
  lineFormula,
  measurementWords,
  PART_WORDS,
  percent,
  SOURCE_WORDS,
} from '../../../src/components/planner/words';
import {
  BASIC_STITCHES,
  CAUSES,
  estimate,
  EXAMPLE_PLAN,
  PARTS,
  type LedgerLine,
  type NextMeasurement,
} from '../../../src/lib';

const use = (key: string, change = {}) => colourUse({ ...EXAMPLE_PLAN, ...change }, key);

describe('colourUse', () => {
  it('names the rounds of every colourway once, in order, then joins and border', () => {
    expect(use('c1')).toBe('joins; border');
    expect(use('c2')).toBe('rounds 1, 4; border');
    expect(use('c3')).toBe('rounds 2, 3');
  });

  it('says one round, and says when there is nothing', () => {
    const [first] = EXAMPLE_PLAN.colourways;
    expect(use('c4', { colourways: [first] })).toBe('round 3');
    expect(use('c5', { colourways: [first] })).toBe('not used');
  });

  it('counts no join yarn where motifs are joined in their last round', () => {
    expect(use('c1', { join: { key: 'last-round', colour: 'c1' } })).toBe('border');
  });
});

describe('measurementWords', () => {
  const words = (part: Partial<NextMeasurement>) =>
    measurementWords({ motifs: 0, resolutionG: 1, ...part } as NextMeasurement);

  it('is an instruction', () => {
    expect(words({ kind: 'weigh the swatch', resolutionG: 0.1 })).toBe(
      'Weigh the swatch on a scale to 0.1 g',
    );
    expect(words({ kind: 'unravel the swatch' })).toBe('Unravel the swatch and measure its yarn');
    expect(words({ kind: 'weigh motifs together', motifs: 1 })).toBe('Weigh one motif');
    expect(words({ kind: 'weigh motifs together', motifs: 8 })).toBe('Weigh 8 motifs together');
    expect(words({ kind: 'read a finer scale', resolutionG: 0.1 })).toBe(
      'Weigh the same pieces on a scale to 0.1 g',
    );
  });
});

describe('lineFormula', () => {
  const line = (part: Partial<LedgerLine>) =>
    lineFormula(
      { part: 'rounds', stitch: null, count: 0, loopsEach: 0, eachMm: 0, ...part } as LedgerLine,
      'tr',
    );

  it('says stitches, loops and mm, in the terms it is given', () => {
    expect(line({ stitch: 'dc', count: 14_400, loopsEach: 5, eachMm: 40.12 })).toBe(
      '14,400 tr × 5 loops × 40.1 mm',
    );
    expect(line({ stitch: 'ch', count: 320, loopsEach: 1, eachMm: 40 })).toBe(
      '320 tr × 1 loop × 40 mm',
    );
  });

  it('says what is not made of loops', () => {
    expect(line({ part: 'tails', count: 240, eachMm: 150 })).toBe('240 tails × 150 mm');
    expect(line({ part: 'allowance' })).toBe('what being this sure takes');
    expect(line({ part: 'join', count: 16.64, eachMm: 3210 })).toBe('16.6 m of seam × 3.21');
  });

  it('has words for every line of the example', () => {
    for (const each of estimate(EXAMPLE_PLAN).ledger) {
      expect(lineFormula(each, 'x')).not.toMatch(/NaN|undefined/);
      expect(SOURCE_WORDS[each.source]).toBeTruthy();
    }
  });
});

describe('words', () => {
  it('there are for every part and every cause', () => {
    expect(Object.keys(PART_WORDS)).toEqual([...PARTS]);
    expect(Object.keys(CAUSE_WORDS)).toEqual([...CAUSES]);
  });

  it('count skeins and say a share to a tenth of a percent', () => {
    expect([skeinWord(0), skeinWord(1), skeinWord(12)]).toEqual([
      '0 skeins',
      '1 skein',
      '12 skeins',
    ]);
    expect([sureWord(0.95), percent(0.0534)]).toEqual(['95\u00a0%', '5.3\u00a0%']);
  });

  // Published: the craft yarn standards body's table of US and UK terms.
  it('call a stitch as US and UK terms do', () => {
    expect(['sc', 'hdc', 'dc', 'tr'].map((code) => codeWord(code, 'uk'))).toEqual([
      'dc',
      'htr',
      'tr',
      'dtr',
    ]);
    for (const { code } of BASIC_STITCHES) expect(codeWord(code, 'us')).toBe(code);
    expect(codeWord('no such stitch', 'uk')).toBe('no such stitch');
  });
});
