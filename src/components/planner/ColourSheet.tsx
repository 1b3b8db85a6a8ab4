import { Plus, Trash2 } from 'lucide-react';
import { withTurns } from '../../lib/colour/paintEdits';
import {
  withChangedColour,
  withColour,
  withColourway,
  withoutColour,
  withRoundColour,
} from '../../lib/plan/edits';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import { mainMotif, type Plan } from '../../lib/plan/plan';
import { withFurtherMotif, withoutColourwayAndItsMotif } from '../../lib/plan/furtherMotif';
import { PLAN_LIMITS } from '../../schemas/limits';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Sheet } from '../ui/Dialog';
import { Field } from '../ui/Field';
import { Select } from '../ui/Select';
import { WoundCard } from '../ui/WoundCard';
import { StashColours } from './StashColours';
import { useMotifChoice } from './useMotifChoice';
import type { ChangePlan } from './usePlan';

interface ColourSheetProps {
  plan: Plan;
  change: ChangePlan;
  choices: readonly MotifChoice[];
  onClose: () => void;
}

/** Colourways that can be edited by hand here; more arrive only from a file or a program. */
const MOST_BY_HAND = 12;

/** The colours of a plan, the colour of every round, and of the border. */
export default function ColourSheet({ plan, change, choices, onClose }: ColourSheetProps) {
  return (
    <Sheet
      open
      onOpenChange={(open) => !open && onClose()}
      title="Colours"
      description="The yarns, and the colour of every round. Paint it says which colourway lies where."
    >
      <Colours {...{ plan, change }} />
      <Colourways {...{ plan, change, choices }} />
      <BorderColours {...{ plan, change }} />
    </Sheet>
  );
}

interface PartProps {
  plan: Plan;
  change: ChangePlan;
}

function Colours({ plan, change }: PartProps) {
  return (
    <section className="pb-5">
      <h3 className="pb-2">Yarn colours</h3>
      <ul className="grid gap-3">
        {plan.colours.map(({ key, name, hex }) => (
          <li
            key={key}
            className="grid grid-cols-[auto_minmax(0,1fr)_4rem_auto] items-end gap-3 max-sm:gap-2"
          >
            <WoundCard colour={hex} weight={plan.yarn.weightCategory} size="md" />
            <Field
              label="Name"
              value={name}
              maxLength={PLAN_LIMITS.nameLength}
              onChange={(event) => {
                const next = event.target.value;
                change((old) => withChangedColour(old, key, { name: next }), `colour name ${key}`);
              }}
              error={name.trim() === '' ? 'A colour needs a name' : undefined}
            />
            <Field
              label="Shade"
              type="color"
              value={hex}
              aria-label={`Shade of ${name}`}
              onChange={(event) => {
                const next = event.target.value;
                change((old) => withChangedColour(old, key, { hex: next }), `colour ${key}`);
              }}
            />
            <Button
              kind="quiet"
              icon={Trash2}
              disabled={plan.colours.length === 1}
              onClick={() => change((old) => withoutColour(old, key))}
              aria-label={`Remove ${name}`}
            >
              Remove
            </Button>
          </li>
        ))}
      </ul>
      {plan.colours.length < PLAN_LIMITS.colours && (
        <Button
          className="mt-3 align-top"
          icon={Plus}
          onClick={() =>
            change((old) =>
              withColour(old, { name: `Colour ${old.colours.length + 1}`, hex: '#7d8f8b' }),
            )
          }
        >
          Add a colour
        </Button>
      )}
      <StashColours {...{ plan, change }} />
    </section>
  );
}

function Colourways({ plan, change, choices }: PartProps & { choices: readonly MotifChoice[] }) {
  const { choose, failed } = useMotifChoice(change, withFurtherMotif);
  const main = mainMotif(plan);
  const options = plan.colours.map(({ key, name }) => ({ value: key, word: name }));
  return (
    <section className="border-t border-line py-5">
      <h3 className="pb-2">Colourways of the motif</h3>
      <ol className="grid gap-4">
        {plan.colourways.slice(0, MOST_BY_HAND).map((colourway, i) => (
          <li key={i}>
            <div className="flex items-center justify-between">
              <h4 className="font-bold">
                Colourway {i + 1}
                {plan.motifs.length > 1 && (
                  <span className="font-normal"> of {plan.motifs[colourway.motifIndex]?.name}</span>
                )}
              </h4>
              <Button
                kind="quiet"
                small
                icon={Trash2}
                disabled={plan.colourways.length === 1}
                onClick={() => change((old) => withoutColourwayAndItsMotif(old, i))}
                aria-label={`Remove colourway ${i + 1}`}
              >
                Remove
              </Button>
            </div>
            {colourway.motifIndex !== plan.secondMotif && plan.colourways.length > 1 && (
              <Checkbox
                label="Takes its turn where nothing is painted"
                checked={!plan.placement.byHand.includes(i)}
                onChange={({ target }) => change((old) => withTurns(old, i, target.checked))}
              />
            )}
            <div className="grid grid-cols-2 gap-2 sm:grid-cols-4">
              {colourway.roundColours.map((colour, round) => (
                <Select
                  key={round}
                  label={plan.motifs[colourway.motifIndex]?.rounds[round]?.label ?? ''}
                  value={colour}
                  options={options}
                  onChange={(event) => {
                    const next = event.target.value;
                    change((old) => withRoundColour(old, i, round, next));
                  }}
                />
              ))}
            </div>
          </li>
        ))}
      </ol>
      {plan.colourways.length < MOST_BY_HAND && (
        <Button className="mt-3" icon={Plus} onClick={() => change(withColourway)}>
          Add a colourway
        </Button>
      )}
      {plan.motifs.length < PLAN_LIMITS.motifs && (
        <Select
          className="mt-3"
          label="Add another motif"
          hint="It takes its turn among the others."
          value=""
          error={failed ? 'This pattern could not be loaded. Try again.' : undefined}
          onChange={({ target }) => {
            const chosen = choices.find(({ key }) => key === target.value);
            if (chosen) choose(chosen, main.rounds.length);
          }}
          options={[
            { value: '', word: 'choose a motif of the same shape' },
            ...choices
              .filter(({ sides, key }) => sides === main.sides && key !== main.key)
              .map(({ key, name }) => ({ value: key, word: name })),
          ]}
        />
      )}
    </section>
  );
}

function BorderColours({ plan, change }: PartProps) {
  if (plan.border.length === 0) return null;
  return (
    <section className="border-t border-line py-5">
      <h3 className="pb-2">Border</h3>
      <div className="grid grid-cols-2 gap-2 sm:grid-cols-4">
        {plan.border.map(({ colour }, i) => (
          <Select
            key={i}
            label={`Round ${i + 1}`}
            value={colour}
            options={plan.colours.map(({ key, name }) => ({ value: key, word: name }))}
            onChange={(event) => {
              const next = event.target.value;
              change((old) => ({
                ...old,
                border: old.border.map((round, j) =>
                  j === i ? { ...round, colour: next } : round,
                ),
              }));
            }}
          />
        ))}
      </div>
    </section>
  );
}
