import { PATTERN_LIMITS } from '../limits';
import type { Report } from '../report';
import type { CountNote, PatternText, RoundText, Step } from '../syntax';

/** One round to work: a line that stands for several is planned once for each. */
export interface PlannedRound {
  readonly text: RoundText;
  readonly number: number;
  readonly steps: readonly Step[];
  /** Whether it is worked back the way the last one came. */
  readonly turnsFirst: boolean;
  readonly note: CountNote | null;
}

/** All rounds in order, those that repeat others written out, turns and chains carried over to where they belong. */
export function plannedRounds(
  pattern: PatternText,
  firstSteps: readonly Step[],
  report: Report,
): PlannedRound[] {
  const byNumber = new Map<number, readonly Step[]>();
  const planned: PlannedRound[] = [];
  let carried: readonly Step[] = [];
  let turns = false;
  for (const [i, text] of pattern.rounds.entries()) {
    for (let number = text.from; number <= Math.max(text.from, text.to); number += 1) {
      const own = i === 0 && number === text.from ? firstSteps : text.steps;
      const steps = stepsOf(text, number, own, byNumber, report);
      if (planned.length >= PATTERN_LIMITS.rounds) {
        tellTooMany(text, report);
        return planned;
      }
      byNumber.set(number, steps);
      const { worked, later, turnsAfter } = split(steps);
      const opening = worked.findIndex(({ kind }) => kind !== 'turn' && kind !== 'colour');
      const turnsFirst =
        turns || worked.slice(0, Math.max(0, opening)).some(({ kind }) => kind === 'turn');
      planned.push({ text, number, steps: [...carried, ...worked], turnsFirst, note: text.note });
      carried = later;
      turns = turnsAfter;
    }
  }
  return planned;
}

function tellTooMany(text: RoundText, report: Report): void {
  const message = `A pattern may have ${PATTERN_LIMITS.rounds} rounds; the rest is not worked.`;
  report.say('error', 'limit', text.header, message);
}

/** The steps of the rounds that a line repeats, one after another, and then its own. */
function stepsOf(
  text: RoundText,
  number: number,
  own: readonly Step[],
  byNumber: ReadonlyMap<number, readonly Step[]>,
  report: Report,
): readonly Step[] {
  if (!text.again) return own;
  const { from, to } = text.again;
  const cycle = Math.max(1, to - from + 1);
  const source = from + ((number - text.from) % cycle);
  const steps = byNumber.get(source);
  if (!steps || source >= number) {
    const message = `There is no round ${source} before this one to work again.`;
    report.say('error', 'repeated-round', text.again, message);
    return own;
  }
  return [...steps, ...own];
}

/**
 * What comes after the join belongs to the next round: slip stitches to where it begins, or its turning
 * chain. So does the chain before the turn at the end of a row: "ch 1, turn".
 */
function split(steps: readonly Step[]): { worked: Step[]; later: Step[]; turnsAfter: boolean } {
  const join = steps.findIndex((step) => step.kind === 'join' && step.to !== 'ring');
  const end = join < 0 ? endOfRow(steps) : join + 1;
  const rest = steps.slice(end);
  return {
    worked: steps.slice(0, end),
    later: rest.filter(
      ({ kind }) => kind === 'stitch' || kind === 'chain' || kind === 'attach' || kind === 'colour',
    ),
    turnsAfter: rest.some(({ kind }) => kind === 'turn'),
  };
}

function endOfRow(steps: readonly Step[]): number {
  let end = steps.length;
  while (end > 0 && (steps[end - 1]?.kind === 'fasten-off' || steps[end - 1]?.kind === 'colour'))
    end -= 1;
  if (steps[end - 1]?.kind !== 'turn') return steps.length;
  return steps[end - 2]?.kind === 'chain' ? end - 2 : end - 1;
}
