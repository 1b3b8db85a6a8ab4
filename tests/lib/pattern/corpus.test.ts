import { describe, expect, it } from 'vitest';
import { readPattern, type Reading } from '../../../src/lib';
import { corpus } from '../../support/patternCorpus';

const right = corpus('right');
const wrong = corpus('wrong');
const named = <Case extends { name: string }>(cases: Case[]) =>
  cases.map((each) => [each.name, each] as const);

const counts = (reading: Reading) =>
  reading.rounds.map(({ label, made, tally, spaces, perSide }) => ({
    ...{ label, made, tally, spaces, perSide },
  }));

describe('the corpus', () => {
  it('holds at least thirty right and thirty wrong texts, each derived in its comment', () => {
    expect(right.length).toBeGreaterThanOrEqual(30);
    expect(wrong.length).toBeGreaterThanOrEqual(30);
  });
});

describe.each(named(right))('right: %s', (_, { text, options, rounds, diagnostics }) => {
  const reading = readPattern(text, options);

  it('makes, counts and leaves as spaces what its comment derives', () => {
    expect(counts(reading)).toEqual(rounds);
  });

  it('has no error and no warning', () => {
    const told = reading.diagnostics.map(({ code, severity, begin, end, message }) => ({
      ...{ code, severity, at: text.slice(begin, end) },
      says: message,
    }));
    expect(told).toEqual(
      diagnostics.map((each) => ({ ...each, says: expect.stringContaining(each.says) })),
    );
    for (const { severity } of told) expect(severity).toBe('note');
  });
});

describe.each(named(wrong))('wrong: %s', (_, { text, options, rounds, diagnostics }) => {
  const reading = readPattern(text, options);

  it('is told exactly what is wrong, where, in words', () => {
    const wanted = diagnostics.some(({ severity }) => severity === 'note');
    const told = reading.diagnostics
      .filter(({ severity }) => severity !== 'note' || wanted)
      .map(({ code, severity, begin, end, message }) => ({
        ...{ code, severity, at: text.slice(begin, end) },
        says: message,
      }));
    expect(told).toEqual(
      diagnostics.map((each) => ({ ...each, says: expect.stringContaining(each.says) })),
    );
  });

  it('has its place in lines and columns', () => {
    const before = (offset: number) => text.slice(0, offset).split('\n');
    for (const { begin, line, column } of reading.diagnostics) {
      expect([line, column]).toEqual([
        before(begin).length,
        (before(begin).at(-1)?.length ?? 0) + 1,
      ]);
    }
  });

  if (rounds.length > 0) {
    it('still makes what can be made', () => {
      expect(counts(reading).slice(0, rounds.length)).toEqual(rounds);
    });
  }

  it('offers only changes that take their problem away', () => {
    for (const { fix, code, begin } of reading.diagnostics) {
      if (!fix) continue;
      const mended = text.slice(0, fix.begin) + fix.replacement + text.slice(fix.end);
      const left = readPattern(mended, options).diagnostics;
      expect(left.filter((each) => each.code === code && each.begin === begin)).toEqual([]);
    }
  });
});
