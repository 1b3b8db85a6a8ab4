import { useEffect, useState } from 'react';
import { getMotif } from '../../client/queries/motifs';
import { motifChanges, type MotifChanges } from '../../lib/motifs/motifChanges';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import type { Motif } from '../../lib/motifs/motif';
import { withMotif } from '../../lib/plan/edits';
import type { Plan } from '../../lib/plan/plan';
import type { PresentedMotif } from '../../schemas/motif';
import { savedOn } from '../islands/motifs/motifWording';
import { countsInWords, SHAPE_WORDS } from '../motifs/motifWords';
import { Button } from '../ui/Button';
import { Notice } from '../ui/Notice';
import { hasStayed, stayWith } from './stayedWith';
import type { Terms } from './stitchWord';
import type { ChangePlan } from './usePlan';

interface NewerVersionProps {
  plan: Plan;
  /** The motif as it is kept now; undefined where it is kept no longer, or has no rounds. */
  choice: MotifChoice | undefined;
  change: ChangePlan;
  terms: Terms;
}

/** A blanket keeps the version of its motif that it was planned with; this says that there is a newer one. */
export default function NewerVersion({ plan, choice, change, terms }: NewerVersionProps) {
  const planned = plan.motifs[0];
  const [newer, setNewer] = useState<PresentedMotif | null>(null);
  const [stayed, setStayed] = useState(() => choice !== undefined && hasStayed(choice));
  const key = choice?.key;
  useEffect(() => {
    if (key === undefined || stayed) return;
    let gone = false;
    // Without an answer nothing is said: the plan holds all it needs.
    getMotif(key).then(
      (found) => !gone && setNewer(found),
      () => undefined,
    );
    return () => {
      gone = true;
    };
  }, [key, stayed]);

  if (!planned) return null;
  if (!choice) {
    return (
      <p className="text-sm text-ink-2">
        Planned with version {planned.version} of a motif that is no longer kept, or has no rounds
        now. The blanket keeps the rounds it was planned with.
      </p>
    );
  }
  const now = newer?.motif;
  if (stayed || !now) return null;
  const changes = motifChanges(planned, now);
  const title = `Version ${newer.version} of ${newer.name}, saved ${savedOn(newer.updatedAt ?? '')}`;

  function take(motif: Motif) {
    const rounds = motif.rounds.slice(0, planned?.rounds.length);
    change((old) => withMotif(old, { ...motif, rounds }));
  }

  return (
    <Notice title={title}>
      <p>
        This blanket is planned with version {planned.version}. {changesInWords(changes, terms)}
        {plan.motifSideMm !== null &&
          ' The measured side was of the older one and would be taken out.'}{' '}
        <a className="link font-normal" href={`/motifs/${choice.key}`}>
          Look at the motif
        </a>
      </p>
      <div className="mt-2 flex flex-wrap gap-2">
        <Button small onClick={() => take(now)}>
          Take version {newer.version}
        </Button>
        <Button
          small
          kind="quiet"
          onClick={() => {
            stayWith(choice);
            setStayed(true);
          }}
        >
          Stay with version {planned.version}
        </Button>
      </div>
    </Notice>
  );
}

function changesInWords(changes: MotifChanges, terms: Terms): string {
  const { sides, roundsGone, roundsMore, rounds } = changes;
  const more = (count: number) => (count === 1 ? '1 round' : `${count} rounds`);
  const parts = [
    sides && `It is now a ${SHAPE_WORDS[sides[1]]}, not a ${SHAPE_WORDS[sides[0]]}.`,
    ...rounds.slice(0, 3).map(({ label, before, now }) => {
      const [was, is] = [countsInWords(before, terms), countsInWords(now, terms)];
      return was === is
        ? `${label} is made otherwise.`
        : `${label} counts ${is} instead of ${was}.`;
    }),
    rounds.length > 3 && `${more(rounds.length - 3)} more differ.`,
    roundsGone > 0 && `It has ${more(roundsGone)} fewer than this blanket works.`,
    roundsMore > 0 && `It can be worked to ${more(roundsMore)} more.`,
  ].filter(Boolean);
  const alters = sides !== null || rounds.length > 0 || roundsGone > 0;
  return [...parts, !alters && 'Nothing of it alters this blanket.'].filter(Boolean).join(' ');
}
