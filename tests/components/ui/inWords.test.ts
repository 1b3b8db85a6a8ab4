import { describe, expect, it } from 'vitest';
import { capitalised, countInWords, percentInWords } from '../../../src/components/ui/inWords';

describe('countInWords', () => {
  it('writes counts up to twelve as words and the rest in figures', () => {
    expect([0, 1, 7, 12, 13].map(countInWords)).toEqual(['no', 'one', 'seven', 'twelve', '13']);
  });
});

describe('percentInWords', () => {
  it.each([
    [0.41, '41 %'],
    [0.414, '41 %'],
    [0.0012, '0.1 %'],
    [0.05, '5 %'],
    [0.0512, '5.1 %'],
    [0.0999, '10 %'],
    [0.955, '95.5 %'],
    [0.00004, 'less than 0.1 %'],
    [0, 'less than 0.1 %'],
    [0.99999, 'more than 99.9 %'],
  ])('says %d as %s', (probability, words) => {
    expect(percentInWords(probability).replaceAll('\u00a0', ' ')).toBe(words);
  });
});

describe('capitalised', () => {
  it('begins a sentence', () => {
    expect(capitalised('seven skeins')).toBe('Seven skeins');
    expect(capitalised('14 skeins')).toBe('14 skeins');
  });
});
