import { useEffect, useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { sameAround, withPainted, withPaintedRound } from '../../../lib/colour/paintEdits';
import type { Estimate } from '../../../lib/ledger/ledger';
import { blanketFaces } from '../../../lib/plan/blanketFaces';
import { motifAt, motifTowards } from '../../../lib/plan/motifAt';
import type { Plan } from '../../../lib/plan/plan';
import { classNames } from '../../ui/classNames';
import { useWidthPx } from '../../ui/useWidthPx';
import type { ChangePlan } from '../usePlan';
import { motifInWords } from './motifInWords';
import { usePaintCanvas } from './usePaintCanvas';

export type Tool = 'paint' | 'fill' | 'pick' | 'move';

/** What the brush holds: a colourway, or a colour for one round. */
export type Brush =
  | { readonly of: 'colourway'; readonly colourway: number }
  | { readonly of: 'round'; readonly round: number; readonly colour: string };

interface PaintCanvasProps {
  plan: Plan;
  estimate: Estimate;
  change: ChangePlan;
  tool: Tool;
  brush: Brush;
  onPick: (motif: number) => void;
  zoom: number;
  grey: boolean;
}

const ARROWS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};

/** The blanket to paint on: by finger, mouse or keyboard. A stroke is one step to undo. */
export function PaintCanvas(props: PaintCanvasProps) {
  const { plan, estimate, change, tool, brush, onPick, zoom, grey } = props;
  const [frame, frameWidthPx] = useWidthPx<HTMLDivElement>(600);
  const widthPx = frameWidthPx * zoom;
  const { ref, show } = usePaintCanvas(plan, estimate, widthPx);
  const [at, setAt] = useState(0);
  const [byKeys, setByKeys] = useState(false);
  const stroke = useRef<{ plan: Plan; last: readonly [number, number] } | null>(null);
  const { widthMm, heightMm } = estimate.size;
  const laid = blanketFaces(plan, estimate);
  const here = laid.motifs[Math.min(at, laid.motifs.length - 1)];

  // A stroke belongs to the plan it began on.
  useEffect(() => {
    stroke.current = null;
  }, [plan]);

  function brushed(on: Plan, motifs: readonly number[]): Plan {
    const all = blanketFaces(on, estimate).motifs;
    const faces = motifs.flatMap((i) => all[i] ?? []);
    return brush.of === 'round'
      ? withPaintedRound(on, faces, brush.round, brush.colour)
      : withPainted(
          on,
          faces.filter(({ colourway }) => suits(on, colourway, brush.colourway)),
          brush.colourway,
        );
  }

  function use(motif: number): void {
    setAt(motif);
    if (tool === 'pick') onPick(motif);
    else if (tool === 'fill') {
      const same = sameAround(laid, motif).map((each) => laid.motifs.indexOf(each));
      change((old) => brushed(old, same));
    } else if (tool === 'paint') change((old) => brushed(old, [motif]));
  }

  const pointOf = (event: PointerEvent<HTMLCanvasElement>): readonly [number, number] => {
    const box = event.currentTarget.getBoundingClientRect();
    return [
      ((event.clientX - box.left) / box.width) * widthMm,
      ((event.clientY - box.top) / box.height) * heightMm,
    ];
  };

  function onPointerDown(event: PointerEvent<HTMLCanvasElement>) {
    if (tool === 'move' || event.button !== 0) return;
    const point = pointOf(event);
    const motif = motifAt(laid, point);
    if (tool !== 'paint') {
      if (motif !== null) use(motif);
      return;
    }
    event.currentTarget.setPointerCapture(event.pointerId);
    stroke.current = { plan, last: point };
    dab(motif === null ? [] : [motif]);
  }

  function dab(motifs: readonly number[]): void {
    if (!stroke.current || motifs.length === 0) return;
    stroke.current.plan = brushed(stroke.current.plan, motifs);
    show(stroke.current.plan, motifs);
  }

  function onPointerMove(event: PointerEvent<HTMLCanvasElement>) {
    if (!stroke.current) return;
    const point = pointOf(event);
    dab(motifsBetween(stroke.current.last, point));
    stroke.current.last = point;
  }

  /** Motifs that a quick stroke passed over between two events. */
  function motifsBetween(from: readonly [number, number], to: readonly [number, number]): number[] {
    const stepMm = Math.max(5, (estimate.motifs[0]?.acrossMm ?? 50) / 3);
    const steps = Math.max(1, Math.ceil(Math.hypot(to[0] - from[0], to[1] - from[1]) / stepMm));
    const passed = new Set<number>();
    for (let i = 1; i <= steps; i += 1) {
      const share = i / steps;
      const point = [
        from[0] + share * (to[0] - from[0]),
        from[1] + share * (to[1] - from[1]),
      ] as const;
      const motif = motifAt(laid, point);
      if (motif !== null) passed.add(motif);
    }
    return [...passed];
  }

  function endStroke(): void {
    const done = stroke.current?.plan;
    stroke.current = null;
    if (done && done !== plan) change(() => done);
  }

  function onKeyDown(event: KeyboardEvent) {
    const way = ARROWS[event.key];
    if (way) setAt(motifTowards(laid, at, way));
    else if (event.key === 'Enter' || event.key === ' ') use(at);
    else return;
    setByKeys(true);
    event.preventDefault();
  }

  return (
    <div ref={frame} className="max-h-[62dvh] min-h-48 overflow-auto overscroll-contain bg-sunk">
      <div className="relative" style={{ width: widthPx, aspectRatio: `${widthMm} / ${heightMm}` }}>
        <canvas
          ref={ref}
          role="application"
          aria-label="The blanket, motif by motif. Arrow keys move, Enter uses the tool."
          tabIndex={0}
          className={classNames(
            'keeps-colour absolute inset-0 h-full w-full outline-none',
            grey && 'grayscale',
            tool === 'move' ? 'cursor-grab' : 'cursor-crosshair touch-none',
          )}
          onPointerDown={onPointerDown}
          onPointerMove={onPointerMove}
          onPointerUp={endStroke}
          onPointerCancel={endStroke}
          onKeyDown={onKeyDown}
          onFocus={({ target }) => setByKeys(target.matches(':focus-visible'))}
          onBlur={() => setByKeys(false)}
        />
        {byKeys && here && (
          <svg
            aria-hidden
            viewBox={`0 0 ${widthMm} ${heightMm}`}
            className="pointer-events-none absolute inset-0 h-full w-full"
          >
            <polygon
              points={here.outlineMm.map((point) => point.join()).join(' ')}
              className="fill-none stroke-teal"
              vectorEffect="non-scaling-stroke"
              strokeWidth={3}
            />
          </svg>
        )}
      </div>
      <p className="sr-only" role="status">
        {byKeys && here && motifInWords(plan, here)}
      </p>
    </div>
  );
}

/** Main motifs take colourways of the main motif, second ones those of the second. */
const suits = (plan: Plan, one: number, other: number): boolean =>
  (plan.colourways[one]?.motifIndex === plan.secondMotif) ===
  (plan.colourways[other]?.motifIndex === plan.secondMotif);
