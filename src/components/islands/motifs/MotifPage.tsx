import { BookOpen, LayoutGrid } from 'lucide-react';
import { useMemo, useState } from 'react';
import { gaugeOf } from '../../../lib/gauge/gauge';
import { layoutFor } from '../../../lib/layout/layouts';
import { joinStitches } from '../../../lib/ledger/blanketOf';
import { motifGeometry } from '../../../lib/motifs/geometry';
import type { Motif } from '../../../lib/motifs/motif';
import type { Units } from '../../../lib/units/display';
import { showFabric } from '../../../lib/units/display';
import { MotifPicture } from '../../motifs/MotifPicture';
import { acrossWord, SHAPE_WORDS, workedTo } from '../../motifs/motifWords';
import type { Terms } from '../../planner/stitchWord';
import { AnswerBar } from '../../ui/AnswerBar';
import { ButtonLink } from '../../ui/Button';
import { Fact } from '../../ui/Fact';
import { Notice } from '../../ui/Notice';
import { Select } from '../../ui/Select';
import { useTerms, useUnits } from '../../ui/useUnits';
import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import { gaugeChoices } from './gaugeChoices';
import { JoinFits } from './JoinFits';
import { RoundsTable } from './RoundsTable';

interface MotifPageProps {
  motif: Motif;
  /** It has a written pattern to open. */
  isReadyMade: boolean;
  swatches: GaugeSwatch[];
  units: Units;
  terms: Terms;
}

/** A motif to so many rounds at some gauge: its size, its rounds, and the joins that fit it. */
export function MotifPage(props: MotifPageProps) {
  const units = useUnits(props.units);
  const terms = useTerms(props.terms);
  const [rounds, setRounds] = useState(Math.min(4, props.motif.rounds.length));
  const choices = useMemo(() => gaugeChoices(props.swatches, units), [props.swatches, units]);
  const [gaugeKey, setGaugeKey] = useState(props.swatches[0]?.id ?? 'weight-4');
  const choice = choices.find(({ key }) => key === gaugeKey) ?? choices[0];
  const gauge = useMemo(
    () => gaugeOf(choice?.swatch ?? null, choice?.category ?? 4),
    [choice?.swatch, choice?.category],
  );
  const motif = useMemo(() => workedTo(props.motif, rounds), [props.motif, rounds]);
  const geometry = motifGeometry(motif, gauge, null);
  const { sides } = motif;
  const across = showFabric(geometry.acrossMm, units);
  const stitches = joinStitches(motif);
  const plan = layoutFor(sides) && `/?motif=${motif.key}&rounds=${rounds}`;

  return (
    <>
      <div className="grid gap-x-14 gap-y-8 lg:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]">
        <MotifPicture {...{ motif, gauge, units }} maxHeightPx={420} />
        <div className="grid content-start gap-6">
          <Fact
            lead={`A ${SHAPE_WORDS[sides]} of ${rounds} ${rounds === 1 ? 'round' : 'rounds'} comes out`}
            answer={across}
            live
          >
            {acrossWord(sides)}, give or take {showFabric(1.96 * geometry.acrossSdMm, units)}{' '}
            (95&nbsp;% sure). <b className="text-ink">{stitches} stitches</b> meet each neighbour.
          </Fact>
          <div className="grid max-w-lg gap-3 sm:grid-cols-[10rem_1fr]">
            <Select
              label="Worked to"
              value={String(rounds)}
              onChange={(event) => setRounds(Number(event.target.value))}
              options={props.motif.rounds.map((_, i) => ({
                value: String(i + 1),
                word: i === 0 ? '1 round' : `${i + 1} rounds`,
              }))}
            />
            <Select
              label="At the gauge of"
              value={choice?.key}
              onChange={(event) => setGaugeKey(event.target.value)}
              options={choices.map(({ key, word }) => ({ value: key, word }))}
            />
          </div>
          {geometry.trouble && (
            <Notice kind="question" title={`It ${geometry.trouble.kind}`} live>
              From {geometry.trouble.label} on, the stitches of a side and the height of the rounds
              disagree at this gauge. Work one and measure it.
            </Notice>
          )}
          <div className="flex flex-wrap items-center gap-3">
            {plan && (
              <ButtonLink kind="primary" icon={LayoutGrid} href={plan}>
                Plan a blanket
              </ButtonLink>
            )}
            {props.isReadyMade && (
              <ButtonLink icon={BookOpen} href={`/motifs/read?from=${motif.key}`}>
                Pattern and chart
              </ButtonLink>
            )}
            {!plan && (
              <p className="text-ink-2">There is no layout for blankets of this shape yet.</p>
            )}
          </div>
        </div>
      </div>
      <RoundsTable {...{ motif, geometry, units, terms }} />
      <JoinFits {...{ motif, terms }} />
      <AnswerBar
        answer={`${across} ${acrossWord(sides)}`}
        detail={`${rounds} ${rounds === 1 ? 'round' : 'rounds'} · ${stitches} stitches`}
        action={
          plan && (
            <ButtonLink kind="primary" href={plan}>
              Plan
            </ButtonLink>
          )
        }
      />
    </>
  );
}
