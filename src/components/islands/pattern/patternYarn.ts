import type { Gauge } from '../../../lib/gauge/gauge';
import { expectedM, learnHand } from '../../../lib/hand/hand';
import type { Reading } from '../../../lib/pattern/reading';
import { addCounts } from '../../../lib/stitches/counts';
import { loopsOf } from '../../../lib/stitches/loops';
import type { StitchCounts } from '../../../lib/stitches/stitch';
import { stitch } from '../../../lib/stitches/stitchTable';

export interface YarnTaken {
  loops: number;
  lengthM: number;
}

export interface PatternYarn {
  /** Of each round; the ring is in the first. */
  rounds: YarnTaken[];
  /** Of each yarn that the pattern names, where it names more than one. */
  byColour: { colour: string; taken: YarnTaken }[];
}

/** Loops that a pattern lays, and the yarn they take in a hand of this gauge. */
export function patternYarn({ ring, rounds }: Reading, gauge: Gauge): PatternYarn {
  const codes = new Set([ring, ...rounds].flatMap(({ made }) => Object.keys(made)));
  const hand = learnHand(gauge.stitchWidthMm, [...codes], []);
  const taken = (...counted: StitchCounts[]): YarnTaken => {
    const loops = new Map<string, number>();
    for (const [code, count] of Object.entries(counted.reduce(addCounts, {}))) {
      const each = stitch(code);
      if (each) loops.set(code, count * loopsOf(each));
    }
    return {
      loops: [...loops.values()].reduce((sum, count) => sum + count, 0),
      lengthM: expectedM(hand, { loops, seamM: 0, cutM: 0 }),
    };
  };

  const first = rounds.flatMap(({ colours }) => colours)[0] ?? '';
  const byColour = new Map<string, Record<string, number>>([[first, { ...ring.made }]]);
  for (const { colour, code } of rounds.flatMap(({ stitches }) => stitches)) {
    const key = colour ?? first;
    const made = byColour.get(key) ?? {};
    made[code] = (made[code] ?? 0) + 1;
    byColour.set(key, made);
  }
  return {
    rounds: rounds.map(({ made }, i) => taken(made, i === 0 ? ring.made : {})),
    byColour:
      byColour.size > 1
        ? [...byColour].map(([colour, made]) => ({ colour, taken: taken(made) }))
        : [],
  };
}
