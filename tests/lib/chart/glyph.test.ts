import { describe, expect, it } from 'vitest';
import { glyphOf } from '../../../src/lib/chart/glyph';

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
});
