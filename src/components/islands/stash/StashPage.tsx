import { useQuery, useQueryClient } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useCallback, useState } from 'react';
import { createLot, deleteLot, lotContent, stashQuery } from '../../../client/queries/stash';
import { yarnsQuery } from '../../../client/queries/yarns';
import { showYarn, type Units } from '../../../lib/units/display';
import type { PresentedLot } from '../../../schemas/stash';
import type { Money, PresentedYarn } from '../../../schemas/yarn';
import type { Terms } from '../../planner/stitchWord';
import { Button } from '../../ui/Button';
import { Fact } from '../../ui/Fact';
import { countInWords } from '../../ui/inWords';
import { SegmentedControl } from '../../ui/SegmentedControl';
import { useTerms, useUnits } from '../../ui/useUnits';
import { DeletionNotice } from '../form/DeletionNotice';
import { StaleNotice } from '../form/StaleNotice';
import { useDeletion } from '../form/useDeletion';
import { WithQueries } from '../WithQueries';
import { NoStash } from './NoStash';
import { StashByYarn } from './StashByYarn';
import { StashSheets, type OpenSheet } from './StashSheets';
import { StashTable } from './StashTable';
import { lotName, stashWords } from './stashWords';

interface StashPageProps {
  lots: PresentedLot[];
  yarns: PresentedYarn[];
  units: Units;
  terms: Terms;
  currency: Money['currency'];
}

export function StashPage(props: StashPageProps) {
  return (
    <WithQueries>
      <Stash {...props} />
    </WithQueries>
  );
}

function Stash(props: StashPageProps) {
  const units = useUnits(props.units);
  const terms = useTerms(props.terms);
  const client = useQueryClient();
  const stash = useQuery({ ...stashQuery, initialData: props.lots });
  const yarns = useQuery({ ...yarnsQuery, initialData: props.yarns });
  const [view, setView] = useState<'yarn' | 'table'>('yarn');
  const [sheet, setSheet] = useState<OpenSheet | null>(null);
  const deletion = useDeletion<PresentedLot>({
    queryKey: stashQuery.queryKey,
    remove: ({ id }) => deleteLot(id),
    restore: (lot) => createLot(lot.colourway.id, lotContent(lot)),
  });
  const openLot = useCallback((lot: PresentedLot) => setSheet({ is: 'lot', lot }), []);
  const refresh = () => {
    void client.invalidateQueries({ queryKey: stashQuery.queryKey });
    void client.invalidateQueries({ queryKey: yarnsQuery.queryKey });
  };
  const lots = stash.data;

  return (
    <>
      <h1 className={yarns.data.length === 0 ? 'mb-6' : 'sr-only'}>Stash</h1>
      <DeletionNotice deletion={deletion} what={lotsWords} />
      <StaleNotice error={stash.error ?? yarns.error} onRetry={refresh} />
      {yarns.data.length === 0 ? (
        <NoStash
          onAdd={() => setSheet({ is: 'add' })}
          onExample={() => setSheet({ is: 'example' })}
        />
      ) : (
        <>
          <div className="mb-6 flex flex-wrap items-end justify-between gap-x-6 gap-y-4">
            <Fact lead="In the stash" answer={showYarn(sumM(lots), units)}>
              {stashWords(lots)} of {countInWords(yarns.data.length)}{' '}
              {yarns.data.length === 1 ? 'yarn' : 'yarns'}. Every shopping list takes them off.
            </Fact>
            <div className="flex flex-wrap items-center gap-3">
              <SegmentedControl
                label="Shown"
                value={view}
                onChange={setView}
                options={[
                  { value: 'yarn', word: 'By yarn' },
                  { value: 'table', word: 'Table' },
                ]}
              />
              <Button kind="primary" icon={Plus} onClick={() => setSheet({ is: 'add' })}>
                Add yarn
              </Button>
            </div>
          </div>
          {view === 'yarn' ? (
            <StashByYarn
              yarns={yarns.data}
              {...{ lots, units }}
              onLot={openLot}
              onYarn={(yarn) => setSheet({ is: 'yarn', yarn })}
              onAdd={(yarnId) => setSheet({ is: 'add', yarnId })}
            />
          ) : (
            <StashTable
              {...{ lots, units }}
              isDeleting={deletion.isBusy}
              onLot={openLot}
              onDelete={deletion.remove}
            />
          )}
        </>
      )}
      <StashSheets
        {...{ sheet, setSheet, units, terms }}
        yarns={yarns.data}
        currency={props.currency}
        onChange={refresh}
        onDelete={(lot) => deletion.remove([lot])}
      />
    </>
  );
}

const sumM = (lots: readonly PresentedLot[]): number =>
  lots.reduce((sum, { totalM }) => sum + totalM, 0);

const lotsWords = (lots: readonly PresentedLot[]): string =>
  lots.length === 1 && lots[0] ? lotName(lots[0]) : `${lots.length} dye lots`;
