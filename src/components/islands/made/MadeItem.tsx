import { LayoutGrid, Pencil, Trash2 } from 'lucide-react';
import { useMemo } from 'react';
import type { Gauge } from '../../../lib/gauge/gauge';
import type { Motif } from '../../../lib/motifs/motif';
import { showFabric, type Units } from '../../../lib/units/display';
import { YARN_CATEGORIES } from '../../../lib/yarnCategories';
import { acrossWord } from '../../motifs/motifWords';
import { Button } from '../../ui/Button';
import { showDay } from '../swatches/swatchWords';
import type { KeptMade } from './keptMade';
import { madeFigures } from './madeFigures';
import { doubtWords, sizeTold, verdictChange, workedWords, yarnTold, type Told } from './madeWords';

interface MadeItemProps {
  kept: KeptMade;
  /** The gauge shown is of a yarn like that it was made in. */
  isOfGauge: boolean;
  motif: Motif;
  /** The save that is shown. */
  motifVersion: number | null;
  gauge: Gauge;
  units: Units;
  onPlan?: () => void;
  onEdit: () => void;
  onDelete: () => void;
}

/** One made motif of the list: what it told, and what can be done with it. */
export function MadeItem(props: MadeItemProps) {
  const { kept, isOfGauge, motif, motifVersion, gauge, units, onPlan, onEdit, onDelete } = props;
  const isShown = kept.rounds <= motif.rounds.length;
  const figures = useMemo(
    () => (isOfGauge ? madeFigures(kept, motif, gauge) : null),
    [isOfGauge, kept, motif, gauge],
  );
  const verdict = figures && verdictChange(figures);
  const doubt = figures && doubtWords(figures);
  const day = showDay(kept.madeOn);
  return (
    <li className="border-t border-line py-3 first:border-t-0">
      <p>
        <b>{day}</b>{' '}
        <span className="text-ink-2">
          · {workedWords(kept)}
          {kept.motifVersion !== motifVersion &&
            kept.motifVersion !== null &&
            ` · from version ${kept.motifVersion}`}
        </span>
      </p>
      <div className="max-w-[80ch] tabular-nums">
        {figures ? (
          <>
            <Sentence told={sizeTold(figures, motif.sides, units)} />
            {verdict && <p>{verdict}</p>}
            {doubt && <p className="text-amber-ink">{doubt}</p>}
            <Sentence told={yarnTold(figures, units)} />
          </>
        ) : (
          <>
            <p>{taped(kept, motif, units)}</p>
            <p className="text-ink-2">{isShown ? otherYarn(kept) : tooManyRounds(kept)}</p>
          </>
        )}
      </div>
      {kept.notes && <p className="max-w-[72ch] whitespace-pre-line">{kept.notes}</p>}
      <p className="-ms-2 mt-0.5 flex flex-wrap gap-x-1">
        {onPlan && isShown && (
          <Button
            kind="quiet"
            small
            icon={LayoutGrid}
            onClick={onPlan}
            aria-label={`Plan with the one of ${day}`}
          >
            Plan with it
          </Button>
        )}
        <Button
          kind="quiet"
          small
          icon={Pencil}
          onClick={onEdit}
          aria-label={`Change the one of ${day}`}
        >
          Change
        </Button>
        <Button
          kind="quiet"
          small
          icon={Trash2}
          className="text-madder"
          onClick={onDelete}
          aria-label={`Delete the one of ${day}`}
        >
          Delete
        </Button>
      </p>
    </li>
  );
}

function Sentence({ told }: { told: Told | null }) {
  if (!told) return null;
  const [lead, answer, rest] = told;
  return (
    <p className="text-ink-2">
      {lead}
      <b className="text-ink">{answer}</b>
      {rest}
    </p>
  );
}

/** What the tape read, where it cannot be set beside a gauge. */
function taped({ sizes }: KeptMade, { sides }: Motif, units: Units): string | null {
  const last = sizes.at(-1);
  return last
    ? `${showFabric(last.acrossMm, units)} ${acrossWord(sides)} after round ${last.round}.`
    : null;
}

const tooManyRounds = ({ rounds }: KeptMade): string =>
  `Show the motif with ${rounds} rounds to set this beside them.`;

const otherYarn = ({ weightCategory }: KeptMade): string =>
  `Made in ${YARN_CATEGORIES[weightCategory]?.name.toLowerCase()} yarn: choose its gauge above to set this beside it.`;
