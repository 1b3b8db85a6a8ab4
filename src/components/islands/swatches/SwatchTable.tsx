import { useQuery } from '@tanstack/react-query';
import { Plus, Trash2 } from 'lucide-react';
import { useMemo } from 'react';
import {
  createSwatch,
  deleteSwatch,
  swatchContent,
  swatchesQuery,
} from '../../../client/queries/swatches';
import type { Units } from '../../../lib/units/display';
import type { PresentedSwatch } from '../../../schemas/swatch';
import type { Terms } from '../../planner/stitchWord';
import { Button, ButtonLink } from '../../ui/Button';
import { DataTable } from '../../ui/DataTable';
import { EmptyState } from '../../ui/EmptyState';
import { useTerms, useUnits } from '../../ui/useUnits';
import { DeletionNotice } from '../form/DeletionNotice';
import { StaleNotice } from '../form/StaleNotice';
import { useDeletion } from '../form/useDeletion';
import { WithQueries } from '../WithQueries';
import { SampleSwatch } from './SampleSwatch';
import { swatchColumns } from './swatchColumns';
import type { YarnChoice } from '../../../lib/swatches/swatchRecord';
import { swatchRow, type SwatchRow } from './swatchRow';
import { useSwatchFigures, type FiguresBySave } from './useSwatchFigures';

interface SwatchTableProps {
  swatches: PresentedSwatch[];
  yarns: YarnChoice[];
  /** Worked out by the server for these very saves. */
  figures: FiguresBySave;
  units: Units;
  terms: Terms;
}

export function SwatchTable(props: SwatchTableProps) {
  return (
    <WithQueries>
      <Table {...props} />
    </WithQueries>
  );
}

function Table({ swatches, yarns, figures: known, ...preferences }: SwatchTableProps) {
  const units = useUnits(preferences.units);
  const terms = useTerms(preferences.terms);
  const query = useQuery({ ...swatchesQuery, initialData: swatches });
  const deletion = useDeletion<SwatchRow>({
    queryKey: swatchesQuery.queryKey,
    remove: ({ swatch }) => deleteSwatch(swatch.id),
    restore: ({ swatch }) => createSwatch(swatchContent(swatch)),
  });
  const figures = useSwatchFigures(query.data, yarns, known);
  const rows = useMemo(
    () => query.data.map((swatch) => swatchRow(swatch, yarns, figures)),
    [query.data, yarns, figures],
  );
  const columns = useMemo(() => {
    const sizes = rows.flatMap((row) =>
      row.figures ? [row.figures.widthMm, row.figures.heightMm] : [],
    );
    return swatchColumns(units, terms, Math.max(1, ...sizes));
  }, [rows, units, terms]);

  return (
    <>
      <DeletionNotice deletion={deletion} what={swatchesWords} />
      <StaleNotice error={query.error} onRetry={() => void query.refetch()} />
      <DataTable
        caption="Your swatches"
        captionHidden
        rows={rows}
        columns={columns}
        rowId={({ swatch }) => swatch.id}
        empty={<NoSwatches units={units} />}
        filterLabel="Find a swatch, yarn or stitch"
        selectable={{
          nameOf: ({ swatch }) => swatch.name,
          actions: (chosen, clear) => (
            <Button
              icon={Trash2}
              busy={deletion.isBusy && 'Deleting…'}
              onClick={() => {
                deletion.remove(chosen);
                clear();
              }}
            >
              Delete {chosen.length}
            </Button>
          ),
        }}
      />
    </>
  );
}

const swatchesWords = (rows: readonly SwatchRow[]): string =>
  rows.length === 1 && rows[0] ? `“${rows[0].swatch.name}”` : `${rows.length} swatches`;

function NoSwatches({ units }: { units: Units }) {
  return (
    <EmptyState
      drawing={<SampleSwatch units={units} />}
      action={
        <ButtonLink kind="primary" icon={Plus} href="/swatches/new">
          Add a swatch
        </ButtonLink>
      }
      example={
        <a className="link" href="/swatches/new?example">
          Open an example
        </a>
      }
    >
      A swatch you count, measure and weigh tells how wide your stitches are and how much yarn you
      pull into a loop.
    </EmptyState>
  );
}
