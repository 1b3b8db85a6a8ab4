import { useEffect, useState } from 'react';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import { onDevice, readDeviceStitches, writeDeviceStitches } from './deviceStitches';
import type { KeptStitch } from './keptStitch';

/** The stitches that this device keeps, also while another tab changes them. */
export function useDeviceStitches() {
  const [stitches, setStitches] = useState<readonly KeptStitch[]>([]);
  useEffect(() => {
    const read = () => setStitches(readDeviceStitches());
    read();
    window.addEventListener('storage', read);
    return () => window.removeEventListener('storage', read);
  }, []);

  function write(next: readonly KeptStitch[]) {
    writeDeviceStitches(next);
    setStitches(next);
  }

  return {
    stitches,
    save(stitch: OwnStitch, from: KeptStitch | null): KeptStitch {
      const saved = onDevice(stitch);
      write(
        from ? stitches.map((each) => (each.id === from.id ? saved : each)) : [...stitches, saved],
      );
      return saved;
    },
    remove: (gone: readonly string[]) => write(stitches.filter(({ id }) => !gone.includes(id))),
  };
}
