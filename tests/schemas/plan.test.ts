import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN, QUANTITY_LIMITS, READY_JOINS } from '../../src/lib';
import { MOST_ROWS } from '../../src/lib/layout/gridCounts';
import { estimateSchema } from '../../src/schemas/estimate';
import { POSSIBLE } from '../../src/schemas/limits';
import { PLAN_LIMITS, planSchema, type PlanInput } from '../../src/schemas/plan';
import { fieldErrors } from '../../src/schemas/schema';

const plain = (): PlanInput => JSON.parse(JSON.stringify(EXAMPLE_PLAN));
type Path = (string | number)[];

/** The plan with another value at a path; `undefined` leaves the field out. */
function planWith(path: Path, value: unknown): unknown {
  const plan = plain() as unknown;
  const at = path.slice(0, -1).reduce((node, key) => (node as never)[key], plan);
  (at as Record<string | number, unknown>)[path.at(-1)!] = value;
  return plan;
}

const errorsOf = (input: unknown) => {
  const result = planSchema.safeParse(input);
  return result.success ? {} : fieldErrors(result.error);
};
const errorAt = (path: Path, value: unknown) => errorsOf(planWith(path, value))[path.join('.')];

const MASS: Path = ['yarn', 'putUp', 'massG'];

describe('planSchema', () => {
  it("gives the library's plan for its JSON, stitches in the order they were written", () => {
    const plan = planSchema.parse(plain());
    expect(plan).toEqual(EXAMPLE_PLAN);
    const stitches = ({ motifs }: { motifs: readonly { rounds: readonly { made: object }[] }[] }) =>
      JSON.stringify(motifs.map(({ rounds }) => rounds.map(({ made }) => made)));
    expect(stitches(plan)).toBe(stitches(EXAMPLE_PLAN));
  });

  it.each([
    [undefined, 'Skein mass is missing'],
    [null, 'Skein mass is missing'],
    ['', 'Skein mass must be a number'],
    ['100', 'Skein mass must be a number'],
    [NaN, 'Skein mass must be a number'],
    [Infinity, 'Skein mass must be a number'],
    [-Infinity, 'Skein mass must be a number'],
    [-1, 'Skein mass must be more than 0 g'],
    [0, 'Skein mass must be more than 0 g'],
    [0.01, 'Skein mass must be at least 0.1 g'],
    [1e300, 'Skein mass must be at most 10,000 g'],
  ])('refuses a skein mass of %s in words', (value, message) => {
    expect(errorAt(MASS, value)).toBe(message);
  });

  it.each<[Path, unknown, string]>([
    [['yarn', 'name'], '  ', 'Yarn name is missing'],
    [['yarn', 'name'], 'x'.repeat(81), 'Yarn name must have at most 80 characters'],
    [['yarn', 'name'], 'a\u0007b', 'Yarn name must not contain control characters'],
    [['yarn', 'name'], 'a\ud800b', 'Yarn name must not contain control characters'],
    [['yarn', 'weightCategory'], 8, 'Yarn weight category must be one of 0, 1, 2, 3, 4, 5, 6, 7'],
    [['yarn', 'price', 'priceMinor'], 6.5, 'Price of a skein must be a whole number'],
    [['yarn', 'price', 'priceMinor'], -1, 'Price of a skein must not be less than 0'],
    [['yarn', 'price', 'currency'], 'eur', 'Choose one of the listed currencies, for example EUR.'],
    [['yarn', 'ownerId'], 'me', ''],
    [['colours'], [], 'Colours must be at least 1'],
    [
      ['colours', 0, 'hex'],
      'red',
      'Colour must be written as # and six digits 0-9, a-f, such as #2f6f6b',
    ],
    [['swatch', 'stitches'], 0, 'Stitches across the swatch must be at least 1'],
    [['swatch', 'stitches'], 2.5, 'Stitches across the swatch must be a whole number'],
    [['swatch', 'widthMm'], 0, 'Width of the swatch must be more than 0 mm'],
    [['swatch', 'stitch'], 'zz', 'There is no stitch “zz” in the stitch table'],
    [['evidence', 0, 'reading', 'massG'], 0, 'Yarn weighed must be more than 0 g'],
    [['evidence', 0, 'count'], 0, 'Motifs weighed must be at least 1'],
    [
      ['evidence', 0, 'piece'],
      'sock',
      'Weighed piece must be the swatch, motifs or a counted piece',
    ],
    [['motifs', 0, 'rounds', 0, 'made', 'dc'], 5001, 'Stitches made must be at most 5,000'],
    [['motifs', 0, 'rounds', 0, 'made', 'xx'], 1, 'There is no stitch “xx” in the stitch table'],
    [['motifs', 0, 'rounds', 0, 'height'], 'tall', 'There is no stitch “tall” in the stitch table'],
    [
      ['motifs', 0, 'rounds', 0, 'height'],
      7,
      'Height of a round must be a stitch such as dc, or chain loops',
    ],
    [['size', 'rows'], 401, 'Rows of motifs must be at most 400'],
    [['size', 'rows'], 0, 'Rows of motifs must be at least 1'],
    [['size', 'by'], 'eye', 'Size must be a grid or a target'],
    [['confidence'], 0.97, 'Confidence must be one of 0.5, 0.8, 0.9, 0.95, 0.99'],
    [['corners'], 'round', 'Corners must be one of gathered, crossed'],
    [['secondsPerMove'], 0, 'Time of a move must be more than 0 s'],
    [['motifSideMm'], -3, 'Side of a motif must be more than 0 mm'],
    [
      ['border'],
      Array(31).fill({ stitch: 'sc', colour: 'c1' }),
      'Border rounds must be at most 30',
    ],
  ])('refuses %j = %j beside its field', (path, value, message) => {
    if (message) expect(errorAt(path, value)).toBe(message);
    else expect(errorsOf(planWith(path, value)).yarn).toBe('Yarn has no field named ownerId');
  });

  it.each<[Path, unknown, string]>([
    [['colours', 1, 'key'], 'c1', 'Two colours have the key c1'],
    [['colourways', 0, 'motifIndex'], 3, 'There is no motif number 3'],
    [
      ['colourways', 0, 'roundColours'],
      ['c1'],
      'Classic group square has 4 rounds, but 1 colours are given',
    ],
    [['colourways', 1, 'roundColours', 2], 'c9', 'There is no colour with the key c9'],
    [['join', 'colour'], 'c9', 'There is no colour with the key c9'],
    [['join', 'key'], 'glue', 'There is no join named glue'],
    [['border', 2, 'colour'], 'c9', 'There is no colour with the key c9'],
    [['evidence', 0, 'motifIndex'], 7, 'There is no motif number 7'],
    [['layout'], 'triangles', 'Motifs of 4 sides cannot lie in the layout “triangles”'],
    [
      ['motifs', 0, 'rounds', 1, 'travel', 'sl st'],
      9,
      'Rnd 2 travels over 9 sl st but makes only 4',
    ],
    [['motifs', 0, 'rounds', 1, 'cornerSpace'], 'ch-9', 'Rnd 2 has no ch-9 space for its corners'],
  ])('checks %j against the rest of the plan', (path, value, message) => {
    expect(errorAt(path, value)).toBe(message);
  });

  it('refuses a yarn that could not be spun and stitches that could not be made', () => {
    expect(errorsOf(planWith(['yarn', 'putUp', 'massG'], 0.1))).toEqual({
      'yarn.putUp.lengthM': 'No yarn runs 2000 m to the gram: check the length and the mass',
    });
    expect(errorsOf(planWith(['swatch', 'widthMm'], 1))).toEqual({
      'swatch.widthMm': 'Stitches of 0.05 mm cannot be: check the width and the stitches counted',
    });
    expect(errorsOf(planWith(['swatch', 'heightMm'], 1))).toEqual({
      'swatch.heightMm': 'Rows of 0.0556 mm cannot be: check the height and the rows counted',
    });
  });

  it('wants a swatch where one is said to be weighed', () => {
    const plan = { ...plain(), swatch: null };
    plan.evidence = [{ piece: 'swatch', reading: { by: 'weighing', massG: 20, resolutionG: 1 } }];
    expect(errorsOf(plan)).toEqual({
      'evidence.0.piece': 'A weighed swatch needs its stitches, rows and size',
    });
  });

  it('wants all motifs of one blanket to have as many sides', () => {
    const plan = plain();
    plan.motifs = [plan.motifs[0]!, { ...plan.motifs[0]!, sides: 6 }];
    expect(errorsOf(plan)).toEqual({
      'motifs.1.sides': 'All motifs of a blanket must have the same number of sides',
    });
  });

  it('wants a second motif where the layout has places for it, and none elsewhere', () => {
    expect(errorsOf({ ...plain(), layout: 'large-and-small' })).toMatchObject({
      secondMotif: 'The layout “large and small” needs a second motif of 4 sides',
      colourways: 'The second motif has no colourway',
    });
    expect(errorsOf({ ...plain(), secondMotif: 0 })).toEqual({
      secondMotif: 'The second motif cannot be the only one',
    });
    const two = plain();
    two.motifs = [two.motifs[0]!, two.motifs[0]!];
    expect(errorsOf({ ...two, secondMotif: 1 })).toEqual({
      secondMotif: 'The layout “square grid” has no place for a second motif',
    });
  });

  it('reads a plan from before layouts and placements: the usual ones', () => {
    const { layout, edge, secondMotif, placement, ...older } = plain();
    expect([layout, edge, secondMotif]).toEqual([null, 'toothed', null]);
    expect(planSchema.parse(older)).toEqual(planSchema.parse({ ...older, placement }));
  });

  it('says what is wrong with a placement', () => {
    const rule = { by: 'diagonals', width: 1 };
    expect(errorsOf({ ...plain(), placement: { rule, painted: [[0, 0, 0, 0]] } })).toEqual({
      'placement.painted.0.2': expect.stringContaining('Motifs painted'),
    });
    expect(
      errorsOf({ ...plain(), placement: { rule: { by: 'wish' }, painted: [], byHand: [] } }),
    ).toEqual({
      'placement.rule.by': 'Placement must be stripes, a repeat, a gradient or at random',
    });
  });

  it('refuses what is not a plan at all', () => {
    expect(errorsOf(undefined)).toEqual({ '': 'Plan is missing' });
    expect(errorsOf('plan')).toEqual({ '': 'Plan must be an object' });
    expect(errorsOf([])).toEqual({ '': 'Plan must be an object' });
  });

  it('names what it does not know instead of taking it', () => {
    expect(errorsOf({ ...plain(), ownerId: 'me', version: 2 })).toEqual({
      '': 'Plan has no field named ownerId, version',
    });
  });

  it('never lets a constructor of a quantity throw', () => {
    const numbers = fc.oneof(fc.double(), fc.constantFrom(-1, 0, NaN, Infinity, 1e308, 1e12));
    const paths: Path[] = [
      MASS,
      ['yarn', 'putUp', 'lengthM'],
      ['yarn', 'price', 'priceMinor'],
      ['swatch', 'widthMm'],
      ['swatch', 'heightMm'],
      ['evidence', 0, 'reading', 'massG'],
      ['evidence', 0, 'reading', 'resolutionG'],
      ['motifSideMm'],
    ];
    fc.assert(
      fc.property(fc.constantFrom(...paths), numbers, (path, value) => {
        expect(() => planSchema.safeParse(planWith(path, value))).not.toThrow();
      }),
      { seed: 20261201 },
    );
  });

  it('accepts nothing that the library refuses', () => {
    const { skeinMassG, skeinLengthM, swatchSizeMm, motifSideMm, targetSizeMm } = PLAN_LIMITS;
    expect(Math.max(skeinMassG, PLAN_LIMITS.pieceMassG)).toBeLessThanOrEqual(QUANTITY_LIMITS.massG);
    expect(Math.max(skeinLengthM, PLAN_LIMITS.pieceLengthM)).toBeLessThanOrEqual(
      QUANTITY_LIMITS.lengthM,
    );
    expect(Math.max(swatchSizeMm, motifSideMm, targetSizeMm)).toBeLessThanOrEqual(
      QUANTITY_LIMITS.widthMm,
    );
    expect(PLAN_LIMITS.priceMinor).toBeLessThanOrEqual(QUANTITY_LIMITS.priceMinor);
    expect(PLAN_LIMITS.gridRows).toBe(MOST_ROWS);
    expect(PLAN_LIMITS.gridColumns).toBe(MOST_ROWS);
  });
});

