import { describe, expect, it } from 'vitest';
import { isTakenWord } from '../../../../src/lib/pattern';
import {
  COMPOUND_WORDS,
  INSERTION_WORDS,
  STITCH_WORDS,
} from '../../../../src/lib/pattern/terms/stitchWords';
import { STRUCTURE_WORDS } from '../../../../src/lib/pattern/terms/words';

const single = (word: string) => /^[a-z]+$/.test(word);

describe('isTakenWord', () => {
  it('knows every word that stands for something in patterns, in US and UK terms', () => {
    const words = [
      ...STITCH_WORDS.us.keys(),
      ...STITCH_WORDS.uk.keys(),
      ...COMPOUND_WORDS.keys(),
      ...INSERTION_WORDS.keys(),
      ...STRUCTURE_WORDS,
    ].filter(single);
    expect(words.filter((word) => !isTakenWord(word))).toEqual([]);
    expect(words.length).toBeGreaterThan(150);
  });

  it.each(
    'dc htr fpdc blosc flohdc rnd sk miss st sp ch picot cl pc inc magic tch yo rs two twice'.split(
      ' ',
    ),
  )('says that %s is taken', (word) => expect(isTakenWord(word)).toBe(true));

  it('takes capitals and blanks round it for the same word', () => {
    expect(isTakenWord(' DC ')).toBe(true);
    expect(isTakenWord('Fasten')).toBe(true);
  });

  it('does not let the plural of a new word be an old one', () => {
    // "thi" would read "this" as several of it.
    expect(isTakenWord('thi')).toBe(true);
    expect(isTakenWord('picots')).toBe(true);
  });

  it.each('lst xst bul knot bead vst spike cross shst lsts constructor hasownproper'.split(' '))(
    'leaves %s free',
    (word) => expect(isTakenWord(word)).toBe(false),
  );
});
