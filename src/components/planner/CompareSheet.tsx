import { useQuery } from '@tanstack/react-query';
import { swatchesQuery } from '../../client/queries/swatches';
import type { Plan } from '../../lib/plan/plan';
import { gaugeSwatch } from '../../lib/swatches/gaugeSwatch';
import type { GaugeSwatch } from '../../lib/swatches/swatchRecord';
import type { Units } from '../../lib/units/display';
import { WithQueries } from '../islands/WithQueries';
import CompareJoins from '../joins/CompareJoins';
import { Sheet } from '../ui/Dialog';
import type { Terms } from './stitchWord';
import type { ChangePlan } from './usePlan';

interface CompareSheetProps {
  plan: Plan;
  units: Units;
  terms: Terms;
  change: ChangePlan;
  /** The plan is kept in an account, whose swatches can be compared by. */
  inAccount: boolean;
  onClose: () => void;
}

/** The joins compared without leaving the plan. */
export default function CompareSheet(props: CompareSheetProps) {
  return (
    <Sheet
      open
      wide
      onOpenChange={(open) => !open && props.onClose()}
      title="Compare joins"
      description="The same motifs, grid and border, each join tried at your tension or at several."
    >
      <WithQueries>
        <Compared {...props} />
      </WithQueries>
    </Sheet>
  );
}

function Compared({ plan, units, terms, change, inAccount }: CompareSheetProps) {
  const { data } = useQuery({ ...swatchesQuery, enabled: inAccount });
  const kept = data?.flatMap((each): GaugeSwatch[] => {
    const swatch = gaugeSwatch(each);
    return swatch ? [{ id: each.id, name: each.name, swatch, weightCategory: null }] : [];
  });
  return (
    <CompareJoins
      {...{ plan, units, terms, kept }}
      onUse={(key) => change((old) => ({ ...old, join: { ...old.join, key } }))}
    />
  );
}
