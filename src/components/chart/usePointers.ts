import { useEffect, useRef, type PointerEvent, type RefObject } from 'react';
import type { InSight, Zoom } from './useZoom';

type Pixels = readonly [number, number];
type ToSight = (clientX: number, clientY: number) => InSight;

/** How far a finger may slip and still tap. */
const TAP_PX = 6;

interface PointerActs {
  zoom: Zoom;
  inSight: ToSight;
  /** A mouse over the drawing, or away from it. */
  onHover: (at: InSight | null) => void;
  onTap: (at: InSight) => void;
}

/** Drags, pinches, hovers and taps on a drawing that can be looked at closer. */
export function usePointers({ zoom, inSight, onHover, onTap }: PointerActs) {
  const down = useRef(new Map<number, Pixels>());
  const slipPx = useRef(0);

  /** Moves what lay under one point of the screen to another. */
  function pan(from: Pixels, to: Pixels) {
    const [before, after] = [inSight(...from), inSight(...to)];
    zoom.pan([before[0] - after[0], before[1] - after[1]]);
  }

  function onPointerMove(event: PointerEvent) {
    const at: Pixels = [event.clientX, event.clientY];
    const before = down.current.get(event.pointerId);
    if (!before) {
      if (event.pointerType === 'mouse') onHover(inSight(...at));
      return;
    }
    const other = [...down.current].find(([id]) => id !== event.pointerId)?.[1];
    slipPx.current += Math.hypot(at[0] - before[0], at[1] - before[1]);
    if (other) {
      const apart = (point: Pixels) => Math.hypot(point[0] - other[0], point[1] - other[1]);
      const middle = (point: Pixels): Pixels => [
        (point[0] + other[0]) / 2,
        (point[1] + other[1]) / 2,
      ];
      zoom.zoomBy(apart(at) / Math.max(1, apart(before)), inSight(...middle(before)));
      pan(middle(before), middle(at));
    } else if (zoom.view.zoom > 1) pan(before, at);
    down.current.set(event.pointerId, at);
  }

  return {
    onPointerDown: (event: PointerEvent) => {
      slipPx.current = down.current.size === 0 ? 0 : TAP_PX;
      down.current.set(event.pointerId, [event.clientX, event.clientY]);
      if (zoom.view.zoom > 1) event.currentTarget.setPointerCapture?.(event.pointerId);
    },
    onPointerMove,
    onPointerUp: (event: PointerEvent) => {
      const isTap = down.current.has(event.pointerId) && slipPx.current < TAP_PX;
      down.current.delete(event.pointerId);
      if (isTap) onTap(inSight(event.clientX, event.clientY));
    },
    onPointerCancel: (event: PointerEvent) => down.current.delete(event.pointerId),
    onPointerLeave: (event: PointerEvent) => {
      down.current.delete(event.pointerId);
      // A finger leaves with every tap; what it pointed at stays.
      if (event.pointerType === 'mouse') onHover(null);
    },
  };
}

/** The wheel looks closer with Ctrl, or once the drawing has the focus; else it scrolls the page. */
export function useWheel(ref: RefObject<Element | null>, zoom: Zoom, inSight: ToSight): void {
  const latest = useRef({ zoom, inSight });
  useEffect(() => {
    latest.current = { zoom, inSight };
  });
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    function wheel(event: WheelEvent) {
      if (!event.ctrlKey && !element?.matches(':focus')) return;
      event.preventDefault();
      const factor = Math.exp(-event.deltaY * (event.ctrlKey ? 0.01 : 0.002));
      const { zoom, inSight } = latest.current;
      zoom.zoomBy(factor, inSight(event.clientX, event.clientY));
    }
    // React's own listeners are passive and cannot keep the page from scrolling.
    const listener = wheel as EventListener;
    element.addEventListener('wheel', listener, { passive: false });
    return () => element.removeEventListener('wheel', listener);
  }, [ref]);
}
