import { changedParts, mergedPlan, type PlanPart } from '../../lib/plan/merge';
import type { Plan } from '../../lib/plan/plan';
import { Button } from '../ui/Button';
import { Notice } from '../ui/Notice';
import type { Kept, KeptVersion } from './useAutosave';

interface ConflictNoticeProps {
  base: Kept;
  mine: Kept;
  conflict: KeptVersion;
  /** Settles the conflict with this title and plan on the screen. */
  onSettle: (kept: Kept) => void;
}

const PART_NAMES: Record<PlanPart, string> = {
  yarn: 'the yarn',
  colours: 'the colours',
  swatch: 'the swatch',
  evidence: 'the weighed pieces',
  motifs: 'the motif',
  colourways: 'the colours of the rounds',
  motifSideMm: "the motif's measured side",
  size: 'the size',
  layout: 'the layout',
  edge: 'the edge',
  secondMotif: 'the second motif',
  placement: 'which colours lie where',
  join: 'the join',
  corners: 'the corners',
  border: 'the border',
  confidence: 'how sure to be',
  secondsPerMove: 'the working pace',
};

/** Told when the same blanket was changed in another tab or on another device; nothing is lost either way. */
export function ConflictNotice({ base, mine, conflict, onSettle }: ConflictNoticeProps) {
  const both = mergedKept(base, mine, conflict);
  return (
    <Notice
      kind="question"
      title="This blanket was changed elsewhere meanwhile"
      live
      action={
        <>
          {both && (
            <Button kind="primary" onClick={() => onSettle(both)}>
              Keep both changes
            </Button>
          )}
          <Button onClick={() => onSettle(mine)}>Keep mine</Button>
          <Button onClick={() => onSettle(conflict)}>Take theirs</Button>
        </>
      }
    >
      <p>
        There: {changesInWords(base, conflict)}. Here: {changesInWords(base, mine)}.
      </p>
      <p className="text-ink-2">Every earlier save stays among the blanket’s versions.</p>
    </Notice>
  );
}

function changesInWords(from: Kept, to: Kept): string {
  const parts = changedParts(from.plan, to.plan).map((part) => PART_NAMES[part]);
  return (
    [...(from.title === to.title ? [] : ['the title']), ...parts].join(', ') || 'no difference'
  );
}

function mergedKept(base: Kept, mine: Kept, theirs: Kept): Kept | null {
  const plan: Plan | null = mergedPlan(base.plan, mine.plan, theirs.plan);
  const titles = mine.title !== base.title && theirs.title !== base.title;
  if (!plan || titles) return null;
  return { plan, title: mine.title === base.title ? theirs.title : mine.title };
}
