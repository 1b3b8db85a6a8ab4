import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN, type Plan } from '../../../src/lib';
import {
  sameAround,
  withoutPaint,
  withPainted,
  withRecoloured,
  withTurns,
} from '../../../src/lib/colour/paintEdits';
import { blanketFaces } from '../../../src/lib/plan/blanketFaces';
import { withLayout } from '../../../src/lib/plan/layoutEdits';

const laid = (plan: Plan) => blanketFaces(plan, estimate(plan));
const colourwaysOf = (plan: Plan) => laid(plan).motifs.map(({ colourway }) => colourway);
const at = (plan: Plan, ...places: number[]) => places.map((i) => laid(plan).motifs[i]!);
const painted = (plan: Plan, places: readonly number[], colourway: number) =>
  withPainted(
    plan,
    at(plan, ...places).map((motif) => ({ ...motif, colourway })),
  );
const recoloured = (plan: Plan, places: readonly number[], round: number, colour: string) =>
  places.reduce((sum, place) => {
    const next = withRecoloured(sum, colourwaysOf(sum)[place]!, round, colour);
    return next ? painted(next.plan, [place], next.colourway) : sum;
  }, plan);

const everywhere = Array.from({ length: 80 }, (_, i) => i);

describe('withPainted', () => {
  it('gives motifs a colourway, in runs along their rows', () => {
    const result = painted(EXAMPLE_PLAN, [3, 4, 5, 9], 2);
    expect(result.placement.painted).toEqual([
      [0, 3, 3, 2],
      [1, 1, 1, 2],
    ]);
    const changed = colourwaysOf(result).flatMap((each, i) =>
      each === colourwaysOf(EXAMPLE_PLAN)[i] ? [] : [i],
    );
    expect(changed).toEqual([3, 4]); // the others were in it already
  });

  it('paints over what was painted, and moves the yarn with it', () => {
    const once = painted(EXAMPLE_PLAN, [0, 1, 2], 1);
    const twice = painted(once, [1], 0);
    expect(twice.placement.painted).toEqual([
      [0, 0, 1, 1],
      [0, 1, 1, 0],
      [0, 2, 1, 1],
    ]);
    expect(estimate(painted(EXAMPLE_PLAN, everywhere, 0)).colourwayMotifs).toEqual([80, 0, 0]);
  });

  it('keeps second motifs apart from the main ones of the same row', () => {
    const plan = withLayout(EXAMPLE_PLAN, 'large-and-small');
    const small = laid(plan).motifs.findIndex(({ face }) => face.slot === 'fillers');
    const result = painted(plan, [small], 3);
    expect(colourwaysOf(result)[small]).toBe(3);
    expect(withoutPaint(result).placement).toEqual(plan.placement);
  });
});

describe('withRecoloured', () => {
  it('makes a colourway for a motif that differs in one round, and only one for several alike', () => {
    const result = recoloured(EXAMPLE_PLAN, [0, 3], 1, 'c4');
    // both are in the first colourway: c2 c3 c4 c2
    expect(result.colourways).toHaveLength(4);
    expect(result.colourways[3]?.roundColours).toEqual(['c2', 'c4', 'c4', 'c2']);
    expect(colourwaysOf(result)[0]).toBe(3);
    expect(colourwaysOf(result)[3]).toBe(3);
    // every other motif stays as it was
    expect(colourwaysOf(result).map((each) => each % 3)).toEqual(colourwaysOf(EXAMPLE_PLAN));
    expect(estimate(result).colourwayMotifs).toEqual([25, 27, 26, 2]);
    expect(colourwaysOf(withTurns(result, 3, true))).not.toEqual(colourwaysOf(result));
  });

  it('takes a colourway that is there already', () => {
    const result = recoloured(EXAMPLE_PLAN, [0], 1, 'c3');
    expect(result.colourways).toHaveLength(3);
    expect(recoloured(EXAMPLE_PLAN, [0], 9, 'c3')).toEqual(EXAMPLE_PLAN);
  });
});

describe('all motifs locked', () => {
  it('keeps every motif as it lies, whatever rule comes after', () => {
    const locked = withPainted(EXAMPLE_PLAN, laid(EXAMPLE_PLAN).motifs);
    const other: Plan = {
      ...locked,
      placement: { ...locked.placement, rule: { by: 'rows', width: 3 } },
    };
    expect(colourwaysOf(other)).toEqual(colourwaysOf(EXAMPLE_PLAN));
  });
});

describe('sameAround', () => {
  it('finds what hangs together by its sides, and nothing across a corner', () => {
    const rows: Plan = {
      ...EXAMPLE_PLAN,
      placement: { rule: { by: 'rows', width: 2 }, painted: [], byHand: [] },
    };
    expect(sameAround(laid(rows), 3)).toHaveLength(16);
    expect(sameAround(laid(EXAMPLE_PLAN), 3)).toHaveLength(1);
  });
});
