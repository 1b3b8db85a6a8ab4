import { useMutation, useQueryClient, type QueryKey } from '@tanstack/react-query';
import { useState } from 'react';
import { failureWords } from './formErrors';

interface DeletionOptions<Row> {
  /** The list that the rows are shown from. */
  queryKey: QueryKey;
  remove: (row: Row) => Promise<unknown>;
  /** Brings a deleted row back. */
  restore: (row: Row) => Promise<unknown>;
}

export interface Deletion<Row> {
  /** What the last act deleted: what can be undone. */
  deleted: readonly Row[];
  failure: string | null;
  isBusy: boolean;
  remove: (rows: readonly Row[]) => void;
  undo: () => void;
  forget: () => void;
}

/**
 * Deletes rows of a list, one after the other, and can take that back. The list follows the
 * server: a row goes once the server says so.
 */
export function useDeletion<Row>(options: DeletionOptions<Row>): Deletion<Row> {
  const { queryKey, remove, restore } = options;
  const client = useQueryClient();
  const [deleted, setDeleted] = useState<readonly Row[]>([]);
  const refresh = () => client.invalidateQueries({ queryKey });

  const removing = useMutation({
    async mutationFn(rows: readonly Row[]) {
      const gone: Row[] = [];
      setDeleted(gone);
      for (const row of rows) {
        await remove(row);
        gone.push(row);
      }
      setDeleted([...gone]);
    },
    onSettled: refresh,
  });
  const undoing = useMutation({
    // The rows are handed over: closing the notice forgets them before this runs.
    async mutationFn(rows: readonly Row[]) {
      for (const row of rows) await restore(row);
      setDeleted([]);
    },
    onSettled: refresh,
  });

  const error = removing.error ?? undoing.error;
  return {
    deleted,
    failure: error && failureWords(error),
    isBusy: removing.isPending || undoing.isPending,
    remove: (rows) => {
      undoing.reset();
      removing.mutate(rows);
    },
    undo: () => undoing.mutate(deleted),
    forget: () => setDeleted([]),
  };
}
