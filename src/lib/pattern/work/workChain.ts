import { abbreviationOf } from '../../stitches/ownStitch';
import type { Stitch } from '../../stitches/stitch';
import { BASIC_STITCHES, knownStitch, stitch } from '../../stitches/stitchTable';
import type { ChainStep, StandsFor, Step, StitchStep } from '../syntax';
import { baseOf } from './family';
import { indexOf, type Hand } from './hand';
import { intoOf, tell, type Ahead } from './run';
import { beginAfterTravel } from './workStitch';

/** Chains: at the beginning of a round they stand for a stitch or reach its height, elsewhere they are a space. */
export function workChain(hand: Hand, step: ChainStep, ahead: Ahead): boolean {
  const isBeginning = !hand.begun && hand.inPlace === null;
  if (!isBeginning && step.standsFor === null) {
    hand.begun = true;
    for (let i = 0; i < step.amount.value; i += 1) hand.chain('space', { kind: 'none' }, step);
    return true;
  }
  beginAfterTravel(hand);
  const cluster = beginningCluster(ahead);
  if (cluster) return leadCluster(hand, step, cluster);
  const standsFor = step.standsFor ?? ruled(hand, step) ?? inferred(hand, step, ahead);
  if (standsFor === 'space') {
    for (let i = 0; i < step.amount.value; i += 1) hand.chain('space', { kind: 'none' }, step);
    return true;
  }
  if (standsFor.code === null) {
    for (let i = 0; i < step.amount.value; i += 1) hand.chain('turning', { kind: 'none' }, step);
    return true;
  }
  standingStitch(hand, step, standsFor.code, standsFor.chains);
  return true;
}

/**
 * "ch 3, dc2tog" in a round of dc3tog is one of them: the chain is its first leg. The code of the whole
 * cluster, or null.
 */
function beginningCluster({ steps, next }: Ahead): string | null {
  const then = steps[next];
  const first = then?.kind === 'group' ? then.parts[0] : then;
  if (first?.kind !== 'stitch') return null;
  const [, base, legs] = /^(hdc|dc|tr|dtr)(\d+)(?:tog|cl)$/.exec(first.code) ?? [];
  if (!base) return null;
  const whole = [`${base}${Number(legs) + 1}cl`, `${base}${Number(legs) + 1}tog`];
  return stitchesOf(steps).find(({ code }) => whole.includes(code))?.code ?? null;
}

function leadCluster(hand: Hand, step: ChainStep, code: string): boolean {
  if (!hand.isRing) hand.stand();
  hand.begun = true;
  const into = hand.isRing ? intoOf(hand, 'ring') : intoOf(hand, hand.here);
  const from = hand.stitches.length;
  for (let i = 0; i < step.amount.value; i += 1) hand.chain('standing', into, step);
  hand.lead = { code, from };
  return true;
}

const ruled = (hand: Hand, { amount }: ChainStep): StandsFor | null =>
  hand.budget.chainRules.find(({ chains }) => chains === amount.value)?.standsFor ?? null;

/** The chain is made in the place where the hook stands, and that place is then worked. */
function standingStitch(hand: Hand, step: ChainStep, code: string, spaceChains: number): void {
  if (hand.isRing && hand.below.kind === 'nothing')
    tell(hand, 'no-ring', step, 'There is no ring to work into yet.');
  if (!hand.isRing) hand.stand();
  hand.worked += 1;
  const into = hand.isRing ? intoOf(hand, 'ring') : intoOf(hand, hand.here);
  const chains = Math.max(0, step.amount.value - spaceChains);
  tellHeight(hand, step, code, chains, spaceChains);
  hand.closeSpace();
  const place = hand.addPlace({
    kind: 'stitch',
    code,
    chains: 0,
    into: indexOf(into),
  });
  for (let i = 0; i < chains; i += 1) {
    hand.chain('standing', into, step);
    const made = hand.stitches.at(-1);
    if (made) made.place = place;
  }
  for (let i = 0; i < spaceChains; i += 1) hand.chain('space', { kind: 'none' }, step);
}

