import { ArrowDown, ArrowUp, Trash2 } from 'lucide-react';
import { withMovedRound, withoutBorderRound } from '../../../lib/border/borderEdits';
import type { BorderCheck } from '../../../lib/border/borderFit';
import { addInWords } from '../../../lib/border/fixInWords';
import type { BorderRound, Plan } from '../../../lib/plan/plan';
import { Button } from '../../ui/Button';
import { Select } from '../../ui/Select';
import { codeWord, type Terms } from '../stitchWord';
import type { ChangePlan } from '../usePlan';
import { EvenOrNot } from './EvenOrNot';

interface BorderRoundItemProps {
  plan: Plan;
  terms: Terms;
  change: ChangePlan;
  check: BorderCheck;
  index: number;
}

const PLAIN_STITCHES = ['sc', 'hdc', 'dc', 'tr'] as const;
const figure = new Intl.NumberFormat('en', { maximumFractionDigits: 0 });

/** One round of the border: its colour, what is worked in it here, and whether that is even. */
export function BorderRoundItem({ plan, terms, change, check, index }: BorderRoundItemProps) {
  const round = plan.border[index] as BorderRound;
  const { edging, adjust } = round;
  const name = `Round ${index + 1}`;
  const set = (part: Partial<BorderRound>) =>
    change((old) => ({
      ...old,
      border: old.border.map((each, i) => (i === index ? { ...each, ...part } : each)),
    }));
  return (
    <li className="border-t border-line pt-3">
      <div className="flex flex-wrap items-center justify-between gap-x-3">
        <h3>
          {name}
          {edging && `: ${edging.name}`}
        </h3>
        <div className="-me-3 flex">
          <Button
            kind="quiet"
            small
            icon={ArrowUp}
            aria-label={`Move ${name} inwards`}
            disabled={index === 0}
            onClick={() => change((old) => withMovedRound(old, index, -1))}
          >
            In
          </Button>
          <Button
            kind="quiet"
            small
            icon={ArrowDown}
            aria-label={`Move ${name} outwards`}
            disabled={index === plan.border.length - 1}
            onClick={() => change((old) => withMovedRound(old, index, 1))}
          >
            Out
          </Button>
          <Button
            kind="quiet"
            small
            icon={Trash2}
            aria-label={`Remove ${name}`}
            onClick={() => change((old) => withoutBorderRound(old, index))}
          >
            Remove
          </Button>
        </div>
      </div>
      <div className="mt-1 grid grid-cols-2 gap-3">
        <Select
          label="Colour"
          aria-label={`Colour of ${name}`}
          value={round.colour}
          onChange={({ target }) => set({ colour: target.value })}
          options={plan.colours.map(({ key, name: word }) => ({ value: key, word }))}
        />
        {!edging && (
          <Select
            label="Worked in"
            aria-label={`Stitch of ${name}`}
            value={round.stitch}
            onChange={({ target }) => set({ stitch: target.value })}
            options={[...new Set([...PLAIN_STITCHES, round.stitch])].map((code) => ({
              value: code,
              word: codeWord(code, terms),
            }))}
          />
        )}
      </div>
      {edging && <p className="mt-2 font-mono text-sm text-ink-2">{edging.text}</p>}
      <p className="mt-2">
        {Object.entries(check.made)
          .filter(([, count]) => count > 0)
          .map(([code, count]) => `${figure.format(count)} ${codeWord(code, terms)}`)
          .join(', ')}
        {!edging && `: ${sidesInWords(check.leaves)}`}
      </p>
      {adjust?.some((each) => each !== 0) && (
        <p className="flex flex-wrap items-center gap-x-2 text-ink-2">
          With {addInWords(adjust)}, spread evenly.
          <Button kind="quiet" small onClick={() => set({ adjust: undefined })}>
            Leave that out
          </Button>
        </p>
      )}
      {edging && <EvenOrNot {...{ edging, check, index, terms, change, plan }} />}
    </li>
  );
}

/** "137 along the top, 171 right, 137 bottom, 171 left", or for both alike. */
function sidesInWords([top, right, bottom, left]: BorderCheck['leaves']): string {
  const [t, r, b, l] = [top, right, bottom, left].map((side) => figure.format(side));
  if (t === b && r === l)
    return t === r ? `${t} on every side` : `${t} along top and bottom, ${r} along either side`;
  return `${t} along the top, ${r} right, ${b} bottom, ${l} left`;
}
