import { memo } from 'react';
import { inkOf } from '../../lib/chart/inks';
import type { Chart } from '../../lib/chart/layoutChart';
import { SIZES } from '../../lib/chart/sizes';
import type { ChartSymbol } from '../../lib/chart/symbol';
import { symbolPath } from '../../lib/chart/symbolPath';

interface ChartRoundsProps {
  chart: Chart;
  /** Symbols that something else points at. */
  marked: readonly ChartSymbol[];
  /** Ink of each round. */
  inks: readonly number[];
}

/** The symbols of a chart, round by round in its own ink, in mm from the middle. For use inside an svg. */
export function ChartRounds({ chart, marked, inks }: ChartRoundsProps) {
  const { stitchWidthMm, magicRingMm } = chart;
  const line = SIZES.line * stitchWidthMm;
  return (
    <g strokeLinecap="round" strokeLinejoin="round" fill="none">
      <path
        d={marked.map((symbol) => Object.values(symbolPath(symbol)).join('')).join('')}
        className="stroke-amber"
        strokeWidth={4 * line}
        opacity="0.75"
      />
      <g strokeWidth={line}>
        {magicRingMm !== null && <circle r={magicRingMm} style={ink(0)} stroke="currentColor" />}
        <RoundPath symbols={chart.ring} ink={-1} />
        {chart.rounds.map((symbols, i) => (
          <RoundPath key={i} symbols={symbols} ink={inks[i] ?? i} />
        ))}
      </g>
    </g>
  );
}

const ink = (index: number) => {
  const { light, dark } = inkOf(index);
  return { color: `light-dark(${light}, ${dark})` };
};

const RoundPath = memo(
  ({ symbols, ink: index }: { symbols: readonly ChartSymbol[]; ink: number }) => {
    const paths = symbols.map(symbolPath);
    return (
      <g style={ink(index)}>
        <path d={paths.map(({ line }) => line).join('')} stroke="currentColor" />
        <path d={paths.map(({ solid }) => solid).join('')} fill="currentColor" />
      </g>
    );
  },
);
RoundPath.displayName = 'RoundPath';
