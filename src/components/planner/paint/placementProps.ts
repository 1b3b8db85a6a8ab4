import type { Estimate } from '../../../lib/ledger/ledger';
import type { Plan } from '../../../lib/plan/plan';
import type { Units } from '../../../lib/units/display';
import type { ChangePlan } from '../usePlan';

export interface PlacementProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  change: ChangePlan;
}
