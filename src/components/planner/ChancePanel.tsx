import type { Estimate } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import { ChanceTape } from '../ui/ChanceTape';

/** How sure one colour is, drawn over its skeins. */
export function ChancePanel({
  plan,
  estimate,
  chosen,
}: {
  plan: Plan;
  estimate: Estimate;
  chosen: string;
}) {
  const colour = plan.colours.find(({ key }) => key === chosen) ?? plan.colours[0];
  const need = estimate.colours.find((each) => each.colour === colour?.key);
  if (!colour || !need) return null;
  return (
    <section aria-live="polite">
      <h2>{colour.name}: how sure</h2>
      {need.meanM > 0 ? (
        <ChanceTape
          meanM={need.meanM}
          sdM={need.sdM}
          skeinM={plan.yarn.putUp.lengthM}
          skeins={need.skeins}
          chances={need.chances}
          colour={colour.hex}
          weight={plan.yarn.weightCategory}
        />
      ) : (
        <p className="text-ink-2">
          This colour is not used: give it a round, the join or the border.
        </p>
      )}
    </section>
  );
}
