import type { Plan } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import CompareJoins from '../joins/CompareJoins';
import { Sheet } from '../ui/Dialog';
import type { ChangePlan } from './usePlan';

interface CompareSheetProps {
  plan: Plan;
  units: Units;
  change: ChangePlan;
  onClose: () => void;
}

/** The joins compared without leaving the plan. */
export default function CompareSheet({ plan, units, change, onClose }: CompareSheetProps) {
  return (
    <Sheet
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title="Compare joins"
      description="The same motifs, grid and border, each join tried at your tension."
    >
      <CompareJoins
        plan={plan}
        units={units}
        onUse={(key) => change((old) => ({ ...old, join: { ...old.join, key } }))}
      />
    </Sheet>
  );
}
