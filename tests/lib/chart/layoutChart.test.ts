import { describe, expect, it } from 'vitest';
import {
  chartSvg,
  gaugeOf,
  layoutChart,
  motifGeometry,
  motifOf,
  overlapsOf,
  readPattern,
  READY_PATTERNS,
  type Chart,
  type MotifSides,
  type Reading,
} from '../../../src/lib';
import { corpus } from '../../support/patternCorpus';

/** Most of a symbol's box that its neighbour's may cover: stated here, and held by every motif. */
const MOST_OVERLAP = { ready: 0.1, corpus: 0.2 } as const;
const gauge = gaugeOf(null, 4);

const read = (text: string, sides: MotifSides): Reading =>
  readPattern(text, { terms: 'us', sides });
const chartOf = (reading: Reading): Chart => layoutChart(reading, gauge);

/** Every stitch that the rounds make, by its address, and as many of the ring. */
const addressesOf = (reading: Reading): string[] =>
  reading.rounds.flatMap(({ stitches }, round) => stitches.map((_, i) => `${round}/${i}`)).sort();
const ringCount = ({ ring }: Reading): number =>
  Object.values(ring.made).reduce((sum, count) => sum + count, 0);

const CLASSIC = `Ch 4, join with sl st to form ring.
Rnd 1: Ch 3 (counts as dc), 2 dc in ring, ch 2, *3 dc in ring, ch 2; rep from * 2 more times; join with sl st in top of beg ch-3.
Rnd 2: Sl st in next 2 dc and in next ch-2 sp, ch 3, (2 dc, ch 2, 3 dc) in same sp, ch 1, *(3 dc, ch 2, 3 dc) in next ch-2 sp, ch 1; rep from * 2 more times; join with sl st in top of beg ch-3.`;

const texts = [
  ...READY_PATTERNS.map(
    ({ key, text, sides }) => [key, read(text, sides), MOST_OVERLAP.ready] as const,
  ),
  ...corpus('right').map(
    ({ name, text, options }) => [name, readPattern(text, options), MOST_OVERLAP.corpus] as const,
  ),
];

describe.each(texts)('the chart of %s', (_, reading, mostOverlap) => {
  const chart = chartOf(reading);

  it('draws every stitch exactly once', () => {
    const drawn = chart.rounds.flat().map(({ round, stitch }) => `${round}/${stitch}`);
    expect(drawn.sort()).toEqual(addressesOf(reading));
    expect(chart.ring).toHaveLength(ringCount(reading));
  });

  it('lets no symbol cover more than the stated share of another', () => {
    const worst = overlapsOf(chart, mostOverlap).map(
      ({ a, b, share }) => `${a.round}/${a.stitch} and ${b.round}/${b.stitch}: ${share.toFixed(2)}`,
    );
    expect(worst).toEqual([]);
  });

  it('is drawn in numbers', () => {
    expect(chartSvg(chart, 'A motif')).not.toMatch(/NaN|Infinity/);
  });
});

describe('the chart of a text that is wrong', () => {
  it.each(corpus('wrong').map(({ name, text, options }) => [name, text, options] as const))(
    'draws what could be worked: %s',
    (_, text, options) => {
      const reading = readPattern(text, options);
      const chart = chartOf(reading);
      expect(chart.rounds.flat()).toHaveLength(addressesOf(reading).length);
      expect(chartSvg(chart, 'A motif')).not.toMatch(/NaN|Infinity/);
    },
  );
});

/** Distances from the middle of every outermost symbol end to the outline, at their largest. */
const reachMm = (chart: Chart, [x, y]: readonly [number, number]): number =>
  Math.max(
    ...chart.rounds
      .at(-1)!
      .flatMap(({ feet, head }) => [head, ...feet].map((at) => at[0] * x + at[1] * y)),
  );

describe('the scale of a chart', () => {
  it.each(READY_PATTERNS.map(({ key, text, sides }) => [key, text, sides] as const))(
    'draws the outer edge of %s where the motif ends',
    (_, text, sides) => {
      const reading = read(text, sides);
      const chart = chartOf(reading);
      const { acrossMm } = motifGeometry(motifOf(reading, '', ''), gauge, null);
      // Textbook: twice from the middle to a side; a triangle is three times that high.
      const apothemMm = acrossMm / (sides === 3 ? 3 : 2);
      const count = sides === 0 ? 4 : sides;
      // Heads lie on the outline but for the room they keep from it: 0.07 of a stitch, chains 0.1 more.
      for (let side = 0; side < count; side += 1) {
        const angle = (2 * Math.PI * side) / count + (sides === 3 ? Math.PI : 0);
        const mm = reachMm(chart, [-Math.sin(angle), -Math.cos(angle)]);
        expect(mm).toBeLessThanOrEqual(apothemMm + 1e-6);
        expect(mm).toBeGreaterThan(apothemMm - 0.2 * gauge.stitchWidthMm);
      }
      const lowMm = Math.min(chart.widthMm, chart.heightMm);
      expect(lowMm).toBeCloseTo(acrossMm, 6);
    },
  );
});

