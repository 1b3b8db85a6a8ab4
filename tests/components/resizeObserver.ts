import { vi } from 'vitest';

/** jsdom lays nothing out. This says once that every watched element is `widthPx` wide. */
export function stubWidth(widthPx: number): void {
  class StubObserver {
    constructor(private readonly report: ResizeObserverCallback) {}
    observe() {
      const entry = { contentRect: { width: widthPx } } as ResizeObserverEntry;
      this.report([entry], this as unknown as ResizeObserver);
    }
    unobserve() {}
    disconnect() {}
  }
  vi.stubGlobal('ResizeObserver', StubObserver);
}
