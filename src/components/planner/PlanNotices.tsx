import { lazy } from 'react';
import type { Notice as PlanNotice } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import { LoadedLater } from '../ui/LoadedLater';
import { Notice } from '../ui/Notice';
import { useIsHere } from '../ui/useIsHere';
import type { ChangePlan } from './usePlan';

const JoinCures = lazy(() => import('./JoinCures'));

interface PlanNoticesProps {
  notices: readonly PlanNotice[];
  plan: Plan;
  change: ChangePlan;
}

/** Questions about the figures first, then notes; cautions together at the end. */
export function PlanNotices({ notices, plan, change }: PlanNoticesProps) {
  const isHere = useIsHere();
  const cautions = notices.filter(({ severity }) => severity === 'caution');
  return (
    <div className="grid max-w-3xl gap-3">
      {notices
        .filter(({ severity }) => severity !== 'caution')
        .map(({ code, severity, message }, i) => (
          <Notice key={`${code} ${i}`} kind={severity === 'question' ? 'question' : 'note'}>
            {message}
            {code === 'join-does-not-fit' && isHere && (
              <LoadedLater what="What would make it fit">
                <JoinCures {...{ plan, change }} />
              </LoadedLater>
            )}
          </Notice>
        ))}
      {cautions.length > 0 && (
        <Notice title="Take care">
          <ul className="grid gap-1">
            {cautions.map(({ code, message }) => (
              <li key={code}>{message}</li>
            ))}
          </ul>
        </Notice>
      )}
    </div>
  );
}
