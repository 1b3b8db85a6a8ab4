import { useEffect, useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { sameAround, withPainted, withRecoloured } from '../../../lib/colour/paintEdits';
import type { Estimate } from '../../../lib/ledger/ledger';
import { blanketFaces, type BlanketMotif } from '../../../lib/plan/blanketFaces';
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

/** A stroke under way: its motifs are on the canvas, and go into the plan when it ends. */
interface Stroke {
  plan: Plan;
  last: readonly [number, number];
  readonly painted: Map<number, number>;
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
  const stroke = useRef<Stroke | null>(null);
  const { widthMm, heightMm } = estimate.size;
  const laid = blanketFaces(plan, estimate);
  const here = laid.motifs[Math.min(at, laid.motifs.length - 1)];

  // A stroke belongs to the plan it began on.
  useEffect(() => {
    stroke.current = null;
  }, [plan]);

  /** The plan and the colourway that the brush gives a motif; null where it does not suit it. */
  function brushed(on: Plan, { colourway }: BlanketMotif) {
    if (brush.of === 'round') return withRecoloured(on, colourway, brush.round, brush.colour);
    return suits(on, colourway, brush.colourway) ? { plan: on, colourway: brush.colourway } : null;
  }

  function withBrushed(on: Plan, motifs: readonly BlanketMotif[]): Plan {
    return motifs.reduce((painted, motif) => {
      const next = brushed(painted, motif);
      return next ? withPainted(next.plan, [{ ...motif, colourway: next.colourway }]) : painted;
    }, on);
  }

  function use(motif: number): void {
    setAt(motif);
    if (tool === 'pick') onPick(motif);
    else if (tool === 'fill') {
      change((old) => withBrushed(old, sameAround(laid, motif)));
    } else if (tool === 'paint') {
      change((old) => withBrushed(old, laid.motifs.slice(motif, motif + 1)));
    }
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
    stroke.current = { plan, last: point, painted: new Map() };
    dab(motif === null ? [] : [motif]);
  }

  function dab(motifs: readonly number[]): void {
    const now = stroke.current;
    if (!now) return;
    const shown: BlanketMotif[] = [];
    for (const i of motifs) {
      const motif = laid.motifs[i];
      const next = motif && !now.painted.has(i) ? brushed(now.plan, motif) : null;
      if (!motif || !next) continue;
      now.plan = next.plan;
      now.painted.set(i, next.colourway);
      shown.push({ ...motif, colourway: next.colourway });
    }
    if (shown.length > 0) show(now.plan, shown);
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
    const done = stroke.current;
    stroke.current = null;
    if (!done || done.painted.size === 0) return;
    const painted = [...done.painted].flatMap(([i, colourway]) =>
      laid.motifs[i] ? [{ ...laid.motifs[i], colourway }] : [],
    );
    change(() => withPainted(done.plan, painted));
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
