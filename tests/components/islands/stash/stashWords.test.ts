import { describe, expect, it } from 'vitest';
import { amountWords } from '../../../../src/components/islands/stash/stashWords';

const words = (wholeSkeins: number, ...parts: number[]) =>
  amountWords({ wholeSkeins, partSkeins: parts.map((massG) => ({ massG })) }).replaceAll(
    '\u00a0',
    ' ',
  );

describe('amountWords', () => {
  it.each([
    { said: '3 skeins and 62 g', lot: [3, 62] },
    { said: '1 skein', lot: [1] },
    { said: '41 g, 17.5 g', lot: [0, 41, 17.5] },
    { said: 'nothing', lot: [0] },
  ])('says “$said”', ({ said, lot: [whole = 0, ...parts] }) => {
    expect(words(whole, ...parts)).toBe(said);
  });
});
