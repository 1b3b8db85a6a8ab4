import { Plus } from 'lucide-react';
import { EXAMPLE_PLAN } from '../../../lib/plan/examplePlan';
import { Button } from '../../ui/Button';
import { EmptyState } from '../../ui/EmptyState';
import { WoundCard } from '../../ui/WoundCard';

interface NoStashProps {
  onAdd: () => void;
  onExample: () => void;
}

export function NoStash({ onAdd, onExample }: NoStashProps) {
  return (
    <EmptyState
      drawing={<StashDrawing />}
      action={
        <Button kind="primary" icon={Plus} onClick={onAdd}>
          Add yarn
        </Button>
      }
      example={
        <button type="button" className="link" onClick={onExample}>
          Fill in an example
        </button>
      }
    >
      Put down the yarn you own, by colour and dye lot, and every shopping list takes it off what
      there is to buy.
    </EmptyState>
  );
}

/** Three cards, wound, as they will stand here. */
export function StashDrawing() {
  return (
    <div className="flex gap-4" aria-hidden>
      {EXAMPLE_PLAN.colours.slice(0, 3).map(({ key, hex }) => (
        <WoundCard key={key} colour={hex} weight={4} size="lg" />
      ))}
    </div>
  );
}
