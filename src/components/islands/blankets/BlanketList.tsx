import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Plus, Search } from 'lucide-react';
import { useMemo, useState } from 'react';
import {
  blanketsQuery,
  createBlanket,
  deleteBlanket,
  duplicateBlanket,
  restoreBlanket,
} from '../../../client/queries/blankets';
import type { BlanketFace } from '../../../lib/plan/blanketFace';
import { EXAMPLE_PLAN } from '../../../lib/plan/examplePlan';
import type { Units } from '../../../lib/units/display';
import type { BlanketSummary } from '../../../schemas/blanket';
import { Button } from '../../ui/Button';
import { Notice } from '../../ui/Notice';
import { Select } from '../../ui/Select';
import { useUnits } from '../../ui/useUnits';
import { DeletionNotice } from '../form/DeletionNotice';
import { failureWords } from '../form/formErrors';
import { StaleNotice } from '../form/StaleNotice';
import { useDeletion } from '../form/useDeletion';
import { WithQueries } from '../WithQueries';
import { BlanketItem } from './BlanketItem';
import { copyTitle, matching, sorted, SORTINGS, type Sorting } from './blanketOrder';
import { NoBlankets } from './NoBlankets';

interface BlanketListProps {
  blankets: BlanketSummary[];
  faces: Record<string, BlanketFace>;
  units: Units;
}

export function BlanketList(props: BlanketListProps) {
  return (
    <WithQueries>
      <List {...props} />
    </WithQueries>
  );
}

/** Longest side of the largest blanket; the others are drawn to its scale. */
const LARGEST_PX = 104;

function List(props: BlanketListProps) {
  const units = useUnits(props.units);
  const client = useQueryClient();
  const query = useQuery({ ...blanketsQuery, initialData: props.blankets });
  const [copies, setCopies] = useState<Record<string, BlanketFace>>({});
  const [search, setSearch] = useState('');
  const [sorting, setSorting] = useState<Sorting>('changed');
  const deletion = useDeletion<BlanketSummary>({
    queryKey: blanketsQuery.queryKey,
    remove: ({ id }) => deleteBlanket(id),
    restore: ({ id }) => restoreBlanket(id),
  });
  const beginning = useMutation({
    mutationFn: () => createBlanket('A new blanket', EXAMPLE_PLAN),
    onSuccess: ({ id }) => window.location.assign(`/blankets/${id}`),
  });
  const copying = useMutation({
    mutationFn: ({ id, title }: BlanketSummary) =>
      duplicateBlanket(id, copyTitle(title, query.data)),
    onSuccess: (copy, { id }) => {
      const face = props.faces[id] ?? copies[id];
      if (face) setCopies((old) => ({ ...old, [copy.id]: face }));
      return client.invalidateQueries({ queryKey: blanketsQuery.queryKey });
    },
  });
  const shown = useMemo(
    () => sorted(matching(query.data, search), sorting),
    [query.data, search, sorting],
  );
  const largestMm = Math.max(
    1,
    ...query.data.flatMap(({ figures }) => (figures ? [figures.widthMm, figures.heightMm] : [])),
  );
  const error = beginning.error ?? copying.error;
  const newBlanket = (
    <Button
      kind="primary"
      icon={Plus}
      busy={beginning.isPending && 'Making it…'}
      onClick={() => beginning.mutate()}
    >
      New blanket
    </Button>
  );

  return (
    <>
      <div className="mb-6 flex flex-wrap items-center justify-between gap-4">
        <h1>Blankets</h1>
        {query.data.length > 0 && newBlanket}
      </div>
      <DeletionNotice deletion={deletion} what={blanketsWords} />
      <StaleNotice error={query.error} onRetry={() => void query.refetch()} />
      {error && (
        <Notice kind="problem" live className="mb-4">
          {failureWords(error)}
        </Notice>
      )}
      {query.data.length === 0 ? (
        <NoBlankets action={newBlanket} />
      ) : (
        <>
          <div className="mb-2 flex flex-wrap items-end gap-3">
            <SearchField value={search} onChange={setSearch} />
            <Select
              label="In order of"
              value={sorting}
              onChange={(event) => setSorting(event.target.value as Sorting)}
              options={SORTINGS}
            />
            <p role="status" className="self-center text-sm text-ink-2">
              {search && `${shown.length} of ${query.data.length}`}
            </p>
          </div>
          <ul>
            {shown.map((blanket) => (
              <BlanketItem
                key={blanket.id}
                blanket={blanket}
                face={props.faces[blanket.id] ?? copies[blanket.id]}
                units={units}
                pxPerMm={LARGEST_PX / largestMm}
                onDuplicate={() => copying.mutate(blanket)}
                onDelete={() => deletion.remove([blanket])}
              />
            ))}
          </ul>
          {shown.length === 0 && (
            <p className="border-t border-line py-4 text-ink-2">
              No blanket matches “{search}”.{' '}
              <button type="button" className="link" onClick={() => setSearch('')}>
                Show all
              </button>
            </p>
          )}
        </>
      )}
    </>
  );
}

const blanketsWords = (rows: readonly BlanketSummary[]): string =>
  rows.length === 1 && rows[0] ? `“${rows[0].title}”` : `${rows.length} blankets`;

function SearchField({ value, onChange }: { value: string; onChange: (text: string) => void }) {
  return (
    <div className="w-full sm:w-64">
      <label htmlFor="blanket-search" className="label mb-1">
        Find a title, yarn or colour
      </label>
      <div className="control">
        <Search size={16} aria-hidden className="ms-2.5 shrink-0 text-ink-2" />
        <input
          id="blanket-search"
          type="search"
          className="px-2"
          value={value}
          onChange={(event) => onChange(event.target.value)}
        />
      </div>
    </div>
  );
}
