import { Plus } from 'lucide-react';
import type { Plan } from '../../../lib/plan/plan';
import { Button } from '../../ui/Button';
import { codeWord, type Terms } from '../stitchWord';
import type { ChangePlan } from '../usePlan';

interface PlainRoundButtonProps {
  plan: Plan;
  terms: Terms;
  change: ChangePlan;
}

/** One more plain round outside the others. */
export function PlainRoundButton({ plan, terms, change }: PlainRoundButtonProps) {
  const last = plan.border.at(-1);
  const add = () =>
    change((old) => ({
      ...old,
      border: [...old.border, { stitch: 'sc', colour: last?.colour ?? old.join.colour }],
    }));
  return (
    <Button className="justify-self-start" icon={Plus} onClick={add}>
      Add a round of {codeWord('sc', terms)}
    </Button>
  );
}
