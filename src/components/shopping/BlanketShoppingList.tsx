import { useMutation } from '@tanstack/react-query';
import { Download, ListChecks, Pencil, Printer } from 'lucide-react';
import { useState } from 'react';
import { keepList, linkColour, unlinkColour } from '../../client/queries/shopping';
import type { WeightCategory } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import type { BlanketShopping } from '../../schemas/shoppingList';
import { WithQueries } from '../islands/WithQueries';
import { Button, ButtonLink } from '../ui/Button';
import { Notice } from '../ui/Notice';
import { useUnits } from '../ui/useUnits';
import { ShoppingTable } from './ShoppingTable';
import { StashLinks, type StashChoice } from './StashLinks';

interface BlanketShoppingListProps {
  initial: BlanketShopping;
  weight: WeightCategory;
  colourways: readonly StashChoice[];
  units: Units;
}

/** What to buy for a saved blanket, less what the stash holds, and which lots that is. */
export default function BlanketShoppingList(props: BlanketShoppingListProps) {
  return (
    <WithQueries>
      <ListOfBlanket {...props} />
    </WithQueries>
  );
}

function ListOfBlanket({ initial, weight, colourways, units: shown }: BlanketShoppingListProps) {
  const units = useUnits(shown);
  const [shopping, setShopping] = useState(initial);
  const link = useMutation({
    mutationFn: ({ colour, choice }: { colour: string; choice: string }) =>
      choice === 'by name'
        ? unlinkColour(shopping.blanketId, colour)
        : linkColour(shopping.blanketId, colour, choice === 'none' ? null : choice),
    onSuccess: setShopping,
  });
  const keep = useMutation({
    mutationFn: () => keepList(shopping.blanketId),
    onSuccess: ({ id }) => window.location.assign(`/shopping-lists/${id}`),
  });
  const failure = link.error ?? keep.error;
  return (
    <div className="grid max-w-3xl grid-cols-[minmax(0,1fr)] gap-6 pb-10">
      <header>
        <h1>Shopping list</h1>
        <p className="mt-1 text-ink-2">
          For <b className="text-ink">{shopping.title}</b>, whole skeins of {shopping.yarnName},{' '}
          {100 * shopping.confidence} % sure of each colour. Buy each colour in one dye lot.
        </p>
      </header>
      {failure && (
        <Notice kind="problem" live>
          {failure.message}
        </Notice>
      )}
      <ShoppingTable list={shopping} weight={weight} units={units} hasStash />
      <div className="flex flex-wrap gap-3" data-chrome>
        <Button
          kind="primary"
          icon={ListChecks}
          busy={keep.isPending && 'Keeping…'}
          onClick={() => keep.mutate()}
        >
          Keep it to tick off
        </Button>
        <ButtonLink icon={Download} href={`/api/blankets/${shopping.blanketId}/shopping-list.csv`}>
          Download CSV
        </ButtonLink>
        <Button icon={Printer} onClick={() => window.print()}>
          Print
        </Button>
        <ButtonLink icon={Pencil} href={`/blankets/${shopping.blanketId}`}>
          Back to the plan
        </ButtonLink>
      </div>
      <StashLinks
        shopping={shopping}
        colourways={colourways}
        units={units}
        busy={link.isPending}
        onLink={(colour, choice) => link.mutate({ colour, choice })}
      />
    </div>
  );
}
