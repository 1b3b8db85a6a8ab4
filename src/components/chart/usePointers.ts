import { useEffect, useRef, type PointerEvent, type RefObject } from 'react';
import type { Zoom } from './useZoom';

type Pixels = readonly [number, number];
type ToMm = (clientX: number, clientY: number) => readonly [number, number];

/** How far a finger may slip and still tap. */
const TAP_PX = 6;

interface PointerActs {
  zoom: Zoom;
  pxPerMm: number;
  toMm: ToMm;
  /** A mouse over the drawing, or away from it. */
  onHover: (atMm: readonly [number, number] | null) => void;
  onTap: (atMm: readonly [number, number]) => void;
}

/** Drags, pinches, hovers and taps on a drawing that can be looked at closer. */
export function usePointers({ zoom, pxPerMm, toMm, onHover, onTap }: PointerActs) {
  const down = useRef(new Map<number, Pixels>());
  const slipPx = useRef(0);

  function onPointerMove(event: PointerEvent) {
    const at: Pixels = [event.clientX, event.clientY];
    const before = down.current.get(event.pointerId);
    if (!before) {
      if (event.pointerType === 'mouse') onHover(toMm(...at));
      return;
    }
    const others = [...down.current].filter(([id]) => id !== event.pointerId);
    const [other] = others;
    slipPx.current += Math.hypot(at[0] - before[0], at[1] - before[1]);
    if (other) {
      const [x, y] = other[1];
      const apart = (point: Pixels) => Math.hypot(point[0] - x, point[1] - y);
      zoom.zoomBy(apart(at) / Math.max(1, apart(before)), toMm((at[0] + x) / 2, (at[1] + y) / 2));
    } else if (zoom.view.zoom > 1) {
      zoom.pan((before[0] - at[0]) / pxPerMm, (before[1] - at[1]) / pxPerMm);
    }
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
      if (isTap) onTap(toMm(event.clientX, event.clientY));
    },
    onPointerCancel: (event: PointerEvent) => down.current.delete(event.pointerId),
    onPointerLeave: (event: PointerEvent) => {
      down.current.delete(event.pointerId);
      onHover(null);
    },
  };
}

/** The wheel looks closer with Ctrl, or once the drawing has the focus; else it scrolls the page. */
export function useWheel(ref: RefObject<Element | null>, zoom: Zoom, toMm: ToMm): void {
  const latest = useRef({ zoom, toMm });
  useEffect(() => {
    latest.current = { zoom, toMm };
  });
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    function wheel(event: WheelEvent) {
      if (!event.ctrlKey && !element?.matches(':focus')) return;
      event.preventDefault();
      const factor = Math.exp(-event.deltaY * (event.ctrlKey ? 0.01 : 0.002));
      latest.current.zoom.zoomBy(factor, latest.current.toMm(event.clientX, event.clientY));
    }
    // React's own listeners are passive and cannot keep the page from scrolling.
    const listener = wheel as EventListener;
    element.addEventListener('wheel', listener, { passive: false });
    return () => element.removeEventListener('wheel', listener);
  }, [ref]);
}
