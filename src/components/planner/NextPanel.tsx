import { Ruler } from 'lucide-react';
import type { Estimate, NextMeasurement } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import { Notice } from '../ui/Notice';
import { measurementWords, percent } from './words';

/** The measurement that would cut the doubt most, with its figure, and the runners-up. */
export function NextPanel({ plan, estimate }: { plan: Plan; estimate: Estimate }) {
  const [best, ...others] = estimate.next;
  if (!best) {
    return (
      <Notice title="As sure as weighing can make it">
        No further swatch or weighed motif would narrow the margin by much.
      </Notice>
    );
  }
  return (
    <section className="border-s-4 border-teal ps-4">
      <h2 className="flex items-center gap-1.5">
        <Ruler size={16} aria-hidden className="shrink-0" /> Narrow it further
      </h2>
      <p className="mt-1">
        <b>{measurementWords(best)}</b>: the margin falls from ±{percent(best.marginNow)} to ±
        {percent(best.marginThen)}
        {fewerWords(plan, best)}.
      </p>
      {others.length > 0 && (
        <ul className="mt-2 grid gap-0.5 text-sm text-ink-2">
          {others.slice(0, 4).map((each) => (
            <li key={`${each.kind} ${each.motifs}`} className="flex justify-between gap-3">
              <span>{measurementWords(each)}</span>
              <span className="figures whitespace-nowrap">±{percent(each.marginThen)}</span>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

/** ", and Skerry needs 4 skeins, not 5". */
function fewerWords(plan: Plan, { fewer, skeinsNow, skeinsThen }: NextMeasurement): string {
  const [first] = fewer;
  if (!first) return `; the skeins stay at ${skeinsNow}`;
  if (fewer.length > 1) return `, and ${skeinsThen} skeins suffice, not ${skeinsNow}`;
  const name = plan.colours.find(({ key }) => key === first.colour)?.name ?? '';
  return `, and ${name} needs ${first.then} ${first.then === 1 ? 'skein' : 'skeins'}, not ${first.now}`;
}
