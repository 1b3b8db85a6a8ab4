import type { JoinText } from '../../lib/joins/joinTexts';
import { READY_JOINS } from '../../lib/joins/readyJoins';
import type { Terms } from '../../lib/pattern/reading';
import type { Plan } from '../../lib/plan/plan';
import type { GaugeSwatch } from '../../lib/swatches/swatchRecord';
import type { Units } from '../../lib/units/display';
import { Select } from '../ui/Select';
import { useTerms, useUnits } from '../ui/useUnits';
import CompareJoins from './CompareJoins';
import { JoinPattern } from './JoinPattern';

interface JoinsPageProps {
  plan: Plan;
  units: Units;
  terms: Terms;
  /** Swatches kept in the account. */
  kept: readonly GaugeSwatch[];
  /** Id of the blanket compared on; null is the example. */
  chosen: string | null;
  blankets: readonly { id: string; title: string }[];
  /** Joins written out, by their keys; sewn ones are not. */
  written: Readonly<Record<string, Readonly<Record<Terms, JoinText>>>>;
}

/** The joins side by side on one blanket, then each in words. */
export default function JoinsPage(props: JoinsPageProps) {
  const { plan, kept, chosen, blankets, written } = props;
  const units = useUnits(props.units);
  const terms = useTerms(props.terms);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-8 pb-10">
      <header className="flex flex-wrap items-end justify-between gap-4">
        <div>
          <h1>Joins</h1>
          <p className="mt-1 max-w-2xl text-ink-2">
            The same motifs, grid and border; only the join differs. Yarn and time are at the
            tension of the blanket chosen.
          </p>
        </div>
        <Select
          className="w-72"
          label="Compared on"
          value={chosen ?? ''}
          onChange={({ target: { value } }) =>
            window.location.assign(value === '' ? '/joins' : `/joins?blanket=${value}`)
          }
          options={[
            { value: '', word: 'the example blanket' },
            ...blankets.map(({ id, title }) => ({ value: id, word: title })),
          ]}
        />
      </header>
      <CompareJoins {...{ plan, units, terms, kept }} />
      <section>
        <h2>Each join in words</h2>
        <dl className="mt-3 grid gap-x-10 gap-y-5 md:grid-cols-2">
          {READY_JOINS.map((join) => (
            <div key={join.key} className="border-t border-line pt-3">
              <dt className="font-bold">{join.name}</dt>
              <dd className="mt-1">{join.description}</dd>
              <dd className="mt-1 text-sm text-ink-2">{needsInWords(join.fit)}</dd>
              {written[join.key] && (
                <dd className="mt-1">
                  <JoinPattern pattern={written[join.key]![terms]} />
                </dd>
              )}
              {join.cautions.map((caution) => (
                <dd key={caution} className="mt-1 text-sm text-ink-2">
                  {caution}
                </dd>
              ))}
            </div>
          ))}
        </dl>
      </section>
    </div>
  );
}

function needsInWords({ multipleOf, plus }: { multipleOf: number; plus: number }): string {
  if (multipleOf === 1) return 'Fits a side of any number of stitches.';
  return `Needs a multiple of ${multipleOf} and ${plus} between corner centres.`;
}
