import type { MotifChoice } from '../../lib/motifs/motifChoices';

const KEY = 'ellwise.stayed';

/** Which newer versions of motifs the person has decided against, on this device: no part of the plan. */
function stayed(): Record<string, unknown> {
  try {
    const kept: unknown = JSON.parse(localStorage.getItem(KEY) ?? '{}');
    return typeof kept === 'object' && kept !== null ? (kept as Record<string, unknown>) : {};
  } catch {
    return {};
  }
}

export const hasStayed = ({ key, version }: MotifChoice): boolean => stayed()[key] === version;

export function stayWith({ key, version }: MotifChoice): void {
  try {
    localStorage.setItem(KEY, JSON.stringify({ ...stayed(), [key]: version }));
  } catch {
    // A browser without storage asks again next time.
  }
}
