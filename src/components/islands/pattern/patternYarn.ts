import type { Gauge } from '../../../lib/gauge/gauge';
import { expectedM, learnHand } from '../../../lib/hand/hand';
import { useOfStitches } from '../../../lib/hand/yarnUse';
import type { Reading } from '../../../lib/pattern/reading';
import { addCounts } from '../../../lib/stitches/counts';
import type { StitchCounts } from '../../../lib/stitches/stitch';

export interface YarnTaken {
  loops: number;
  lengthM: number;
}

export interface YarnOfColour {
  colour: string;
  taken: YarnTaken;
}

export interface PatternYarn {
  /** Of each round, and of each yarn in it where it is worked in several; the ring is in the first. */
  rounds: (YarnTaken & { byColour: YarnOfColour[] })[];
  /** Of each yarn that the pattern names, where it names more than one. */
  byColour: YarnOfColour[];
}

/** Loops that a pattern lays, and the yarn they take in a hand of this gauge. */
export function patternYarn({ ring, rounds }: Reading, gauge: Gauge): PatternYarn {
  const codes = new Set([ring, ...rounds].flatMap(({ made }) => Object.keys(made)));
  const hand = learnHand(gauge.stitchWidthMm, [...codes], []);
  const taken = (...counted: StitchCounts[]): YarnTaken => {
    const use = useOfStitches(counted.reduce(addCounts, {}));
    return {
      loops: [...use.loops.values()].reduce((sum, count) => sum + count, 0),
      lengthM: expectedM(hand, use),
    };
  };

  const first = rounds.flatMap(({ colours }) => colours)[0] ?? '';
  const madeByRound = rounds.map(({ stitches }, i) =>
    byColourOf(stitches, first, i === 0 ? ring.made : {}),
  );
  const inAll = new Map<string, StitchCounts>();
  for (const [colour, made] of madeByRound.flatMap((each) => [...each]))
    inAll.set(colour, addCounts(inAll.get(colour) ?? {}, made));
  const yarnOf = (counted: ReadonlyMap<string, StitchCounts>): YarnOfColour[] =>
    counted.size > 1 ? [...counted].map(([colour, made]) => ({ colour, taken: taken(made) })) : [];
  return {
    rounds: rounds.map(({ made }, i) => ({
      ...taken(made, i === 0 ? ring.made : {}),
      byColour: yarnOf(madeByRound[i] ?? new Map()),
    })),
    byColour: yarnOf(inAll),
  };
}

/** Stitches of a round by the yarn they are made with; those of no named yarn are of the first. */
function byColourOf(
  stitches: Reading['rounds'][number]['stitches'],
  first: string,
  before: StitchCounts,
): Map<string, StitchCounts> {
  const counted = new Map<string, Record<string, number>>();
  if (Object.keys(before).length > 0) counted.set(first, { ...before });
  for (const { colour, code } of stitches) {
    const key = colour ?? first;
    const made = counted.get(key) ?? {};
    made[code] = (made[code] ?? 0) + 1;
    counted.set(key, made);
  }
  return counted;
}
