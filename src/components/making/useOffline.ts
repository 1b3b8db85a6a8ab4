import { useEffect } from 'react';

const WORKER = '/making-worker.js';

/** Has the browser keep this page and what it is made of, so that it opens without a connection. */
export function useOffline(): void {
  useEffect(() => {
    if (!('serviceWorker' in navigator)) return;
    async function keepPage() {
      await navigator.serviceWorker.register(WORKER, { scope: '/blankets/' });
      const { active } = await navigator.serviceWorker.ready;
      const parts = performance
        .getEntriesByType('resource')
        .map(({ name }) => name)
        .filter((name) => new URL(name).origin === location.origin && !name.includes('/api/'));
      active?.postMessage({ keep: [location.href, ...new Set(parts)] });
    }
    // Without it the page works as long as there is a connection.
    keepPage().catch(() => undefined);
  }, []);
}
