import type { Notice as PlanNotice } from '../../lib/ledger/ledger';
import { Notice } from '../ui/Notice';

/** Questions about the figures first, then notes; cautions together at the end. */
export function PlanNotices({ notices }: { notices: readonly PlanNotice[] }) {
  const cautions = notices.filter(({ severity }) => severity === 'caution');
  return (
    <div className="grid max-w-3xl gap-3">
      {notices
        .filter(({ severity }) => severity !== 'caution')
        .map(({ code, severity, message }, i) => (
          <Notice key={`${code} ${i}`} kind={severity === 'question' ? 'question' : 'note'}>
            {message}
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
