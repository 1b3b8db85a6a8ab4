import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convertTerms, printPattern, readPattern, READY_PATTERNS } from '../../../src/lib';
import { corpus } from '../../support/patternCorpus';
import { generatedMotif, type MotifPlan } from '../../support/generatedMotifs';
import { modelOf } from '../../support/patternModel';

const SEED = 20261201;

const plans: fc.Arbitrary<MotifPlan> = fc.record({
  sides: fc.constantFrom(3, 4, 6, 8),
  stitch: fc.constantFrom('sc', 'hdc', 'dc', 'tr'),
  firstSide: fc.integer({ min: 1, max: 5 }),
  gain: fc.integer({ min: 1, max: 3 }),
  cornerChains: fc.integer({ min: 1, max: 4 }),
  rounds: fc.integer({ min: 1, max: 6 }),
  terms: fc.constantFrom('us', 'uk'),
  star: fc.boolean(),
  counted: fc.boolean(),
});

const other = (terms: 'us' | 'uk') => (terms === 'us' ? 'uk' : 'us');

describe('a generated motif', () => {
  it('is read with no diagnostic and with the counts it was made from', () => {
    fc.assert(
      fc.property(plans, (plan) => {
        const { text, rounds } = generatedMotif(plan);
        const reading = readPattern(text, plan);
        expect(reading.diagnostics).toEqual([]);
        expect(
          reading.rounds.map(({ made, tally, spaces, perSide }) => ({
            ...{ made, tally, spaces, perSide },
          })),
        ).toEqual(rounds);
      }),
      { seed: SEED, numRuns: 400 },
    );
  });

  it('has one stitch for everything it makes, each with its words, side and place', () => {
    fc.assert(
      fc.property(plans, (plan) => {
        const { text } = generatedMotif(plan);
        for (const round of readPattern(text, plan).rounds) {
          const made = Object.values(round.made).reduce((sum, count) => sum + count, 0);
          expect(round.stitches).toHaveLength(made);
          const sides = new Set(round.stitches.map(({ side }) => side));
          expect(sides.size).toBe(plan.sides);
          for (const { span, place } of round.stitches) {
            expect(text.slice(span.begin, span.end)).not.toBe('');
            if (place !== null) expect(round.places[place]).toBeDefined();
          }
        }
      }),
      { seed: SEED, numRuns: 100 },
    );
  });

  it('is the same model when it is printed in any terms and words and read again', () => {
    fc.assert(
      fc.property(plans, fc.constantFrom('us', 'uk'), fc.boolean(), (plan, terms, fullWords) => {
        const { pattern } = readPattern(generatedMotif(plan).text, plan);
        const printed = printPattern(pattern, { terms, fullWords }).lines.join('\n');
        const again = readPattern(printed, { terms, sides: plan.sides });
        expect(modelOf(again.pattern)).toEqual(modelOf(pattern));
        expect(again.diagnostics).toEqual([]);
      }),
      { seed: SEED, numRuns: 200 },
    );
  });

  it('is the same text when it is put into the other terms and back', () => {
    fc.assert(
      fc.property(plans, (plan) => {
        const { text } = generatedMotif(plan);
        const there = convertTerms(text, plan.terms, other(plan.terms));
        expect(there).not.toBe(text);
        expect(convertTerms(there, other(plan.terms), plan.terms)).toBe(text);
        const read = readPattern(there, { terms: other(plan.terms), sides: plan.sides });
        expect(modelOf(read.pattern)).toEqual(modelOf(readPattern(text, plan).pattern));
      }),
      { seed: SEED, numRuns: 200 },
    );
  });
});

const written = [
  ...[...corpus('right'), ...corpus('wrong')].map(({ name, text, options }) => ({
    name,
    text,
    ...options,
  })),
  ...READY_PATTERNS.map(({ key, text, sides }) => ({
    name: key,
    text,
    sides,
    terms: 'us' as const,
  })),
];

describe.each(written.map((each) => [each.name, each] as const))(
  '%s',
  (_, { text, ...options }) => {
    it('is the same model when it is printed in any terms and words and read again', () => {
      const { pattern } = readPattern(text, options);
      for (const terms of ['us', 'uk'] as const) {
        for (const fullWords of [false, true]) {
          const printed = printPattern(pattern, { terms, fullWords }).lines.join('\n');
          expect(modelOf(readPattern(printed, { ...options, terms }).pattern)).toEqual(
            modelOf(pattern),
          );
        }
      }
    });

    // A mistyped stitch is guessed by the words of its terms.
    const mistyped = readPattern(text, options).diagnostics.some(
      ({ code }) => code === 'unknown-word',
    );
    it.skipIf(mistyped)('means the same in the other terms', () => {
      const there = convertTerms(text, options.terms, other(options.terms));
      const read = readPattern(there, { ...options, terms: other(options.terms) });
      expect(modelOf(read.pattern)).toEqual(modelOf(readPattern(text, options).pattern));
    });
  },
);
