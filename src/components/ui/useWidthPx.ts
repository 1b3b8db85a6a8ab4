import { useEffect, useRef, useState, type RefObject } from 'react';

/** The width of an element as it is laid out; `beforeMeasured` until the browser has measured it. */
export function useWidthPx<Element extends HTMLElement>(
  beforeMeasured: number,
): [RefObject<Element | null>, number] {
  const ref = useRef<Element>(null);
  const [widthPx, setWidthPx] = useState(beforeMeasured);
  useEffect(() => {
    if (!ref.current) return;
    const observer = new ResizeObserver(([entry]) => {
      if (entry && entry.contentRect.width > 0) setWidthPx(Math.round(entry.contentRect.width));
    });
    observer.observe(ref.current);
    return () => observer.disconnect();
  }, []);
  return [ref, widthPx];
}
