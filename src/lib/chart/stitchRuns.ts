import { placeOf } from './feet';
import type { Place, Role, WorkedRound, WorkedStitch } from '../pattern/reading';

/** Equal stitches one after another: a line of the table that says what the chart shows. */
export interface StitchRun {
  readonly code: string;
  readonly role: Role;
  readonly count: number;
  /** Index of the first of them in the round. */
  readonly first: number;
  /** US code of what they are worked into or, in a gap, after, "ch-2" for a space; or what else they hang on. */
  readonly into:
    | { readonly kind: 'place' | 'gap'; readonly code: string; readonly inOne: boolean }
    | { readonly kind: 'ring' | 'round-start' | 'own-chain' | 'facing' | 'none' };
  readonly side: number;
  readonly corner: number | null;
}

/** The stitches of a round in the order of making, equal ones taken together. */
export function stitchRuns(round: WorkedRound, below: readonly Place[]): StitchRun[] {
  const runs: StitchRun[] = [];
  round.stitches.forEach((stitch, i) => {
    const last = runs.at(-1);
    const before = round.stitches[i - 1];
    const longer =
      last && before && alike(before, stitch, below) ? withOneMore(last, before, stitch) : null;
    if (longer) runs[runs.length - 1] = longer;
    else runs.push(runOf(stitch, i, below));
  });
  return runs;
}

/** The run with one stitch more; null where some would share a place and others not. */
function withOneMore(run: StitchRun, before: WorkedStitch, stitch: WorkedStitch): StitchRun | null {
  const { into, count } = run;
  if (into.kind !== 'place' && into.kind !== 'gap') return { ...run, count: count + 1 };
  const inOne = sameInto(before, stitch);
  return count === 1 || into.inOne === inOne
    ? { ...run, count: count + 1, into: { ...into, inOne } }
    : null;
}

function runOf(stitch: WorkedStitch, first: number, below: readonly Place[]): StitchRun {
  const { code, role, into, side, corner } = stitch;
  return {
    ...{ code, role, count: 1, first, side, corner },
    into:
      into.kind === 'place'
        ? { kind: into.gap ? 'gap' : 'place', code: below[into.index]?.code ?? '', inOne: true }
        : { kind: into.kind },
  };
}

function alike(before: WorkedStitch, next: WorkedStitch, below: readonly Place[]): boolean {
  const codeBelow = ({ into }: WorkedStitch) =>
    into.kind === 'place' ? `${below[into.index]?.code} ${into.gap ?? ''}` : into.kind;
  return (
    before.code === next.code &&
    before.role === next.role &&
    before.side === next.side &&
    before.corner === next.corner &&
    codeBelow(before) === codeBelow(next)
  );
}

const sameInto = (one: WorkedStitch, other: WorkedStitch): boolean =>
  one.into.kind === 'place' && placeOf(one.into) === placeOf(other.into);
