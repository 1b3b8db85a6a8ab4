import { Download, Printer } from 'lucide-react';
import { download } from '../../client/download';
import type { Estimate } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import { shoppingCsv } from '../../lib/shopping/shoppingCsv';
import { shoppingList } from '../../lib/shopping/shoppingList';
import type { Units } from '../../lib/units/display';
import { ShoppingTable } from '../shopping/ShoppingTable';
import { Button } from '../ui/Button';
import { Sheet } from '../ui/Dialog';
import { sureWord } from './Answer';

interface ShoppingSheetProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  onClose: () => void;
}

/** The shopping list of a plan that is not kept: nothing in the stash, everything to buy. */
export default function ShoppingSheet({ plan, estimate, units, onClose }: ShoppingSheetProps) {
  const list = shoppingList({ plan, estimate, stash: [] });
  return (
    <Sheet
      open
      onOpenChange={(open) => !open && onClose()}
      title="Shopping list"
      description={`Whole skeins of ${plan.yarn.name}, ${sureWord(plan.confidence)} sure of each colour. Buy each colour in one dye lot.`}
      actions={
        <>
          <Button
            kind="primary"
            icon={Download}
            onClick={() =>
              download(
                'shopping-list.csv',
                'text/csv',
                shoppingCsv({ ...list, yarnName: plan.yarn.name }, units),
              )
            }
          >
            Download CSV
          </Button>
          <Button icon={Printer} onClick={() => window.print()}>
            Print
          </Button>
        </>
      }
    >
      <ShoppingTable list={list} weight={plan.yarn.weightCategory} units={units} hasStash={false} />
      <p className="py-4 text-ink-2">
        Keep this blanket in an account and the list takes off what your stash already holds.
      </p>
    </Sheet>
  );
}
