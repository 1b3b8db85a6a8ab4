import { Dices } from 'lucide-react';
import { withRule } from '../../../lib/colour/paintEdits';
import { gradientOrder } from '../../../lib/colour/gradientOrder';
import {
  GRADIENT_WAYS,
  STRIPES,
  type GradientWay,
  type PlacementRule,
  type Stripes,
} from '../../../lib/colour/placement';
import { colourwayGroups } from '../../../lib/ledger/blanketOf';
import { blanketFaces } from '../../../lib/plan/blanketFaces';
import { Button } from '../../ui/Button';
import { NumberField } from '../../ui/NumberField';
import { Select } from '../../ui/Select';
import type { ChangePlan } from '../usePlan';
import { FromYarn } from './FromYarn';
import type { PlacementProps } from './placementProps';
import { RepeatFields } from './RepeatFields';

const RULES: readonly { value: PlacementRule['by']; word: string }[] = [
  { value: 'diagonals', word: 'Along diagonals' },
  { value: 'rows', word: 'In rows' },
  { value: 'columns', word: 'In columns' },
  { value: 'checks', word: 'In checks' },
  { value: 'repeat', word: 'As a repeat' },
  { value: 'gradient', word: 'As a gradient' },
  { value: 'random', word: 'At random' },
];

const WAYS: Readonly<Record<GradientWay, string>> = {
  down: 'down',
  across: 'across',
  'to the corner': 'to the corner',
  outwards: 'from the middle outwards',
};

const isStripes = (by: string): by is Stripes => STRIPES.some((each) => each === by);

/** The rule by which unpainted motifs get their colourways, and what it can be told. */
export function PlacementFields(props: PlacementProps) {
  const { plan, estimate, change } = props;
  const { rule } = plan.placement;
  const { main } = colourwayGroups(plan);
  const start: Readonly<Record<PlacementRule['by'], () => PlacementRule>> = {
    diagonals: () => ({ by: 'diagonals', width: 1 }),
    rows: () => ({ by: 'rows', width: 1 }),
    columns: () => ({ by: 'columns', width: 1 }),
    checks: () => ({ by: 'checks', width: 2 }),
    repeat: () => ({ by: 'repeat', tile: [main.slice(0, 6)] }),
    gradient: () => ({
      by: 'gradient',
      towards: 'down',
      order: gradientOrder(plan, main),
      seed: 1,
    }),
    random: () => ({ by: 'random', seed: 1, counts: null }),
  };
  return (
    <section className="grid gap-3">
      <Select
        label="What is not painted lies"
        value={rule.by}
        onChange={({ target }) =>
          change((old) => withRule(old, start[target.value as PlacementRule['by']]()))
        }
        options={RULES}
      />
      {isStripes(rule.by) && 'width' in rule && (
        <NumberField
          label="Motifs to a stripe"
          whole
          min={1}
          max={40}
          value={rule.width}
          onCommit={(reading) =>
            reading.ok &&
            reading.value !== null &&
            change((old) => withRule(old, { ...rule, width: reading.value as number }), 'stripe')
          }
        />
      )}
      {rule.by === 'repeat' && <RepeatFields {...{ plan, estimate, change }} />}
      {rule.by === 'gradient' && (
        <>
          <Select
            label="Going"
            value={rule.towards}
            onChange={({ target }) =>
              change((old) => withRule(old, { ...rule, towards: target.value as GradientWay }))
            }
            options={GRADIENT_WAYS.map((way) => ({ value: way, word: WAYS[way] }))}
          />
          <div className="flex flex-wrap gap-2">
            <Button
              small
              onClick={() =>
                change((old) => withRule(old, { ...rule, order: rule.order.toReversed() }))
              }
            >
              The other way
            </Button>
            <Again rule={rule} change={change} />
          </div>
        </>
      )}
      {rule.by === 'random' && (
        <>
          <RandomWords {...{ plan, estimate }} />
          <Again rule={rule} change={change} />
          <FromYarn {...props} rule={rule} />
        </>
      )}
    </section>
  );
}

/** Another arrangement by the same rule: the next seed, so that undo brings this one back. */
function Again({
  rule,
  change,
}: {
  rule: PlacementRule & { by: 'gradient' | 'random' };
  change: ChangePlan;
}) {
  return (
    <Button
      small
      icon={Dices}
      className="justify-self-start"
      onClick={() => change((old) => withRule(old, { ...rule, seed: rule.seed + 1 }))}
    >
      Another arrangement
    </Button>
  );
}

function RandomWords({ plan, estimate }: Pick<PlacementProps, 'plan' | 'estimate'>) {
  const { alike } = blanketFaces(plan, estimate);
  return (
    <p className="text-sm text-ink-2" role="status">
      {alike === 0
        ? 'No two alike lie side by side.'
        : `${alike} ${alike === 1 ? 'pair' : 'pairs'} of neighbours are alike: more colourways, or fewer locked motifs, part them.`}
    </p>
  );
}