describe('estimateSchema', () => {
  it('names every figure of an estimate and no other, whatever the join', () => {
    for (const { key } of READY_JOINS) {
      const answer = estimate({ ...EXAMPLE_PLAN, join: { ...EXAMPLE_PLAN.join, key } });
      expect(estimateSchema.parse(JSON.parse(JSON.stringify(answer)))).toEqual(answer);
    }
  });

  it('holds at the edges of what a plan may say: every figure is a finite number', () => {
    // Even over orders of magnitude, the ends as likely as all between.
    const between = (least: number, most: number) =>
      fc.oneof(
        fc.constantFrom(least, most),
        fc
          .double({ min: Math.log(least), max: Math.log(most), noNaN: true })
          .map((power) => Math.min(most, Math.max(least, Math.exp(power)))),
      );
    const { metresPerGram, stitchSizeMm } = POSSIBLE;
    const edges = fc.record({
      massG: between(POSSIBLE.leastSkeinMassG, PLAN_LIMITS.skeinMassG),
      perGram: between(metresPerGram.least, metresPerGram.most),
      stitches: fc.integer({ min: 1, max: PLAN_LIMITS.swatchStitches }),
      rowCount: fc.integer({ min: 1, max: PLAN_LIMITS.swatchRows }),
      stitchMm: between(stitchSizeMm.least, stitchSizeMm.most),
      rowMm: between(stitchSizeMm.least, stitchSizeMm.most),
      weighedG: between(POSSIBLE.leastPieceMassG, PLAN_LIMITS.pieceMassG),
      resolutionG: between(POSSIBLE.leastScaleStepG, 100),
      motifSideMm: fc.option(between(POSSIBLE.leastMotifSideMm, PLAN_LIMITS.motifSideMm)),
      rows: fc.integer({ min: 1, max: PLAN_LIMITS.gridRows }),
      join: fc.constantFrom(...READY_JOINS.map(({ key }) => key)),
      confidence: fc.constantFrom(0.5, 0.99),
    });
    let accepted = 0;
    fc.assert(
      fc.property(edges, (edge) => {
        const plan = plain();
        Object.assign(plan.yarn.putUp, { massG: edge.massG, lengthM: edge.massG * edge.perGram });
        Object.assign(plan.swatch!, {
          stitches: edge.stitches,
          rows: edge.rowCount,
          widthMm: edge.stitches * edge.stitchMm,
          heightMm: edge.rowCount * edge.rowMm,
        });
        plan.evidence[0]!.reading = {
          by: 'weighing',
          massG: edge.weighedG,
          resolutionG: edge.resolutionG,
        };
        plan.motifSideMm = edge.motifSideMm;
        plan.size = { by: 'grid', rows: edge.rows, columns: edge.rows };
        plan.join.key = edge.join;
        plan.confidence = edge.confidence as 0.5;
        const parsed = planSchema.safeParse(plan);
        if (!parsed.success) return;
        accepted += 1;
        estimateSchema.parse(estimate(parsed.data));
      }),
      { seed: 20261201, numRuns: 1000 },
    );
    expect(accepted).toBeGreaterThan(200);
  });
});
