import { Check } from 'lucide-react';
import { withBorderFix } from '../../../lib/border/borderEdits';
import type { BorderCheck } from '../../../lib/border/borderFit';
import { sumSides, type Edging } from '../../../lib/border/edging';
import { fixInWords } from '../../../lib/border/fixInWords';
import type { Plan } from '../../../lib/plan/plan';
import { PLAN_LIMITS } from '../../../schemas/limits';
import { Button } from '../../ui/Button';
import { Notice } from '../../ui/Notice';
import { codeWord, type Terms } from '../stitchWord';
import type { ChangePlan } from '../usePlan';

interface EvenOrNotProps {
  plan: Plan;
  edging: Edging;
  check: BorderCheck;
  index: number;
  terms: Terms;
  change: ChangePlan;
}

/** Whether an edging's repeat comes out at all four corners, and with one click that it does. */
export function EvenOrNot({ plan, edging, check, index, terms, change }: EvenOrNotProps) {
  const { multipleOf, least } = edging.over;
  const repeats = Math.round((sumSides(check.over) - least) / multipleOf) + 1;
  if (check.even) {
    return (
      <p className="mt-1 flex items-start gap-1.5">
        <Check size={16} aria-hidden className="mt-0.5 shrink-0" />
        {multipleOf === 1
          ? 'Comes out on any number of stitches.'
          : `Even at all four corners: ${repeats} repeats of ${multipleOf} stitches.`}
      </p>
    );
  }
  const room = PLAN_LIMITS.borderRounds - plan.border.length;
  const fixes = check.fixes.filter((fix) =>
    fix.kind === 'rounds' ? fix.count <= room : !fix.inserted || room > 0,
  );
  return (
    <div className="mt-2">
      <Notice kind="question" title={`Does not come out even in repeats of ${multipleOf}`}>
        <p>{leftInWords(check)}</p>
        <ul className="mt-2 grid gap-2">
          {fixes.map((fix) => (
            <li key={fix.kind} className="flex flex-wrap items-center gap-x-3 gap-y-1">
              <span className="min-w-52 flex-1">{fixInWords(fix, codeWord('sc', terms))}</span>
              <Button
                small
                aria-label={`Do this for round ${index + 1}: ${fixInWords(fix, codeWord('sc', terms))}`}
                onClick={() => change((old) => withBorderFix(old, index, fix))}
              >
                Do this
              </Button>
            </li>
          ))}
        </ul>
      </Notice>
    </div>
  );
}

/** "4 stitches are left over along the top and bottom, 2 along the right and left." */
function leftInWords({ left, over }: BorderCheck): string {
  const names = ['top', 'right', 'bottom', 'left'] as const;
  const amounts = [...new Set(left)].filter((each) => each > 0);
  const parts = amounts.map((amount, i) => {
    const sides = names.filter((_, side) => left[side] === amount).join(' and ');
    const stitches = i > 0 ? '' : amount === 1 ? ' stitch is left over' : ' stitches are left over';
    return `${amount}${stitches} along the ${sides}`;
  });
  return parts.length > 0
    ? `${parts.join(', ')}.`
    : `An edge of ${Math.round(sumSides(over))} stitches is too short for it.`;
}
