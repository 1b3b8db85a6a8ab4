import { describe, expect, it } from 'vitest';
import type { SwatchMeasurement } from '../../../src/lib/swatches/swatchRecord';
import { swatchSizes } from '../../../src/lib/swatches/swatchSizes';

const before = { kind: 'size', widthMm: 150, heightMm: 124, blocked: false } as const;
const after = { kind: 'size', widthMm: 156, heightMm: 130, blocked: true } as const;
const weight = { kind: 'weight', massG: 15, resolutionG: 1 } as const;

describe('swatchSizes', () => {
  it('takes the sizes before blocking while there are no others', () => {
    expect(swatchSizes([before, weight])).toEqual([before]);
  });

  it('takes only the sizes after blocking once there is one', () => {
    expect(swatchSizes([before, after, weight, before])).toEqual([after]);
  });

  it('takes none from a swatch that was only weighed', () => {
    const measurements: SwatchMeasurement[] = [weight];
    expect(swatchSizes(measurements)).toEqual([]);
  });
});
