import type { Span } from '../span';
import type { PlaceFilter, Until, Where } from '../syntax';
import type { Hand } from './hand';
import { tell } from './run';
import { filterInWords } from './words';

export type Position = number | 'ring';

/** Positions that a place names, in order; null when a repeat tries and one is missing. */
export function positionsOf(
  hand: Hand,
  where: Where,
  span: Span,
  takes: number,
): Position[] | null {
  if (where.kind === 'ring' || hand.isRing) return inRing(hand, where, span);
  switch (where.kind) {
    case 'next':
      return nextOnes(hand, where.filter, where.amount.value * takes, span);
    case 'last':
      return lastOnes(hand, where.filter, where.amount.value, span);
    case 'each':
      return eachOne(hand, where.filter, where.until, span);
    case 'same':
      if (hand.at !== hand.here) hand.moveTo(hand.here);
      return [hand.at];
    case 'first':
      return firstOne(hand, where.filter, span);
    case 'any':
      return anyOne(hand, where.filter, span);
    case 'turning-chain':
      return turningChain(hand, span);
    case 'facing':
      return onlyLinks(hand, span);
    case 'chain-from-hook':
      return nextOnes(hand, { of: 'stitch', code: null, chains: null }, 1, span);
  }
}

function inRing(hand: Hand, where: Where, span: Span): Position[] {
  if (where.kind === 'ring' && hand.below.kind === 'places') {
    tell(
      hand,
      'no-such-place',
      span,
      'The ring is closed: this round is worked into the one below.',
    );
    return [hand.here];
  }
  const named =
    where.kind === 'next' || where.kind === 'last' || where.kind === 'each' || where.kind === 'any';
  if (named && hand.below.kind === 'ring') {
    const message = `There is no ${filterInWords(where.filter)} to work into yet: only the ring.`;
    tell(hand, 'no-such-place', span, message);
  }
  return ['ring'];
}

function nextOnes(hand: Hand, filter: PlaceFilter, count: number, span: Span): Position[] | null {
  const positions: Position[] = [];
  for (let i = 0; i < count; i += 1) {
    const position = nextOne(hand, filter, span);
    if (position < 0) return missing(hand, filter, count, i, span) ? positions : null;
    hand.moveTo(position);
    positions.push(position);
  }
  return positions;
}

/** The next place; a space where the round began may be come back to at its end. */
function nextOne(hand: Hand, filter: PlaceFilter, span: Span): number {
  const position = hand.find(filter, hand.at, span);
  if (position >= 0 || hand.attempts > 0 || hand.at >= hand.size) return position;
  const backToStart = filter.of !== 'stitch' && hand.at > 0 && hand.matches(filter, 0);
  return backToStart && hand.placeAt(0)?.kind === 'space' ? hand.size : -1;
}

/** Tells what is missing; false where a repeat only tries. */
function missing(
  hand: Hand,
  filter: PlaceFilter,
  wanted: number,
  found: number,
  span: Span,
): boolean {
  if (hand.attempts > 0) return false;
  const what = filterInWords(filter);
  const message =
    wanted > 1
      ? `This needs ${wanted} more ${filterInWords(filter, wanted)} of the round below, and there ${found === 1 ? 'is' : 'are'} ${found}.`
      : `There is no next ${what} to work into: the round below has no more of them.`;
  hand.budget.report.say('error', 'no-such-place', span, message);
  hand.explained = true;
  return true;
}

function lastOnes(hand: Hand, filter: PlaceFilter, count: number, span: Span): Position[] | null {
  let left = 0;
  let position = hand.find(filter, hand.at, span, hand.size);
  for (; position >= 0; position = hand.find(filter, position, span, hand.size)) left += 1;
  if (hand.budget.spent) return [];
  if (left > count) {
    const over = left - count;
    const message = `${over} ${filterInWords(filter, over)} stand before the last ${count}: they are left unworked.`;
    tell(hand, 'unworked', span, message);
    for (let i = 0; i < over; i += 1) {
      const position = hand.find(filter, hand.at, span);
      if (position >= 0) hand.at = position;
    }
  }
  return nextOnes(hand, filter, count, span);
}

function eachOne(hand: Hand, filter: PlaceFilter, until: Until, span: Span): Position[] | null {
  const limit = Math.min(hand.limit, limitOf(hand, until, span));
  const positions: Position[] = [];
  for (;;) {
    const position = hand.find(filter, hand.at, span, limit);
    if (position < 0) break;
    hand.moveTo(position);
    positions.push(position);
  }
  if (positions.length === 0 && until.to === 'end' && until.word !== 'to end') {
    if (hand.attempts > 0) return null;
    const message = `There is no ${filterInWords(filter)} left in the round below.`;
    hand.budget.report.say('error', 'no-such-place', span, message);
    hand.explained = true;
  }
  return positions;
}

/** The position at which "to corner", "to next ch-2 sp" or "to last 2 sts" stops. */
export function limitOf(hand: Hand, until: Until, span: Span): number {
  if (until.to === 'end') return hand.size;
  if (until.to === 'left') {
    let left = until.amount.value;
    let position = until.before === 'corner' ? cornerAfter(hand, span) : hand.size;
    while (position > hand.next && left > 0 && hand.budget.step(span)) {
      position -= 1;
      if (hand.placeAt(position)?.kind === 'stitch') left -= 1;
    }
    return position;
  }
  if (until.to === 'corner') return cornerAfter(hand, span);
  const position = hand.find(until.filter, hand.at, span, hand.size);
  return position < 0 ? hand.size : position;
}

function cornerAfter(hand: Hand, span: Span): number {
  const position = hand.find({ of: 'corner', code: null, chains: null }, hand.at, span, hand.size);
  return position < 0 ? hand.size : position;
}

function firstOne(hand: Hand, filter: PlaceFilter, span: Span): Position[] | null {
  if (hand.matches(filter, 0)) {
    hand.at = hand.at <= 0 ? hand.home : hand.size;
    hand.worked += 1;
    return [hand.home];
  }
  if (hand.at < 0) return nextOnes(hand, filter, 1, span);
  tell(hand, 'no-such-place', span, `The round does not begin in a ${filterInWords(filter)}.`);
  return [hand.home];
}

function anyOne(hand: Hand, filter: PlaceFilter, span: Span): Position[] | null {
  const position = hand.find(filter, -1, span);
  if (position < 0) {
    const message = `The round below has no ${filterInWords(filter)}.`;
    tell(hand, 'no-such-place', span, message);
    return [hand.here];
  }
  hand.beginAt(position);
  return [hand.home];
}

/** A group or a new yarn has no place in the motif beside this one: single stitches link to it. */
function onlyLinks(hand: Hand, span: Span): Position[] {
  const message = 'Only single stitches are worked into the motif beside this one.';
  // Also while a repeat tries: another time round it is no better.
  hand.budget.report.say('error', 'no-such-place', span, message);
  return [hand.here];
}

/** Top of the turning chain: the last place of a row, the first of a round. */
function turningChain(hand: Hand, span: Span): Position[] | null {
  const last = hand.size - 1;
  if (hand.at < last) return nextOnes(hand, { of: 'stitch', code: null, chains: null }, 1, span);
  return [hand.size];
}
