import { describe, expect, it } from 'vitest';
import { estimate, READY_JOINS, readyMotif, type Motif, type Plan } from '../../../src/lib';
import { joinFit } from '../../../src/lib/joins/fit';
import { joinCures, withScRounds } from '../../../src/lib/joins/joinCures';
import { joinStitches } from '../../../src/lib/ledger/pieces';
import { mainMotif } from '../../../src/lib/plan/plan';
import { plainPlan } from '../../support/plans';

const square = readyMotif('group-square', 4) as Motif;
/** A motif with `n` stitches a side, spaces and all. */
const sided = (n: number): Motif => ({
  ...square,
  rounds: square.rounds.map((round, i) => (i === 3 ? { ...round, perSide: n } : round)),
});
const planned = (n: number, key: string): Plan =>
  plainPlan('group-square', { motifs: [sided(n)], join: { key, colour: 'c1' } }, 4);

describe('joinCures', () => {
  it('has nothing to cure where the join fits', () => {
    expect(joinCures(planned(15, 'reed-lace'))).toEqual([]);
  });

  it('gives its worked example: 16 stitches take no rounds of sc, but another join', () => {
    const words = joinCures(planned(16, 'reed-lace')).map((cure) => cure.words);
    expect(words.filter((each) => each.includes('of sc'))).toEqual([]);
    expect(words.some((each) => each.startsWith('Join with'))).toBe(true);
  });

  it('adds rounds of sc with three in each corner: two stitches a side each, by hand', () => {
    // 13 + 2 = 15 = 4 × 3 + 3; a square of 15 a side has 4 × (15 + 1) sc
    const [cure] = joinCures(planned(13, 'reed-lace'));
    expect(cure?.words).toBe('Add a round of sc to every motif');
    const cured = cure!.apply(planned(13, 'reed-lace'));
    expect(mainMotif(cured).rounds.at(-1)).toMatchObject({ perSide: 15, tally: { sc: 64 } });
    expect(cured.colourways[0]?.roundColours).toHaveLength(5);
    expect(estimate(cured).fit.fits).toBe(true);
  });

  it('offers only what fits, for every join and every side from 5 to 40 stitches', () => {
    for (const join of READY_JOINS) {
      for (let n = 5; n <= 40; n += 1) {
        const plan = planned(n, join.key);
        const fits = joinFit(join, sided(n), n).fits;
        // The rule itself: n = r modulo m, with at least r.
        const { multipleOf: m, plus: r } = join.fit;
        expect(fits, `${join.key} on ${n}`).toBe(n >= r && (n - r) % m === 0);
        const cures = joinCures(plan);
        if (fits) expect(cures).toEqual([]);
        else expect(cures.length).toBeGreaterThan(0);
        for (const { apply, words } of cures) {
          const cured = apply(plan);
          const chosen = READY_JOINS.find(({ key }) => key === cured.join.key)!;
          const motif = mainMotif(cured);
          expect(joinFit(chosen, motif, joinStitches(motif)).fits, words).toBe(true);
        }
      }
    }
  });

  it('works the lace edge of four and three in numbers', () => {
    // Common practice, no source: n = 15 holds groups at 2, 6, 10, 14: four; five loops a side,
    // of which the first and last stay free and three link.
    const positions = [2, 6, 10, 14];
    const reed = READY_JOINS.find(({ key }) => key === 'reed-lace')!;
    const { repeats } = estimate(planned(15, 'reed-lace')).fit;
    expect(repeats + 1).toBe(positions.length);
    expect(reed.perMotifSide.dc).toEqual({ fixed: 2, perRepeat: 2 });
    expect(2 + 2 * repeats).toBe(2 * positions.length); // a pair of dc in each
    expect(reed.perSeam['sl st']?.perRepeat).toBe(1);
    expect(repeats).toBe(3); // loops that link
  });
});

describe('withScRounds', () => {
  it('is a motif like any other: counted, measured, and planned with', () => {
    const motif = withScRounds(square, 2);
    expect(motif.rounds.map(({ perSide }) => perSide)).toEqual([3, 7, 11, 15, 17, 19]);
  });
});
