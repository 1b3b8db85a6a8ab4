import { describe, expect, it } from 'vitest';
import { moved } from '../../../src/components/chart/useZoom';

const room = { widthMm: 100, heightMm: 80 };
const whole = { zoom: 1, leftMm: 0, topMm: 0 };

describe('moved', () => {
  it('keeps what is under the finger where it is', () => {
    // 30 of 100 mm across and 20 of 80 mm down.
    const at = [0.3, 0.25] as const;
    const { zoom, leftMm, topMm } = moved(whole, { by: 'zoom', factor: 2, at }, room);
    // At twice the size the point lies as far from the corner in what is seen: (30 - left) x 2 = 30.
    expect([(30 - leftMm) * zoom, (20 - topMm) * zoom]).toEqual([30, 20]);
  });

  it('never looks past the edges, and never farther than the whole', () => {
    const close = moved(whole, { by: 'zoom', factor: 4, at: [1, 1] }, room);
    expect(moved(close, { by: 'pan', way: [9, 9] }, room)).toMatchObject({
      leftMm: 75,
      topMm: 60,
    });
    expect(moved(close, { by: 'zoom', factor: 0.01, at: [0.5, 0.5] }, room)).toEqual(whole);
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
