import { READY_JOINS } from '../../lib/joins/readyJoins';
import { joinFit } from '../../lib/joins/fit';
import type { MotifChoice } from '../../lib/motifs/motifChoices';
import type { Estimate } from '../../lib/ledger/ledger';
import { withBorder } from '../../lib/plan/edits';
import { mainMotif, type Plan } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import { Button } from '../ui/Button';
import { Select } from '../ui/Select';
import { LayoutFields } from './LayoutFields';
import { Section } from './Section';
import { SizeFields } from './SizeFields';
import { codeWord, type Terms } from './stitchWord';
import type { ChangePlan } from './usePlan';

interface BlanketSectionProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  terms: Terms;
  change: ChangePlan;
  choices: readonly MotifChoice[];
  onBorder: () => void;
}

const BORDER_STITCHES = ['sc', 'hdc', 'dc'] as const;
const MOST_BORDER_ROUNDS = 12;

/** How many motifs, how they are joined, and what goes round them. */
export function BlanketSection(props: BlanketSectionProps) {
  const { plan, estimate, units, terms, change, choices, onBorder } = props;
  const stitch = plan.border[0]?.stitch ?? 'sc';
  const rounds = Math.max(plan.border.length, MOST_BORDER_ROUNDS);
  return (
    <Section title="Blanket">
      <SizeFields {...{ plan, estimate, units, change }} />
      <LayoutFields {...{ plan, change, choices }} />
      <div className="col-span-6">
        <Select
          label="Join"
          value={plan.join.key}
          onChange={(event) =>
            change((old) => ({ ...old, join: { ...old.join, key: event.target.value } }))
          }
          options={READY_JOINS.map((join) => ({
            value: join.key,
            word: joinFit(join, mainMotif(plan), estimate.sideStitches).fits
              ? join.name
              : `${join.name} · does not fit`,
          }))}
        />
      </div>
      <div className="col-span-3">
        <Select
          label="Joined in"
          value={plan.join.colour}
          onChange={(event) =>
            change((old) => ({ ...old, join: { ...old.join, colour: event.target.value } }))
          }
          options={plan.colours.map(({ key, name }) => ({ value: key, word: name }))}
        />
      </div>
      <div className="col-span-3">
        <Select
          label="Corners"
          value={plan.corners}
          onChange={(event) =>
            change((old) => ({ ...old, corners: event.target.value as Plan['corners'] }))
          }
          options={[
            { value: 'crossed', word: 'Crossed inside' },
            { value: 'gathered', word: 'Gathered' },
          ]}
        />
      </div>
      <div className="col-span-3">
        <Select
          label="Border"
          value={String(plan.border.length)}
          onChange={(event) => change((old) => withBorder(old, Number(event.target.value), stitch))}
          options={Array.from({ length: rounds + 1 }, (_, count) => ({
            value: String(count),
            word: count === 0 ? 'No border' : count === 1 ? '1 round' : `${count} rounds`,
          }))}
        />
      </div>
      <div className="col-span-3">
        <Select
          label="of"
          value={stitch}
          disabled={plan.border.length === 0}
          onChange={(event) =>
            change((old) => withBorder(old, old.border.length, event.target.value))
          }
          options={[...new Set([...BORDER_STITCHES, stitch])].map((code) => ({
            value: code,
            word: codeWord(code, terms),
          }))}
        />
      </div>
      <Button kind="quiet" small className="col-span-6 -ms-3 justify-self-start" onClick={onBorder}>
        Border round by round
      </Button>
    </Section>
  );
}
