import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN, readyMotif, type Motif, type Plan } from '../../../src/lib';
import {
  withBorder,
  withChangedColour,
  withColour,
  withColourway,
  withEvidence,
  withMotif,
  withoutColour,
  withRoundColour,
} from '../../../src/lib/plan/edits';
import { withoutColourway } from '../../../src/lib/plan/withoutMotif';
import { planSchema } from '../../../src/schemas/plan';
import { buildPlan, weighed } from '../../support/plans';

const plan = buildPlan();
const coloursOf = (edited: Plan) => edited.colourways.map(({ roundColours }) => roundColours);
const isValid = (edited: Plan) => planSchema.safeParse(edited).success;

describe('withMotif', () => {
  const hexagon = readyMotif('hexagon', 5) as Motif;
  const changed = withMotif(plan, hexagon);

  it('keeps the colours of the rounds that stay and begins them again for new ones', () => {
    expect(coloursOf(changed)[0]).toEqual(['c2', 'c3', 'c4', 'c2', 'c2']);
    expect(coloursOf(withMotif(plan, readyMotif('group-square', 2) as Motif))).toEqual([
      ['c2', 'c3'],
      ['c2', 'c5'],
      ['c2', 'c4'],
    ]);
    expect(isValid(changed)).toBe(true);
  });

  it('forgets the side that was measured on the other motif', () => {
    const measured = buildPlan({ motifSideMm: 120 as Plan['motifSideMm'] });
    expect(withMotif(measured, hexagon).motifSideMm).toBeNull();
  });

  it('keeps weighed motifs as a counted piece of the stitches they were made of', () => {
    const [piece] = changed.evidence;
    // Counted by hand from the example: rounds 1 to 4 of the group square are 12, 24, 36 and 48 dc
    // (6k(k+1) in all: published), and each reading is four motifs.
    expect(piece).toMatchObject({
      piece: 'counted',
      label: '4 × Classic group square',
      reading: EXAMPLE_PLAN.evidence[0]?.reading,
    });
    const made = piece?.piece === 'counted' ? piece.made : {};
    expect(made.dc).toBeLessThanOrEqual(4 * 120);
    expect(made.dc).toBeGreaterThan(4 * 100);
    expect(made['sl st']).toBeGreaterThan(0);
  });

  // Apart from how far the motifs weighed may differ from the rest, which one piece cannot tell.
  it('learns the same from the counted piece as from the motifs', () => {
    const before = estimate(plan);
    const asCounted = { ...changed, motifs: plan.motifs, colourways: plan.colourways };
    const after = estimate(asCounted);
    expect(after.totals.meanM / before.totals.meanM).toBeCloseTo(1, 2);
  });

  it('leaves pieces of another kind alone', () => {
    const swatch = { piece: 'swatch', reading: weighed(30, 1) } as const;
    expect(withMotif(buildPlan({ evidence: [swatch] }), hexagon).evidence).toEqual([swatch]);
  });
});

describe('colours', () => {
  it('changes one round of one colourway', () => {
    const changed = withRoundColour(plan, 1, 2, 'c5');
    expect(coloursOf(changed)).toEqual([
      ['c2', 'c3', 'c4', 'c2'],
      ['c2', 'c5', 'c5', 'c2'],
      ['c2', 'c4', 'c5', 'c2'],
    ]);
  });

  it('adds a colour under a key that none has, also after one in the middle was taken out', () => {
    const fewer = withoutColour(plan, 'c2');
    const added = withColour(fewer, { name: 'Marram', hex: '#c0b070' });
    expect(added.colours.map(({ key }) => key)).toEqual(['c1', 'c3', 'c4', 'c5', 'c6']);
    expect(new Set(added.colours.map(({ key }) => key)).size).toBe(5);
    expect(isValid(added)).toBe(true);
  });

  it('works what was in a removed colour in the first that is left', () => {
    const changed = withoutColour(plan, 'c1');
    expect(changed.join.colour).toBe('c2');
    expect(changed.border.map(({ colour }) => colour)).toEqual(['c2', 'c2', 'c2']);
    expect(isValid(changed)).toBe(true);
    expect(coloursOf(withoutColour(plan, 'c5')).flat()).not.toContain('c5');
  });

  it('keeps the last colour', () => {
    const one = ['c2', 'c3', 'c4', 'c5'].reduce(withoutColour, plan);
    expect(withoutColour(one, 'c1')).toBe(one);
  });

  it('renames a colour and nothing else', () => {
    const changed = withChangedColour(plan, 'c3', { name: 'Haw' });
    expect(changed.colours[2]).toEqual({ key: 'c3', name: 'Haw', hex: '#bf4630' });
    expect({ ...changed, colours: plan.colours }).toEqual(plan);
  });

  it('adds a colourway like the last, and takes any but the only one out', () => {
    const more = withColourway(plan);
    expect(coloursOf(more).slice(2)).toEqual([
      ['c2', 'c4', 'c5', 'c2'],
      ['c2', 'c4', 'c5', 'c2'],
    ]);
    expect(coloursOf(withoutColourway(more, 0))).toEqual(coloursOf(more).slice(1));
    const single = buildPlan({ colourways: plan.colourways.slice(0, 1) });
    expect(withoutColourway(single, 0)).toBe(single);
  });
});

describe('withBorder', () => {
  it('keeps the colours of the rounds there are, new ones take that of the join', () => {
    const changed = withBorder(plan, 5, 'hdc');
    expect(changed.border.map(({ colour }) => colour)).toEqual(['c1', 'c2', 'c1', 'c1', 'c1']);
    expect(changed.border.every(({ stitch }) => stitch === 'hdc')).toBe(true);
    expect(withBorder(plan, 0, 'sc').border).toEqual([]);
  });
});

describe('withEvidence', () => {
  const piece = { piece: 'swatch', reading: weighed(30, 1) } as const;

  it('replaces, adds past the end and takes out', () => {
    expect(withEvidence(plan, 0, piece).evidence).toEqual([piece]);
    expect(withEvidence(plan, 1, piece).evidence).toEqual([...plan.evidence, piece]);
    expect(withEvidence(plan, 0, null).evidence).toEqual([]);
  });
});
