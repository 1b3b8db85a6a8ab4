import { describe, expect, it } from 'vitest';
import { swatchFigures } from '../../../src/lib/swatches/swatchFigures';
import type { SwatchRecord } from '../../../src/lib/swatches/swatchRecord';

const swatch: SwatchRecord = {
  stitch: 'sc',
  stitches: 20,
  rows: 18,
  yarn: { weightCategory: 4, putUp: { massG: 100, lengthM: 200 } },
  measurements: [{ kind: 'size', widthMm: 150, heightMm: 124, blocked: false }],
};

describe('swatchFigures', () => {
  it('gives the size and the gauge', () => {
    const figures = swatchFigures(swatch);
    expect(figures).toMatchObject({
      widthMm: 150,
      heightMm: 124,
      stitchWidthMm: 7.5,
      loopMm: null,
    });
    expect(figures?.rowHeightMm).toBeCloseTo(124 / 18, 12);
  });

  it('gives the yarn in a loop once the swatch is weighed', () => {
    const weight = { kind: 'weight', massG: 15, resolutionG: 1 } as const;
    const figures = swatchFigures({ ...swatch, measurements: [...swatch.measurements, weight] });
    // Near (30 m less two tails) / 758 loops, pulled a little to 5.2 stitch widths.
    expect(figures?.loopMm).toBeCloseTo(39.27, 2);
  });

  it('has no answer before a size is measured', () => {
    expect(swatchFigures({ ...swatch, measurements: [] })).toBeNull();
  });
});
