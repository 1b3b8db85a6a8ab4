import { Plus, Trash2 } from 'lucide-react';
import { withEvidence } from '../../lib/plan/edits';
import type { Plan, PlanEvidence } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import { lengthM, massG } from '../../lib/units/quantities';
import { PLAN_LIMITS } from '../../schemas/limits';
import { Button } from '../ui/Button';
import { NumberField } from '../ui/NumberField';
import { Select } from '../ui/Select';
import { YarnLengthField } from './QuantityFields';
import { Section } from './Section';
import type { ChangePlan } from './usePlan';

interface WeighedSectionProps {
  plan: Plan;
  units: Units;
  change: ChangePlan;
}

/** Resolutions that scales have, in g. */
const RESOLUTIONS = [0.01, 0.1, 0.5, 1, 2, 5] as const;
const TOGETHER = [1, 2, 3, 4, 6, 8, 12, 16, 20] as const;

/** Pieces weighed or unravelled: what tells this maker's yarn from anybody's. */
export function WeighedSection({ plan, units, change }: WeighedSectionProps) {
  const add = () => change((old) => withEvidence(old, old.evidence.length, firstReading(old)));
  return (
    <Section title="Weighed so far">
      {plan.evidence.length === 0 && (
        <p className="col-span-6 text-ink-2">
          Nothing yet. Weighing a swatch or a few motifs is what makes the figures yours.
        </p>
      )}
      {plan.evidence.map((item, i) => (
        <EvidenceRow key={i} {...{ plan, units, change, item }} index={i} />
      ))}
      <div className="col-span-6 -ms-2 -mt-1 flex flex-wrap">
        {plan.evidence.length < PLAN_LIMITS.evidence && (
          <Button kind="quiet" icon={Plus} onClick={add}>
            {plan.evidence.length === 0 ? 'Enter a weight' : 'Another piece'}
          </Button>
        )}
        {plan.evidence.length > 0 && (
          <Button
            kind="quiet"
            icon={Trash2}
            onClick={() => change((old) => withEvidence(old, old.evidence.length - 1, null))}
          >
            Remove {plan.evidence.length > 1 ? 'the last' : ''}
          </Button>
        )}
      </div>
    </Section>
  );
}

function firstReading(plan: Plan): PlanEvidence {
  const reading = { by: 'weighing', massG: massG(10), resolutionG: massG(1) } as const;
  const swatchFree = plan.swatch && !plan.evidence.some(({ piece }) => piece === 'swatch');
  return swatchFree
    ? { piece: 'swatch', reading }
    : { piece: 'motifs', count: 4, motifIndex: 0, reading };
}

interface EvidenceRowProps extends WeighedSectionProps {
  item: PlanEvidence;
  index: number;
}

function EvidenceRow({ plan, units, change, item, index }: EvidenceRowProps) {
  const set = (next: PlanEvidence, about?: string) =>
    change((old) => withEvidence(old, index, next), about && `${about} ${index}`);
  return (
    <>
      <div className="col-span-2">
        <PieceSelect {...{ plan, item }} onChange={(next) => set(next)} />
      </div>
      <ReadingFields {...{ item, units, set }} />
    </>
  );
}

/** What was on the scale; a piece counted elsewhere keeps its own name. */
function PieceSelect({
  plan,
  item,
  onChange,
}: {
  plan: Plan;
  item: PlanEvidence;
  onChange: (item: PlanEvidence) => void;
}) {
  const { reading } = item;
  const counts =
    item.piece === 'motifs'
      ? [...new Set([...TOGETHER, item.count])].sort((a, b) => a - b)
      : TOGETHER;
  const value = item.piece === 'motifs' ? String(item.count) : item.piece;
  function choose(chosen: string) {
    if (chosen === 'swatch') onChange({ piece: 'swatch', reading });
    else if (chosen !== 'counted')
      onChange({ piece: 'motifs', count: Number(chosen), motifIndex: 0, reading });
  }
  return (
    <Select
      label="Piece"
      value={value}
      onChange={(event) => choose(event.target.value)}
      options={[
        ...(item.piece === 'counted' ? [{ value: 'counted', word: item.label }] : []),
        ...(plan.swatch || item.piece === 'swatch'
          ? [{ value: 'swatch', word: 'the swatch' }]
          : []),
        ...counts.map((count) => ({
          value: String(count),
          word: count === 1 ? '1 motif' : `${count} motifs`,
        })),
      ]}
    />
  );
}

function ReadingFields({
  item,
  units,
  set,
}: {
  item: PlanEvidence;
  units: Units;
  set: (next: PlanEvidence, about?: string) => void;
}) {
  const { reading } = item;
  if (reading.by === 'unravelling') {
    return (
      <div className="col-span-4">
        <YarnLengthField
          label="unravelled to"
          units={units}
          maxM={PLAN_LIMITS.pieceLengthM}
          valueM={reading.lengthM}
          onChange={(value) =>
            set(
              { ...item, reading: { ...reading, lengthM: value, errorM: lengthM(0.01 * value) } },
              'unravelled',
            )
          }
        />
      </div>
    );
  }
  const resolutions = [...new Set<number>([...RESOLUTIONS, reading.resolutionG])].sort(
    (a, b) => a - b,
  );
  return (
    <>
      <div className="col-span-2">
        <NumberField
          label="took"
          unit="g"
          min={0.1}
          max={PLAN_LIMITS.pieceMassG}
          value={reading.massG}
          onCommit={(read) =>
            read.ok &&
            read.value !== null &&
            set({ ...item, reading: { ...reading, massG: massG(read.value) } }, 'weight')
          }
        />
      </div>
      <div className="col-span-2">
        <Select
          label="Scale reads"
          value={String(reading.resolutionG)}
          onChange={(event) =>
            set({
              ...item,
              reading: { ...reading, resolutionG: massG(Number(event.target.value)) },
            })
          }
          options={resolutions.map((resolution) => ({
            value: String(resolution),
            word: `to ${resolution} g`,
          }))}
        />
      </div>
    </>
  );
}
