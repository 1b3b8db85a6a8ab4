import { useId } from 'react';
import { Bar, BarChart, LabelList, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import type { JoinComparison } from '../../lib/joins/compareJoins';
import type { Plan } from '../../lib/plan/plan';
import { showYarn, YARN_UNIT, type Units } from '../../lib/units/display';
import { StrandPattern } from '../ui/StrandPattern';

interface JoinsChartProps {
  rows: readonly JoinComparison[];
  plan: Plan;
  units: Units;
}

/** Yarn of each join, thriftiest first, in the joining colour. The table beneath holds the figures. */
export function JoinsChart({ rows, plan, units }: JoinsChartProps) {
  const id = useId();
  const colour = plan.colours.find(({ key }) => key === plan.join.colour)?.hex ?? '#888888';
  const data = rows
    .toSorted((left, right) => left.joinM - right.joinM)
    .map(({ join, joinM }) => ({
      name: join.name,
      yarn: joinM / YARN_UNIT[units].m,
      words: showYarn(joinM, units),
    }));
  return (
    <figure>
      <figcaption className="font-bold">Yarn for the join alone</figcaption>
      <div aria-hidden className="keeps-colour mt-1" style={{ height: 30 * data.length + 8 }}>
        <ResponsiveContainer>
          <BarChart
            // The chart is a picture of the table beneath: nothing in it takes the focus.
            accessibilityLayer={false}
            data={data}
            layout="vertical"
            margin={{ left: 0, right: 72, top: 4, bottom: 4 }}
            barSize={14}
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
            <Bar
              dataKey="yarn"
              fill={`url(#${id})`}
              stroke="var(--color-edge)"
              isAnimationActive={false}
            >
              <LabelList dataKey="words" position="right" fill="var(--color-ink)" fontSize={13} />
            </Bar>
          </BarChart>
        </ResponsiveContainer>
      </div>
    </figure>
  );
}
