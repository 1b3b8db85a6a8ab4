import { useCallback, useEffect, useMemo, useRef } from 'react';
import { drawBorder, layStamps, stampsOf, type Stamp } from '../../blanket/paintBlanket';
import type { Estimate } from '../../../lib/ledger/ledger';
import { blanketFaces, type BlanketMotif } from '../../../lib/plan/blanketFaces';
import type { Plan } from '../../../lib/plan/plan';

/** Most pixels a canvas is given: phones refuse more. */
const MOST_PIXELS = 12_000_000;

interface PaintCanvas {
  readonly ref: React.RefObject<HTMLCanvasElement | null>;
  /** Shows these motifs in colourways of `plan`, at once and without a render. */
  readonly show: (plan: Plan, motifs: readonly BlanketMotif[]) => void;
}

/** A canvas with the blanket on it, `widthPx` wide: painted anew when the plan changes, and motif by motif in between. */
export function usePaintCanvas(plan: Plan, estimate: Estimate, widthPx: number): PaintCanvas {
  const ref = useRef<HTMLCanvasElement>(null);
  const known = useRef<ReadonlyMap<string, Stamp>>(new Map());
  const { widthMm, heightMm } = estimate.size;
  const scale = useMemo(() => {
    const density = typeof window === 'undefined' ? 1 : window.devicePixelRatio;
    const wanted = (widthPx * density) / widthMm;
    return Math.min(wanted, Math.sqrt(MOST_PIXELS / (widthMm * heightMm)));
  }, [widthPx, widthMm, heightMm]);

  const stamped = useCallback(
    (shown: Plan): Stamp[] => {
      const made = stampsOf(shown, estimate, scale, known.current);
      known.current = new Map([...known.current, ...made.known]);
      return made.stamps;
    },
    [estimate, scale],
  );

  useEffect(() => {
    const canvas = ref.current;
    const context = canvas?.getContext('2d');
    if (!canvas || !context) return;
    canvas.width = Math.ceil(widthMm * scale);
    canvas.height = Math.ceil(heightMm * scale);
    const { motifs } = blanketFaces(plan, estimate);
    drawBorder(context, plan, estimate, scale);
    layStamps(context, motifs, stamped(plan), scale);
  }, [plan, estimate, scale, stamped, widthMm, heightMm]);

  const show = useCallback(
    (shown: Plan, motifs: readonly BlanketMotif[]) => {
      const context = ref.current?.getContext('2d');
      if (context) layStamps(context, motifs, stamped(shown), scale);
    },
    [scale, stamped],
  );
  return { ref, show };
}
