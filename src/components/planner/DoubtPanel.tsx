import type { Estimate } from '../../lib/ledger/ledger';
import { CAUSE_WORDS } from './words';

/** What the uncertainty is made of, largest first. */
export function DoubtPanel({ estimate }: { estimate: Estimate }) {
  const causes = estimate.uncertainty.filter(({ share }) => share >= 0.005);
  if (causes.length === 0) return null;
  return (
    <section>
      <h2>What the doubt is made of</h2>
      <ul className="mt-2 grid gap-2">
        {causes.map(({ cause, share }) => (
          <li key={cause} className="text-sm">
            <span className="flex justify-between gap-3">
              {CAUSE_WORDS[cause]}
              <span className="figures">{Math.round(100 * share)} %</span>
            </span>
            <span className="mt-1 block h-1.5 bg-sunk" aria-hidden>
              <span className="block h-full bg-amber" style={{ width: `${100 * share}%` }} />
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
