import type { Into } from '../reading';
import type { Span } from '../span';
import type { Step } from '../syntax';
import { workAttach, workColour } from './attach';
import { workChain } from './workChain';
import type { Hand } from './hand';
import { workGroup } from './workGroup';
import { workJoin } from './workJoin';
import { workRepeat } from './workRepeat';
import { workSkip } from './workSkip';
import { workStitch } from './workStitch';

/** What is still to come in the round, for a beginning chain that does not say what it stands for. */
export interface Ahead {
  readonly steps: readonly Step[];
  readonly next: number;
  readonly inRepeat: boolean;
}

/** Works steps one after another; false when a place was not found while a repeat tries. */
export function run(
  hand: Hand,
  steps: readonly Step[],
  inRepeat: boolean,
  upTo = steps.length,
): boolean {
  for (let i = 0; i < upTo; i += 1) {
    const step = steps[i] as Step;
    if (hand.budget.spent || !hand.budget.step(step)) return true;
    if (!workStep(hand, step, { steps, next: i + 1, inRepeat })) return false;
  }
  return true;
}

function workStep(hand: Hand, step: Step, ahead: Ahead): boolean {
  switch (step.kind) {
    case 'stitch':
      return workStitch(hand, step);
    case 'chain':
      return workChain(hand, step, ahead);
    case 'skip':
      return workSkip(hand, step);
    case 'group':
      return workGroup(hand, step);
    case 'repeat':
      return workRepeat(hand, step);
    case 'join':
      return workJoin(hand, step);
    case 'attach':
      return workAttach(hand, step);
    case 'colour':
      return workColour(hand, step);
    case 'turn':
      hand.turned = true;
      return true;
    case 'magic-ring':
    case 'fasten-off':
      return true;
  }
}

/** What a stitch at a position hangs on. */
export const intoOf = (hand: Hand, position: number | 'ring'): Into =>
  position === 'ring'
    ? { kind: 'ring' }
    : {
        kind: 'place',
        index: hand.indexAt(position),
        ...(!Number.isInteger(position) && { gap: true }),
      };

/** Says a problem of the work, unless a repeat is only trying. */
export function tell(
  hand: Hand,
  code: 'no-such-place' | 'unworked' | 'no-ring',
  span: Span,
  message: string,
): void {
  if (hand.attempts > 0 || (code === 'no-ring' && hand.budget.toldNoRing)) return;
  if (code === 'no-ring') hand.budget.toldNoRing = true;
  hand.budget.report.say('error', code, span, message);
}
