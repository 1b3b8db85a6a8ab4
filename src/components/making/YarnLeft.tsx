import { Scale } from 'lucide-react';
import { hexOf } from '../../lib/plan/hexOf';
import { WARN_FROM, type ColourProgress } from '../../lib/making/makingYarn';
import type { Plan } from '../../lib/plan/plan';
import { yarnFigure, YARN_UNIT, type Units } from '../../lib/units/display';
import { Button } from '../ui/Button';
import { Notice } from '../ui/Notice';
import { WoundCard } from '../ui/WoundCard';
import { colourName } from './makingWords';

interface YarnLeftProps {
  plan: Plan;
  units: Units;
  progress: readonly ColourProgress[];
  onWeigh: (colour: string) => void;
}

/** Yarn of each colour: used, to go, left; and who will run short while there is time to buy. */
export function YarnLeft({ plan, units, progress, onWeigh }: YarnLeftProps) {
  const short = progress.filter(({ probabilityShort }) => probabilityShort >= WARN_FROM);
  const unit = YARN_UNIT[units].word;
  return (
    <section className="grid gap-3">
      <h2>Yarn</h2>
      {short.map(({ colour, probabilityShort, toGoM, leftM }) => (
        <Notice
          key={colour}
          kind="problem"
          title={`${colourName(plan, colour)} may run short`}
          live
        >
          {toGoM > leftM
            ? `About ${yarnFigure(toGoM - leftM, units)} ${unit} more will be needed.`
            : `There is hardly more left than needed: ${Math.round(100 * probabilityShort)} % chance that it does not suffice.`}{' '}
          Weigh what is left to be surer, or buy now, in the same lot.
        </Notice>
      ))}
      <table className="w-full">
        <caption className="sr-only">Yarn used, to go and left, in {unit}</caption>
        <thead>
          <tr className="text-sm text-ink-2">
            <th scope="col" className="pb-1 text-start font-normal">
              Colour
            </th>
            {['used', 'to go', 'left'].map((head) => (
              <th key={head} scope="col" className="ps-3 pb-1 text-end font-normal">
                {head}, {unit}
              </th>
            ))}
            <th scope="col">
              <span className="sr-only">Weigh</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {progress.map(({ colour, usedM, toGoM, leftM }) => (
            <tr key={colour} className="border-t border-line">
              <th scope="row" className="py-1.5 text-start font-normal">
                <span className="flex items-center gap-2">
                  <WoundCard
                    colour={hexOf(plan, colour)}
                    weight={plan.yarn.weightCategory}
                    size="sm"
                  />
                  <b>{colourName(plan, colour)}</b>
                </span>
              </th>
              {[usedM, toGoM, leftM].map((metres, i) => (
                <td key={i} className="figures ps-3 text-end">
                  {yarnFigure(metres, units)}
                </td>
              ))}
              <td className="text-end">
                <Button
                  kind="quiet"
                  small
                  icon={Scale}
                  className="-me-3"
                  onClick={() => onWeigh(colour)}
                  aria-label={`Weigh what is left of ${colourName(plan, colour)}`}
                >
                  Weigh
                </Button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
