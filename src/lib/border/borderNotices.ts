import type { Blanket } from '../ledger/blanketOf';
import type { Notice } from '../ledger/ledger';
import { outerStitches } from '../ledger/pieces';
import { borderChecks } from './borderFit';
import { edgeSides } from './edge';

/** Asks about every edging whose repeat does not come out even round this blanket. */
export function borderNotices(blanket: Blanket): Notice[] {
  const { plan, join, sideStitches, arrangement } = blanket;
  if (plan.border.every(({ edging }) => !edging)) return [];
  const edge = edgeSides(
    { ...blanket, layout: arrangement.layout },
    outerStitches(plan, join, sideStitches),
  );
  return borderChecks(plan.border, edge).flatMap(({ even }, i): Notice[] => {
    const edging = plan.border[i]?.edging;
    if (even !== false || !edging) return [];
    return [
      {
        code: 'border-uneven',
        severity: 'question',
        message: `Border round ${i + 1}, ${edging.name}, does not come out even in repeats of ${edging.over.multipleOf}: “Border round by round” says what would make it.`,
      },
    ];
  });
}
