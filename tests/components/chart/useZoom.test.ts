import { describe, expect, it } from 'vitest';
import { moved } from '../../../src/components/chart/useZoom';

const room = { widthMm: 100, heightMm: 80 };
const whole = { zoom: 1, leftMm: 0, topMm: 0 };

describe('moved', () => {
  it('keeps what is under the finger where it is', () => {
    const at = [30, 20] as const;
    const { zoom, leftMm, topMm } = moved(whole, { by: 'zoom', factor: 2, atMm: at }, room);
    // At twice the size the point lies as far from the corner in what is seen: (30 - left) x 2 = 30.
    expect([(at[0] - leftMm) * zoom, (at[1] - topMm) * zoom]).toEqual([30, 20]);
  });

  it('never looks past the edges, and never farther than the whole', () => {
    const close = moved(whole, { by: 'zoom', factor: 4, atMm: [100, 80] }, room);
    expect(moved(close, { by: 'pan', xMm: 500, yMm: 500 }, room)).toMatchObject({
      leftMm: 75,
      topMm: 60,
    });
    expect(moved(close, { by: 'zoom', factor: 0.01, atMm: [50, 40] }, room)).toEqual(whole);
  });

  it('brings a stitch into sight only when it is out of it', () => {
    const close = { zoom: 4, leftMm: 0, topMm: 0 };
    expect(moved(close, { by: 'show', atMm: [10, 10] }, room)).toBe(close);
    expect(moved(close, { by: 'show', atMm: [60, 40] }, room)).toEqual({
      zoom: 4,
      leftMm: 47.5,
      topMm: 30,
    });
  });
});
