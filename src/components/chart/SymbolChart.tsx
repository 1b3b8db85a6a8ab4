import { Download, Maximize, ZoomIn, ZoomOut } from 'lucide-react';
import { memo, useMemo, useState, type KeyboardEvent } from 'react';
import { download, downloadBlob } from '../../client/download';
import { chartSvg } from '../../lib/chart/chartSvg';
import { layoutChart } from '../../lib/chart/layoutChart';
import type { ChartSymbol } from '../../lib/chart/symbol';
import type { Gauge } from '../../lib/gauge/gauge';
import type { Reading } from '../../lib/pattern/reading';
import type { OwnStitch } from '../../lib/stitches/ownStitch';
import type { Units } from '../../lib/units/display';
import type { Terms } from '../planner/stitchWord';
import { Button } from '../ui/Button';
import { Disclosure } from '../ui/Disclosure';
import { Menu } from '../ui/Menu';
import { ChartFrame, marginMmOf } from './ChartFrame';
import { ChartKey } from './ChartKey';
import { ChartRounds } from './ChartRounds';
import { ChartTable } from './ChartTable';
import { symbolInWords } from './chartWords';
import { chartPng, fileName } from './downloadChart';
import { nearestSymbol } from './nearestSymbol';
import { roundInks } from './roundInks';
import { useZoom } from './useZoom';

/** A stitch of the chart by its round and its index there; round -1 is the ring. */
export interface StitchAddress {
  round: number;
  stitch: number;
}

interface SymbolChartProps {
  reading: Reading;
  gauge: Gauge;
  name: string;
  units: Units;
  terms: Terms;
  ownStitches?: readonly OwnStitch[];
  /** Stitches that the text points at. */
  marked: readonly StitchAddress[];
  /** The stitch that the chart points at, or none. */
  onPoint: (stitch: StitchAddress | null) => void;
  maxHeightPx?: number;
}

const STEP = 1.5;
const KEYS =
  'Arrow keys walk from stitch to stitch, plus and minus look closer or farther, 0 shows it whole.';

