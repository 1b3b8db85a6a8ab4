import { abbreviationOf } from '../../stitches/ownStitch';
import type { PlaceFilter } from '../syntax';

/** A kind of place in the trade's words: "ch-2 sp", "dc", "sts". */
export function filterInWords({ of, code, chains }: PlaceFilter, count = 1): string {
  const s = count === 1 ? '' : 's';
  if (of === 'corner') return `corner${s}`;
  if (of === 'gap-of-groups') return `sp${s} between groups`;
  if (of === 'gap') return `sp${s} between ${code === null ? 'sts' : abbreviationOf(code)}`;
  const corner = of === 'corner-space' ? 'corner ' : '';
  if (of === 'stitch') return code === null ? `st${s}` : abbreviationOf(code);
  if (of === 'stitch-or-space') return `st${s} or sp${s}`;
  return chains === null ? `${corner}${corner ? '' : 'ch-'}sp${s}` : `${corner}ch-${chains} sp${s}`;
}

/** "1 st", "3 sts". */
export const counted = (count: number, noun: string): string =>
  `${count} ${noun}${count === 1 ? '' : 's'}`;
