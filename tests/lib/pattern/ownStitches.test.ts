import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN } from '../../../src/lib';
import {
  convertTerms,
  motifOf,
  printPattern,
  readPattern,
  type OwnStitch,
  type Reading,
} from '../../../src/lib/pattern';
import { layoutChart } from '../../../src/lib/chart/layoutChart';
import { gaugeOf } from '../../../src/lib/gauge/gauge';
import { withMotif } from '../../../src/lib/plan/edits';
import { planSchema } from '../../../src/schemas/plan';
import { LONG_STITCH } from '../../support/longStitch';

const lst = LONG_STITCH;
/** Gathers two stitches. */
const xst: OwnStitch = {
  ...lst,
  abbreviation: 'xst',
  name: 'crossed stitch',
  moves: { wraps: 2, draws: 2, throughs: 4 },
  takes: 2,
};
/** Stands on the stitch before it. */
const knot: OwnStitch = {
  ...lst,
  abbreviation: 'knot',
  name: 'knot',
  moves: { wraps: 0, draws: 1, throughs: 4 },
  takes: 0,
};
const ownStitches = [lst, xst, knot];
const LST = 'lst{1,1,3}';
const XST = 'xst{2,2,4}';
const KNOT = 'knot{0,1,4}';

const BEGIN = 'Rnd 1: Ch 1, 12 sc in magic ring, join with sl st in first sc. (12 sc)\n';
const read = (second: string, sides: 0 | 4 = 0): Reading =>
  readPattern(BEGIN + second, { terms: 'us', sides, ownStitches });
const saysOf = ({ diagnostics }: Reading) => diagnostics.map(({ message }) => message);

/** A second round on twelve sc: its text, what is made beside chains and slip stitches, what it counts. */
const ROUNDS: readonly (readonly [string, object, object])[] = [
  // The chain that counts, and eleven more.
  [
    'Rnd 2: Ch 4 (counts as lst), lst in next sc and in each sc around, join with sl st in top of beg ch-4. (12 lst)',
    { [LST]: 11 },
    { [LST]: 12 },
  ],
  // 12 × 2.
  [
    'Rnd 2: Ch 1, 2 lst in each st around, join with sl st in first lst. (24 lst)',
    { [LST]: 24 },
    { [LST]: 24 },
  ],
  [
    'Rnd 2: Ch 1, 2 Lst in each st around, join with sl st in first LST. (24 LSTS)',
    { [LST]: 24 },
    { [LST]: 24 },
  ],
  ['Rnd 2: Ch 4 (counts as lst), 11 lsts, join. (12 lsts)', { [LST]: 11 }, { [LST]: 12 }],
  // Two stitches each: 12 / 2.
  ['Rnd 2: Ch 1, xst around, join with sl st in first xst. (6 xst)', { [XST]: 6 }, { [XST]: 6 }],
  [
    'Rnd 2: Ch 1, [xst in next 2 sc, lst in next sc] 4 times, join with sl st in first xst. (4 xst, 4 lst)',
    { [XST]: 4, [LST]: 4 },
    { [XST]: 4, [LST]: 4 },
  ],
  // A knot is made and stands on a sc; the round counts the sc.
  [
    'Rnd 2: Ch 1, *sc in next sc, knot; rep from * around, join with sl st in first sc. (12 sc, 12 knots)',
    { sc: 12, [KNOT]: 12 },
    { sc: 12 },
  ],
  [
    'Rnd 2: Ch 1, *(lst, ch 2, lst) in next sc, sk next 2 sc; rep from * around, join with sl st in first lst. (8 lst, 4 ch-2 sps)',
    { [LST]: 8 },
    { [LST]: 8 },
  ],
  [
    'Rnd 2: Standing lst in any sc, lst in next 11 sts, join with sl st in first lst. (12 lst)',
    { [LST]: 12 },
    { [LST]: 12 },
  ],
  [
    'Rnd 2: Join B with lst in any sc, lst in next 11 sts, join with sl st in first lst. (12 lst)',
    { [LST]: 12 },
    { [LST]: 12 },
  ],
];

describe('reading stitches of one’s own', () => {
  it.each(ROUNDS)('reads %s', (text, made, tally) => {
    const reading = read(text);
    expect(saysOf(reading)).toEqual([]);
    const { ch: _, 'sl st': __, ...rest } = reading.rounds[1]?.made ?? {};
    expect(rest).toEqual(made);
    expect(reading.rounds[1]?.tally).toEqual(tally);
  });

  it('works the next round into them', () => {
    const reading = read(
      'Rnd 2: Ch 1, lst in each sc around, join with sl st in first lst.\n' +
        'Rnd 3: Ch 1, *sk next lst, sc in each of next 2 lsts, ch 3; rep from * around, join. (8 sc, 4 ch-3 sps)',
    );
    expect(saysOf(reading)).toEqual([]);
    expect(reading.rounds[2]?.tally).toEqual({ sc: 8 });
  });

  it('measures a round by the tallest, be it of one’s own', () => {
    // lst comes to 2.15, dc has 1.85, and tr has 2.6: heights of the table and the fit.
    const text = (other: string) =>
      `Rnd 2: Ch 1, *lst in next sc, ${other} in next sc; rep from * around, join with sl st in first lst.`;
    expect(read(text('dc')).rounds[1]?.height).toBe(LST);
    expect(read(text('tr')).rounds[1]?.height).toBe('tr');
  });

  it('tells what is wrong by the abbreviation', () => {
    const messages = saysOf(
      read('Rnd 2: Ch 1, lst in each sc around, join with sl st in first lst. (11 lst)'),
    );
    expect(messages).toEqual(['Rnd 2: the note says 11 lst, the text makes 12.']);
    const tall = saysOf(read('Rnd 2: Ch 2 (counts as lst), 11 lst, join. (12 lst)'));
    expect(tall).toEqual([
      'A chain of 2 is too short for the lst it stands for, which is 4 chains tall.',
    ]);
    const none = saysOf(read('Rnd 2: Ch 1, sc in next lst, sc in next 11 sc, join.'));
    expect(none.join()).toContain('lst');
    expect([...messages, ...tall, ...none].join()).not.toContain('{');
  });

  it('lets the chain that stands for one be a chain off, as its height is only guessed', () => {
    expect(saysOf(read('Rnd 2: Ch 3 (counts as lst), 11 lst, join. (12 lst)'))).toEqual([]);
  });

  it('does not know them without being told', () => {
    const reading = readPattern(`${BEGIN}Rnd 2: Ch 1, lst in each sc around, join.`, {
      terms: 'us',
      sides: 0,
    });
    expect(reading.diagnostics.some(({ code }) => code === 'unknown-word')).toBe(true);
  });
});

