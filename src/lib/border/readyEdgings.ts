import type { Edging } from './edging';
import { readEdging } from './readEdging';

/** A ready-made round of border, in US terms. */
export interface ReadyEdging {
  readonly key: string;
  readonly name: string;
  readonly description: string;
  readonly text: string;
}

/** Edgings in common use, in the program's own words. */
export const READY_EDGINGS: readonly ReadyEdging[] = [
  {
    key: 'shell',
    name: 'Shells',
    description: 'Fans of five dc, each held down by a sc on either side.',
    text: 'Ch 1, *sc in next st, sk 2 sts, 5 dc in next st, sk 2 sts; rep from * around; join with sl st in first sc.',
  },
  {
    key: 'scallop',
    name: 'Small scallops',
    description: 'Low waves that rise to three dc and fall to a slip stitch.',
    text: 'Ch 1, *sl st in next st, hdc in next st, 3 dc in next st, hdc in next st; rep from * around; join with sl st in first sl st.',
  },
  {
    key: 'picot',
    name: 'Picots',
    description: 'A point of three chains after every third sc.',
    text: 'Ch 1, *sc in next 3 sts, ch-3 picot; rep from * around; join with sl st in first sc.',
  },
  {
    key: 'mesh',
    name: 'Mesh',
    description: 'Open squares: a dc, a chain over the stitch that is skipped.',
    text: 'Ch 4 (counts as dc and ch 1), sk next st, *dc in next st, ch 1, sk next st; rep from * around; join with sl st in 3rd ch of beg ch-4.',
  },
  {
    key: 'v-stitch',
    name: 'V stitches',
    description: 'Two dc with a chain between them, in every third stitch.',
    text: 'Ch 4 (counts as dc and ch 1), dc in same st, sk 2 sts, *(dc, ch 1, dc) in next st, sk 2 sts; rep from * around; join with sl st in 3rd ch of beg ch-4.',
  },
  {
    key: 'loops',
    name: 'Chain loops',
    description: 'Loops of five chains, held by a sc in every fourth stitch.',
    text: 'Ch 1, *sc in next st, ch 5, sk 3 sts; rep from * around; join with sl st in first sc.',
  },
  {
    key: 'crab',
    name: 'Crab stitch',
    description:
      'Single crochet worked backwards, which twists to a cord; the last round of a border.',
    text: 'Work this round from left to right. Ch 1, sc in each st around; join with sl st in first sc.',
  },
];

const read = new Map<string, Edging>();

/** The ready-made edging of this key as the reader works it out, or null. */
export function readyEdging(key: string): Edging | null {
  const ready = READY_EDGINGS.find((each) => each.key === key);
  if (!ready) return null;
  const known = read.get(key);
  if (known) return known;
  const { edging } = readEdging(ready.text, { terms: 'us' });
  if (!edging) return null;
  const named = { name: ready.name, ...edging };
  read.set(key, named);
  return named;
}
