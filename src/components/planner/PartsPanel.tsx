import { lazy } from 'react';
import type { Estimate } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import { LoadedLater } from '../ui/LoadedLater';
import { Skeleton } from '../ui/Skeleton';
import { useInView } from '../ui/useInView';

const PartsChart = lazy(() => import('./PartsChart'));

interface PartsPanelProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
}

/** Where the yarn goes; the chart's code is fetched when it comes into view. */
export function PartsPanel(props: PartsPanelProps) {
  const [ref, seen] = useInView<HTMLElement>();
  return (
    <section ref={ref}>
      <h2>Where it goes</h2>
      <div className="mt-2 min-h-44">
        {seen && (
          <LoadedLater
            what="The chart"
            fallback={<Skeleton label="The chart is loading" lines={6} />}
          >
            <PartsChart {...props} />
          </LoadedLater>
        )}
      </div>
    </section>
  );
}
