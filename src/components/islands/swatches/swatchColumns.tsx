import type { ColumnDef } from '@tanstack/react-table';
import type { Units } from '../../../lib/units/display';
import { codeWord, type Terms } from '../../planner/stitchWord';
import { SwatchDrawing } from './SwatchDrawing';
import { PLAIN_YARN } from './swatchForm';
import type { SwatchRow } from './swatchRow';
import { GAUGE_SPAN, perSpan, showDay, showLoop } from './swatchWords';

/** Longest side of a swatch in the list, all drawn to one scale. */
const THUMB_PX = 44;

export function swatchColumns(
  units: Units,
  terms: Terms,
  largestMm: number,
): ColumnDef<SwatchRow>[] {
  return [
    {
      id: 'name',
      accessorFn: ({ swatch }) => swatch.name,
      header: 'Swatch',
      meta: { rowHeader: true },
      cell: ({ row }) => <NameCell row={row.original} pxPerMm={THUMB_PX / largestMm} />,
    },
    {
      id: 'yarn',
      accessorFn: ({ swatch }) => swatch.yarnName ?? '',
      header: 'Yarn',
      cell: ({ row }) => row.original.swatch.yarnName ?? <Missing>not said</Missing>,
    },
    {
      id: 'stitch',
      accessorFn: ({ swatch }) => codeWord(swatch.stitch, terms),
      header: 'Worked in',
    },
    {
      id: 'gauge',
      accessorFn: ({ figures }) => figures?.stitchWidthMm ?? 0,
      header: `Stitches × rows in ${GAUGE_SPAN[units].words}`,
      enableGlobalFilter: false,
      meta: { figures: true },
      cell: ({ row: { original } }) =>
        original.figures ? (
          `${perSpan(original.figures.stitchWidthMm, units)} × ${perSpan(original.figures.rowHeightMm, units)}`
        ) : (
          <Missing>not measured</Missing>
        ),
    },
    {
      id: 'loop',
      accessorFn: ({ figures }) => figures?.loopMm ?? 0,
      header: 'Yarn in a loop',
      enableGlobalFilter: false,
      meta: { figures: true },
      cell: ({ row: { original } }) =>
        original.figures?.loopMm ? (
          showLoop(original.figures.loopMm, units)
        ) : (
          <Missing>not weighed</Missing>
        ),
    },
    {
      id: 'changed',
      accessorFn: ({ swatch }) => swatch.updatedAt,
      header: 'Changed',
      enableGlobalFilter: false,
      cell: ({ row }) => (
        <span className="whitespace-nowrap text-ink-2">
          {showDay(row.original.swatch.updatedAt)}
        </span>
      ),
    },
  ];
}

function Missing({ children }: { children: string }) {
  return <span className="font-sans whitespace-nowrap text-ink-2">{children}</span>;
}

function NameCell({ row, pxPerMm }: { row: SwatchRow; pxPerMm: number }) {
  const { swatch, figures, hex } = row;
  return (
    <span className="flex items-center gap-3">
      <span className="flex shrink-0 justify-center" style={{ width: THUMB_PX }}>
        {figures ? (
          <svg
            aria-hidden
            width={figures.widthMm * pxPerMm}
            height={figures.heightMm * pxPerMm}
            viewBox={`0 0 ${figures.widthMm} ${figures.heightMm}`}
          >
            <SwatchDrawing
              stitch={swatch.stitch}
              stitches={swatch.stitches}
              rows={swatch.rows}
              widthMm={figures.widthMm}
              heightMm={figures.heightMm}
              hex={hex ?? PLAIN_YARN}
            />
          </svg>
        ) : (
          <span aria-hidden className="size-8 rounded-fine border border-dashed border-edge" />
        )}
      </span>
      <a className="link min-w-32" href={`/swatches/${swatch.id}`}>
        {swatch.name}
      </a>
    </span>
  );
}
