import { useId } from 'react';
import { Bar, BarChart, ResponsiveContainer, XAxis, YAxis } from 'recharts';
import { PARTS, type Estimate } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import { showYarn, YARN_UNIT, type Units } from '../../lib/units/display';
import { StrandPattern } from '../ui/StrandPattern';
import { PART_WORDS } from './words';

interface PartsChartProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
}

/** Yarn by part, each bar laid of the colours' own strands, with its figure at the end. */
export default function PartsChart({ plan, estimate, units }: PartsChartProps) {
  const id = useId();
  const rows = PARTS.map((part) => {
    const ofPart = estimate.parts.filter((each) => each.part === part);
    return {
      part: PART_WORDS[part],
      words: showYarn(
        ofPart.reduce((sum, { lengthM }) => sum + lengthM, 0),
        units,
      ),
      ...Object.fromEntries(
        ofPart.map(({ colour, lengthM }) => [colour, lengthM / YARN_UNIT[units].m]),
      ),
    };
  });
  return (
    <figure>
      <div aria-hidden className="keeps-colour h-44">
        <ResponsiveContainer>
          <BarChart
            // A picture with its figures in words: nothing in it takes the focus.
            accessibilityLayer={false}
            data={rows}
            layout="vertical"
            margin={{ left: 0, right: 0, top: 4, bottom: 0 }}
            barCategoryGap={8}
          >
            <defs>
              {plan.colours.map(({ key, hex }) => (
                <StrandPattern
                  key={key}
                  id={`${id}${key}`}
                  colour={hex}
                  weight={plan.yarn.weightCategory}
                />
              ))}
            </defs>
            <XAxis type="number" hide />
            <YAxis
              type="category"
              dataKey="part"
              width={92}
              tickLine={false}
              axisLine={false}
              tick={{ fill: 'var(--color-ink)', fontSize: 13 }}
            />
            {plan.colours.map(({ key }) => (
              <Bar
                key={key}
                dataKey={key}
                stackId="yarn"
                fill={`url(#${id}${key})`}
                stroke="var(--color-edge)"
                isAnimationActive={false}
              />
            ))}
            {/* The figures stand on an axis of their own, which needs a bar to belong to. */}
            <YAxis
              yAxisId="figures"
              orientation="right"
              type="category"
              dataKey="words"
              width={72}
              tickLine={false}
              axisLine={false}
              tick={{ fill: 'var(--color-ink)', fontSize: 13 }}
            />
            <Bar yAxisId="figures" dataKey="none" isAnimationActive={false} />
          </BarChart>
        </ResponsiveContainer>
      </div>
      <figcaption className="sr-only">
        {rows.map(({ part, words }) => `${part}: ${words}`).join('; ')}
      </figcaption>
    </figure>
  );
}
