import { describe, expect, it } from 'vitest';
import {
  currencyDecimals,
  FABRIC_UNIT,
  showDuration,
  showFabric,
  showMass,
  showPrice,
  showSize,
  showYarn,
  YARN_UNIT,
  yarnFigure,
} from '../../../src/lib/units/display';

/** A figure stays with its unit: the space between them does not break. */
const nb = (text: string) => text.replaceAll('_', '\u00a0');

describe('showYarn', () => {
  it('shows whole metres or yards, and a decimal under ten', () => {
    expect(showYarn(1184.2, 'metric')).toBe(nb('1,184_m'));
    expect(showYarn(9.96, 'metric')).toBe(nb('10_m'));
    expect(showYarn(9.94, 'metric')).toBe(nb('9.9_m'));
    expect(showYarn(200.2536, 'imperial')).toBe(nb('219_yd')); // 219 × 0.9144
    expect(showYarn(0, 'metric')).toBe(nb('0_m'));
    expect(yarnFigure(1184.2, 'metric')).toBe('1,184');
  });
});

describe('showFabric', () => {
  it('shows centimetres or inches, with a decimal where that is still measured', () => {
    expect(showFabric(1181, 'metric')).toBe(nb('118_cm'));
    expect(showFabric(142, 'metric')).toBe(nb('14.2_cm'));
    expect(showFabric(142, 'imperial')).toBe(nb('5.6_in')); // 142 / 25.4 = 5.59
    expect(showFabric(1270, 'imperial')).toBe(nb('50_in'));
    expect(showSize(1181, 1472, 'metric')).toBe(nb('118 × 147_cm'));
  });
});

describe('showMass', () => {
  it('shows grams or ounces', () => {
    expect(showMass(1242, 'metric')).toBe(nb('1,242_g'));
    expect(showMass(1242, 'imperial')).toBe(nb('43.8_oz')); // 1242 / 28.3495 = 43.81
    expect(showMass(4.26, 'metric')).toBe(nb('4.3_g'));
  });
});

describe('showDuration', () => {
  it('shows minutes up to an hour and a half, then whole hours', () => {
    expect(showDuration(96_338)).toBe(nb('27_h'));
    expect(showDuration(2_700)).toBe(nb('45_min'));
    expect(showDuration(5_399)).toBe(nb('90_min'));
    expect(showDuration(5_400)).toBe(nb('2_h'));
  });
});

describe('showPrice', () => {
  it('places the point by the decimals of the currency', () => {
    // ISO 4217 minor units: EUR 2, JPY 0, KWD 3 (from memory)
    expect(showPrice(10_240, 'EUR')).toBe('€102.40');
    expect(showPrice(10_240, 'JPY')).toBe('¥10,240');
    expect(currencyDecimals('KWD')).toBe(3);
  });
});

describe('the units of fields', () => {
  it('say how much one of them is', () => {
    expect(FABRIC_UNIT.imperial.mm).toBe(25.4);
    expect(FABRIC_UNIT.metric.mm).toBe(10);
    expect(YARN_UNIT.imperial.m).toBe(0.9144);
    expect(YARN_UNIT.metric.m).toBe(1);
  });
});
