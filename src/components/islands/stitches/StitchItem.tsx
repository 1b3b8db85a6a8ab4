import { CornerDownLeft, Pencil, Trash2 } from 'lucide-react';
import { movesInWords } from '../../../lib/stitches/movesInWords';
import { Button } from '../../ui/Button';
import type { KeptStitch } from './keptStitch';
import { StitchSymbol } from './StitchSymbol';
import { movesComeTo, takesInWords } from './stitchWords';

interface StitchItemProps {
  kept: KeptStitch;
  isUsed: boolean;
  onInsert?: (abbreviation: string) => void;
  onEdit: () => void;
  onDelete: () => void;
}

/** One stitch of the list: its symbol, what it is called, how it is made, and what can be done with it. */
export function StitchItem({ kept, isUsed, onInsert, onEdit, onDelete }: StitchItemProps) {
  const { abbreviation, name, moves, heightOverWidth, takes } = kept;
  const more = [movesComeTo(moves, heightOverWidth), takesInWords(takes)].filter(Boolean);
  return (
    <li className="flex gap-3 border-t border-line py-2.5 first:border-t-0">
      <StitchSymbol stitch={kept} className="mt-0.5 h-11 w-8" />
      <div className="min-w-0 flex-1">
        <p>
          <b className="font-mono">{abbreviation}</b> {name}
          {isUsed && <span className="text-sm text-ink-2"> · in this text</span>}
        </p>
        <p className="text-sm text-ink-2">
          {movesInWords(moves)}: {more.join('; ')}
        </p>
        <p className="-ms-2 mt-0.5 flex flex-wrap gap-x-1">
          {onInsert && (
            <Button
              kind="quiet"
              small
              icon={CornerDownLeft}
              onClick={() => onInsert(abbreviation)}
              aria-label={`Insert ${abbreviation} into the text`}
            >
              Insert
            </Button>
          )}
          <Button
            kind="quiet"
            small
            icon={Pencil}
            onClick={onEdit}
            aria-label={`Change ${abbreviation}`}
          >
            Change
          </Button>
          <Button
            kind="quiet"
            small
            icon={Trash2}
            className="text-madder"
            onClick={onDelete}
            aria-label={`Delete ${abbreviation}`}
          >
            Delete
          </Button>
        </p>
      </div>
    </li>
  );
}
