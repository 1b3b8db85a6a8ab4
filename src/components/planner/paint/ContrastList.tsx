import { touchingColours } from '../../../lib/colour/contrast';
import type { LaidBlanket } from '../../../lib/plan/blanketFaces';
import type { Plan } from '../../../lib/plan/plan';

/** Less than this between neighbours is hard to tell apart in grey (ours). */
const HARD_TO_TELL = 0.12;
const MOST_SHOWN = 4;

/** Which neighbours are hard to tell apart without colour. */
export function ContrastList({ plan, laid }: { plan: Plan; laid: LaidBlanket }) {
  const close = touchingColours(plan, laid).filter(({ lightness }) => lightness < HARD_TO_TELL);
  const nameOf = (key: string) => plan.colours.find((each) => each.key === key)?.name ?? '';
  if (close.length === 0) {
    return <p className="text-sm text-ink-2">All neighbours can be told apart in grey.</p>;
  }
  return (
    <p className="text-sm text-ink-2">
      Hard to tell apart in grey:{' '}
      {close
        .slice(0, MOST_SHOWN)
        .map(
          ({ colours: [one, other], lightness }) =>
            `${nameOf(one)} beside ${nameOf(other)} (${Math.round(100 * lightness)} of 100 apart)`,
        )
        .join('; ')}
      {close.length > MOST_SHOWN && `; ${close.length - MOST_SHOWN} more`}.
    </p>
  );
}
