import { chartSvg, gaugeOf, layoutChart, readPattern, type Reading } from '../../src/lib';
import { growingSquare } from './growingSquare.ts';
import { line, heading } from './report.ts';
import { exponent, leastMs } from './timing.ts';

/** Rounds of a motif; the longest text is nearly as long as one may be. */
const ROUNDS = [3, 5, 10, 15, 20, 30, 40] as const;
/** From here on the part that does not grow is small: characters of text. */
const FIT_FROM = 3000;
const TIMES = 12;
const gauge = gaugeOf(null, 4);

/** Time to read and to draw a pattern against the length of its text, up to a motif of 40 rounds. */
export function benchPatternTime(): void {
  heading('Time to read and to draw a pattern');
  const texts = ROUNDS.map((rounds) => growingSquare(rounds, 'each'));
  const readings = texts.map(read);
  const stages = [
    [
      'read',
      leastMs(
        texts.map((text) => () => void read(text)),
        TIMES,
      ),
    ],
    [
      'lay out',
      leastMs(
        readings.map((each) => () => void layoutChart(each, gauge)),
        TIMES,
      ),
    ],
    [
      'draw',
      leastMs(
        readings.map((each) => () => void draw(each)),
        TIMES,
      ),
    ],
  ] as const;
  const lengths = texts.map(({ length }) => length);
  for (const [stage, times] of stages) {
    ROUNDS.forEach((rounds, i) => {
      const length = lengths[i] ?? 1;
      const name = `${stage}, ${rounds} rounds, ${length} characters`;
      line(name, (1000 * (times[i] ?? 0)) / length, 'µs a character');
    });
    const linear = { most: 1.2, why: 'linear is 1' };
    const name = `${stage}, exponent of the text's length from ${FIT_FROM}`;
    line(name, exponent(lengths, times, FIT_FROM), '', linear);
  }
}

function read(text: string): Reading {
  const reading = readPattern(text, { terms: 'us', sides: 4 });
  if (reading.diagnostics.length > 0) throw new Error(reading.diagnostics[0]?.message);
  return reading;
}

const draw = (reading: Reading): string => chartSvg(layoutChart(reading, gauge), 'A square');
