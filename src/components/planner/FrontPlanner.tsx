import { RotateCcw } from 'lucide-react';
import { lazy, useState } from 'react';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import type { Plan } from '../../lib/plan/plan';
import { Button } from '../ui/Button';
import { LoadedLater } from '../ui/LoadedLater';
import { Planner, type PlannerPreferences } from './Planner';
import { usePlan } from './usePlan';
import { useStoredPlan } from './useStoredPlan';

const KeepBlanket = lazy(() => import('./KeepBlanket'));

interface FrontPlannerProps {
  example: Plan;
  /** The example, or it with the motif or swatch that the address asks for. */
  initial: Plan;
  /** The address asked for something: do not bring back what was on the screen last time. */
  asked: boolean;
  signedIn: boolean;
  motifChoices: readonly MotifChoice[];
  preferences: PlannerPreferences;
}

/** The estimator of the front page: works at once, remembers on this device, can be kept by signing up. */
export default function FrontPlanner(props: FrontPlannerProps) {
  const { example, initial, asked, signedIn, motifChoices, preferences } = props;
  const editing = usePlan(initial);
  const stored = useStoredPlan(editing, example, asked);
  const [keeping, setKeeping] = useState(false);
  return (
    <Planner
      editing={editing}
      preferences={preferences}
      motifChoices={motifChoices}
      heading={
        <div>
          <h1>How much yarn, how big, how sure</h1>
          <p className="mt-1 text-ink-2">
            {stored
              ? 'Your plan, kept on this device.'
              : 'An example to change: put in your own yarn, swatch and motif.'}
          </p>
        </div>
      }
      keeping={
        <>
          {stored && (
            <Button
              kind="quiet"
              small
              icon={RotateCcw}
              onClick={() => editing.change(() => example)}
            >
              Example
            </Button>
          )}
          {signedIn ? (
            <Button small onClick={() => setKeeping(true)}>
              Keep this blanket
            </Button>
          ) : (
            <a className="btn btn-small" href="/register?returnTo=/">
              Sign up to keep it
            </a>
          )}
          <LoadedLater what="The form to keep it">
            {keeping && <KeepBlanket plan={editing.plan} onClose={() => setKeeping(false)} />}
          </LoadedLater>
        </>
      }
    />
  );
}
