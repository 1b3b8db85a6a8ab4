import { numberFromText } from '../../lib/units/numberFromText';

export interface NumberLimits {
  min?: number;
  max?: number;
  /** Whole numbers only. */
  whole?: boolean;
  /** An empty field is an answer: "not known". */
  optional?: boolean;
  unit?: string;
}

export type NumberReading = { ok: true; value: number | null } | { ok: false; error: string };

const shown = new Intl.NumberFormat('en', { maximumFractionDigits: 6 });

/** Reads what was typed in a number field, or says in words what is wrong with it. Empty is never 0. */
export function readNumber(typed: string, limits: NumberLimits = {}): NumberReading {
  if (limits.optional && typed.trim() === '') return { ok: true, value: null };
  const parsed = numberFromText(typed);
  return parsed.ok ? withinLimits(parsed.value, limits) : parsed;
}

function withinLimits(value: number, { min, max, whole, unit }: NumberLimits): NumberReading {
  const withUnit = (limit: number) =>
    unit ? `${shown.format(limit)} ${unit}` : shown.format(limit);
  if (whole && !Number.isInteger(value)) return { ok: false, error: 'Write a whole number' };
  if (min !== undefined && value < min) return { ok: false, error: `At least ${withUnit(min)}` };
  if (max !== undefined && value > max) return { ok: false, error: `At most ${withUnit(max)}` };
  return { ok: true, value };
}

/** The next value up or down, on whole steps: 12.4 goes up to 13 with a step of 1. Stays within the limits. */
export function stepNumber(
  value: number,
  direction: 1 | -1,
  step: number,
  limits: NumberLimits,
): number {
  const steps = value / step;
  // A hair of tolerance, or 0.3 / 0.1 would count as 2.9999999999999996 steps.
  const next = direction === 1 ? Math.floor(steps + 1e-9) + 1 : Math.ceil(steps - 1e-9) - 1;
  const rounded = Number((next * step).toPrecision(12));
  return Math.min(limits.max ?? Infinity, Math.max(limits.min ?? -Infinity, rounded));
}
