import type { ReactNode } from 'react';
import { layoutFacts } from '../../../lib/layout/layouts';
import { arrangementOf } from '../../../lib/ledger/blanketOf';
import { mainMotif, type Plan } from '../../../lib/plan/plan';
import type { BlanketSize } from '../../../lib/sizes/blanketSizes';
import type { SizedPlan } from '../../../lib/sizes/sizesOf';
import {
  showDuration,
  showPrice,
  showSize,
  showYarn,
  type Units,
} from '../../../lib/units/display';
import { Button } from '../../ui/Button';
import { WoundCard } from '../../ui/WoundCard';
import { skeinWord } from '../Answer';

interface SizesTableProps {
  plan: Plan;
  sized: readonly SizedPlan[];
  units: Units;
  onUse: (size: BlanketSize) => void;
  onRemove: (key: string) => void;
}

/** A column for each size: motifs, finished size, yarn of each colour, skeins and cost. */
export function SizesTable({ plan, sized, units, onUse, onRemove }: SizesTableProps) {
  const { price, putUp, weightCategory } = plan.yarn;
  const { unit } = layoutFacts(arrangementOf(plan).layout);
  return (
    <div role="region" aria-label="Several sizes" tabIndex={0} className="relative overflow-x-auto">
      <table className="w-full border-collapse">
        <caption className="pb-2 text-start">
          <b>{mainMotif(plan).name}</b>, skeins of {showYarn(putUp.lengthM, units)}
        </caption>
        <thead>
          <tr className="align-bottom">
            <td />
            {sized.map(({ target }) => (
              <th key={target.key} scope="col" className="px-2 pb-1 text-end whitespace-nowrap">
                {target.name}
                <span className="block font-normal text-ink-2">
                  {showSize(target.widthMm, target.heightMm, units)}
                </span>
                {target.key.startsWith('own ') && (
                  <Button
                    kind="quiet"
                    small
                    className="-me-3"
                    aria-label={`Remove ${target.name}`}
                    onClick={() => onRemove(target.key)}
                  >
                    Remove
                  </Button>
                )}
              </th>
            ))}
          </tr>
        </thead>
        <tbody className="figures text-sm">
          <Row head={unit === 'blocks' ? 'Blocks' : 'Motifs'} sized={sized}>
            {({ columns, rows }) => `${columns} × ${rows}`}
          </Row>
          <Row head="Finished" sized={sized}>
            {({ size }) => showSize(size.widthMm, size.heightMm, units)}
          </Row>
          {plan.colours.map(({ key, name, hex }, i) => (
            <Row
              key={key}
              sized={sized}
              head={
                <span className="flex items-center gap-3">
                  <WoundCard colour={hex} weight={weightCategory} size="sm" />
                  {name}
                </span>
              }
            >
              {({ colours }) => (
                <>
                  <b className="block">{skeinWord(colours[i]?.skeins ?? 0)}</b>
                  <span className="text-ink-2">{showYarn(colours[i]?.neededM ?? 0, units)}</span>
                </>
              )}
            </Row>
          ))}
          <Row head="In all" sized={sized}>
            {({ totals }) => <b>{skeinWord(totals.skeins)}</b>}
          </Row>
          <Row head="Yarn expected" sized={sized}>
            {({ totals }) => showYarn(totals.meanM, units)}
          </Row>
          {price && (
            <Row head="Cost" sized={sized}>
              {({ totals }) =>
                totals.costMinor === null ? '' : showPrice(totals.costMinor, price.currency)
              }
            </Row>
          )}
          <Row head="Time" sized={sized}>
            {({ totals }) => showDuration(totals.durationS)}
          </Row>
          <tr className="not-printed border-t border-line">
            <td />
            {sized.map(({ target }) => (
              <td key={target.key} className="py-1 text-end">
                <Button
                  kind="quiet"
                  small
                  className="-me-3 font-sans"
                  onClick={() => onUse(target)}
                >
                  Use<span className="sr-only"> the size {target.name}</span>
                </Button>
              </td>
            ))}
          </tr>
        </tbody>
      </table>
    </div>
  );
}

interface RowProps {
  head: ReactNode;
  sized: readonly SizedPlan[];
  children: (each: SizedPlan) => ReactNode;
}

function Row({ head, sized, children }: RowProps) {
  return (
    <tr className="border-t border-line align-top">
      <th scope="row" className="py-1.5 pe-3 text-start font-sans text-base font-normal">
        {head}
      </th>
      {sized.map((each) => (
        <td key={each.target.key} className="px-2 py-1.5 text-end whitespace-nowrap">
          {children(each)}
        </td>
      ))}
    </tr>
  );
}
