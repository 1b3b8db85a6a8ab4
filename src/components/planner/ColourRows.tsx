import type { Estimate } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';
import { YARN_UNIT, yarnFigure, type Units } from '../../lib/units/display';
import { classNames } from '../ui/classNames';
import { StrandBar } from '../ui/StrandBar';
import { WoundCard } from '../ui/WoundCard';
import { skeinWord } from './Answer';
import { colourUse } from './words';

interface ColourRowsProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  /** The colour whose chances are shown. */
  chosen: string;
  onChoose: (colour: string) => void;
  onLedger: (colour: string) => void;
}

/** Each colour: metres with their interval, skeins, and both as a bar of the yarn itself. */
export function ColourRows(props: ColourRowsProps) {
  const { plan, estimate, units } = props;
  const putUpM = plan.yarn.putUp.lengthM;
  const mostM = Math.max(...estimate.colours.map(({ skeins }) => skeins * putUpM), putUpM);
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Yarn and skeins of each colour</caption>
      <thead>
        <tr className="text-sm text-ink-2">
          <th scope="col" className="pb-1 text-start font-normal">
            Colour
          </th>
          <th scope="col" className="pb-1 text-end font-normal">
            {units === 'metric' ? 'metres' : 'yards'}
          </th>
          <th scope="col" className="ps-4 pb-1 text-end font-normal">
            skeins
          </th>
          <th scope="col" className="hidden w-2/5 pb-1 sm:table-cell">
            <span className="sr-only">Needed of what is in hand</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {estimate.colours.map((colour) => (
          <ColourRow key={colour.colour} {...props} colour={colour} mostM={mostM} />
        ))}
      </tbody>
    </table>
  );
}

interface ColourRowProps extends ColourRowsProps {
  colour: Estimate['colours'][number];
  mostM: number;
}

function ColourRow({ plan, units, chosen, onChoose, onLedger, colour, mostM }: ColourRowProps) {
  const { meanM, neededM, skeins } = colour;
  const { name, hex } = plan.colours.find(({ key }) => key === colour.colour) ?? {
    name: '',
    hex: '#888888',
  };
  const isChosen = colour.colour === chosen;
  const unit = YARN_UNIT[units].word;
  const bar = {
    fraction: meanM / mostM,
    sureFraction: neededM / mostM,
    mark: (skeins * plan.yarn.putUp.lengthM) / mostM,
  };
  return (
    <tr className={classNames('border-t border-line', isChosen && 'bg-teal-soft')}>
      <th scope="row" className="py-1.5 text-start font-normal">
        <button
          type="button"
          className="flex min-h-11 items-center gap-3 rounded-control text-start"
          aria-pressed={isChosen}
          onClick={() => onChoose(colour.colour)}
          title={`Show how sure ${name} is`}
        >
          <WoundCard colour={hex} weight={plan.yarn.weightCategory} size="sm" />
          <span>
            <b className="block">{name}</b>
            <span className="block text-sm text-ink-2">{colourUse(plan, colour.colour)}</span>
          </span>
        </button>
      </th>
      <td className="text-end">
        <button
          type="button"
          className="figures min-h-9 rounded-control px-1 text-end coarse:min-h-11 hocus:text-teal"
          onClick={() => onLedger(colour.colour)}
          aria-label={`${yarnFigure(meanM, units)} ${unit}, give or take ${yarnFigure(neededM - meanM, units)}: how ${name} is worked out`}
        >
          <span className="block underline decoration-dotted underline-offset-3">
            {yarnFigure(meanM, units)}
          </span>
          <span className="block text-sm text-ink-2">
            ± {yarnFigure(Math.abs(neededM - meanM), units)}
          </span>
        </button>
      </td>
      <td className="ps-4 text-end text-xl font-bold tabular-nums">{skeins}</td>
      <td className="hidden ps-4 sm:table-cell">
        <StrandBar
          colour={hex}
          weight={plan.yarn.weightCategory}
          label={`${name}: ${yarnFigure(meanM, units)} ${unit} expected, ${yarnFigure(neededM, units)} ${unit} to be sure, of ${skeinWord(skeins)}`}
          {...bar}
        />
      </td>
    </tr>
  );
}
