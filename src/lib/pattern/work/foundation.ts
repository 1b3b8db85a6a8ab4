import type { Place, WorkedRing } from '../reading';
import { spanFrom, type Span } from '../span';
import type { ChainStep, PatternText, Step, StitchStep, Where } from '../syntax';
import { baseOf } from './family';
import type { Budget } from './state';

/** What the first round is worked into, and the steps of the first round that are left to work. */
export interface Foundation {
  readonly ring: WorkedRing;
  readonly firstSteps: readonly Step[];
}

/**
 * Makes the ring, or the chain that is worked into. Part of it may stand in the first round itself:
 * "Rnd 1: Ch 2, 6 sc in 2nd ch from hook".
 */
export function foundationOf(pattern: PatternText, budget: Budget): Foundation {
  const first = pattern.rounds[0]?.steps ?? [];
  const before = pattern.foundation.filter(({ kind }) => kind !== 'colour' && kind !== 'attach');
  const taken = before.some(makesRing) ? 0 : stepsOfRing(first, before);
  const steps = [...before, ...first.slice(0, taken)];
  const rest = first.slice(taken);
  const span = steps.length > 0 ? spanFrom(steps[0] as Span, steps.at(-1) as Span) : null;
  const chains = steps.filter((step): step is ChainStep => step.kind === 'chain');
  const count = chains.reduce((sum, { amount }) => sum + amount.value, 0);
  const stitch = firstStitch(rest);
  const [where] = stitch?.where ?? [];

  if (steps.some(({ kind }) => kind === 'magic-ring') || magicIn(rest)) {
    // Chains before a magic ring are the beginning of the first round.
    return { ring: ringOf('magic-ring', 0, {}, span), firstSteps: [...chains, ...rest] };
  }
  const join = steps.find(({ kind }) => kind === 'join');
  if (join && count > 0) {
    return { ring: ringOf('chain-ring', count, { ch: count, 'sl st': 1 }, span), firstSteps: rest };
  }
  if (count > 0 && stitch && where?.kind === 'chain-from-hook') {
    return intoChain(count, where.nth, stitch, rest, chains, span);
  }
  if (count > 0 && where?.kind === 'ring' && stitch) {
    const message = 'The chain is not joined to a ring: "join with sl st to form ring" is missing.';
    budget.report.say('error', 'no-ring', chains[0] as Span, message);
    return { ring: ringOf('chain-ring', count, { ch: count }, span), firstSteps: rest };
  }
  if (count > 0) {
    const places = Array.from({ length: count }, chainPlace);
    return { ring: { ...ringOf('chain-row', 0, { ch: count }, span), places }, firstSteps: rest };
  }
  return { ring: ringOf('none', 0, {}, span), firstSteps: rest };
}

const makesRing = ({ kind }: Step): boolean => kind === 'magic-ring' || kind === 'join';

/** How many steps at the beginning of the first round make the ring. */
function stepsOfRing(first: readonly Step[], before: readonly Step[]): number {
  const [one, two] = first;
  if (one?.kind === 'magic-ring') return 1;
  const closed = two?.kind === 'join' && first.length > 2;
  if (one?.kind === 'chain' && (closed || (two?.kind === 'join' && two.to === 'ring'))) return 2;
  if (one?.kind === 'join' && before.length > 0 && first.length > 1) return 1;
  const intoChains = firstStitch(first.slice(0, 2))?.where[0]?.kind === 'chain-from-hook';
  return one?.kind === 'chain' && before.length === 0 && intoChains ? 1 : 0;
}

/** "Ch 4, 11 dc in 4th ch from hook": the farthest chain is the ring; with more chains they are a row. */
function intoChain(
  count: number,
  nth: number,
  stitch: StitchStep,
  rest: readonly Step[],
  chains: readonly ChainStep[],
  span: Span | null,
): Foundation {
  const skipped = Math.min(nth - 1, count - 1);
  const counts = skipped >= 2 && chains.at(-1)?.standsFor?.code !== null;
  const standsFor = chains.at(-1)?.standsFor ?? { code: baseOf(stitch.code), chains: 0 };
  const standing = counts ? [standingChain(chains[0] as ChainStep, skipped, standsFor)] : [];
  const made = { ch: count - (counts ? skipped : 0) };
  const isRow = count > nth;
  const ring = ringOf(isRow ? 'chain-row' : 'one-chain', 0, made, span);
  const places = isRow
    ? Array.from({ length: count - skipped + (counts ? 1 : 0) }, chainPlace)
    : [];
  return { ring: { ...ring, places }, firstSteps: [...standing, ...rest] };
}

const standingChain = (
  { begin, end, amountSpan }: ChainStep,
  chains: number,
  standsFor: ChainStep['standsFor'],
): ChainStep => ({
  kind: 'chain',
  begin,
  end,
  amountSpan,
  amount: { value: chains, sizes: null },
  standsFor,
});

const ringOf = (
  kind: WorkedRing['kind'],
  chains: number,
  made: WorkedRing['made'],
  span: Span | null,
): WorkedRing => ({ kind, chains, made, span, places: [] });

const chainPlace = (): Place => ({
  kind: 'stitch',
  code: 'ch',
  chains: 0,
  side: 0,
  corner: null,
  width: 1,
});

function firstStitch(steps: readonly Step[]): StitchStep | null {
  for (const step of steps) {
    if (step.kind === 'stitch') return step;
    const inside = step.kind === 'group' || step.kind === 'repeat' ? firstStitch(step.parts) : null;
    if (inside) return inside;
  }
  return null;
}

/** "6 sc in magic ring" makes the ring as it uses it. */
function magicIn(steps: readonly Step[]): boolean {
  const isMagic = (where: Where): boolean => where.kind === 'ring' && where.magic;
  return steps.some((step) => {
    if (step.kind === 'stitch') return step.where.some(isMagic);
    if (step.kind === 'group') return step.where.some(isMagic) || magicIn(step.parts);
    return step.kind === 'repeat' && magicIn(step.parts);
  });
}