describe('layoutChart', () => {
  it('is as large as the motif: a group square of two rounds', () => {
    // By the formula of the model: ring 4 x 0.9 w / 2 pi, two rounds of dc of 1.85 w, w = 101.6 / 12.5.
    const w = 101.6 / 12.5;
    const acrossMm = 2 * ((4 * 0.9 * w) / (2 * Math.PI) + 2 * 1.85 * w);
    const { widthMm, heightMm, overMm } = chartOf(read(CLASSIC, 4));
    expect([widthMm, heightMm]).toEqual([expect.closeTo(acrossMm, 6), expect.closeTo(acrossMm, 6)]);
    expect(overMm).toBeLessThan(w / 2);
  });

  it('puts the corner spaces of a square on its diagonals', () => {
    const reading = read(CLASSIC, 4);
    const chains = chartOf(reading).rounds[1]?.filter(
      ({ stitch }) => reading.rounds[1]?.stitches[stitch]?.corner !== null,
    );
    expect(chains).toHaveLength(8);
    // Two chains to a corner, one on either side of the diagonal: their middles average out on it.
    for (let i = 0; i < 8; i += 2) {
      const [one, two] = [chains?.[i], chains?.[i + 1]];
      const [x, y] = [one, two].reduce(
        (sum, symbol) => [
          sum[0] + (symbol?.head[0] ?? 0) + (symbol?.feet[0]?.[0] ?? 0),
          sum[1] + (symbol?.head[1] ?? 0) + (symbol?.feet[0]?.[1] ?? 0),
        ],
        [0, 0] as [number, number],
      );
      expect(Math.abs(Math.abs(x) - Math.abs(y))).toBeLessThan(0.05 * gauge.stitchWidthMm);
    }
  });

  it('goes round anticlockwise, and back where the pattern turns', () => {
    const turned = `Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join with sl st in top of beg ch-3, turn.
Rnd 2: Ch 1, sc in same st, sc in next 11 sts; join.`;
    const [first = [], second = []] = chartOf(read(turned, 0)).rounds;
    const turnOf = (symbols: Chart['rounds'][number], i: number): number => {
      const [a, b] = [symbols[i]?.head, symbols[i + 1]?.head];
      return (a?.[0] ?? 0) * (b?.[1] ?? 0) - (a?.[1] ?? 0) * (b?.[0] ?? 0);
    };
    expect(turnOf(first, 4)).toBeLessThan(0);
    expect(turnOf(second, 3)).toBeGreaterThan(0);
  });

  it('stands the legs of a decrease in the stitches it takes up', () => {
    const text = `Rnd 1: 12 sc in magic ring; join.\nRnd 2: Ch 1, sc2tog around; join.`;
    const [, second = []] = chartOf(read(text, 0)).rounds;
    const decreases = second.filter(({ feet }) => feet.length === 2);
    expect(decreases).toHaveLength(6);
  });

  it('draws rows over one another, each back over the last', () => {
    const text =
      'Ch 6.\nRow 1: Sc in 2nd ch from hook and in each ch across, turn.\nRow 2: Ch 1, sc in each st across.';
    const [first = [], second = []] = chartOf(read(text, 0)).rounds;
    const across = (symbols: Chart['rounds'][number]) =>
      symbols.filter(({ glyph }) => glyph.body === 'cross').map(({ head }) => head[0]);
    expect(across(first)).toEqual([...across(first)].sort((a, b) => b - a));
    expect(across(second)).toEqual([...across(second)].sort((a, b) => a - b));
  });

  it('draws nothing of nothing', () => {
    expect(chartOf(read('', 4)).rounds).toEqual([]);
  });

  it("draws a stitch of one's own from its moves", () => {
    const own = {
      abbreviation: 'lst',
      name: 'long stitch',
      moves: { wraps: 2, draws: 1, throughs: 3 },
      ...{ heightOverWidth: null, takes: 1, symbol: null },
    } as const;
    const options = { terms: 'us', sides: 0, ownStitches: [own] } as const;
    const reading = readPattern('Rnd 1: 12 lst in magic ring; join.', options);
    const glyphs = layoutChart(reading, gauge, [own]).rounds[0]?.map(({ glyph }) => glyph.bars);
    // Made as a treble is, which has two strokes.
    expect(glyphs?.slice(0, 12)).toEqual(Array.from({ length: 12 }, () => 2));
  });
});