describe('writing stitches of one’s own', () => {
  const text = BEGIN + (ROUNDS[0]?.[0] ?? '');
  const { pattern } = readPattern(text, { terms: 'us', sides: 0, ownStitches });

  it('leaves them as they are in the other terms', () => {
    const uk = convertTerms(text, 'us', 'uk');
    expect(uk).toContain('Ch 4 (counts as lst), lst in next dc and in each dc around');
    expect(convertTerms(uk, 'uk', 'us')).toBe(text.replaceAll('  ', ' '));
  });

  it.each(['us', 'uk'] as const)('prints and explains the abbreviation in %s terms', (terms) => {
    const { lines, key } = printPattern(pattern, { terms, ownStitches });
    expect(lines[1]).toContain('Ch 4 (counts as lst), lst in next');
    expect(lines[1]).toContain('(12 lst)');
    expect(key.find(({ abbreviation }) => abbreviation === 'lst')?.meaning).toBe(
      'long stitch (1 wrap, 1 draw, 3 throughs)',
    );
    const again = readPattern(lines.join('\n'), { terms, sides: 0, ownStitches });
    expect(again.diagnostics).toEqual([]);
    expect(again.rounds[1]?.made).toEqual({ ch: 4, [LST]: 11, 'sl st': 1 });
  });

  it('writes the name in whole words, and still says how it is made', () => {
    const { lines, key } = printPattern(pattern, { terms: 'us', fullWords: true, ownStitches });
    expect(lines[1]).toContain('Chain 4 (counts as long stitch), long stitch in next');
    expect(key).toEqual([{ abbreviation: 'long stitch', meaning: '1 wrap, 1 draw, 3 throughs' }]);
  });

  it('explains the moves even where the name is not known', () => {
    const { key } = printPattern(pattern, { terms: 'us' });
    expect(key.find(({ abbreviation }) => abbreviation === 'lst')?.meaning).toBe(
      '1 wrap, 1 draw, 3 throughs',
    );
  });
});

describe('planning with stitches of one’s own', () => {
  const text =
    'Rnd 1: Ch 4 (counts as lst), 2 lst in magic ring, ch 2, [3 lst in ring, ch 2] 3 times, join with sl st in top of beg ch-4. (12 lst, 4 ch-2 sps)';

  it('estimates their yarn by their loops', () => {
    const reading = readPattern(text, { terms: 'us', sides: 4, ownStitches });
    expect(reading.diagnostics).toEqual([]);
    const motif = motifOf(reading, 'own', 'Long square');
    const plan = withMotif(EXAMPLE_PLAN, motif);
    const checked = planSchema.parse(JSON.parse(JSON.stringify(plan)));
    expect(checked.motifs[0]?.rounds[0]?.made).toEqual({ ch: 12, [LST]: 11, 'sl st': 1 });
    const { ledger, rows, columns } = estimate(plan);
    const lines = ledger.filter(({ stitch }) => stitch === LST);
    const motifs = rows * columns;
    // Eleven in each motif, of 1 + 1 + 3 loops.
    expect(lines.reduce((sum, { count }) => sum + count, 0)).toBe(11 * motifs);
    expect(lines.reduce((sum, { loops }) => sum + (loops ?? 0), 0)).toBe(5 * 11 * motifs);
  });

  it('makes the same of moves that the table has, but for the guessed height', () => {
    // edc is made of the same moves: 1, 1, 3.
    const edc = text.replaceAll('lst', 'edc');
    const made = (written: string) =>
      readPattern(written, { terms: 'us', sides: 4, ownStitches }).rounds[0];
    expect(made(edc)?.made).toEqual({ ch: 12, edc: 11, 'sl st': 1 });
    expect(made(text)?.perSide).toBe(made(edc)?.perSide);
  });
});

describe('drawing stitches of one’s own', () => {
  it.each(ROUNDS)('draws every stitch of %s once', (text) => {
    const reading = read(text);
    const chart = layoutChart(reading, gaugeOf(null, 4), ownStitches);
    expect(chart.rounds.map(({ length }) => length)).toEqual(
      reading.rounds.map(({ stitches }) => stitches.length),
    );
    const points = chart.rounds.flat().flatMap(({ feet, head }) => [...feet, head].flat());
    expect(points.every(Number.isFinite)).toBe(true);
  });
});
