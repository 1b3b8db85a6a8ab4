import { describe, expect, it } from 'vitest';
import { glyphOf } from '../../../src/lib/chart/glyph';
import { sampleSymbol } from '../../../src/lib/chart/sampleSymbol';
import { symbolPath } from '../../../src/lib/chart/symbolPath';
import {
  OWN_STITCH_LIMITS,
  SYMBOL_BODIES,
  type OwnStitch,
} from '../../../src/lib/stitches/ownStitch';
import { BASIC_STITCHES } from '../../../src/lib/stitches/stitchTable';

describe('glyphOf', () => {
  // published: crochet chart symbols, and JIS L 0201: oval, dot, cross, T, and a stroke more from dc on.
  it.each([
    ['ch', 'chain', 0],
    ['sl st', 'dot', 0],
    ['sc', 'cross', 0],
    ['hdc', 'legs', 0],
    ['dc', 'legs', 1],
    ['tr', 'legs', 2],
    ['dtr', 'legs', 3],
    ['trtr', 'legs', 4],
  ])('draws %s as %s with %i strokes', (code, body, bars) => {
    expect(glyphOf(code)).toMatchObject({ body, bars, legs: 1 });
  });

  // common practice, no source: legs of the stitch named, joined at the top.
  it.each([
    ['sc2tog', 'legs', 2, 0],
    ['dc3tog', 'legs', 3, 1],
    ['tr3cl', 'legs', 3, 2],
    ['hdc3tog', 'legs', 3, 0],
    ['5-dc pc', 'popcorn', 5, 1],
    ['4-tr pc', 'popcorn', 4, 2],
    ['3-hdc puff', 'puff', 3, 0],
    ['picot-3', 'picot', 3, 0],
  ])('draws %s as %s of %i legs with %i strokes each', (code, body, legs, bars) => {
    expect(glyphOf(code)).toMatchObject({ body, legs, bars });
  });

  it('marks at the foot how a stitch is inserted', () => {
    expect(glyphOf('FPdc')).toMatchObject({ insertion: 'front-post', bars: 1 });
    expect(glyphOf('BPtr')).toMatchObject({ insertion: 'back-post', bars: 2 });
    expect(glyphOf('BLsc')).toMatchObject({ insertion: 'back-loop', body: 'cross' });
    expect(glyphOf('FLdc')).toMatchObject({ insertion: 'front-loop', bars: 1 });
  });

  it('tells extended stitches from taller ones by the chain at the foot', () => {
    expect(glyphOf('ehdc')).toMatchObject({ body: 'legs', bars: 0, footChains: 1 });
    expect(glyphOf('edc')).toMatchObject({ body: 'legs', bars: 1, footChains: 1 });
    expect(glyphOf('dc').footChains).toBe(0);
  });

  it('draws moves that the table has as the table does, whatever they are called', () => {
    const drawn = BASIC_STITCHES.filter(({ code }) => code !== 'ehdc');
    for (const { code, wraps, draws, throughs } of drawn) {
      expect(glyphOf(`own{${wraps},${draws},${throughs}}`)).toEqual(glyphOf(code));
    }
    // Made as a dc is, which is what is drawn: only the name tells an extended hdc.
    expect(glyphOf('own{1,1,2}')).toEqual(glyphOf('dc'));
    expect(glyphOf('own{3,3,4}')).toEqual(glyphOf('dc3tog'));
  });

  it('draws a stroke only for a wrap that is drawn off by itself, and no more than there is room for', () => {
    expect(glyphOf('bul{7,1,1}')).toMatchObject({ body: 'legs', legs: 1, bars: 0 });
    expect(glyphOf('tall{20,1,60}').bars).toBe(OWN_STITCH_LIMITS.bars);
  });

  it('draws a stitch of one’s own as it asks to be', () => {
    const symbol = { body: 'puff', legs: 4, bars: 0 } as const;
    const own = { ...LST, symbol };
    expect(glyphOf('lst{1,1,3}', own)).toMatchObject(symbol);
    expect(glyphOf('lst{1,1,3}', LST)).toEqual(glyphOf('edc'));
  });
});

describe('sampleSymbol', () => {
  it('stands as tall as the stitch, up to what a key has room for', () => {
    // Heights of the table; 2.4 is the key's own limit.
    expect(sampleSymbol('dc').head).toEqual([0, -1.85]);
    expect(sampleSymbol('lst{1,1,3,2.2}').head).toEqual([0, -2.2]);
    expect(sampleSymbol('lst{1,1,3,9}').head).toEqual([0, -2.4]);
  });

  it('draws every body that can be chosen, with any stems and strokes, and nothing that is no number', () => {
    for (const body of SYMBOL_BODIES) {
      for (const [legs, bars] of [
        [1, 0],
        [2, 3],
        [OWN_STITCH_LIMITS.legs, OWN_STITCH_LIMITS.bars],
      ] as const) {
        const { line, solid } = symbolPath(
          sampleSymbol('lst{1,1,3}', { ...LST, symbol: { body, legs, bars } }),
        );
        expect(line + solid).toMatch(/^M/);
        expect(line + solid).not.toContain('NaN');
      }
    }
  });
});

const LST: OwnStitch = {
  abbreviation: 'lst',
  name: 'long stitch',
  moves: { wraps: 1, draws: 1, throughs: 3 },
  ...{ heightOverWidth: null, takes: 1, symbol: null },
};
