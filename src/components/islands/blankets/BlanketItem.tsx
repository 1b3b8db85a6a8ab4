import { Copy, ListChecks, MoreHorizontal, Trash2 } from 'lucide-react';
import type { BlanketFace } from '../../../lib/plan/blanketFace';
import { showPrice, showSize, type Units } from '../../../lib/units/display';
import type { BlanketSummary } from '../../../schemas/blanket';
import { BlanketThumb } from '../../blankets/BlanketThumb';
import { ColourCards } from '../../blankets/ColourCards';
import { Menu } from '../../ui/Menu';
import { showDay } from '../swatches/swatchWords';

interface BlanketItemProps {
  blanket: BlanketSummary;
  face: BlanketFace | undefined;
  units: Units;
  pxPerMm: number;
  onDuplicate: () => void;
  onDelete: () => void;
}

/** One blanket of the list: drawn to the list's scale, with its headline figures. */
export function BlanketItem(props: BlanketItemProps) {
  const { blanket, face, units, pxPerMm, onDuplicate, onDelete } = props;
  const { id, title, figures, currency } = blanket;
  const href = `/blankets/${id}`;
  return (
    <li className="grid grid-cols-[6.5rem_minmax(0,1fr)] gap-x-5 gap-y-3 border-t border-line py-4 lg:grid-cols-[6.5rem_minmax(0,1fr)_9rem_7rem_7rem_auto] lg:items-center">
      <a href={href} tabIndex={-1} aria-hidden className="flex justify-center max-lg:row-span-2">
        {figures && <BlanketThumb face={face} {...figures} pxPerMm={pxPerMm} />}
      </a>
      <div className="min-w-0">
        <h2>
          <a className="link" href={href}>
            {title}
          </a>
        </h2>
        <p className="text-sm text-ink-2">{blanket.yarnName}</p>
        <ColourCards colours={blanket.colours} className="mt-2" />
      </div>
      <div className="max-lg:col-start-2 max-lg:flex max-lg:flex-wrap max-lg:items-end max-lg:gap-x-5 max-lg:gap-y-2 lg:contents">
        {figures ? (
          <p className="tabular-nums">
            <span className="block">{showSize(figures.widthMm, figures.heightMm, units)}</span>
            <span className="block text-sm text-ink-2">
              {figures.columns} × {figures.rows} motifs
            </span>
          </p>
        ) : (
          <p className="text-sm text-ink-2">
            Made for an older edition: open it once to bring it up to date.
          </p>
        )}
        <p className="tabular-nums">
          {figures && (
            <>
              <span className="text-xl font-bold">{figures.skeins}</span>{' '}
              {figures.skeins === 1 ? 'skein' : 'skeins'}
              {figures.costMinor !== null && currency && (
                <span className="block text-sm text-ink-2">
                  {showPrice(figures.costMinor, currency)}
                </span>
              )}
            </>
          )}
        </p>
        <p className="text-sm text-ink-2">{showDay(blanket.updatedAt)}</p>
        <Menu
          word="More"
          icon={MoreHorizontal}
          small
          items={[
            { word: 'Shopping list', icon: ListChecks, href: `${href}/shopping-list` },
            { word: 'Duplicate', icon: Copy, onSelect: onDuplicate },
            { word: 'Delete', icon: Trash2, onSelect: onDelete, destructive: true, apart: true },
          ]}
        />
      </div>
    </li>
  );
}
