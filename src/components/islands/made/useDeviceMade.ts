import { useEffect, useState } from 'react';
import { ApiError } from '../../../client/api';
import type { MadeMotifInput } from '../../../schemas/madeMotif';
import { MOST_ON_DEVICE, readDeviceMade, writeDeviceMade } from './deviceMade';
import type { KeptMade } from './keptMade';

/** The made motifs that this device keeps, of every motif, also while another tab changes them. */
export function useDeviceMade() {
  const [made, setMade] = useState<readonly KeptMade[]>([]);
  useEffect(() => {
    const read = () => setMade(readDeviceMade());
    read();
    window.addEventListener('storage', read);
    return () => window.removeEventListener('storage', read);
  }, []);

  function write(next: readonly KeptMade[]) {
    writeDeviceMade(next);
    setMade(next);
  }

  return {
    made,
    save(content: MadeMotifInput, from: KeptMade | null): KeptMade {
      if (!from && made.length >= MOST_ON_DEVICE) throw full();
      const saved = { ...content, id: from?.id ?? newId(made), version: 1 };
      write(from ? made.map((each) => (each.id === from.id ? saved : each)) : [saved, ...made]);
      return saved;
    },
    remove: (gone: readonly string[]) => write(made.filter(({ id }) => !gone.includes(id))),
  };
}

/** Unlike any that is there. */
function newId(made: readonly KeptMade[]): string {
  const numbers = made.map(({ id }) => Number(id)).filter(Number.isFinite);
  return String(Math.max(0, ...numbers) + 1);
}

const full = () =>
  new ApiError(400, {
    code: 'invalid',
    message: `This device keeps ${MOST_ON_DEVICE} made motifs, the most there can be: delete one first, or sign in.`,
  });
