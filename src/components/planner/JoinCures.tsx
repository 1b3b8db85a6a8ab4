import { joinCures } from '../../lib/joins/joinCures';
import type { Plan } from '../../lib/plan/plan';
import { Button } from '../ui/Button';
import type { ChangePlan } from './usePlan';

/** The nearest ways to make join and motif fit, each done by a click, and undone like any change. */
export default function JoinCures({ plan, change }: { plan: Plan; change: ChangePlan }) {
  return (
    <ul className="mt-2 flex flex-wrap gap-2" aria-label="What would make it fit">
      {joinCures(plan).map(({ words, apply }) => (
        <li key={words}>
          <Button small onClick={() => change(apply)}>
            {words}
          </Button>
        </li>
      ))}
    </ul>
  );
}
