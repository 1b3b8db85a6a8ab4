import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback, useMemo, useState } from 'react';
import {
  createOwnStitch,
  deleteOwnStitch,
  ownStitchesQuery,
  updateOwnStitch,
} from '../../../client/queries/ownStitches';
import type { OwnStitch } from '../../../lib/stitches/ownStitch';
import { OWN_STITCH_LIMITS } from '../../../lib/stitches/ownStitch';
import type { PresentedOwnStitch } from '../../../schemas/ownStitch';
import { stitchContent, type KeptStitch } from './keptStitch';
import { refusedHere } from './refusedHere';
import { useDeviceStitches } from './useDeviceStitches';

/** The form as it is open: on a kept stitch, or on a new one that begins with what is known of it. */
export type Writing =
  { readonly kept: KeptStitch } | { readonly kept: null; readonly begins: Partial<OwnStitch> };

/** What the panel needs of the hook; spread it over `<OwnStitchesPanel>`. */
export interface OwnStitchesState {
  readonly signedIn: boolean;
  readonly kept: readonly KeptStitch[];
  /** Those that stand on this device only, of a person who has since signed in. */
  readonly left: readonly KeptStitch[];
  readonly writing: Writing | null;
  readonly write: (writing: Writing | null) => void;
  readonly save: (stitch: OwnStitch, from: KeptStitch | null) => Promise<KeptStitch>;
  readonly remove: (kept: KeptStitch) => Promise<void>;
  readonly takeToAccount: () => Promise<void>;
  /** Why the stitches could not be asked for again. */
  readonly error: Error | null;
  readonly retry: () => void;
}

interface OwnStitchesOptions {
  signedIn: boolean;
  /** Those of the account; none for a stranger. */
  initial: readonly PresentedOwnStitch[];
}

/**
 * All stitches of the person's own: of a signed-in person in the account, of a stranger on this device.
 * Needs `WithQueries` round it. `stitches` stays the same array until one changes, so it can be given
 * to the reader; `openWith('lst')` opens the panel's form on a new stitch with that abbreviation, which
 * needs the panel to be mounted somewhere, seen or not.
 */
export function useOwnStitches({ signedIn, initial }: OwnStitchesOptions) {
  const client = useQueryClient();
  const { queryKey } = ownStitchesQuery;
  const account = useQuery({
    ...ownStitchesQuery,
    enabled: signedIn,
    initialData: initial as PresentedOwnStitch[],
  });
  const device = useDeviceStitches();
  const [writing, setWriting] = useState<Writing | null>(null);
  const kept: readonly KeptStitch[] = signedIn ? account.data : device.stitches;
  const stitches = useMemo(() => kept.map(stitchContent), [kept]);

  const change = (next: (rows: PresentedOwnStitch[]) => PresentedOwnStitch[]) =>
    client.setQueryData<PresentedOwnStitch[]>(queryKey, (rows = []) => next(rows));

  async function save(stitch: OwnStitch, from: KeptStitch | null): Promise<KeptStitch> {
    const refusal = refusedHere(stitch, from, kept);
    if (refusal) throw refusal;
    if (!signedIn) return device.save(stitch, from);
    const row = from
      ? await updateOwnStitch(from.id, from.version, stitch)
      : await createOwnStitch(stitch);
    change((rows) => [...rows.filter(({ id }) => id !== row.id), row].sort(byAbbreviation));
    return row;
  }

  async function remove({ id }: KeptStitch): Promise<void> {
    if (!signedIn) return device.remove([id]);
    await deleteOwnStitch(id);
    change((rows) => rows.filter((row) => row.id !== id));
  }

  const left = signedIn ? device.stitches : [];
  async function takeToAccount(): Promise<void> {
    const known = new Set(kept.map(({ abbreviation }) => abbreviation));
    const rows: PresentedOwnStitch[] = [];
    for (const each of left) {
      if (!known.has(each.abbreviation)) rows.push(await createOwnStitch(stitchContent(each)));
    }
    device.remove(left.map(({ id }) => id));
    change((old) => [...old, ...rows].sort(byAbbreviation));
  }

  const openWith = useCallback(
    (abbreviation: string) =>
      setWriting({ kept: null, begins: { abbreviation: asAbbreviation(abbreviation) } }),
    [],
  );
  const panelProps: OwnStitchesState = {
    signedIn,
    kept,
    left,
    writing,
    write: setWriting,
    save,
    remove,
    takeToAccount,
    error: signedIn ? account.error : null,
    retry: () => void account.refetch(),
  };
  return { stitches, openWith, panelProps };
}

const byAbbreviation = (a: KeptStitch, b: KeptStitch) => (a.abbreviation < b.abbreviation ? -1 : 1);

/** What of a word of the text can be an abbreviation: small letters. */
const asAbbreviation = (word: string): string =>
  word
    .toLowerCase()
    .replace(/[^a-z]/g, '')
    .slice(0, OWN_STITCH_LIMITS.abbreviation);
