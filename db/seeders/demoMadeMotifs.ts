import type { Transaction } from 'sequelize';
import type { Motif } from '../../src/lib/motifs/motif';
import { madeMotifInput } from '../../src/schemas/madeMotif';
import type { CurrentUser } from '../../src/schemas/user';
import { createMadeMotif } from '../../src/server/commands/createMadeMotif';

/** A made motif by the names of what it is of; the rest is as the schema takes it. */
export interface DemoMadeMotif {
  /** Key of a ready-made motif, or the name of one's own. */
  motif: string;
  yarn: string;
  swatch: string;
}

interface Kept {
  motifs: readonly (Motif | null)[];
  swatchIds: ReadonlyMap<string, string>;
  yarns: readonly { name: string; weightCategory: number; putUp: object }[];
}

/** Everything a person made and measured, of the motifs as they were saved last. */
export async function addMadeMotifs(
  user: CurrentUser,
  all: readonly DemoMadeMotif[],
  { motifs, swatchIds, yarns }: Kept,
  transaction: Transaction,
): Promise<void> {
  for (const { motif, yarn, swatch, ...measured } of all) {
    const own = motifs.findLast((each) => each?.name === motif);
    const { weightCategory, putUp } = yarns.find(({ name }) => name === yarn)!;
    const input = madeMotifInput.parse({
      ...measured,
      motifKey: own?.key ?? motif,
      motifVersion: own?.version ?? null,
      swatchId: swatchIds.get(swatch),
      weightCategory,
      putUp,
    });
    await createMadeMotif(user, input, transaction);
  }
}
