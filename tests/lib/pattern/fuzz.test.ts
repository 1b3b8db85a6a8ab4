import { describe, expect, it } from 'vitest';
import { PATTERN_LIMITS, printPattern, readPattern, type MotifSides } from '../../../src/lib';
import { corpus } from '../../support/patternCorpus';
import { pick, seeded, type Random } from '../../support/random';

const TEXTS = 100_000;
/** Long enough for two rounds, short enough for a hundred thousand. */
const LENGTH = 180;
/** Every stitch makes at most one step more than it is looked at, so the last step may overrun a little. */
const MOST_STEPS = PATTERN_LIMITS.workSteps + PATTERN_LIMITS.amount;

const SIDES: readonly MotifSides[] = [0, 3, 4, 6, 8];
const PIECES =
  '*|**|(|)|[|]|; rep from * |around|to corner|99999999|2000 |ch |\n|Rnd 2: |Rnds 1-9: |. |, |; |join|turn|in ring|in next st|sk |\u00a0|\ud83e|each |same |first |last |x 9 times |Rep Rnd 1|-|=|(counts as dc)|picot|cl|tog|\u0000|ending last rep at **|magic ring|with B|3 |sc'.split(
    '|',
  );

const bases = [...corpus('right'), ...corpus('wrong')].map(({ text }) => text.slice(0, LENGTH));

/** One to four changes: something left out, put in, doubled, mistyped or taken from another text. */
function mutated(random: Random): string {
  let text = pick(random, bases);
  const below = (most: number): number => Math.floor(random() * most);
  for (let changes = 1 + below(4); changes > 0; changes -= 1) {
    const begin = below(text.length + 1);
    const end = Math.min(text.length, begin + below(12));
    const before = text.slice(0, begin);
    const change = below(5);
    if (change === 0) text = before + text.slice(end);
    else if (change === 1) text = before + pick(random, PIECES) + text.slice(begin);
    else if (change === 2) text = before + text.slice(begin, end) + text.slice(begin);
    else if (change === 3)
      text = before + String.fromCharCode(32 + below(95)) + text.slice(begin + 1);
    else text = before + pick(random, bases).slice(0, 40) + text.slice(end);
  }
  return text;
}

describe('readPattern', () => {
  it(
    'never throws, and does a bounded amount of work, for a hundred thousand mutated texts',
    () => {
      const random = seeded(7);
      const trouble: string[] = [];
      for (let i = 0; i < TEXTS; i += 1) {
        const text = mutated(random);
        try {
          const terms = i % 7 === 0 ? 'uk' : 'us';
          const reading = readPattern(text, {
            terms,
            sides: SIDES[i % SIDES.length] as MotifSides,
          });
          const wrongPlace = reading.diagnostics.some(
            ({ begin, end }) => begin < 0 || begin > end || end > text.length,
          );
          if (wrongPlace || reading.workSteps > MOST_STEPS) trouble.push(text);
          if (i % 20 === 0) printPattern(reading.pattern, { terms });
        } catch (error) {
          trouble.push(`${String(error)}: ${text}`);
        }
      }
      expect(trouble.slice(0, 3)).toEqual([]);
    },
    // A limit against hanging only.
    300_000,
  );
});
