/** A stretch of numbers to draw, with a tick at each step. */
export interface Axis {
  from: number;
  to: number;
  ticks: readonly number[];
}

const STEPS = [1, 2, 5];
const WANTED_TICKS = 5;

/** The axis that holds all values, on round numbers: 7.2 and 9.3 give 7 to 9.5 by halves. */
export function axisFor(values: readonly number[]): Axis {
  const least = Math.min(...values);
  const most = Math.max(...values);
  const span = Math.max(most - least, Math.abs(most) * 0.1, 1e-6);
  const rough = span / WANTED_TICKS;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = power * (STEPS.find((each) => each * power >= rough) ?? 10);
  const first = Math.floor((least - 0.04 * span) / step);
  const last = Math.ceil((most + 0.04 * span) / step);
  const ticks = Array.from({ length: last - first + 1 }, (_, i) => rounded((first + i) * step));
  return { from: ticks[0] ?? least, to: ticks.at(-1) ?? most, ticks };
}

/** Where a value stands on the axis, as a share from 0 to 1. */
export const shareOf = ({ from, to }: Axis, value: number): number =>
  Math.min(1, Math.max(0, (value - from) / (to - from)));

const rounded = (value: number): number => Number(value.toPrecision(10));
