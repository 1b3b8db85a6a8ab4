import { describe, expect, it } from 'vitest';
import { DomainError } from '../../../src/lib/errors';
import { BASIC_STITCHES, knownStitch, stitch } from '../../../src/lib/stitches/stitchTable';

const movesOf = (code: string) => {
  const found = stitch(code);
  return found && [found.wraps, found.draws, found.throughs];
};

describe('stitch', () => {
  it('knows the basic stitches by their US abbreviation', () => {
    expect(stitch('dc')?.throughs).toBe(2);
    expect(BASIC_STITCHES.map(({ code }) => code)).toEqual([
      'ch',
      'sl st',
      'sc',
      'esc',
      'hdc',
      'ehdc',
      'dc',
      'edc',
      'tr',
      'etr',
      'dtr',
      'trtr',
    ]);
  });

  it.each([
    // Worked by hand, wrap · draw · through: N legs left on the hook, then one through all
    ['sc2tog', 0, 2, 1],
    ['sc3tog', 0, 3, 1],
    // each leg: wrap, draw, through; then one through all
    ['dc2tog', 2, 2, 3],
    ['dc3cl', 3, 3, 4],
    // five whole dc (1, 1, 2 each), then one draw through the first
    ['5-dc pc', 5, 6, 10],
    // three wraps and draws, one through all
    ['3-hdc puff', 3, 3, 1],
    // three chains and a slip stitch, whose draw is its only loop
    ['picot-3', 0, 1, 3],
    ['dc20tog', 20, 20, 21],
    // a leg of hdc is a wrap and a draw, one of tr two wraps, a draw and two throughs
    ['hdc2tog', 2, 2, 1],
    ['tr3cl', 6, 3, 7],
    // four whole tr (2, 1, 3 each), then one draw through the first
    ['4-tr pc', 8, 5, 12],
    // round the post or into one loop, with the moves of the stitch itself
    ['FPdc', 1, 1, 2],
    ['BPtr', 2, 1, 3],
    ['BLsc', 0, 1, 1],
    ['FLhdc', 1, 1, 1],
  ])('works %s out of its moves', (code, wraps, draws, throughs) => {
    expect(movesOf(code)).toEqual([wraps, draws, throughs]);
  });

  it('gives a compound stitch a UK name and no turning chain', () => {
    expect(stitch('dc3cl')).toMatchObject({
      code: 'dc3cl',
      us: '3 double crochet together',
      ukCode: 'tr3tog',
      turningChains: 0,
      heightOverWidth: 1.85,
    });
    expect(stitch('sc2tog')?.ukCode).toBe('dc2tog');
    expect(stitch('5-dc pc')?.ukCode).toBe('5-tr pc');
    expect(stitch('FPdc')).toMatchObject({ ukCode: 'FPtr', us: 'front post double crochet' });
  });

  it.each([
    '',
    'DC',
    'dc ',
    'dc1tog',
    'dc0cl',
    'dc21tog',
    'dc3togx',
    'dc100tog',
    'constructor',
    'FPch',
    'fpdc',
    'XXdc',
    '__proto__',
  ])('does not know "%s"', (code) => {
    expect(stitch(code)).toBeNull();
  });
});

describe('knownStitch', () => {
  it('throws with the code it was asked for', () => {
    expect(knownStitch('tr').turningChains).toBe(4);
    expect(() => knownStitch('xyz')).toThrow(DomainError);
    expect(() => knownStitch('xyz')).toThrow('got "xyz"');
  });
});

describe('BASIC_STITCHES', () => {
  it('grow by one wrap and one through from sc to trtr', () => {
    const tall = ['dc', 'tr', 'dtr', 'trtr'].map((code) => movesOf(code));
    expect(tall).toEqual([
      [1, 1, 2],
      [2, 1, 3],
      [3, 1, 4],
      [4, 1, 5],
    ]);
  });

  it('name each stitch once in US and once in UK terms', () => {
    expect(new Set(BASIC_STITCHES.map(({ us }) => us)).size).toBe(BASIC_STITCHES.length);
    expect(new Set(BASIC_STITCHES.map(({ ukCode }) => ukCode)).size).toBe(BASIC_STITCHES.length);
  });
});