/** A pattern in symbols: under the rule, looked at as closely as one likes, and in words beside it. */
export const SymbolChart = memo((props: SymbolChartProps) => {
  const {
    reading,
    gauge,
    name,
    units,
    terms,
    ownStitches,
    marked,
    onPoint,
    maxHeightPx = 530,
  } = props;
  const chart = useMemo(
    () => layoutChart(reading, gauge, ownStitches),
    [reading, gauge, ownStitches],
  );
  const inks = useMemo(() => roundInks(reading), [reading]);
  const codes = useMemo(() => codesOf(reading), [reading]);
  const [pointed, setPointed] = useState<StitchAddress | null>(null);
  const [failed, setFailed] = useState(false);
  // A large chart has thousands of lines of table, which most people never open.
  const [hasTable, setHasTable] = useState(false);
  const marginMm = marginMmOf(chart);
  const room = { widthMm: chart.widthMm + 2 * marginMm, heightMm: chart.heightMm + 2 * marginMm };
  const zoom = useZoom(room);

  const symbolAt = ({ round, stitch }: StitchAddress): ChartSymbol | undefined =>
    (round < 0 ? chart.ring : chart.rounds[round])?.[stitch];
  const current = pointed ? symbolAt(pointed) : undefined;
  const shown = current ? [current] : marked.flatMap((each) => symbolAt(each) ?? []);

  function point(symbol: ChartSymbol | null) {
    if (symbol?.round === pointed?.round && symbol?.stitch === pointed?.stitch) return;
    const address = symbol && { round: symbol.round, stitch: symbol.stitch };
    setPointed(address);
    onPoint(address);
  }

  const fromFrame = ([x, y]: readonly [number, number]): readonly [number, number] => [
    x - marginMm - chart.originMm[0],
    y - marginMm - chart.originMm[1],
  ];

  function onKeyDown(event: KeyboardEvent) {
    const next = walked(
      event.key,
      pointed,
      chart.rounds.map(({ length }) => length),
    );
    const symbol = next && symbolAt(next);
    if (symbol) {
      point(symbol);
      const [x, y] = symbol.head;
      zoom.show([x + marginMm + chart.originMm[0], y + marginMm + chart.originMm[1]]);
    } else if (event.key === '+' || event.key === '=') zoom.zoomBy(STEP);
    else if (event.key === '-') zoom.zoomBy(1 / STEP);
    else if (event.key === '0') zoom.whole();
    else if (event.key === 'Escape') point(null);
    else return;
    event.preventDefault();
  }

  async function savePng() {
    try {
      setFailed(false);
      downloadBlob(`${fileName(name)}.png`, await chartPng(chart, name, inks));
    } catch {
      setFailed(true);
    }
  }

  return (
    <section aria-label="Chart">
      <div className="not-printed mb-2 flex flex-wrap items-center gap-2">
        <Button small icon={ZoomIn} onClick={() => zoom.zoomBy(STEP)}>
          Closer
        </Button>
        <Button
          small
          icon={ZoomOut}
          aria-disabled={zoom.view.zoom === 1}
          onClick={() => zoom.zoomBy(1 / STEP)}
        >
          Farther
        </Button>
        <Button small icon={Maximize} aria-disabled={zoom.view.zoom === 1} onClick={zoom.whole}>
          Whole
        </Button>
        <span className="flex-1" />
        <Menu
          small
          word="Download"
          icon={Download}
          items={[
            {
              word: 'As SVG, for print and drawing programs',
              onSelect: () =>
                download(`${fileName(name)}.svg`, 'image/svg+xml', chartSvg(chart, name, inks)),
            },
            { word: 'As PNG, a picture', onSelect: () => void savePng() },
          ]}
        />
      </div>
      {failed && <p role="alert">This browser could not make the picture; the SVG still works.</p>}
      <ChartFrame
        {...{ chart, zoom, units, maxHeightPx, onKeyDown }}
        label={`Chart of ${name || 'the motif'}, ${reading.rounds.length} rounds, to scale. ${KEYS} The same stitches stand in the table below.`}
        onHover={(at) => point(at && nearestSymbol(chart, fromFrame(at)))}
        onTap={(at) => point(nearestSymbol(chart, fromFrame(at)))}
      >
        <ChartRounds {...{ chart, inks }} marked={shown} />
      </ChartFrame>
      <p className="not-printed mt-2 min-h-6 text-ink-2" aria-live="polite">
        {current ? (
          <span className="text-ink">{symbolInWords(current, reading, terms)}</span>
        ) : (
          'Point at a stitch to see where the text says it.'
        )}
      </p>
      <div className="mt-3">
        <ChartKey {...{ codes, terms, ownStitches }} />
      </div>
      <Disclosure
        className="not-printed mt-3"
        summary="The chart as a table"
        onToggle={setHasTable}
      >
        {hasTable && <ChartTable {...{ reading, terms }} />}
      </Disclosure>
    </section>
  );
});
SymbolChart.displayName = 'SymbolChart';

/** Every stitch that the pattern makes, in the order of its first. */
const codesOf = ({ ring, rounds }: Reading): string[] => [
  ...new Set([...Object.keys(ring.made), ...rounds.flatMap(({ made }) => Object.keys(made))]),
];

/** The stitch that an arrow key leads to: along the round, or to the like place of the next. */
function walked(
  key: string,
  from: StitchAddress | null,
  counts: readonly number[],
): StitchAddress | null {
  const step = { ArrowLeft: [0, 1], ArrowRight: [0, -1], ArrowUp: [1, 0], ArrowDown: [-1, 0] }[key];
  if (!step || counts.length === 0) return null;
  if (!from || from.round < 0) return { round: 0, stitch: 0 };
  const [rounds = 0, stitches = 0] = step;
  const round = Math.min(counts.length - 1, Math.max(0, from.round + rounds));
  const count = counts[round] ?? 0;
  if (stitches === 0) {
    const share = from.stitch / Math.max(1, counts[from.round] ?? 1);
    return { round, stitch: Math.min(count - 1, Math.round(share * count)) };
  }
  const stitch = from.stitch + stitches;
  if (stitch >= count && round + 1 < counts.length) return { round: round + 1, stitch: 0 };
  if (stitch < 0 && round > 0) return { round: round - 1, stitch: (counts[round - 1] ?? 1) - 1 };
  return { round, stitch: Math.min(count - 1, Math.max(0, stitch)) };
}
