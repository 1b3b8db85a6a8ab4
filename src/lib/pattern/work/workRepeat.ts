import type { RepeatStep, Until } from '../syntax';
import type { Hand } from './hand';
import { limitOf } from './resolve';
import { run } from './run';
import { counted } from './words';

/** Works a repeat so many times, or as long as the round below lasts. */
export function workRepeat(hand: Hand, step: RepeatStep): boolean {
  if (step.times.kind === 'until') return asLongAsItLasts(hand, step, step.times.until);
  const times = step.times.amount.value;
  for (let i = 0; i < times && !hand.budget.spent; i += 1) {
    const upTo = i === times - 1 ? (step.partsBeforeEnd ?? step.parts.length) : step.parts.length;
    if (!run(hand, step.parts, true, upTo)) return false;
  }
  return true;
}

function asLongAsItLasts(hand: Hand, step: RepeatStep, until: Until): boolean {
  if (hand.isRing || hand.inPlace !== null) return endless(hand, step);
  const outerLimit = hand.limit;
  hand.limit = Math.min(outerLimit, limitOf(hand, until, step));
  const done = untilNothingIsLeft(hand, step, until);
  hand.limit = outerLimit;
  return done;
}

function untilNothingIsLeft(hand: Hand, step: RepeatStep, until: Until): boolean {
  let each = 0;
  let atMark: ReturnType<Hand['snapshot']> | null = null;
  for (;;) {
    const before = hand.snapshot(step);
    const { result, mark } = attempt(hand, step);
    const moved =
      hand.at !== before.at || hand.worked > before.worked || hand.skipped > before.skipped;
    if (result === 'ended-at-mark' || hand.budget.spent) return true;
    if (result === 'done') {
      if (!moved) return endless(hand, step);
      each = hand.at - before.at;
      atMark = mark;
      continue;
    }
    hand.takeBack(before);
    if (!moved) {
      // The one before was the last, and so it ends at its "**".
      if (atMark) hand.takeBack(atMark);
      if (each === 0 && hand.attempts === 0) tellNothing(hand, step, until);
      return true;
    }
    if (hand.attempts > 0) return false;
    tellUneven(hand, step, each);
    return true;
  }
}

interface Attempt {
  readonly result: 'done' | 'failed' | 'ended-at-mark';
  /** The hand as it was at "**". */
  readonly mark: ReturnType<Hand['snapshot']> | null;
}

/** One time round; with "**", it ends there when what comes after does not fit. */
function attempt(hand: Hand, step: RepeatStep): Attempt {
  hand.attempts += 1;
  const done = run(hand, step.parts, true, step.partsBeforeEnd ?? step.parts.length);
  const mark = done && step.partsBeforeEnd !== null ? hand.snapshot(step) : null;
  let result: Attempt['result'] = done ? 'done' : 'failed';
  if (mark) {
    const after = step.parts.slice(step.partsBeforeEnd ?? 0);
    if (nothingLeft(hand) || !run(hand, after, true)) {
      hand.takeBack(mark);
      result = 'ended-at-mark';
    }
  }
  hand.attempts -= 1;
  return { result, mark };
}

const nothingLeft = (hand: Hand): boolean => hand.next >= hand.limit;

/** Says by how much the repeat does not come out even, and with how many stitches it would. */
function tellUneven(hand: Hand, step: RepeatStep, each: number): void {
  const left = hand.limit - hand.next;
  const leftStitches = counted(left, 'st');
  hand.explained = true;
  if (each === 0) {
    const message = `The repeat does not fit once: the round below has only ${leftStitches} for it.`;
    hand.budget.report.say('error', 'repeat-uneven', step, message);
    return;
  }
  const below = hand.size - left;
  const message =
    `The repeat does not come out even: it takes ${each} of the round below each time and leaves ${left} over. ` +
    `${below} or ${below + each} places instead of ${hand.size} would.`;
  hand.budget.report.say('error', 'repeat-uneven', step, message);
}

function tellNothing(hand: Hand, step: RepeatStep, until: Until): void {
  // "[…] to corner" may have nothing to do on the first, short side.
  if (until.to !== 'end' || until.word === 'to end') return;
  hand.explained = true;
  const message =
    'The repeat finds nothing to work into: the round below has none of its places left.';
  hand.budget.report.say('error', 'no-such-place', step, message);
}

function endless(hand: Hand, step: RepeatStep): boolean {
  const message =
    'This repeat uses up nothing of the round below and would never end: say how many times.';
  hand.budget.report.say('error', 'repeat-endless', step, message);
  hand.explained = true;
  return true;
}
