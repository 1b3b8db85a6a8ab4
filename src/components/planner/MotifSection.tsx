import { Palette } from 'lucide-react';
import { lazy } from 'react';
import type { Estimate } from '../../lib/ledger/ledger';
import type { MotifSides } from '../../lib/motifs/motif';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import { mainMotif, type Plan } from '../../lib/plan/plan';
import { showFabric, type Units } from '../../lib/units/display';
import { PLAN_LIMITS } from '../../schemas/limits';
import { Button } from '../ui/Button';
import { LoadedLater } from '../ui/LoadedLater';
import { Select } from '../ui/Select';
import { useIsHere } from '../ui/useIsHere';
import { WoundCard } from '../ui/WoundCard';
import { FabricField } from './QuantityFields';
import { Section } from './Section';
import type { Terms } from './stitchWord';
import type { ChangePlan } from './usePlan';
import { useMotifChoice } from './useMotifChoice';

const NewerVersion = lazy(() => import('./NewerVersion'));

const ACROSS_WORDS: Readonly<Record<MotifSides, string>> = {
  0: 'Across, measured',
  3: 'Height, measured',
  4: 'Side, measured',
  6: 'Flat to flat, measured',
  8: 'Flat to flat, measured',
};

interface MotifSectionProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  terms: Terms;
  change: ChangePlan;
  choices: readonly MotifChoice[];
  onColours: () => void;
}

/** Which motif, to how many rounds, how big it came out, and in which colours. */
export function MotifSection(props: MotifSectionProps) {
  const { plan, estimate, units, terms, change, choices, onColours } = props;
  const { choose, failed } = useMotifChoice(change);
  const isHere = useIsHere();
  const motif = mainMotif(plan);
  const motifIndex = plan.motifs.indexOf(motif);
  const choice = choices.find(({ key }) => key === motif.key);
  const rounds = choice?.rounds ?? motif.rounds.length;
  const isBehind = motif.version !== null && motif.version !== (choice?.version ?? null);
  const computedMm = estimate.motifs[motifIndex]?.acrossMm ?? 0;
  return (
    <Section title="Motif">
      <div className="col-span-6">
        <Select
          label="Pattern"
          value={motif.key}
          error={failed ? 'This pattern could not be loaded. Try again.' : undefined}
          onChange={(event) => {
            const chosen = choices.find(({ key }) => key === event.target.value);
            if (chosen) choose(chosen, motif.rounds.length);
          }}
          options={[
            ...(choice ? [] : [{ value: motif.key, word: motif.name }]),
            ...choices.map(({ key, name, version }) => ({
              value: key,
              word: name,
              group: version === null ? 'Ready-made' : 'Your own',
            })),
          ]}
        />
      </div>
      {isBehind && isHere && (
        <div className="col-span-6">
          <LoadedLater what="The newer version of the motif">
            <NewerVersion {...{ plan, choice, change, terms }} />
          </LoadedLater>
        </div>
      )}
      <div className="col-span-3">
        <Select
          label="Worked to"
          value={String(motif.rounds.length)}
          disabled={!choice || isBehind}
          hint={choice && isBehind ? `of version ${motif.version}` : undefined}
          onChange={(event) => choice && choose(choice, Number(event.target.value))}
          options={Array.from({ length: rounds }, (_, i) => ({
            value: String(i + 1),
            word: i === 0 ? '1 round' : `${i + 1} rounds`,
          }))}
        />
      </div>
      <div className="col-span-3">
        <FabricField
          label={ACROSS_WORDS[motif.sides]}
          units={units}
          optional
          maxMm={PLAN_LIMITS.motifSideMm}
          valueMm={plan.motifSideMm}
          onChange={(motifSideMm) => change((old) => ({ ...old, motifSideMm }), 'motif side')}
          hint={
            plan.motifSideMm === null ? `${showFabric(computedMm, units)} by its rounds` : undefined
          }
        />
      </div>
      <RoundCards plan={plan} />
      <div className="col-span-6">
        <Button icon={Palette} onClick={onColours}>
          Change colours
        </Button>
      </div>
    </Section>
  );
}

/** The first colourway, round by round. */
function RoundCards({ plan }: { plan: Plan }) {
  const colourway = plan.colourways[0];
  const motif = plan.motifs[colourway?.motifIndex ?? 0];
  return (
    <ul
      className="col-span-6 flex flex-wrap gap-x-2 gap-y-1"
      aria-label="Colours of the first colourway"
    >
      {colourway?.roundColours.map((key, i) => {
        const colour = plan.colours.find((each) => each.key === key);
        const label = motif?.rounds[i]?.label ?? '';
        return (
          <li key={i} className="text-center text-xs text-ink-2">
            <WoundCard
              colour={colour?.hex ?? '#888888'}
              weight={plan.yarn.weightCategory}
              size="sm"
              label={`${label}: ${colour?.name ?? 'no colour'}`}
            />
            <span aria-hidden>{label}</span>
          </li>
        );
      })}
    </ul>
  );
}
