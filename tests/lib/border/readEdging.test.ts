import { describe, expect, it } from 'vitest';
import { readEdging } from '../../../src/lib/border/readEdging';
import { READY_EDGINGS, readyEdging } from '../../../src/lib/border/readyEdgings';
import { convertTerms } from '../../../src/lib/pattern';

const us = { terms: 'us' } as const;
const LOOPS =
  'Ch 1, *sc in next st, ch 5, sk 3 sts; rep from * around; join with sl st in first sc.';

describe('readEdging', () => {
  it('gives its worked example', () => {
    const { edging } = readEdging(LOOPS, us);
    // by hand: a sc and five chains over every four stitches; once, a chain to turn and a slip stitch to close
    expect(edging).toMatchObject({
      over: { least: 4, multipleOf: 4 },
      made: { least: { ch: 6, sc: 1, 'sl st': 1 }, perRepeat: { ch: 5, sc: 1 } },
      top: { least: 6, perRepeat: 6 },
      height: { chains: 5, gapStitches: 4 },
    });
  });

  it('takes a header, a remark and a count of one blanket for what they are', () => {
    const plainText = readEdging(LOOPS, us).edging;
    const dressed = readEdging(`Rnd 4: ${LOOPS} (120 sc)`, us).edging;
    expect(dressed).toEqual({ ...plainText, text: `Rnd 4: ${LOOPS} (120 sc)` });
  });

  it('reads UK terms as such', () => {
    const uk = readEdging(convertTerms(LOOPS, 'us', 'uk'), { terms: 'uk' }).edging;
    expect(uk?.made).toEqual(readEdging(LOOPS, us).edging?.made);
  });

  it('finds what a round is a multiple of besides what it needs once', () => {
    // by hand: two stitches at the beginning, then threes
    const text =
      'Ch 1, sc in next 2 sts, *3 dc in next st, sk next st, sc in next st; rep from * around; join with sl st in first sc.';
    expect(readEdging(text, us).edging?.over).toEqual({ least: 5, multipleOf: 3 });
  });

  it('says where a word is not known, in the text as it was typed', () => {
    const text = 'Rnd 1: Ch 1, *sc in next st, frob 3; rep from * around.';
    const { edging, problems } = readEdging(text, us);
    expect(edging).toBeNull();
    const unknown = problems.find(({ message }) => message.includes('is not an abbreviation'));
    expect(text.slice(unknown?.begin, unknown?.end)).toBe('frob');
    expect(text.slice(unknown?.fix?.begin, unknown?.fix?.end)).toBe('frob');
    for (const { begin } of problems) expect(begin).toBeGreaterThanOrEqual(0);
  });

  it('says what is wrong with the whole of it', () => {
    const problemOf = (text: string) => readEdging(text, us).problem;
    expect(problemOf('')).toBe('Write the round first.');
    expect(problemOf('hello')).toBe('It makes no stitch.');
    expect(problemOf(`${LOOPS}\nRnd 2: ${LOOPS}`)).toMatch(/^One round at a time/);
    expect(problemOf('Ch 1, sc in next 7 sts; join with sl st in first sc.')).toMatch(
      /^No repeat was found/,
    );
    expect(problemOf('Ch 1, *frob; rep from * around.')).toMatch(/^It comes out even on no edge/);
  });

  it('never throws', () => {
    for (const text of ['*', '(((', 'rep from *', 'Ch 9999999', '\u0000', 'sc '.repeat(400)]) {
      expect(() => readEdging(text, us)).not.toThrow();
    }
  });
});

describe('READY_EDGINGS', () => {
  it('are all read, and are multiples of what their texts take up', () => {
    const multiples = READY_EDGINGS.map(({ key }) => [key, readyEdging(key)?.over.multipleOf]);
    // by hand, from each text
    expect(Object.fromEntries(multiples)).toEqual({
      shell: 6,
      scallop: 4,
      picot: 3,
      mesh: 2,
      'v-stitch': 3,
      loops: 4,
      crab: 1,
    });
  });

  it('know none of another name', () => {
    expect(readyEdging('tassels')).toBeNull();
  });
});
