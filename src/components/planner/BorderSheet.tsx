import { withEdging } from '../../lib/border/borderEdits';
import { planBorder } from '../../lib/border/planBorder';
import type { Edging } from '../../lib/border/edging';
import type { Estimate } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import { showFabric, type Units } from '../../lib/units/display';
import { PLAN_LIMITS } from '../../schemas/limits';
import { Sheet } from '../ui/Dialog';
import { BorderRoundItem } from './border/BorderRoundItem';
import { PlainRoundButton } from './border/PlainRoundButton';
import { ReadyEdgings } from './border/ReadyEdgings';
import { TypedEdging } from './border/TypedEdging';
import type { Terms } from './stitchWord';
import type { ChangePlan } from './usePlan';

interface BorderSheetProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  terms: Terms;
  change: ChangePlan;
  onClose: () => void;
}

/** The border round by round: what each is worked over here, and whether it comes out even. */
export default function BorderSheet(props: BorderSheetProps) {
  const { plan, estimate, units, terms, change, onClose } = props;
  const checks = planBorder(plan, estimate);
  const full = plan.border.length >= PLAN_LIMITS.borderRounds;
  const add = (edging: Edging) => change((old) => withEdging(old, edging));
  return (
    <Sheet
      open
      onOpenChange={(open) => !open && onClose()}
      title="Border round by round"
      description={`From the motifs outwards, ${showFabric(estimate.size.borderMm, units)} wide. Counted on this blanket, corner stitch to corner stitch.`}
    >
      <div className="grid grid-cols-[minmax(0,1fr)] gap-6 pb-4">
        {checks.length === 0 ? (
          <p className="text-ink-2">No border yet: add a plain round or an edging.</p>
        ) : (
          <ol className="grid gap-4">
            {checks.map((check, index) => (
              <BorderRoundItem key={index} {...{ plan, terms, change, check, index }} />
            ))}
          </ol>
        )}
        {full ? (
          <p>{PLAN_LIMITS.borderRounds} rounds are the most.</p>
        ) : (
          <>
            <PlainRoundButton {...{ plan, terms, change }} />
            <ReadyEdgings terms={terms} onAdd={add} />
            <TypedEdging terms={terms} onAdd={add} />
          </>
        )}
      </div>
    </Sheet>
  );
}
