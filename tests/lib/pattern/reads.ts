import { expect } from 'vitest';
import { convertTerms, printPattern, readPattern } from '../../../src/lib';
import type { ReadOptions, Reading, WorkedRound } from '../../../src/lib';
import { modelOf } from '../../support/patternModel';

export type Options = Partial<ReadOptions>;

export const read = (text: string, options: Options = {}): Reading =>
  readPattern(text, { terms: 'us', sides: 0, ...options });

/** Rounds to begin with: 12 sc; 12 dc, the first of which is a chain; a square of four groups of 3 dc. */
export const SC12 =
  'Rnd 1: Ch 1, 12 sc in magic ring; join with sl st in first sc. (12 sc)\nRnd 2: ';
export const DC12 =
  'Rnd 1: Ch 3 (counts as dc), 11 dc in magic ring; join with sl st in top of beg ch-3. (12 dc)\nRnd 2: ';
export const SQUARE =
  'Ch 4, join with sl st to form ring.\nRnd 1: Ch 3 (counts as dc), 2 dc in ring, ch 2, ' +
  '*3 dc in ring, ch 2; rep from * 2 more times; join with sl st in top of beg ch-3. (12 dc, 4 ch-2 sps)\nRnd 2: ';

/** What a round counts: "12 dc + 4 ch-2". */
export const counts = ({ tally, spaces }: WorkedRound): string =>
  Object.entries({ ...tally, ...spaces })
    .map(([code, count]) => `${count} ${code}`)
    .sort()
    .join(' + ');

export const messages = ({ diagnostics }: Reading): string[] =>
  diagnostics.map(({ severity, code, message }) => `${severity} ${code}: ${message}`);

/** Reads the text with nothing to say about it, the last rounds counting this; printed, it is the same pattern. */
export function expectReads(text: string, rounds: string | string[], options: Options = {}): void {
  const reading = read(text, options);
  const wanted = [rounds].flat().map((each) => each.split(' + ').sort().join(' + '));
  expect(messages(reading)).toEqual([]);
  expect(reading.rounds.slice(-wanted.length).map(counts)).toEqual(wanted);
  const model = modelOf(reading.pattern);
  for (const terms of ['us', 'uk'] as const) {
    for (const fullWords of [false, true]) {
      const printed = printPattern(reading.pattern, { terms, fullWords }).lines.join('\n');
      expect({ printed, model: modelOf(read(printed, { ...options, terms }).pattern) }).toEqual({
        ...{ printed, model },
      });
    }
  }
  const other = reading.terms === 'us' ? 'uk' : 'us';
  const there = convertTerms(text, reading.terms, other);
  expect(modelOf(read(there, { ...options, terms: other }).pattern)).toEqual(model);
}
