import { toCsv, type CsvCell } from '../csv/toCsv';
import type { Plan } from '../plan/plan';
import { currencyDecimals } from '../units/display';
import type { SizedPlan } from './sizesOf';

/** Several sizes as CSV, a column for each: dimensions in mm, yarn in m to a tenth. */
export function sizesCsv(plan: Plan, sized: readonly SizedPlan[]): string {
  const { price } = plan.yarn;
  const decimals = price ? currencyDecimals(price.currency) : 0;
  const row = (what: string, cell: (each: SizedPlan) => CsvCell): CsvCell[] => [
    what,
    ...sized.map(cell),
  ];
  const tenth = (value: number): number => Math.round(10 * value) / 10;
  return toCsv(
    ['size', ...sized.map(({ target }) => target.name)],
    [
      row('columns', ({ columns }) => columns),
      row('rows', ({ rows }) => rows),
      row('width_mm', ({ size }) => tenth(size.widthMm)),
      row('height_mm', ({ size }) => tenth(size.heightMm)),
      ...plan.colours.flatMap(({ name }, i) => [
        row(`${name}: needed_m`, ({ colours }) => tenth(colours[i]?.neededM ?? 0)),
        row(`${name}: skeins`, ({ colours }) => colours[i]?.skeins ?? 0),
      ]),
      row('skeins', ({ totals }) => totals.skeins),
      ...(price
        ? [
            row(`cost_${price.currency}`, ({ totals }) =>
              totals.costMinor === null
                ? null
                : (totals.costMinor / 10 ** decimals).toFixed(decimals),
            ),
          ]
        : []),
    ],
  );
}
