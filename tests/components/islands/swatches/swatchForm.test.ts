import { describe, expect, it } from 'vitest';
import {
  blankMeasurement,
  blankSwatch,
  exampleSwatch,
  readableSwatch,
} from '../../../../src/components/islands/swatches/swatchForm';
import { swatchInput } from '../../../../src/schemas/swatch';

const today = '2026-11-08';
const yarn = {
  id: '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41',
  name: 'Lindry Aran',
  weightCategory: 4 as const,
  putUp: { massG: 100, lengthM: 200 },
  hex: null,
};

describe('readableSwatch', () => {
  it('leaves out measurements that are not complete yet', () => {
    const values = { ...exampleSwatch(today) };
    values.measurements = [...values.measurements, blankMeasurement('weight', today)];
    expect(readableSwatch(values, [])?.measurements).toHaveLength(3);
  });

  it('is nothing while a count cannot be read', () => {
    expect(readableSwatch({ ...blankSwatch(today), stitches: NaN }, [])).toBeNull();
    expect(readableSwatch({ ...blankSwatch(today), rows: 0 }, [])).toBeNull();
  });

  it('knows its yarn when that is one of those listed', () => {
    const values = { ...blankSwatch(today), yarnId: yarn.id };
    expect(readableSwatch(values, [yarn])?.yarn).toBe(yarn);
    expect(readableSwatch(values, [])?.yarn).toBeNull();
  });
});

describe('exampleSwatch', () => {
  it('can be saved as it stands', () => {
    expect(swatchInput.safeParse(exampleSwatch(today)).success).toBe(true);
  });
});
