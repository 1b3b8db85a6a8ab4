import { useMutation } from '@tanstack/react-query';
import { Printer } from 'lucide-react';
import { useRef, useState } from 'react';
import { ApiError } from '../../client/api';
import { tickLines } from '../../client/queries/shopping';
import { showPrice, showYarn, type Units } from '../../lib/units/display';
import {
  keptShoppingListSchema,
  type KeptShoppingList as KeptList,
} from '../../schemas/shoppingList';
import { useLeaveWarning } from '../islands/form/useLeaveWarning';
import { WithQueries } from '../islands/WithQueries';
import { Button, ButtonLink } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Notice } from '../ui/Notice';
import { SaveStatus, type SaveState } from '../ui/SaveStatus';
import { useUnits } from '../ui/useUnits';

interface KeptShoppingListProps {
  initial: KeptList;
  units: Units;
}

/** A shopping list as it was kept, to tick off in the shop. */
export default function KeptShoppingList(props: KeptShoppingListProps) {
  return (
    <WithQueries>
      <TickList {...props} />
    </WithQueries>
  );
}

function TickList({ initial, units: shown }: KeptShoppingListProps) {
  const units = useUnits(shown);
  const [list, setList] = useState(initial);
  const latest = useRef(list);
  /** Colours ticked here: shown at once, saved one after the other. */
  const [bought, setBought] = useState(() => boughtOf(initial));
  const take = (saved: KeptList) => {
    latest.current = saved;
    setList(saved);
  };
  const tick = useMutation({
    scope: { id: 'ticks' },
    mutationFn: (colours: readonly string[]) => tickLines(latest.current, colours),
    onSuccess: take,
    onError: (error) => {
      // Ticked on another device meanwhile: show that list, to be ticked again.
      const current = error instanceof ApiError && keptShoppingListSchema.safeParse(error.current);
      if (!current || !current.success) return;
      take(current.data);
      setBought(boughtOf(current.data));
    },
  });
  useLeaveWarning(tick.isPending);
  const toBuy = list.lines.filter(({ toBuySkeins }) => toBuySkeins > 0);
  function toggle(colour: string) {
    const next = bought.includes(colour)
      ? bought.filter((each) => each !== colour)
      : [...bought, colour];
    setBought(next);
    tick.mutate(next);
  }
  return (
    <div className="grid max-w-xl gap-6 pb-10">
      <header>
        <h1>{list.title}</h1>
        <p className="mt-1 text-ink-2" role="status">
          {bought.length} of {toBuy.length} colours bought, {list.toBuySkeins} skeins of{' '}
          {list.yarnName} in all.
        </p>
        <SaveStatus state={saveState(tick)} className="mt-1" />
      </header>
      {tick.error && (
        <Notice
          kind="problem"
          live
          action={<Button onClick={() => tick.mutate(bought)}>Try again</Button>}
        >
          {tick.error.message}
        </Notice>
      )}
      {toBuy.length === 0 && <p>Nothing to buy: the stash covers this blanket.</p>}
      <ul>
        {toBuy.map((line) => (
          <li key={line.colour} className="flex items-center gap-4 border-t border-line py-2">
            <Checkbox
              checked={bought.includes(line.colour)}
              onChange={() => toggle(line.colour)}
              label={`${line.name}: ${line.toBuySkeins} ${line.toBuySkeins === 1 ? 'skein' : 'skeins'}`}
            />
            <span className="figures ms-auto text-sm text-ink-2">
              {showYarn(line.neededM, units)}
              {line.costMinor !== null &&
                list.currency &&
                `, ${showPrice(line.costMinor, list.currency)}`}
            </span>
          </li>
        ))}
      </ul>
      <div className="flex flex-wrap gap-3" data-chrome>
        <Button icon={Printer} onClick={() => window.print()}>
          Print
        </Button>
        {list.blanketId && (
          <ButtonLink href={`/blankets/${list.blanketId}/shopping-list`}>
            The list as it is now
          </ButtonLink>
        )}
      </div>
    </div>
  );
}

function saveState({ isPending, error }: { isPending: boolean; error: Error | null }): SaveState {
  if (isPending) return { is: 'saving' };
  return error ? { is: 'failed', why: error.message } : { is: 'saved' };
}

const boughtOf = ({ lines }: KeptList): string[] =>
  lines.filter((line) => line.bought && line.toBuySkeins > 0).map(({ colour }) => colour);
