import { useMutation } from '@tanstack/react-query';
import { Ruler } from 'lucide-react';
import { lazy, useState } from 'react';
import type { Gauge } from '../../../lib/gauge/gauge';
import type { Motif } from '../../../lib/motifs/motif';
import type { WeightCategory } from '../../../lib/plan/plan';
import type { Units } from '../../../lib/units/display';
import type { PresentedMadeMotif } from '../../../schemas/madeMotif';
import { SHAPE_WORDS } from '../../motifs/motifWords';
import { Button } from '../../ui/Button';
import { capitalised, countInWords } from '../../ui/inWords';
import { LoadedLater } from '../../ui/LoadedLater';
import { Notice } from '../../ui/Notice';
import { failureWords } from '../form/formErrors';
import { StaleNotice } from '../form/StaleNotice';
import { DeleteMade } from './DeleteMade';
import type { KeptMade, MadeOf } from './keptMade';
import { MadeItem } from './MadeItem';
import { useMadeMotifs } from './useMadeMotifs';

const MadeSheet = lazy(() => import('./MadeSheet'));

export interface MadeMotifsProps {
  /** As it is shown, worked to the rounds shown. */
  motif: Motif;
  motifKey: string;
  motifVersion: number | null;
  gauge: Gauge;
  /** "my swatch: Sc in Towpath" */
  gaugeName: string;
  /** The swatch that the gauge is of, or null. */
  swatchId: string | null;
  category: WeightCategory;
  signedIn: boolean;
  /** Those of the account, of this motif; none for a stranger. */
  initial: PresentedMadeMotif[];
  units: Units;
  /** Hands one on to the estimator. */
  onPlan?: (made: KeptMade) => void;
}

/** What was made of a motif and what it measured, and the form to measure one. Needs `WithQueries` round it. */
export function MadeMotifs(props: MadeMotifsProps) {
  const { motif, motifKey, motifVersion, gauge, gaugeName, units, signedIn, onPlan } = props;
  const state = useMadeMotifs(props);
  const [writing, setWriting] = useState<{ kept: KeptMade | null } | null>(null);
  const [leaving, setLeaving] = useState<KeptMade | null>(null);
  const [status, setStatus] = useState('');
  const of: MadeOf = {
    motifKey,
    motifVersion,
    swatchId: props.swatchId,
    weightCategory: props.category,
  };
  const { kept } = state;
  if (motif.rounds.length === 0) return null;

  return (
    <section aria-labelledby="made-motifs" className="mt-10">
      <h2 id="made-motifs">Made one? Measure it.</h2>
      <StaleNotice error={state.error} onRetry={state.retry} />
      <LeftOnDevice {...state} />
      {kept.length === 0 ? (
        <p className="mt-1 max-w-[62ch] text-ink-2">
          A tape across one finished {SHAPE_WORDS[motif.sides]} tells its size surer than any gauge,
          and a scale tells its yarn. Rounds that you did not measure follow those that you did.
        </p>
      ) : (
        <>
          <p className="mt-1 text-ink-2">Beside the gauge of {gaugeName}.</p>
          <ul aria-label="Motifs you made" className="mt-2">
            {kept.map((each) => (
              <MadeItem
                key={each.id}
                kept={each}
                isOfGauge={isOfGauge(each, of)}
                {...{ motif, motifVersion, gauge, units }}
                onPlan={onPlan && (() => onPlan(each))}
                onEdit={() => setWriting({ kept: each })}
                onDelete={() => setLeaving(each)}
              />
            ))}
          </ul>
        </>
      )}
      <p role="status" className="text-sm text-ink-2 empty:hidden">
        {status}
      </p>
      <div className="mt-3">
        <Button icon={Ruler} onClick={() => setWriting({ kept: null })}>
          {kept.length === 0 ? 'Measure one' : 'Measure another'}
        </Button>
      </div>
      {!signedIn && kept.length > 0 && (
        <p className="mt-2 text-sm text-ink-2">
          Kept on this device.{' '}
          <a className="link font-normal" href="/sign-in">
            Sign in
          </a>{' '}
          to have them everywhere.
        </p>
      )}
      {writing && (
        <LoadedLater what="The form for what you made">
          <MadeSheet
            key={writing.kept?.id ?? 'new'}
            kept={writing.kept}
            last={kept[0]}
            {...{ of, motif, gauge, gaugeName, units }}
            save={state.save}
            onSaved={(wasNew) => {
              setWriting(null);
              setStatus(wasNew ? 'Kept.' : 'Changed.');
            }}
            onClose={() => setWriting(null)}
          />
        </LoadedLater>
      )}
      {leaving && (
        <DeleteMade kept={leaving} remove={state.remove} onClose={() => setLeaving(null)} />
      )}
    </section>
  );
}

/** Of a yarn of another weight, the gauge that is shown says nothing. */
const isOfGauge = (kept: KeptMade, { swatchId, weightCategory }: MadeOf): boolean =>
  swatchId !== null || kept.weightCategory === weightCategory;

/** What was measured before the person signed in stays on the device until it is taken along. */
function LeftOnDevice({
  left,
  takeToAccount,
}: Pick<ReturnType<typeof useMadeMotifs>, 'left' | 'takeToAccount'>) {
  const taking = useMutation({ mutationFn: takeToAccount });
  if (left.length === 0) return null;
  const are = left.length === 1 ? 'that you measured is' : 'that you measured are';
  return (
    <Notice
      className="my-3"
      action={
        <Button small busy={taking.isPending && 'Taking…'} onClick={() => taking.mutate()}>
          Take into the account
        </Button>
      }
    >
      {capitalised(countInWords(left.length))} {are} on this device only.
      {taking.error && <span className="block text-madder">{failureWords(taking.error)}</span>}
    </Notice>
  );
}
