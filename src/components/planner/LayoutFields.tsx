import {
  layoutFacts,
  layoutFor,
  layoutsFor,
  type Edge,
  type Layout,
} from '../../lib/layout/layouts';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import { withLayout, withSecondMotif } from '../../lib/plan/layoutEdits';
import { mainMotif, type Plan } from '../../lib/plan/plan';
import { Select } from '../ui/Select';
import type { ChangePlan } from './usePlan';
import { useMotifChoice } from './useMotifChoice';

interface LayoutFieldsProps {
  plan: Plan;
  change: ChangePlan;
  choices: readonly MotifChoice[];
}

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

/** How the motifs lie, what the edge does, and what lies between them. */
export function LayoutFields({ plan, change, choices }: LayoutFieldsProps) {
  const { sides } = mainMotif(plan);
  const layout = plan.layout ?? layoutFor(sides);
  const layouts = layoutsFor(sides);
  const { hasTeeth, secondSides } = layoutFacts(layout);
  return (
    <>
      {layouts.length > 1 && (
        <div className={hasTeeth ? 'col-span-3' : 'col-span-6'}>
          <Select
            label="Motifs lie in"
            value={layout}
            onChange={({ target: { value } }) => change((old) => withLayout(old, value as Layout))}
            options={layouts.map((each) => ({
              value: each,
              word: capital(layoutFacts(each).name),
            }))}
          />
        </div>
      )}
      {hasTeeth && (
        <div className={layouts.length > 1 ? 'col-span-3' : 'col-span-6'}>
          <Select
            label="Edge"
            value={plan.edge}
            onChange={({ target: { value } }) => change((old) => ({ ...old, edge: value as Edge }))}
            options={[
              { value: 'toothed', word: 'As it comes' },
              { value: 'straight', word: 'Straight, half motifs' },
            ]}
          />
        </div>
      )}
      {secondSides !== null && (
        <SecondMotif {...{ plan, change, choices }} between={layout === 'octagons'} />
      )}
    </>
  );
}

function SecondMotif({ plan, change, choices, between }: LayoutFieldsProps & { between: boolean }) {
  const { choose, failed } = useMotifChoice(change, withSecondMotif);
  const motif = plan.motifs[plan.secondMotif ?? -1];
  if (!motif) return null;
  const squares = choices.filter(({ sides }) => sides === 4);
  const choice = squares.find(({ key }) => key === motif.key);
  const rounds = choice?.rounds ?? motif.rounds.length;
  return (
    <>
      <div className="col-span-4">
        <Select
          label={between ? 'Between them' : 'Small ones'}
          value={motif.key}
          error={failed ? 'This pattern could not be loaded. Try again.' : undefined}
          onChange={({ target: { value } }) => {
            const chosen = squares.find(({ key }) => key === value);
            if (chosen) choose(chosen, motif.rounds.length);
          }}
          options={[
            ...(choice ? [] : [{ value: motif.key, word: motif.name }]),
            ...squares.map(({ key, name }) => ({ value: key, word: name })),
          ]}
        />
      </div>
      <div className="col-span-2">
        <Select
          label="worked to"
          value={String(motif.rounds.length)}
          disabled={!choice}
          onChange={({ target: { value } }) => choice && choose(choice, Number(value))}
          options={Array.from({ length: rounds }, (_, i) => ({
            value: String(i + 1),
            word: i === 0 ? '1 round' : `${i + 1} rounds`,
          }))}
        />
      </div>
    </>
  );
}
