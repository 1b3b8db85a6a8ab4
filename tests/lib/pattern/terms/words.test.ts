import { describe, expect, it } from 'vitest';
import {
  meaningOf,
  numberWord,
  ordinalWord,
  timesWord,
} from '../../../../src/lib/pattern/terms/words';

describe('the words of a pattern', () => {
  it('have one meaning, however they are spelt', () => {
    const spelt = ['foll', 'following', 'nxt', 'subsequent', 'next'];
    expect(spelt.map(meaningOf)).toEqual(spelt.map(() => 'next'));
    expect(['till', 'until', 'to'].map(meaningOf)).toEqual(['to', 'to', 'to']);
    expect(meaningOf('evenly')).toBe('filler');
    expect(meaningOf('dc')).toBeNull();
  });

  it('count up to twelve, in numbers and in order', () => {
    expect(['one', 'four', 'twelve', 'thirteen', 'dc'].map(numberWord)).toEqual([
      ...[1, 4, 12, null, null],
    ]);
    // "first" is a word of its own: it is a place as often as a number
    expect(['second', 'third', 'twelfth', 'first'].map(ordinalWord)).toEqual([2, 3, 12, null]);
    expect(['once', 'twice', 'thrice', 'constructor'].map(timesWord)).toEqual([1, 2, 3, null]);
  });
});
