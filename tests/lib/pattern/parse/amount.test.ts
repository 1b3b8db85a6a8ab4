import { describe, expect, it } from 'vitest';
import { counts, expectReads, read } from '../reads';

/** n + 1 chains hold n sc, worked from the second on. */
describe('the figures of several sizes', () => {
  it.each([
    ['Ch 11 (13, 15)', '10 (12, 14) sc'],
    ['Ch 11 (13, 15)', '(10 (12, 14) sc)'],
    ['Ch 11 (13, 15)', '(10, 12, 14 sc)'],
    ['Ch 11 (13, 15)', '10 (12: 14) sc'],
    ['Ch 11 [13, 15]', '10 [12, 14] sc'],
    ['Ch 11 (13-15)', '10 (12-14) sc'],
    ['Ch 11 (13; 15)', '10 (12; 14) sc'],
    ['Ch 11/13/15', '10/12/14 sc'],
  ])('are read from "%s" and "%s"', (chains, note) => {
    const text = `${chains}.\nRow 1: Sc in 2nd ch from hook and in each ch across, turn. ${note}.`;
    expectReads(text, '10 sc', { size: 0 });
    expectReads(text, '12 sc', { size: 1 });
    expectReads(text, '14 sc', { size: 2 });
  });

  it('may be those of times', () =>
    // 6 + 6 / 2 = 9 and 8 + 8 / 2 = 12
    expectReads(
      'Rnd 1: 6 (8) sc in magic ring. (6 (8) sc)\nRnd 2: [sc in next st, 2 sc in next st] 3 (4) times. 9 (12) sc',
      ['8 sc', '12 sc'],
      { size: 1 },
    ));

  it('are the last given where there are fewer than the size asked for', () => {
    const reading = read('Rnd 1: 6 (8) sc in magic ring.', { size: 5 });
    expect(reading.rounds.map(counts)).toEqual(['8 sc']);
  });
});
