import { expectedM } from '../hand/hand';
import { addUse, NO_YARN, useOfStitches } from '../hand/yarnUse';
import { blanketOf } from '../ledger/blanketOf';
import { estimate } from '../ledger/estimate';
import { handOf } from '../ledger/handOf';
import { piecesOf } from '../ledger/pieces';
import { TAIL_KEPT, TAIL_M } from '../ledger/tails';
import type { Plan, PlanEvidence } from '../plan/plan';
import { normalTail } from '../stats/normal';
import type { StitchCounts } from '../stitches/stitch';
import { massG } from '../units/quantities';
import type { WorkedInColour } from './workedSoFar';

/** What was left of a colour when it was weighed; with nothing made yet, what was begun with. */
export interface LeftWeighed {
  readonly colour: string;
  readonly leftG: number;
  readonly resolutionG: number;
  /** Worked in the colour by then, and tails left hanging. */
  readonly made: StitchCounts;
  readonly tails: number;
}

export interface ColourProgress {
  readonly colour: string;
  /** Worked into the blanket so far. */
  readonly usedM: number;
  /** Still to come, joins and border included. */
  readonly toGoM: number;
  /** In hand: as weighed last, less what was worked since; or what was to be bought, less all that was. */
  readonly leftM: number;
  /** Chance that what is left does not suffice. */
  readonly probabilityShort: number;
}

/** Colours this likely to run short are warned of while there is time (ours). */
export const WARN_FROM = 0.1;

/** Relative standard deviation of what is to come when nothing at all is known: keeps the chance finite. */
const LEAST_SPREAD = 0.01;

/** The plan with what was weighed on the way as evidence of the maker's hand, like any other. */
export function withWeighedYarn(plan: Plan, weighed: readonly LeftWeighed[]): Plan {
  const begun = begunWith(weighed);
  const evidence = weighed.flatMap((each): PlanEvidence[] => {
    const startG = begun.get(each.colour);
    const usedG = (startG ?? 0) - each.leftG;
    if (startG === undefined || isBeginning(each) || usedG <= 0) return [];
    return [
      {
        piece: 'counted',
        label: `${each.colour} so far`,
        made: each.made,
        // Off the skein go whole tails, not what is kept of them once woven in.
        tails: each.tails / TAIL_KEPT,
        // Two weighings: each to its own step.
        reading: {
          by: 'weighing',
          massG: massG(usedG),
          resolutionG: massG(Math.SQRT2 * each.resolutionG),
        },
      },
    ];
  });
  return { ...plan, evidence: [...plan.evidence, ...evidence] };
}

const isBeginning = ({ made, tails }: LeftWeighed): boolean =>
  tails === 0 && Object.values(made).every((count) => count === 0);

function begunWith(weighed: readonly LeftWeighed[]): Map<string, number> {
  return new Map(weighed.filter(isBeginning).map(({ colour, leftG }) => [colour, leftG]));
}

/**
 * Every colour of a blanket in the making: used, to go, left, and the chance of running short.
 * `weighed` in the order of time; `worked` as `workedSoFar` has it.
 */
export function makingYarn(
  plan: Plan,
  worked: ReadonlyMap<string, WorkedInColour>,
  weighed: readonly LeftWeighed[],
): ColourProgress[] {
  const known = withWeighedYarn(plan, weighed);
  const blanket = blanketOf(known);
  const hand = handOf(blanket, piecesOf(blanket));
  const planned = new Map(estimate(plan).colours.map((each) => [each.colour, each]));
  const { massG: skeinG, lengthM: skeinM } = plan.yarn.putUp;
  const begun = begunWith(weighed);
  return estimate(known).colours.map(({ colour, meanM, sdM }) => {
    const usedM = expectedM(hand, worked.get(colour)?.use ?? NO_YARN);
    const toGoM = Math.max(0, meanM - usedM);
    const last = weighed.findLast((each) => each.colour === colour);
    const usedThenM = last
      ? expectedM(hand, addUse(useOfStitches(last.made), { ...NO_YARN, cutM: last.tails * TAIL_M }))
      : 0;
    const startG = begun.get(colour) ?? (planned.get(colour)?.skeins ?? 0) * skeinG;
    const inHandM = ((last?.leftG ?? startG) * skeinM) / skeinG;
    const leftM = Math.max(0, inHandM - Math.max(0, usedM - usedThenM));
    const share = meanM > 0 ? toGoM / meanM : 0;
    const spreadM = Math.max(sdM * share, LEAST_SPREAD * toGoM, 1e-9);
    return {
      colour,
      usedM,
      toGoM,
      leftM,
      probabilityShort: toGoM > 0 ? normalTail((leftM - toGoM) / spreadM) : 0,
    };
  });
}
