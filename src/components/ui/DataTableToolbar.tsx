import { Download, Search } from 'lucide-react';
import { useId, type ReactNode } from 'react';
import { Button } from './Button';

interface DataTableToolbarProps {
  filterLabel?: string;
  filter: string;
  onFilter: (text: string) => void;
  shownCount: number;
  rowCount: number;
  onExportCsv?: () => void;
  chosenCount: number;
  chosenActions: ReactNode;
}

export function DataTableToolbar(props: DataTableToolbarProps) {
  const { filterLabel, filter, onFilter, shownCount, rowCount } = props;
  const { onExportCsv, chosenCount, chosenActions } = props;
  const id = useId();
  if (!filterLabel && !onExportCsv && chosenCount === 0) return null;
  return (
    <div className="not-printed mb-3 flex flex-wrap items-end gap-3">
      {filterLabel && (
        <div className="w-full sm:w-64">
          <label htmlFor={id} className="label mb-1">
            {filterLabel}
          </label>
          <div className="control">
            <Search size={16} aria-hidden className="ms-2.5 shrink-0 text-ink-2" />
            <input
              id={id}
              type="search"
              className="px-2"
              value={filter}
              onChange={(event) => onFilter(event.target.value)}
            />
          </div>
        </div>
      )}
      {onExportCsv && (
        <Button icon={Download} onClick={onExportCsv}>
          Export CSV
        </Button>
      )}
      <p role="status" className="self-center text-sm text-ink-2 tabular-nums">
        {filter && `${shownCount} of ${rowCount}`}
        {chosenCount > 0 && ` ${chosenCount} chosen`}
      </p>
      {chosenActions}
    </div>
  );
}
