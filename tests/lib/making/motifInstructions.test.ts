import { describe, expect, it } from 'vitest';
import { estimate, EXAMPLE_PLAN, type Plan } from '../../../src/lib';
import { joiningSteps } from '../../../src/lib/joining/joiningSteps';
import { makingOrder } from '../../../src/lib/joining/makingOrder';
import { motifInstructions } from '../../../src/lib/making/motifInstructions';
import { blanketFaces } from '../../../src/lib/plan/blanketFaces';

function instructions(plan: Plan, step: number) {
  const { motifs, map } = blanketFaces(plan, estimate(plan));
  const faces = motifs.map(({ face }) => face);
  const order = makingOrder('square', faces, map(), 'row-by-row');
  const steps = joiningSteps('square', faces, map(), order, plan.corners);
  return motifInstructions(plan, motifs, steps[step]!);
}
const withJoin = (key: string): Plan => ({ ...EXAMPLE_PLAN, join: { key, colour: 'c1' } });

describe('motifInstructions', () => {
  it('works the motif plain and links its added round: sides, then corners with their reasons', () => {
    // the tenth motif: row 2, motif 2 of eight across
    const { rounds, links, afterwards } = instructions(EXAMPLE_PLAN, 9);
    expect(rounds.map(({ label, links: linked }) => [label, linked])).toEqual([
      ['Rnd 1', false],
      ['Rnd 2', false],
      ['Rnd 3', false],
      ['Rnd 4', false],
      ['Flat braid', true],
    ]);
    expect(rounds.at(-1)?.colour).toBe('c1');
    expect(afterwards).toBe(false);
    expect(
      links.map(({ where, what, why }) =>
        why === null ? `${where}: ${what}` : `${where}: ${what} (${why})`,
      ),
    ).toEqual([
      'top side: link to row 1, motif 2',
      'left side: link to row 2, motif 1',
      'top left corner: link to row 1, motif 1 (inside: it crosses to the motif opposite)',
      'top right corner: link to row 1, motif 3 (inside: it crosses to the motif opposite)',
      'bottom right corner: leave open (inside: the motif opposite closes it later)',
      'bottom left corner: leave open (inside: the motif opposite closes it later)',
    ]);
  });

  it('links the last round where a join adds none, and nothing while the motifs are made where it is a seam', () => {
    expect(instructions(withJoin('last-round'), 1).rounds.map(({ links }) => links)).toEqual([
      false,
      false,
      false,
      true,
    ]);
    const seam = instructions(withJoin('whip-stitch'), 1);
    expect(seam.rounds.some(({ links }) => links)).toBe(false);
    expect(seam.afterwards).toBe(true);
    expect(seam.links).toEqual([
      { where: 'left side', what: 'seam with row 1, motif 1', why: null },
    ]);
  });
});