/** A turning chain is as tall as its stitch: published, 1 for sc to 6 for trtr. */
function tellHeight(
  hand: Hand,
  step: ChainStep,
  code: string,
  chains: number,
  spaceChains: number,
): void {
  const base = stitch(baseOf(code));
  // How tall a stitch of one's own stands is guessed from its moves: a chain more or less may be right.
  const leeway = abbreviationOf(code) === code ? 0 : 1;
  if (!base || base.turningChains === 0 || Math.abs(base.turningChains - chains) <= leeway) return;
  tellTerms(hand, step, base, chains);
  const right = base.turningChains + spaceChains;
  const short = chains < base.turningChains;
  hand.budget.report.say(
    'warning',
    'turning-chain',
    step,
    `A chain of ${chains} is too ${short ? 'short' : 'tall'} for the ${abbreviationOf(code)} it stands for, which is ${base.turningChains} chains tall.`,
    { label: `Write ${right}`, ...step.amountSpan, replacement: amountText(step, right) },
  );
}

/** The chain is right for the stitch that the same word means in the other terms. */
function tellTerms(hand: Hand, step: ChainStep, { code, ukCode }: Stitch, chains: number): void {
  const { terms } = hand.budget;
  const word = terms === 'us' ? code : ukCode;
  const other = BASIC_STITCHES.find((each) => (terms === 'us' ? each.ukCode : each.code) === word);
  if (hand.budget.toldTerms || other?.turningChains !== chains) return;
  hand.budget.toldTerms = true;
  const [here, there] = terms === 'us' ? ['US', 'UK'] : ['UK', 'US'];
  const message = `A chain of ${chains} is right for a ${word} in ${there} terms, not in ${here} terms: is the pattern written in ${there} terms?`;
  hand.budget.report.say('warning', 'terms-doubtful', step, message);
}

/** "ch" with no number after it needs one. */
const amountText = (step: ChainStep, right: number): string =>
  step.amountSpan.begin === step.begin && step.amount.value === 1 ? `ch ${right}` : String(right);

/**
 * What a chain at the beginning stands for where the pattern does not say: published practice is that 1
 * never counts, 3 and more do; 2 does for a hdc, unless the first hdc goes into the same stitch.
 * Longer than the first stitch is tall, it is that stitch and a space. Before sc it is a loop.
 */
function inferred(hand: Hand, step: ChainStep, ahead: Ahead): StandsFor | 'space' {
  const chains = step.amount.value;
  const first = firstStitch(ahead.steps, ahead.next);
  const base = first ? baseOf(first.code) : null;
  const tall = base === null ? 0 : (stitch(base)?.turningChains ?? 0);
  const skipsFirst = ahead.inRepeat || ahead.steps[ahead.next]?.kind === 'skip';
  if (tall <= 1)
    return skipsFirst || (chains > 1 && !hand.isRing && base !== null) ? 'space' : NO_STITCH;
  const sameStitch = first?.where[0]?.kind === 'same' && first.amount.value === 1 && !hand.isRing;
  if (chains === 1) return NO_STITCH;
  if (chains === 2) return base === 'hdc' && !sameStitch ? { code: 'hdc', chains: 0 } : NO_STITCH;
  const code = standingCode(ahead.steps, base ?? 'dc', chains);
  const over = chains - knownStitch(code).turningChains;
  return { code, chains: Math.max(0, over) };
}

const NO_STITCH: StandsFor = { code: null, chains: 0 };

/** The first stitch, unless it is lower than the chain and another of the round is just as tall. */
function standingCode(steps: readonly Step[], first: string, chains: number): string {
  const { turningChains } = knownStitch(first);
  if (turningChains >= chains) return first;
  const asTall = stitchesOf(steps).find(
    ({ code }) => stitch(baseOf(code))?.turningChains === chains,
  );
  return asTall ? baseOf(asTall.code) : first;
}

function firstStitch(steps: readonly Step[], from: number): StitchStep | null {
  return stitchesOf(steps.slice(from)).find(({ code }) => code !== 'sl st') ?? null;
}

function stitchesOf(steps: readonly Step[]): StitchStep[] {
  return steps.flatMap((step): StitchStep[] => {
    if (step.kind === 'stitch') return [step];
    return step.kind === 'group' || step.kind === 'repeat' ? stitchesOf(step.parts) : [];
  });
}
