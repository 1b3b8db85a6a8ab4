import { LayoutGrid } from 'lucide-react';
import type { ReactNode } from 'react';
import type { MotifGeometry } from '../../../lib/motifs/geometry';
import { joinStitches } from '../../../lib/ledger/pieces';
import { motifOf } from '../../../lib/pattern/motifOf';
import type { Reading } from '../../../lib/pattern/reading';
import { showFabric, type Units } from '../../../lib/units/display';
import { acrossWord, SHAPE_WORDS } from '../../motifs/motifWords';
import { AnswerBar } from '../../ui/AnswerBar';
import { Button } from '../../ui/Button';
import { Fact } from '../../ui/Fact';
import { Notice } from '../../ui/Notice';
import { problemsInWords } from './Problems';
import type { Planning } from './usePlanning';

interface PatternAnswerProps {
  reading: Reading;
  geometry: MotifGeometry;
  units: Units;
  planning: Planning;
}

/** How large it comes out, whether it lies flat, and on to the estimator. */
export function PatternAnswer(props: PatternAnswerProps & { actions?: ReactNode }) {
  const { reading, geometry, units, planning, actions } = props;
  const { rounds, sides } = reading;
  if (rounds.length === 0)
    return <p className="text-ink-2">The chart appears here as soon as a round can be worked.</p>;
  const isFlat = rounds[0]?.kind === 'row';
  const stitches = isFlat ? 0 : joinStitches(motifOf(reading, '', ''));
  return (
    <div className="min-w-0">
      {!isFlat && (
        <Fact
          lead={`A ${SHAPE_WORDS[sides]} of ${countInWords(reading)} comes out`}
          answer={showFabric(geometry.acrossMm, units)}
          live
        >
          {acrossWord(sides)}, give or take {showFabric(1.96 * geometry.acrossSdMm, units)}{' '}
          (95&nbsp;% sure){stitches > 0 && `, ${stitches} stitches to each neighbour`}
        </Fact>
      )}
      {geometry.trouble && !isFlat && (
        <Notice kind="question" title={`It ${geometry.trouble.kind}`} className="mt-2" live>
          From {geometry.trouble.label} on, the stitches and the height of the rounds disagree at
          this gauge.
        </Notice>
      )}
      <div className="not-printed mt-3 flex flex-wrap items-center gap-3">
        <Button
          kind="primary"
          icon={LayoutGrid}
          aria-disabled={planning.why !== null}
          onClick={() => planning.plan()}
        >
          Plan a blanket
        </Button>
        {actions}
        {planning.why && <span className="text-sm text-ink-2">{planning.why}</span>}
      </div>
      {planning.problem && (
        <Notice kind="problem" live className="mt-2">
          {planning.problem}
        </Notice>
      )}
    </div>
  );
}

/** On a phone the answer stays in view, whatever is shown above it. */
export function PatternBar({ reading, geometry, units, planning }: PatternAnswerProps) {
  const { rounds, sides, diagnostics } = reading;
  if (rounds.length === 0) return null;
  const isFlat = rounds[0]?.kind === 'row';
  return (
    <AnswerBar
      answer={
        isFlat
          ? countInWords(reading)
          : `${showFabric(geometry.acrossMm, units)} ${acrossWord(sides)}`
      }
      detail={problemsInWords(diagnostics)}
      action={
        planning.why === null && (
          <Button kind="primary" onClick={() => planning.plan()}>
            Plan
          </Button>
        )
      }
    />
  );
}

export function countInWords({ rounds }: Reading): string {
  const noun = rounds[0]?.kind === 'row' ? 'row' : 'round';
  return `${rounds.length} ${noun}${rounds.length === 1 ? '' : 's'}`;
}
