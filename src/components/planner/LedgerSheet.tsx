import type { ColumnDef } from '@tanstack/react-table';
import { download } from '../../client/download';
import { toCsv } from '../../lib/csv/toCsv';
import { PARTS, type Estimate, type LedgerLine } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import { abbreviationOf } from '../../lib/stitches/ownStitch';
import { showYarn, YARN_UNIT, yarnFigure, type Units } from '../../lib/units/display';
import { DataTable } from '../ui/DataTable';
import { Sheet } from '../ui/Dialog';
import { Select } from '../ui/Select';
import { codeWord, type Terms } from './stitchWord';
import { lineFormula, PART_WORDS, SOURCE_WORDS } from './words';

interface LedgerSheetProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  terms: Terms;
  /** Colour key, or "all". */
  colour: string;
  onColour: (colour: string) => void;
  onClose: () => void;
}

/** Every figure opened: what is worked, how many loops that is, how long one is, and says who. */
export default function LedgerSheet(props: LedgerSheetProps) {
  const { plan, estimate, units, terms, colour, onColour, onClose } = props;
  const lines = estimate.ledger
    .filter((line) => colour === 'all' || line.colour === colour)
    .toSorted((left, right) => PARTS.indexOf(left.part) - PARTS.indexOf(right.part));
  const totalM = lines.reduce((sum, { lengthM }) => sum + lengthM, 0);
  const nameOf = (key: string) => plan.colours.find((each) => each.key === key)?.name ?? key;
  return (
    <Sheet
      open
      onOpenChange={(open) => !open && onClose()}
      title="How this is worked out"
      description="Yarn of a line = stitches × loops in one stitch × length of one loop. The allowance is what being as sure as you chose takes on top."
    >
      <div className="grid grid-cols-[minmax(0,1fr)] gap-4 pb-4">
        <Select
          label="Colour"
          value={colour}
          onChange={(event) => onColour(event.target.value)}
          options={[
            { value: 'all', word: 'All colours' },
            ...plan.colours.map(({ key, name }) => ({ value: key, word: name })),
          ]}
        />
        <DataTable
          caption={`${showYarn(totalM, units)} in ${lines.length} lines`}
          rows={lines}
          columns={columnsFor(units, terms, colour === 'all' ? nameOf : null)}
          rowId={(line) => [line.colour, line.part, line.label, line.stitch].join('|')}
          empty={<p>No yarn of this colour is used.</p>}
          pageSize={50}
          onExportCsv={(rows) => download('ledger.csv', 'text/csv', ledgerCsv(rows, nameOf))}
        />
      </div>
    </Sheet>
  );
}

function columnsFor(
  units: Units,
  terms: Terms,
  nameOf: ((key: string) => string) | null,
): ColumnDef<LedgerLine>[] {
  const word = (line: LedgerLine) => (line.stitch === null ? '' : codeWord(line.stitch, terms));
  return [
    ...(nameOf
      ? [{ id: 'colour', header: 'Colour', accessorFn: (line: LedgerLine) => nameOf(line.colour) }]
      : []),
    {
      id: 'what',
      header: 'Worked',
      accessorFn: (line) => `${PART_WORDS[line.part]} ${line.label}`,
      meta: { rowHeader: true },
      cell: ({ row: { original: line } }) => (
        <>
          <span className="block">
            {line.part === 'tails' ? `Tails of the ${line.label}` : line.label}
          </span>
          <span className="figures block text-sm font-normal text-ink-2">
            {lineFormula(line, word(line))}
          </span>
          {line.stitch !== null && (
            <span className="block text-sm font-normal text-ink-2">
              {SOURCE_WORDS[line.source]}
            </span>
          )}
        </>
      ),
    },
    {
      id: 'length',
      header: YARN_UNIT[units].word,
      accessorKey: 'lengthM',
      meta: { figures: true },
      cell: ({ row: { original: line } }) => yarnFigure(line.lengthM, units),
    },
  ];
}

function ledgerCsv(lines: readonly LedgerLine[], nameOf: (key: string) => string): string {
  return toCsv(
    [
      'colour',
      'part',
      'what',
      'stitch_us',
      'count',
      'loops_each',
      'loops',
      'each_mm',
      'length_m',
      'variance_m2',
      'source',
    ],
    lines.map((line) => [
      nameOf(line.colour),
      line.part,
      line.label,
      line.stitch && abbreviationOf(line.stitch),
      line.count,
      line.loopsEach,
      line.loops,
      line.eachMm,
      line.lengthM,
      line.varianceM2,
      line.source,
    ]),
  );
}
