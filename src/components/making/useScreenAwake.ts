import { useEffect, useState } from 'react';

/** Keeps the screen from going dark while the page is looked at, where the browser can. */
export function useScreenAwake(wanted: boolean): boolean {
  const [awake, setAwake] = useState(false);
  useEffect(() => {
    if (!wanted || !('wakeLock' in navigator)) return;
    let lock: WakeLockSentinel | null = null;
    let over = false;
    async function keepAwake() {
      if (document.visibilityState !== 'visible') return;
      try {
        lock = await navigator.wakeLock.request('screen');
        if (over) await lock.release();
        else setAwake(true);
      } catch {
        // A browser that saves its battery may refuse; everything else works.
        setAwake(false);
      }
    }
    void keepAwake();
    // A lock ends when the page is hidden.
    const again = () => void keepAwake();
    document.addEventListener('visibilitychange', again);
    return () => {
      over = true;
      setAwake(false);
      document.removeEventListener('visibilitychange', again);
      void lock?.release();
    };
  }, [wanted]);
  return awake;
}
