import { describe, expect, it } from 'vitest';
import { PATTERN_LIMITS, tokenize } from '../../../src/lib';

const brief = (text: string) =>
  tokenize(text)
    .slice(0, -1)
    .map(({ kind, text: word }) => `${kind} ${word}`);

describe('tokenize', () => {
  it('gives words, numbers and marks with their places', () => {
    expect(tokenize('Ch 3,')).toEqual([
      { kind: 'word', text: 'ch', written: 'Ch', value: 0, begin: 0, end: 2, spaceBefore: true },
      { kind: 'number', text: '3', written: '3', value: 3, begin: 3, end: 4, spaceBefore: true },
      { kind: 'mark', text: ',', written: ',', value: 0, begin: 4, end: 5, spaceBefore: false },
      { kind: 'end', text: '', written: '', value: 0, begin: 5, end: 5, spaceBefore: false },
    ]);
  });

  it.each([
    ['3dc', ['number 3', 'word dc']],
    ['ch3', ['word ch', 'number 3']],
    ['sc2tog', ['word sc2tog']],
    ['dc3cl', ['word dc3cl']],
    ['x6', ['word x', 'number 6']],
    ['2nd ch', ['ordinal 2nd', 'word ch']],
    ['1st st', ['ordinal 1st', 'word st']],
    // eleven stitches, and no ordinal that anyone says
    ['11st', ['number 11', 'word st']],
    ['**', ['mark **']],
    ['* *', ['mark *', 'mark *']],
    ['ch-2 sp', ['word ch', 'mark -', 'number 2', 'word sp']],
    ['a\n\nb', ['word a', 'line \n', 'line \n', 'word b']],
    ["doesn't", ["word doesn't"]],
    ['', []],
  ])('splits %j', (text, tokens) => expect(brief(text)).toEqual(tokens));

  it('places tokens in the text as it was written', () => {
    const text = 'Ch\u00a03 \u2013 be\u00adg';
    const spans = tokenize(text).map(({ begin, end }) => text.slice(begin, end));
    expect(spans).toEqual(['Ch', '3', '\u2013', 'be\u00adg', '']);
  });

  it('reads numbers too long to count as the largest there is', () => {
    expect(tokenize('9'.repeat(400))[0]?.value).toBe(Number.MAX_SAFE_INTEGER);
  });

  it('stops at its limit', () => {
    expect(tokenize('a '.repeat(60_000))).toHaveLength(PATTERN_LIMITS.tokens + 1);
  });
});
