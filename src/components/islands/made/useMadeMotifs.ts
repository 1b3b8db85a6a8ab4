import { useQuery, useQueryClient } from '@tanstack/react-query';
import {
  createMadeMotif,
  deleteMadeMotif,
  madeMotifsOf,
  updateMadeMotif,
} from '../../../client/queries/madeMotifs';
import type { MadeMotifInput, PresentedMadeMotif } from '../../../schemas/madeMotif';
import { madeContent, type KeptMade } from './keptMade';
import { useDeviceMade } from './useDeviceMade';

interface MadeMotifsOptions {
  motifKey: string;
  signedIn: boolean;
  /** Those of the account; none for a stranger. */
  initial: PresentedMadeMotif[];
}

/** What was made of one motif: of a signed-in person in the account, of a stranger on this device. */
export function useMadeMotifs({ motifKey, signedIn, initial }: MadeMotifsOptions) {
  const client = useQueryClient();
  const query = madeMotifsOf(motifKey);
  const account = useQuery({ ...query, enabled: signedIn, initialData: initial });
  const device = useDeviceMade();
  const onDevice = device.made.filter((each) => each.motifKey === motifKey);
  const kept: readonly KeptMade[] = [...(signedIn ? account.data : onDevice)].sort(newestFirst);
  const left = signedIn ? onDevice : [];

  const change = (next: (rows: PresentedMadeMotif[]) => PresentedMadeMotif[]) =>
    client.setQueryData<PresentedMadeMotif[]>(query.queryKey, (rows = []) => next(rows));

  async function save(content: MadeMotifInput, from: KeptMade | null): Promise<KeptMade> {
    if (!signedIn) return device.save(content, from);
    const row = from
      ? await updateMadeMotif(from.id, from.version, content)
      : await createMadeMotif(content);
    change((rows) => [row, ...rows.filter(({ id }) => id !== row.id)]);
    return row;
  }

  async function remove({ id }: KeptMade): Promise<void> {
    if (!signedIn) return device.remove([id]);
    await deleteMadeMotif(id);
    change((rows) => rows.filter((row) => row.id !== id));
  }

  async function takeToAccount(): Promise<void> {
    const taken: string[] = [];
    try {
      for (const each of left) {
        const row = await createMadeMotif(madeContent(each));
        taken.push(each.id);
        change((rows) => [row, ...rows]);
      }
    } finally {
      // Should one be refused, those before it must not be taken twice.
      device.remove(taken);
    }
  }

  return {
    kept,
    left,
    save,
    remove,
    takeToAccount,
    /** Why the list could not be asked for again. */
    error: signedIn ? account.error : null,
    retry: () => void account.refetch(),
  };
}

const newestFirst = (a: KeptMade, b: KeptMade): number =>
  a.madeOn === b.madeOn ? 0 : a.madeOn < b.madeOn ? 1 : -1;
