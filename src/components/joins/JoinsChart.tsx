import { useId } from 'react';
import { Bar, BarChart, LabelList, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import type { JoinComparison } from '../../lib/joins/compareJoins';
import type { Plan } from '../../lib/plan/plan';
import { showYarn, YARN_UNIT, type Units } from '../../lib/units/display';
import { hexOf } from '../../lib/plan/hexOf';
import { StrandPattern } from '../ui/StrandPattern';
import type { Tension } from './tension';

interface JoinsChartProps {
  tensions: readonly Tension[];
  /** For each tension its joins, alike in order. */
  compared: readonly (readonly JoinComparison[])[];
  plan: Plan;
  units: Units;
}

const BAR_PX = 14;
const GAP_PX = 16;

/** Yarn of each join, thriftiest first, in the joining colour; the tables beside it hold the figures. */
export default function JoinsChart({ tensions, compared, plan, units }: JoinsChartProps) {
  const id = useId();
  const colour = hexOf(plan, plan.join.colour);
  const several = tensions.length > 1;
  const data = (compared[0] ?? [])
    .map((first, i) => ({
      name: first.join.name,
      firstM: first.joinM,
      yarn: compared.map((rows) => (rows[i]?.joinM ?? 0) / YARN_UNIT[units].m),
      words: compared.map((rows, k) => {
        const yarn = showYarn(rows[i]?.joinM ?? 0, units);
        return several ? `${yarn} · ${tensions[k]?.name ?? ''}` : yarn;
      }),
    }))
    .toSorted((left, right) => left.firstM - right.firstM);
  const rowPx = BAR_PX * tensions.length + GAP_PX;
  return (
    <figure>
      <figcaption className="font-bold">Yarn for the join alone</figcaption>
      <div aria-hidden className="keeps-colour mt-1" style={{ height: rowPx * data.length + 8 }}>
        <ResponsiveContainer>
          <BarChart
            // The chart is a picture of the table beneath: nothing in it takes the focus.
            accessibilityLayer={false}
            data={data}
            layout="vertical"
            margin={{ left: 0, right: several ? 150 : 72, top: 4, bottom: 4 }}
            barSize={BAR_PX}
            barGap={0}
          >
            <defs>
              <StrandPattern id={id} colour={colour} weight={plan.yarn.weightCategory} />
            </defs>
            <XAxis type="number" hide />
            <YAxis
              type="category"
              dataKey="name"
              width={168}
              tickLine={false}
              axisLine={false}
              tick={{ fill: 'var(--color-ink)', fontSize: 13 }}
            />
            {tensions.map((tension, k) => (
              <Bar
                key={tension.id}
                dataKey={({ yarn }: (typeof data)[number]) => yarn[k]}
                fill={`url(#${id})`}
                stroke="var(--color-edge)"
                isAnimationActive={false}
              >
                <LabelList
                  valueAccessor={(_: unknown, row: number) => data[row]?.words[k] ?? ''}
                  position="right"
                  fill="var(--color-ink)"
                  fontSize={several ? 11 : 13}
                />
              </Bar>
            ))}
          </BarChart>
        </ResponsiveContainer>
      </div>
    </figure>
  );
}
