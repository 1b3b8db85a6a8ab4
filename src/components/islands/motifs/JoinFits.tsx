import { Check, X } from 'lucide-react';
import type { Motif } from '../../../lib/motifs/motif';
import { joinFits } from '../../motifs/motifWords';
import type { Terms } from '../../planner/stitchWord';

/** Which ready-made joins fit the side, and for those that do not, why and what would. */
export function JoinFits({ motif, terms }: { motif: Motif; terms: Terms }) {
  return (
    <section aria-labelledby="join-fits" className="mt-12">
      <h2 id="join-fits">Joins for this side</h2>
      <ul className="mt-3 grid gap-x-14 md:grid-cols-2">
        {joinFits(motif, terms).map(({ join, fits, words }) => (
          <li
            key={join.key}
            className="grid grid-cols-[1.5rem_1fr] content-start border-t border-line py-3"
          >
            {fits ? (
              <Check size={18} aria-hidden className="mt-0.5 text-teal" />
            ) : (
              <X size={18} aria-hidden className="mt-0.5 text-amber-ink" />
            )}
            <div>
              <h3>
                {join.name}{' '}
                <span className="font-normal text-ink-2">{fits ? 'fits' : 'does not fit'}</span>
              </h3>
              <p className="text-ink-2">{words}</p>
            </div>
          </li>
        ))}
      </ul>
    </section>
  );
}
