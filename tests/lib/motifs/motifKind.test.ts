import { describe, expect, it } from 'vitest';
import { motifKind, readyMotif, type Motif } from '../../../src/lib';

const kindOf = (key: string, rounds?: number) => motifKind(readyMotif(key, rounds) as Motif);

describe('motifKind', () => {
  it('calls a group square openwork: 24 spaces on the sides of four rounds, 120 dc', () => {
    // Counted by hand: ch-1 spaces 0, 4, 8, 12; dc 12, 24, 36, 48.
    expect(kindOf('group-square', 4)).toBe('openwork');
  });

  it('calls a square of stitches only solid, whatever its corner spaces', () => {
    expect(kindOf('solid-square')).toBe('solid');
    expect(kindOf('circle')).toBe('solid');
  });

  it.each(['cluster-square', 'popcorn-square', 'ridged-square', 'popcorn-hexagon'])(
    'calls %s textured by the stitches that stand out',
    (key) => {
      expect(kindOf(key)).toBe('textured');
    },
  );

  it('calls the first round of a group square, which has corner spaces only, solid', () => {
    expect(kindOf('group-square', 1)).toBe('solid');
  });
});
