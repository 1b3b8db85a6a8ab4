import { abbreviationOf } from '../../stitches/ownStitch';
import type { Report } from '../report';
import type { Span } from '../span';
import type { WorkedRound } from '../reading';
import type { CountEntry, CountNote, RoundText } from '../syntax';
import { familyOf } from './family';
import type { Hand } from './hand';
import { counted } from './words';

/** Places at the end of the round below that nothing was worked into and nothing usually passes over. */
export function checkUnworked(hand: Hand, text: RoundText, report: Report): void {
  if (hand.isRing || hand.explained || hand.budget.spent || hand.worked === 0) return;
  let stitches = 0;
  const spaces = new Map<string, number>();
  for (let position = hand.next; position < hand.size; position += 1) {
    const place = hand.placeAt(position);
    if (place?.kind === 'space') spaces.set(place.code, (spaces.get(place.code) ?? 0) + 1);
    else stitches += 1;
  }
  const spaceCount = [...spaces.values()].reduce((sum, count) => sum + count, 0);
  if (stitches <= hand.passedStitches && spaceCount <= hand.passedSpaces) return;
  const left = [
    ...(stitches > 0 ? [counted(stitches, 'st')] : []),
    ...[...spaces].map(([code, count]) => counted(count, `${code} sp`)),
  ].join(' and ');
  const last = hand.stitches.findLast(({ role }) => role !== 'join')?.span ?? text.header;
  const message = `This round leaves ${left} of the round below unworked at its end.`;
  report.say('error', 'unworked', last, message);
}

/** A round that begins with a chain and is not joined stays open. */
export function checkClosed(
  hand: Hand,
  text: RoundText,
  othersJoined: boolean,
  report: Report,
): void {
  if (text.kind === 'row' || hand.joined || hand.budget.spent || hand.stitches.length === 0) return;
  const begins = hand.stitches.some(
    // A chain of 1 may begin a spiral, which is never joined.
    ({ role }) => role === 'standing' || (role === 'turning' && othersJoined),
  );
  if (!begins) return;
  const last = (hand.stitches.at(-1) as { span: Span }).span;
  report.say(
    'warning',
    'round-open',
    text.header,
    'The round begins with a chain but does not close: a join is missing.',
    {
      label: 'Join with a slip stitch',
      begin: last.end,
      end: last.end,
      replacement: '; join with sl st in first st',
    },
  );
}

/** What the bracketed count claims, against what the text makes. */
export function checkNote(
  round: WorkedRound,
  note: CountNote,
  index: number,
  report: Report,
): void {
  for (const entry of note.entries) {
    const claimed = entry.byRound?.[index] ?? entry.amount.value;
    const made = madeOf(round, entry);
    if (made.values.includes(claimed)) continue;
    const right = made.values[0] ?? 0;
    const message = `${round.label}: the note says ${claimed} ${made.noun}, the text makes ${right}.`;
    const plain = entry.byRound === null && entry.amount.sizes === null;
    report.say(
      'error',
      'count-note',
      entry,
      message,
      plain
        ? {
            label: `Write ${right}`,
            begin: entry.amountSpan.begin,
            end: entry.amountSpan.end,
            replacement: String(right),
          }
        : undefined,
    );
  }
}

/** The counts that may be meant, the likeliest first: patterns count chains as stitches or do not. */
function madeOf(
  round: WorkedRound,
  { of, perSide }: CountEntry,
): { values: number[]; noun: string } {
  const sides = Math.max(1, round.sideCounts.length);
  const places = perSide ? round.places.filter(({ corner }) => corner === null) : round.places;
  const share = (count: number): number => (perSide ? count / sides : count);
  if (of.kind === 'space') {
    const spaces = places.filter(
      ({ chains }) => chains > 0 && (of.chains === null || chains === of.chains),
    );
    return {
      values: [share(spaces.length)],
      noun: of.chains === null ? 'ch-sps' : `ch-${of.chains} sps`,
    };
  }
  const stitches = places.filter(({ kind }) => kind === 'stitch');
  if (of.kind === 'all') {
    const chains = places.reduce((sum, place) => sum + place.chains, 0);
    const values = [stitches.length, stitches.length + chains, places.length].map(share);
    return {
      values: perSide ? [...values, round.perSide] : values,
      noun: perSide ? 'sts on each side' : 'sts',
    };
  }
  if (of.code === 'ch') {
    return { values: [round.stitches.filter(({ role }) => role === 'space').length], noun: 'ch' };
  }
  const picots = round.stitches.filter(({ code, role }) => role === 'picot' && code === of.code);
  const same = stitches.filter(({ code }) => code === of.code);
  const family = stitches.filter(({ code }) => familyOf(code) === familyOf(of.code));
  const clusters = family.length === 0 ? groupsCalledClusters(round, of.code) : [];
  const values = [...clusters, same.length + picots.length, family.length].map(share);
  const noun = abbreviationOf(of.code);
  return { values, noun: perSide ? `${noun} on each side` : noun };
}

/** Where nothing is drawn together, "3-dc clusters" are groups of 3 dc: how many stand apart from one another. */
function groupsCalledClusters(round: WorkedRound, code: string): number[] {
  const [, base, legs] = /^([a-z]+)(\d+)cl$/.exec(code) ?? [];
  if (!base) return [];
  const into = new Map(round.stitches.map((each) => [each.place, JSON.stringify(each.into)]));
  let groups = 0;
  let length = 0;
  const end = (): void => {
    if (length === Number(legs)) groups += 1;
    length = 0;
  };
  round.places.forEach((place, i) => {
    if (place.kind === 'space' || into.get(i) !== into.get(i - 1)) end();
    if (place.code === base) length += 1;
  });
  end();
  return groups > 0 ? [groups] : [];
}
