import { MM_PER_INCH } from '../../lib/units/conversion';

export type RuleUnits = 'metric' | 'imperial';

export interface RuleTick {
  atMm: number;
  /** 0 short, 1 longer, 2 longest and numbered. */
  rank: 0 | 1 | 2;
  /** In cm or inches, on numbered ticks only. */
  number?: number;
}

/** Spacing of short, longer and numbered ticks, in the unit that is numbered. */
type Grade = readonly [short: number, longer: number, numbered: number];

const gradesCm: readonly Grade[] = [
  [0.1, 0.5, 1],
  [0.5, 1, 2],
  [1, 5, 10],
  [5, 10, 20],
  [10, 50, 100],
  [50, 100, 200],
  [100, 500, 1000],
  [1000, 5000, 10000],
];
const gradesIn: readonly Grade[] = [
  [1 / 8, 1 / 2, 1],
  [1 / 2, 1, 2],
  [1, 5, 10],
  [5, 10, 20],
  [10, 50, 100],
  [50, 100, 200],
  [100, 500, 1000],
  [1000, 5000, 10000],
];

/** Millimetres and eighths may stand close, as they do on any rule; wider grades want air. */
const FINEST_MIN_PX = 3;
const SHORT_MIN_PX = 5;
const NUMBERED_MIN_PX = 27;

export const mmPerNumber = { metric: 10, imperial: MM_PER_INCH } as const;

/** The finest grading whose ticks stay apart and whose numbers stay legible at this scale. */
function gradeFor(units: RuleUnits, pxPerMm: number): Grade {
  const grades = units === 'metric' ? gradesCm : gradesIn;
  const pxPerUnit = pxPerMm * mmPerNumber[units];
  const fits = (grade: Grade) =>
    grade[0] * pxPerUnit >= (grade === grades[0] ? FINEST_MIN_PX : SHORT_MIN_PX) &&
    grade[2] * pxPerUnit >= NUMBERED_MIN_PX;
  return grades.find(fits) ?? (grades[grades.length - 1] as Grade);
}

/**
 * Ticks from 0 up to the length, without the one at the end, which says the size itself.
 * No number stands nearer than `endClearancePx` to that end.
 */
export function ruleTicks(
  lengthMm: number,
  units: RuleUnits,
  pxPerMm: number,
  endClearancePx: number,
): RuleTick[] {
  if (!(lengthMm > 0) || !(pxPerMm > 0)) return [];
  const [short, longer, numbered] = gradeFor(units, pxPerMm);
  const perLonger = Math.round(longer / short);
  const perNumbered = Math.round(numbered / short);
  const shortMm = short * mmPerNumber[units];
  const count = Math.ceil(lengthMm / shortMm - 1e-6);
  return Array.from({ length: count }, (_, index): RuleTick => {
    const atMm = index * shortMm;
    if (index % perNumbered !== 0) return { atMm, rank: index % perLonger === 0 ? 1 : 0 };
    const crowdsEnd = (lengthMm - atMm) * pxPerMm < endClearancePx;
    return crowdsEnd
      ? { atMm, rank: 1 }
      : { atMm, rank: 2, number: (index / perNumbered) * numbered };
  });
}

/** The size at the end of the rule: to 0.1 below half a metre or 20 in; above, whole cm or half inches. */
export function ruleEnd(lengthMm: number, units: RuleUnits): string {
  const value = lengthMm / mmPerNumber[units];
  if (units === 'metric') return String(Number(value.toFixed(value < 50 ? 1 : 0)));
  return String(value < 20 ? Number(value.toFixed(1)) : Math.round(2 * value) / 2);
}
