import { describe, expect, it } from 'vitest';
import { counts, DC12, expectReads, messages, read, SC12, SQUARE } from '../reads';

const ROUND = 'Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join with sl st in top of beg ch-3';
const SIDES = SQUARE.slice(0, SQUARE.indexOf('. (12 dc'));

/** 1 chain that counts + 11 dc. */
describe('the count of a round', () => {
  it.each([
    '. (12 dc)',
    ' (12 dc).',
    '. [12 dc]',
    '. {12 dc}',
    '. <12>',
    '. *12 dc*',
    '. //12 dc//',
    '. -12-',
    '. "12 dc"',
    '. 12 dc.',
    '.\n12 dc.',
    '.\n(12 dc)',
    ' - 12 dc.',
    ' – 12 dc.',
    ' — 12 dc',
    '—12 dc.',
    ' = 12 dc',
    ' = 12 sts',
    '. ~ 12 dc',
    ': 12 dc.',
    '. (= 12 dc)',
    ' (12)',
    '. [12]',
    '. (12 sts)',
    '. (12 stitches)',
    '. (12 double crochet)',
    '. (12 DC)',
    '. (12dcs)',
    '. 12dc',
    ' (12x dc)',
    ' (12 x dc)',
    '. Total: 12 dc.',
    '. (Total 12 dc)',
    '. (total of 12 dc)',
    '. (12 dc total)',
    '. (12 dc in total)',
    '. (12 dc around)',
    '. (12 dc made)',
    '. (12 dc counted)',
    '. (12 dc sts)',
    '. 12 sts made.',
    '. You will have 12 dc.',
    '. You should now have 12 dc.',
    '. You now have 12 dc.',
    '. There will be 12 dc.',
    '. Stitch count: 12',
    '. (Stitch count: 12 dc)',
    '. Sts: 12',
    '. (dc: 12)',
    '. 12 dc, including beg ch-3.',
    '. (12 dc, counting beg ch-3)',
    '. (12 dc - count the ch-3 as a dc)',
    ', turn. (12 dc)',
    '. (12 dc) Turn.',
    '. (12 dc) Fasten off.',
    '. Fasten off. (12 dc)',
  ])('is read from "%s"', (note) => {
    expectReads(ROUND + note, '12 dc');
    const wrong = read(ROUND + note.replace('12', '14'));
    expect(wrong.diagnostics.map(({ code }) => code)).toEqual(['count-note']);
    expect(wrong.diagnostics[0]?.message).toContain('makes 12');
  });

  /** Four groups of 3 dc, the first of which is a chain, and four spaces of 2 chains. */
  it.each([
    '. (12 dc, 4 ch-2 sps)',
    '. (12 dc and 4 ch-2 sps)',
    '. (12 dc + 4 ch-2 spaces)',
    '. (12 dc & 4 ch2 sps)',
    '. (12 dc; 4 2-ch sps)',
    '. (12 dc, four ch-2 spaces)',
    '. (12 double crochet, 4 chain-2 spaces)',
    '. [12 dc + 4x ch-2 sps]',
    '. (12 dc, 4 ch-sps)',
    '. (12 dc, 4 ch-2 corner sps)',
    '. (12 dc; 4 corner sps)',
    '. (12 dc, 4 corners)',
    '. (12 dc and 8 chs)',
    '. (20 sts, including corner chs)',
    '. (3 dc on each side, 4 ch-2 corners)',
    '. (3 dc per side, 4 corners)',
    '. (3 sts on each side)',
    '. (3 dc each side)',
    '. (3 dc along each side)',
    '. (3 dc between corners)',
    '. (3 dc between each corner)',
    '. (3 sts on each side between corners)',
    '. (3 dc in each side and 4 ch-2 corner sps)',
    '. (4 3-dc clusters)',
  ])('is read from "%s", spaces and sides with it', (note) => {
    expectReads(SIDES + note, '12 dc + 4 ch-2', { sides: 4 });
  });

  it.each([
    '. (4 3-dc groups, 4 ch-2 sps)',
    '. (4 groups of 3 dc, 4 ch-2 sps)',
    '. (4 sets of 3 dc)',
    '. (4 sides of 3 dc)',
    '. (4 groups, 4 sps)',
    '. (4 dc groups)',
    '. 4 x 3 dc',
    '. Four 3-dc groups and four corner sps made.',
  ])('has words that count no stitch and are let be: "%s"', (note) =>
    expectReads(SIDES + note, '12 dc + 4 ch-2', { sides: 4 }),
  );

  it.each([
    ['. (12 dc, 5 ch-2 sps)', 'says 5 ch-2 sps, the text makes 4'],
    ['. (12 dc; 4 3-ch sps)', 'says 4 ch-3 sps, the text makes 0'],
    ['. (4 dc on each side, 4 corners)', 'says 4 dc on each side, the text makes 3'],
    ['. (5 sts between corners)', 'says 5 sts on each side, the text makes 3'],
    ['. (12 dc and 9 chs)', 'says 9 ch, the text makes 8'],
    ['. (5 3-dc clusters)', 'says 5 dc3cl, the text makes 4'],
  ])('is told where it is wrong, as in "%s"', (note, says) => {
    const told = messages(read(SIDES + note, { sides: 4 }));
    expect(told).toEqual([expect.stringContaining(says)]);
  });

  it('is no count where more of the round follows', () => {
    // 3 + 9: the bare "3 sc" after the full stop is worked.
    const reading = read(`${SC12}Ch 1, sc in next 3 sc. 3 sc. Sc in next 6 sc; join. (12 sc)`);
    expect(messages(reading)).toEqual([]);
    expect(reading.rounds[1] && counts(reading.rounds[1])).toBe('12 sc');
  });

  it('is no count where a bracket says how many times', () =>
    // 12 dc, [2 sc] 6 times is a repeat and no note
    expectReads(`${DC12}Ch 1, [2 sc] 6 times; join. (12 sc)`, '12 sc'));
});
