import { useState } from 'react';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import { KEPT_LIMITS } from '../../schemas/limits';
import { WithQueries } from '../islands/WithQueries';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { SaveStatus } from '../ui/SaveStatus';
import { ConflictNotice } from './ConflictNotice';
import { Planner, type PlannerPreferences } from './Planner';
import { useAutosave, type Kept, type KeptVersion } from './useAutosave';
import { usePlan } from './usePlan';

interface SavedPlannerProps {
  motifChoices: readonly MotifChoice[];
  blanket: KeptVersion & { id: string };
  preferences: PlannerPreferences;
}

/** The estimator on a blanket of one's own: saved as it changes. */
export default function SavedPlanner(props: SavedPlannerProps) {
  return (
    <WithQueries>
      <Saved {...props} />
    </WithQueries>
  );
}

function Saved({ blanket, motifChoices, preferences }: SavedPlannerProps) {
  const editing = usePlan(blanket.plan);
  const [title, setTitle] = useState(blanket.title);
  const mine = { title, plan: editing.plan };
  const saving = useAutosave(blanket, mine);
  const { conflict } = saving;
  function settle(kept: Kept) {
    if (!conflict) return;
    editing.change(() => kept.plan);
    setTitle(kept.title);
    saving.settle(conflict);
  }
  return (
    <Planner
      editing={editing}
      preferences={preferences}
      motifChoices={motifChoices}
      shoppingHref={`/blankets/${blanket.id}/shopping-list`}
      makingHref={`/blankets/${blanket.id}/making`}
      heading={
        <div className="grid gap-3">
          <h1 className="sr-only">{title}</h1>
          <Field
            label="Blanket"
            data-own-undo
            value={title}
            maxLength={KEPT_LIMITS.titleLength}
            onChange={(event) => setTitle(event.target.value)}
            error={title.trim() === '' ? 'A blanket needs a title' : undefined}
          />
          {conflict && (
            <ConflictNotice {...{ base: saving.base, mine, conflict }} onSettle={settle} />
          )}
        </div>
      }
      keeping={
        <>
          <SaveStatus state={saving.state} />
          {saving.state.is === 'failed' && !conflict && (
            <Button kind="quiet" small onClick={saving.retry}>
              Try again
            </Button>
          )}
        </>
      }
    />
  );
}
