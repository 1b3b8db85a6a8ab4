import { describe, expect, it } from 'vitest';
import {
  bellPoints,
  chanceSentence,
  tapeNumbers,
  tapeSpan,
} from '../../../src/components/ui/chance';

const chances = [
  { skeins: 1, probabilityShort: 0.2 },
  { skeins: 6, probabilityShort: 0.41 },
  { skeins: 7, probabilityShort: 0.0013 },
];
const said = (...args: Parameters<typeof chanceSentence>) =>
  chanceSentence(...args).replaceAll('\u00a0', ' ');

describe('chanceSentence', () => {
  it('says the chance, and what one skein fewer would leave when the chance is small', () => {
    expect(said(7, chances)).toBe(
      'Seven skeins leave 0.1 % chance of running short. Six would leave 41 %.',
    );
  });

  it('says what one skein more would leave when the chance is large', () => {
    expect(said(6, chances)).toBe(
      'Six skeins leave 41 % chance of running short. Seven would leave 0.1 %.',
    );
  });

  it('speaks of one skein in the singular, and of no neighbour it does not know', () => {
    expect(said(1, chances)).toBe('One skein leaves 20 % chance of running short.');
  });

  it('says nothing of a count it has no chance for', () => {
    expect(said(9, chances)).toBe('');
  });

  it('is plain where there is no yarn at all', () => {
    expect(said(0, [{ skeins: 0, probabilityShort: 1 }])).toBe(
      'With no skein in hand, running short is certain.',
    );
  });
});

describe('tapeSpan', () => {
  it('holds the likely needs and the mark', () => {
    const span = tapeSpan(5.92, 0.265, 9);
    expect(span.fromSkeins).toBeLessThan(5.92 - 3 * 0.265);
    expect(span.toSkeins).toBeGreaterThan(9);
  });

  it('does not begin before the tape does', () => {
    expect(tapeSpan(0.3, 0.2, 1).fromSkeins).toBe(0);
  });
});

describe('tapeNumbers', () => {
  it('numbers every whole skein while there is room', () => {
    expect(tapeNumbers({ fromSkeins: 4.5, toSkeins: 7.5 }, 100)).toEqual([5, 6, 7]);
  });

  it('skips numbers rather than crowd them', () => {
    expect(tapeNumbers({ fromSkeins: 27, toSkeins: 44.4 }, 11)).toEqual([
      28, 30, 32, 34, 36, 38, 40, 42, 44,
    ]);
  });
});

describe('bellPoints', () => {
  it('rises to 1 at the mean and is as high on either side', () => {
    const points = bellPoints(6, 0.25, { fromSkeins: 4.5, toSkeins: 7.5 });
    const at = (skeins: number) => points.find((point) => Math.abs(point.skeins - skeins) < 1e-9);
    expect(at(6)?.height).toBe(1);
    // one deviation away: exp(-1/2)
    expect(at(5.75)?.height).toBeCloseTo(Math.exp(-0.5), 12);
    expect(at(6.25)?.height).toBeCloseTo(Math.exp(-0.5), 12);
  });

  it('finds the top of even the narrowest need, and stays inside the span', () => {
    const span = { fromSkeins: 0, toSkeins: 7 };
    const points = bellPoints(0.75, 0.001, span);
    expect(Math.max(...points.map(({ height }) => height))).toBe(1);
    const skeins = points.map((point) => point.skeins);
    expect(skeins).toEqual([...skeins].sort((a, b) => a - b));
    expect([skeins[0], skeins.at(-1)]).toEqual([0, 7]);
  });
});
