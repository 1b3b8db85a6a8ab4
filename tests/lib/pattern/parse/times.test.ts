import { describe, expect, it } from 'vitest';
import { expectReads, messages, read, SC12 } from '../reads';

const again = 'Ch 1, sc in each st around; join.';

describe('how many times', () => {
  /** [sc in next st, 2 sc in next st] takes 2 of 12 and makes 3: six times make 18. */
  it.each([
    '6 times',
    'six times',
    'x 6',
    'x6',
    '6x',
    'for 6 times',
    'a total of 6 times',
    '6 times more',
    'around',
  ])('is read from "[…] %s"', (times) =>
    expectReads(`${SC12}Ch 1, [sc in next st, 2 sc in next st] ${times}; join. (18 sc)`, '18 sc'),
  );

  it('is 2 for twice, and 1 for once', () =>
    // 2 × (3 + 2) + 1 × 2 = 12 of 12
    expectReads(
      `${SC12}Ch 1, [sc in next 5 sts] twice, [sc in next 2 sts] once; join. (12 sc)`,
      '12 sc',
    ));

  /** What is worked again has been worked once: 1 + 2 rounds. */
  it.each([
    'Rep Rnd 2 two more times.',
    'Rep Rnd 2 twice more.',
    'Repeat Round 2 2 times.',
    'Rep last rnd 2 more times.',
    'Rep the previous rnd twice.',
    'Rep preceding rnd twice.',
  ])('is how many rounds "%s" adds', (line) =>
    expectReads(`${SC12}${again}\n${line}`, ['12 sc', '12 sc', '12 sc', '12 sc']),
  );

  it('is told where a repeat does not fit so often', () => {
    const reading = read(`${SC12}Ch 1, [sc in next 5 sts] 3 times; join.`);
    expect(messages(reading).join()).toContain('no-such-place');
  });
});
