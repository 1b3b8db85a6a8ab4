import { layoutFacts, type LayoutFacts } from '../../lib/layout/layouts';
import type { Estimate } from '../../lib/ledger/ledger';
import type { Plan, PlanSize } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import { widthMm } from '../../lib/units/quantities';
import { PLAN_LIMITS } from '../../schemas/limits';
import { NumberField } from '../ui/NumberField';
import { SegmentedControl } from '../ui/SegmentedControl';
import { Select } from '../ui/Select';
import { FabricField } from './QuantityFields';
import type { ChangePlan } from './usePlan';

interface SizeFieldsProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  change: ChangePlan;
}

/** Size as so many motifs, or as a size wanted that the program turns into motifs. */
export function SizeFields({ plan, estimate, units, change }: SizeFieldsProps) {
  const { size } = plan;
  const setBy = (by: PlanSize['by']) => {
    const { rows, columns } = estimate;
    const whole = (mm: number) => widthMm(Math.round(mm / 10) * 10);
    change((old) => ({
      ...old,
      size:
        by === 'grid'
          ? { by, rows, columns }
          : {
              by,
              widthMm: whole(estimate.size.widthMm),
              heightMm: whole(estimate.size.heightMm),
              rule: 'nearest',
            },
    }));
  };
  return (
    <>
      <SegmentedControl
        className="col-span-6 justify-self-start"
        label="Size given as"
        value={size.by}
        onChange={setBy}
        options={[
          { value: 'grid', word: 'So many motifs' },
          { value: 'target', word: 'A size wanted' },
        ]}
      />
      {size.by === 'grid' ? (
        <GridFields {...{ size, change }} unit={layoutFacts(estimate.layout).unit} />
      ) : (
        <TargetFields {...{ size, units, change, estimate }} />
      )}
    </>
  );
}

function GridFields({
  size,
  unit,
  change,
}: {
  size: PlanSize & { by: 'grid' };
  unit: LayoutFacts['unit'];
  change: ChangePlan;
}) {
  const field = (label: string, key: 'columns' | 'rows', max: number) => (
    <div className="col-span-3">
      <NumberField
        label={label}
        whole
        min={1}
        max={max}
        value={size[key]}
        onCommit={(reading) =>
          reading.ok &&
          reading.value !== null &&
          change(
            (old) => ({ ...old, size: { ...size, [key]: reading.value } as PlanSize }),
            `grid ${key}`,
          )
        }
      />
    </div>
  );
  return (
    <>
      {field(
        unit === 'blocks' ? 'Blocks across' : 'Motifs across',
        'columns',
        PLAN_LIMITS.gridColumns,
      )}
      {field('down', 'rows', PLAN_LIMITS.gridRows)}
    </>
  );
}

function TargetFields({
  size,
  units,
  change,
  estimate,
}: {
  size: PlanSize & { by: 'target' };
  units: Units;
  change: ChangePlan;
  estimate: Estimate;
}) {
  const field = (label: string, key: 'widthMm' | 'heightMm') => (
    <div className="col-span-2">
      <FabricField
        label={label}
        units={units}
        maxMm={PLAN_LIMITS.targetSizeMm}
        valueMm={size[key]}
        onChange={(value) =>
          value !== null &&
          change((old) => ({ ...old, size: { ...size, [key]: value } }), `target ${key}`)
        }
      />
    </div>
  );
  return (
    <>
      {field('Width', 'widthMm')}
      {field('height', 'heightMm')}
      <div className="col-span-2">
        <Select
          label="Motifs for"
          value={size.rule}
          onChange={(event) =>
            change((old) => ({
              ...old,
              size: { ...size, rule: event.target.value as 'nearest' | 'at-least' },
            }))
          }
          options={[
            { value: 'nearest', word: 'nearest' },
            { value: 'at-least', word: 'at least' },
          ]}
        />
      </div>
      <p className="col-span-6 -mt-1 text-sm text-ink-2" role="status">
        {estimate.columns} × {estimate.rows} {layoutFacts(estimate.layout).unit}
      </p>
    </>
  );
}
