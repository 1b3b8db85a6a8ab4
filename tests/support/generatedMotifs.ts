import { knownStitch } from '../../src/lib/stitches/stitchTable';
import type { MotifSides } from '../../src/lib';

/** A motif drawn up from numbers, so that its counts are known before it is written. */
export interface MotifPlan {
  sides: Exclude<MotifSides, 0>;
  stitch: 'sc' | 'hdc' | 'dc' | 'tr';
  /** Stitches of one side in the first round, and each side's gain at one corner in every further one. */
  firstSide: number;
  gain: number;
  cornerChains: number;
  rounds: number;
  /** How it is written. */
  terms: 'us' | 'uk';
  star: boolean;
  counted: boolean;
}

export interface GeneratedMotif {
  text: string;
  rounds: {
    made: Record<string, number>;
    tally: Record<string, number>;
    spaces: Record<string, number>;
    perSide: number;
  }[];
}

/**
 * Rounds of one stitch in every stitch, with `gain` on each side of every corner space. Counts:
 * n = sides × (first + 2 gain (k - 1)) in round k, of which the first is a chain, but for sc.
 */
export function generatedMotif(plan: MotifPlan): GeneratedMotif {
  const { sides, stitch, firstSide, gain, cornerChains, rounds, terms } = plan;
  const { turningChains, code, ukCode } = knownStitch(stitch);
  const st = terms === 'us' ? code : ukCode;
  const sl = terms === 'us' ? 'sl st' : 'ss';
  const counts = stitch !== 'sc';
  const lines = [`Ch 5, join with ${sl} to form ring.`];
  const expected: GeneratedMotif['rounds'] = [];
  for (let k = 1; k <= rounds; k += 1) {
    const side = firstSide + 2 * gain * (k - 1);
    const stitches = sides * side;
    const note = `(${stitches} ${st}, ${sides} ch-${cornerChains} sps)`;
    const start = counts ? `Ch ${turningChains} (counts as ${st})` : 'Ch 1';
    const join = `join with ${sl} in first st.`;
    lines.push(
      `Rnd ${k}: ${[start, ...(k === 1 ? firstRound(plan, st) : furtherRound(plan, st, k))].join(', ')}; ${join} ${note}`,
    );
    expected.push({
      made: {
        ch: turningChains + sides * cornerChains,
        [stitch]: stitches - (counts ? 1 : 0),
        'sl st': 1,
      },
      tally: { [stitch]: stitches },
      spaces: { [`ch-${cornerChains}`]: sides },
      perSide: side,
    });
  }
  return { text: lines.join('\n'), rounds: expected };
}

function firstRound(
  { sides, stitch, firstSide, cornerChains, star }: MotifPlan,
  st: string,
): string[] {
  const left = firstSide - (stitch === 'sc' ? 0 : 1);
  const opening = [...(left > 0 ? [`${left} ${st} in ring`] : []), `ch ${cornerChains}`];
  const again = `${firstSide} ${st} in ring, ch ${cornerChains}`;
  const times = sides - 1;
  return [
    ...opening,
    star && times > 1
      ? `*${again}; rep from * ${times - 1} more times`
      : `[${again}] ${times} times`,
  ];
}

/** The round begins where round 1 began: `before` stitches of its first side come before the corner. */
function furtherRound(plan: MotifPlan, st: string, k: number): string[] {
  const { sides, stitch, firstSide, gain, cornerChains, star, counted } = plan;
  const before = firstSide + gain * (k - 2);
  const after = gain * (k - 2);
  const side = before + after;
  const opening = stitch === 'sc' ? [`${st} in same st`] : [];
  const inEach = (count: number) =>
    count === 0
      ? []
      : counted
        ? [`${st} in each of next ${count} sts`]
        : [`${st} in each st to corner`];
  const group = `${gain} ${st}`;
  const corner = `(${group}, ch ${cornerChains}, ${group}) in ${counted ? `next ch-${cornerChains} sp` : 'corner sp'}`;
  const again = [corner, ...inEach(side)].join(', ');
  const times = sides - 1;
  return [
    ...opening,
    ...inEach(before - 1),
    star && times > 1
      ? `*${again}; rep from * ${times - 1} more times`
      : `[${again}] ${times} times`,
    corner,
    ...(after === 0
      ? []
      : counted
        ? [`${st} in each of last ${after} sts`]
        : [`${st} in each remaining st`]),
  ];
}
