import { useMemo } from 'react';
import { estimate as estimateOf } from '../../lib/ledger/estimate';
import type { Join } from '../../lib/joins/join';
import type { Plan } from '../../lib/plan/plan';
import { showFabric, showSize, type Units } from '../../lib/units/display';
import { RuledFrame } from '../ui/RuledFrame';
import { useIsHere } from '../ui/useIsHere';
import { FourMotifs } from './FourMotifs';

interface JoinPicturesProps {
  plan: Plan;
  joins: readonly Join[];
  units: Units;
}

/** Two by two motifs joined each way, all to one scale. */
export function JoinPictures({ plan, joins, units }: JoinPicturesProps) {
  const isHere = useIsHere();
  const pictures = useMemo(
    () =>
      joins.map((join) => {
        const small = fourOf(plan, join.key);
        return { join, plan: small, estimate: estimateOf(small) };
      }),
    [plan, joins],
  );
  const frame = {
    widthMm: Math.max(...pictures.map(({ estimate }) => estimate.size.widthMm)),
    heightMm: Math.max(...pictures.map(({ estimate }) => estimate.size.heightMm)),
  };
  return (
    <section>
      <h2>Four motifs joined each way</h2>
      <p className="mb-4 text-ink-2">All to one scale, each from its upper left corner.</p>
      {isHere && (
        <ul className="grid grid-cols-2 gap-x-6 gap-y-8 lg:grid-cols-3">
          {pictures.map(({ join, plan: small, estimate }) => (
            <li key={join.key} className="break-inside-avoid">
              <RuledFrame
                {...frame}
                units={units}
                maxHeightPx={340}
                label={`${join.name}: four motifs, ${showSize(estimate.size.widthMm, estimate.size.heightMm, units)}`}
                caption={
                  <>
                    <b className="block">{join.name}</b>
                    <span className="text-sm text-ink-2">
                      {showSize(estimate.size.widthMm, estimate.size.heightMm, units)}, seam{' '}
                      {showFabric(estimate.size.seamMm, units)}
                    </span>
                  </>
                }
              >
                <FourMotifs plan={small} estimate={estimate} />
              </RuledFrame>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

const fourOf = (plan: Plan, key: string): Plan => ({
  ...plan,
  size: { by: 'grid', rows: 2, columns: 2 },
  edge: 'toothed',
  border: [],
  join: { ...plan.join, key },
});
