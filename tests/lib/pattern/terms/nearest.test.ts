import { describe, expect, it } from 'vitest';
import { nearest } from '../../../../src/lib/pattern/terms/nearest';

const KNOWN = ['sc', 'dc', 'hdc', 'next', 'around', 'repeat'];

describe('nearest', () => {
  it.each([
    ['dcc', 'dc'],
    ['nxet', 'next'],
    ['nex', 'next'],
    ['nekt', 'next'],
    ['hdcc', 'hdc'],
    ['arround', 'around'],
    ['arruond', 'around'], // two slips in a long word
    ['repeta', 'repeat'],
    ['dc', 'dc'],
  ])('takes %s for %s', (word, known) => expect(nearest(word, KNOWN)).toBe(known));

  it.each(['xyz', 'n', '', 'exterior', 'nxxt1'])('finds nothing near "%s"', (word) =>
    expect(nearest(word, KNOWN)).toBeNull(),
  );
});
