import { Download, Printer } from 'lucide-react';
import { useMemo, useState } from 'react';
import { download } from '../../client/download';
import type { Plan } from '../../lib/plan/plan';
import { BLANKET_SIZES, type BlanketSize } from '../../lib/sizes/blanketSizes';
import { sizesCsv } from '../../lib/sizes/sizesCsv';
import { sizesOf, withTarget } from '../../lib/sizes/sizesOf';
import type { Units } from '../../lib/units/display';
import { Button } from '../ui/Button';
import { Sheet } from '../ui/Dialog';
import { printSheet } from '../ui/printSheet';
import { sureWord } from './Answer';
import { OwnSize } from './sizes/OwnSize';
import { SizesTable } from './sizes/SizesTable';
import type { ChangePlan } from './usePlan';

interface SizesSheetProps {
  plan: Plan;
  units: Units;
  change: ChangePlan;
  onClose: () => void;
}

/** Sizes of one's own beside the usual ones. */
const MOST_OWN = 6;

/** The plan at several sizes at once, as a published list of materials has them. */
export default function SizesSheet({ plan, units, change, onClose }: SizesSheetProps) {
  const [own, setOwn] = useState<readonly BlanketSize[]>([]);
  const sized = useMemo(() => sizesOf(plan, [...BLANKET_SIZES, ...own]), [plan, own]);
  return (
    <Sheet
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title="Several sizes"
      description={`In ${plan.yarn.name}, ${sureWord(plan.confidence)} sure of each colour. The same motif, join and border at each size.`}
      actions={
        <>
          <Button
            icon={Download}
            onClick={() => download('sizes.csv', 'text/csv', sizesCsv(plan, sized))}
          >
            Download CSV
          </Button>
          <Button icon={Printer} onClick={printSheet}>
            Print the materials list
          </Button>
        </>
      }
    >
      <div className="grid grid-cols-[minmax(0,1fr)] gap-6 pb-2" data-sheet>
        <SizesTable
          {...{ plan, sized, units }}
          onUse={(size) => change((old) => withTarget(old, size))}
          onRemove={(key) => setOwn(own.filter((each) => each.key !== key))}
        />
        {own.length < MOST_OWN && (
          <OwnSize
            units={units}
            taken={[...BLANKET_SIZES, ...own].map(({ name }) => name)}
            onAdd={(size) => setOwn([...own, size])}
          />
        )}
      </div>
    </Sheet>
  );
}
