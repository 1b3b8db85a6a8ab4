import { useState } from 'react';
import { ApiError } from '../../client/api';
import { listStash } from '../../client/queries/stash';
import { withColour } from '../../lib/plan/edits';
import type { Plan } from '../../lib/plan/plan';
import { PLAN_LIMITS } from '../../schemas/limits';
import { Button } from '../ui/Button';
import { WoundCard } from '../ui/WoundCard';
import type { ChangePlan } from './usePlan';

interface StashColour {
  readonly name: string;
  readonly hex: string;
  readonly yarnName: string;
}

type Found = { readonly colours: readonly StashColour[] } | { readonly problem: string } | null;

/** Colours of one's own yarn, to plan with what is there. Asked for only when wanted. */
export function StashColours({ plan, change }: { plan: Plan; change: ChangePlan }) {
  const [found, setFound] = useState<Found>(null);
  const [asking, setAsking] = useState(false);

  async function ask() {
    setAsking(true);
    try {
      const lots = await listStash();
      const byName = new Map(
        lots.map(({ colourway, yarn }) => [
          `${yarn.name} ${colourway.name}`,
          { name: colourway.name, hex: colourway.hex, yarnName: yarn.name },
        ]),
      );
      setFound({ colours: [...byName.values()] });
    } catch (error) {
      const isStranger = error instanceof ApiError && error.status === 401;
      setFound({
        problem: isStranger
          ? 'Sign in to choose from your stash.'
          : 'Your stash could not be loaded. Try again.',
      });
    } finally {
      setAsking(false);
    }
  }

  if (!found || 'problem' in found) {
    return (
      <>
        <Button
          className="ms-2 mt-3 align-top"
          busy={asking && 'Looking…'}
          onClick={() => void ask()}
        >
          From my stash
        </Button>
        {found && (
          <p role="alert" className="mt-2 text-sm">
            {found.problem}
          </p>
        )}
      </>
    );
  }
  const free = found.colours.filter(
    ({ name }) => !plan.colours.some((colour) => colour.name === name),
  );
  return (
    <div className="mt-3">
      <h4 className="font-bold">From my stash</h4>
      {free.length === 0 && <p className="text-sm text-ink-2">No other colour is in it.</p>}
      <ul className="mt-1 flex max-h-48 flex-wrap gap-1 overflow-y-auto">
        {free.map(({ name, hex, yarnName }) => (
          <li key={`${yarnName} ${name}`}>
            <button
              type="button"
              className="flex min-h-11 items-center gap-2 rounded-control border border-line px-2 py-1 text-start"
              disabled={plan.colours.length >= PLAN_LIMITS.colours}
              onClick={() => change((old) => withColour(old, { name, hex }))}
            >
              <WoundCard colour={hex} weight={plan.yarn.weightCategory} size="sm" />
              <span>
                <b className="block">{name}</b>
                <span className="block text-xs text-ink-2">{yarnName}</span>
              </span>
            </button>
          </li>
        ))}
      </ul>
    </div>
  );
}
