import { Plus } from 'lucide-react';
import type { Edging } from '../../../lib/border/edging';
import { READY_EDGINGS, readyEdging } from '../../../lib/border/readyEdgings';
import { convertTerms } from '../../../lib/pattern/print/convertTerms';
import { Button } from '../../ui/Button';
import { Disclosure } from '../../ui/Disclosure';
import type { Terms } from '../stitchWord';

interface ReadyEdgingsProps {
  terms: Terms;
  onAdd: (edging: Edging) => void;
}

/** Ready-made edgings, in the reader's terms, each to be added as the outermost round. */
export function ReadyEdgings({ terms, onAdd }: ReadyEdgingsProps) {
  return (
    <Disclosure summary="Ready-made edgings" open>
      <ul className="grid gap-4">
        {READY_EDGINGS.map(({ key, name, description, text }) => {
          const shown = convertTerms(text, 'us', terms);
          return (
            <li key={key} className="flex items-start justify-between gap-3">
              <div>
                <b className="block">{name}</b>
                <span className="block text-ink-2">{convertTerms(description, 'us', terms)}</span>
                <span className="block font-mono text-sm">{shown}</span>
              </div>
              <Button
                small
                icon={Plus}
                aria-label={`Add ${name}`}
                onClick={() => {
                  const edging = readyEdging(key);
                  if (edging) onAdd({ ...edging, text: shown, terms });
                }}
              >
                Add
              </Button>
            </li>
          );
        })}
      </ul>
    </Disclosure>
  );
}
