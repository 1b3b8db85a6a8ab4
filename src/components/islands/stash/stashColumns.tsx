import type { ColumnDef } from '@tanstack/react-table';
import { showMass, showPrice, yarnFigure, YARN_UNIT, type Units } from '../../../lib/units/display';
import type { PresentedLot } from '../../../schemas/stash';
import { WoundCard } from '../../ui/WoundCard';
import { partWords } from './stashWords';

export function stashColumns(
  units: Units,
  onLot: (lot: PresentedLot) => void,
): ColumnDef<PresentedLot>[] {
  return [
    {
      id: 'colour',
      accessorFn: ({ colourway }) => colourway.name,
      header: 'Colour',
      meta: { rowHeader: true },
      cell: ({ row: { original } }) => (
        <span className="flex items-center gap-3">
          <WoundCard
            colour={original.colourway.hex}
            weight={original.yarn.weightCategory}
            size="sm"
          />
          <button type="button" className="link text-start" onClick={() => onLot(original)}>
            {original.colourway.name}
          </button>
        </span>
      ),
    },
    { id: 'yarn', accessorFn: ({ yarn }) => yarn.name, header: 'Yarn' },
    { id: 'lot', accessorKey: 'lotCode', header: 'Dye lot' },
    {
      id: 'skeins',
      accessorKey: 'wholeSkeins',
      header: 'Skeins',
      enableGlobalFilter: false,
      meta: { figures: true },
    },
    {
      id: 'parts',
      accessorFn: ({ partSkeins }) => partSkeins.reduce((sum, { massG }) => sum + massG, 0),
      header: 'Parts',
      enableGlobalFilter: false,
      meta: { figures: true },
      cell: ({ row }) => row.original.partSkeins.map(({ massG }) => partWords(massG)).join(', '),
    },
    {
      id: 'mass',
      accessorKey: 'totalG',
      header: 'Mass',
      enableGlobalFilter: false,
      meta: { figures: true },
      cell: ({ row }) => showMass(row.original.totalG, units),
    },
    {
      id: 'length',
      accessorKey: 'totalM',
      header: YARN_UNIT[units].word === 'm' ? 'Metres' : 'Yards',
      enableGlobalFilter: false,
      meta: { figures: true },
      cell: ({ row }) => yarnFigure(row.original.totalM, units),
    },
    { id: 'place', accessorKey: 'location', header: 'Place' },
    {
      id: 'paid',
      accessorFn: ({ pricePaid }) => pricePaid?.priceMinor ?? -1,
      header: 'Paid a skein',
      enableGlobalFilter: false,
      meta: { figures: true },
      cell: ({ row: { original } }) =>
        original.pricePaid && showPrice(original.pricePaid.priceMinor, original.pricePaid.currency),
    },
  ];
}
