import { joinStitches } from '../ledger/pieces';
import type { Motif, MotifRound } from '../motifs/motif';
import { withMotif } from '../plan/edits';
import { mainMotif, type Plan } from '../plan/plan';
import { fitOf, joinFit } from './fit';
import { READY_JOINS, readyJoin } from './readyJoins';

/** A way to make join and motif fit: what to do, in words, and the plan with it done. */
export interface JoinCure {
  readonly words: string;
  readonly apply: (plan: Plan) => Plan;
}

/** Stitches that a round of sc with three in each corner adds to a side. */
const ADDED_BY_SC = 2;
const MOST_JOINS = 3;

/**
 * The nearest ways to make the plan's join fit its motif: rounds of sc on the motif, another
 * number of its rounds, or joins that fit as it is. None where it fits already.
 *
 * Example: 16 stitches a side for a join that needs 4 q + 3: no rounds of sc, but another join.
 */
export function joinCures(plan: Plan): JoinCure[] {
  const motif = mainMotif(plan);
  const join = readyJoin(plan.join.key);
  if (!join) return [];
  const fits = (tried: Motif): boolean => joinFit(join, tried, joinStitches(tried)).fits;
  if (fits(motif)) return [];
  const result = fitOf(joinStitches(motif), join.fit);
  const scRounds = result.fits ? null : result.scRounds;
  const squared = scRounds === null ? null : withScRounds(motif, scRounds);
  return [
    ...(scRounds !== null && squared && motif.sides !== 0 && fits(squared)
      ? [
          {
            words: `Add ${scRounds === 1 ? 'a round' : `${scRounds} rounds`} of sc to every motif`,
            apply: (old: Plan) => withMotif(old, withScRounds(mainMotif(old), scRounds)),
          },
        ]
      : []),
    ...fewerRounds(motif, fits),
    ...otherJoins(plan, motif),
  ];
}

/** A motif with so many further rounds of sc, three in each corner: they count as its own rounds. */
export function withScRounds(motif: Motif, count: number): Motif {
  const rounds = Array.from({ length: count }, (_, i): MotifRound => {
    const perSide = (motif.rounds.at(-1)?.perSide ?? 0) + ADDED_BY_SC * (i + 1);
    const stitches = motif.sides * (perSide + 1);
    return {
      label: `Sc round ${i + 1}`,
      made: { ch: 1, sc: stitches, 'sl st': 1 },
      travel: {},
      tally: { sc: stitches },
      spaces: {},
      cornerSpace: null,
      perSide,
      height: 'sc',
    };
  });
  return {
    ...motif,
    // No longer the motif of that pattern: its rounds cannot be chosen by its name.
    key: `${motif.key.slice(0, 70)}-and-sc`,
    name: `${motif.name.slice(0, 70)} and sc`,
    version: null,
    rounds: [...motif.rounds, ...rounds],
  };
}

/** The largest number of the motif's own rounds that fits. */
function fewerRounds(motif: Motif, fits: (tried: Motif) => boolean): JoinCure[] {
  for (let count = motif.rounds.length - 1; count > 0; count -= 1) {
    if (!fits({ ...motif, rounds: motif.rounds.slice(0, count) })) continue;
    return [
      {
        words: `Work the motif to ${count === 1 ? '1 round' : `${count} rounds`}`,
        apply: (old) => {
          const now = mainMotif(old);
          return withMotif(old, { ...now, rounds: now.rounds.slice(0, count) });
        },
      },
    ];
  }
  return [];
}

/** Joins that fit as the motif is, those that look most like the one chosen first. */
function otherJoins(plan: Plan, motif: Motif): JoinCure[] {
  const join = readyJoin(plan.join.key);
  const like = (other: (typeof READY_JOINS)[number]): number =>
    Number(other.openness === join?.openness) +
    Number(other.attached === join?.attached) +
    Number(other.tool === join?.tool);
  return READY_JOINS.filter((other) => joinFit(other, motif, joinStitches(motif)).fits)
    .toSorted((left, right) => like(right) - like(left))
    .slice(0, MOST_JOINS)
    .map(({ key, name }) => ({
      words: `Join with ${name.charAt(0).toLowerCase()}${name.slice(1)}`,
      apply: (old) => ({ ...old, join: { ...old.join, key } }),
    }));
}
