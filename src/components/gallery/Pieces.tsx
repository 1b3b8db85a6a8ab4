import { ChanceTape } from '../ui/ChanceTape';
import { RuledFrame } from '../ui/RuledFrame';
import { StrandBar } from '../ui/StrandBar';
import { useUnits } from '../ui/useUnits';
import { WoundCard } from '../ui/WoundCard';
import type { RuleUnits } from '../ui/ruleTicks';
import type { WeightCategory } from '../../lib/plan/plan';
import { yarns } from './samples';
import { SampleBlanket, SampleMotif } from './SampleBlanket';

const weights: WeightCategory[] = [0, 1, 2, 3, 4, 5, 6, 7];
const chances = [
  { skeins: 5, probabilityShort: 0.998 },
  { skeins: 6, probabilityShort: 0.41 },
  { skeins: 7, probabilityShort: 0.001 },
  { skeins: 8, probabilityShort: 0 },
];

export function Pieces({ units: initial }: { units: RuleUnits }) {
  const units = useUnits(initial);
  return (
    <div className="space-y-12">
      <section>
        <h2 className="mb-3">The rule</h2>
        <div className="grid gap-8 lg:grid-cols-[1fr_20rem]">
          <RuledFrame
            widthMm={1180}
            heightMm={1470}
            units={units}
            maxHeightPx={620}
            label="Blanket of 8 by 10 motifs, 118 by 147 cm"
            caption={
              <>
                <b className="text-lg">{units === 'metric' ? '118 × 147 cm' : '46.5 × 58 in'}</b>{' '}
                finished, joins and border included
              </>
            }
          >
            <SampleBlanket />
          </RuledFrame>
          <div className="space-y-8">
            <RuledFrame
              widthMm={142}
              heightMm={142}
              units={units}
              label="One motif, 14.2 cm across"
            >
              <SampleMotif />
            </RuledFrame>
            <RuledFrame widthMm={62} heightMm={40} units={units} label="A part skein, 6.2 by 4 cm">
              <rect width="62" height="40" rx="12" className="fill-teal-soft stroke-teal" />
            </RuledFrame>
          </div>
        </div>
      </section>

      <section>
        <h2 className="mb-3">The wound card</h2>
        <div className="flex flex-wrap items-end gap-6">
          {yarns.map(({ name, hex, lot, amount }) => (
            <WoundCard key={name} colour={hex} weight={4} name={name} lot={lot} amount={amount} />
          ))}
        </div>
        <h3 className="mt-6 mb-2 font-normal text-ink-2">Weight categories 0 to 7</h3>
        <div className="flex flex-wrap gap-5">
          {weights.map((weight) => (
            <WoundCard
              key={weight}
              colour="#a4413a"
              weight={weight}
              size="lg"
              name={String(weight)}
            />
          ))}
        </div>
        <h3 className="mt-6 mb-2 font-normal text-ink-2">Small, and beside its words</h3>
        <div className="flex flex-wrap gap-x-8 gap-y-3">
          {yarns.map(({ name, hex, lot }) => (
            <WoundCard key={name} colour={hex} weight={4} size="sm" name={name} lot={lot} beside />
          ))}
        </div>
      </section>

      <section>
        <h2 className="mb-3">Strand bars</h2>
        <ul className="max-w-xl space-y-2">
          {yarns.map(({ name, hex, fraction }) => (
            <li key={name} className="grid grid-cols-[6rem_1fr_5rem] items-center gap-4">
              <span>{name}</span>
              <StrandBar
                colour={hex}
                weight={4}
                fraction={fraction}
                sureFraction={Math.min(1, fraction * 1.08)}
                mark={Math.min(1, fraction + 0.12)}
                label={`${name}: ${Math.round(1400 * fraction)} m`}
              />
              <span className="figures text-end">{Math.round(1400 * fraction)} m</span>
            </li>
          ))}
        </ul>
      </section>

      <section>
        <h2 className="mb-3">The chance tape</h2>
        <div className="grid gap-8 sm:grid-cols-2 lg:grid-cols-3">
          <ChanceTape
            {...{ chances }}
            meanM={1184}
            sdM={53}
            skeinM={200}
            skeins={7}
            colour="#2d5872"
            weight={4}
          />
          <ChanceTape
            {...{ chances }}
            meanM={1184}
            sdM={53}
            skeinM={200}
            skeins={6}
            colour="#2d5872"
            weight={4}
          />
          <ChanceTape
            meanM={207}
            sdM={9}
            skeinM={200}
            skeins={2}
            verb="buy"
            chances={[
              { skeins: 1, probabilityShort: 0.78 },
              { skeins: 2, probabilityShort: 0 },
            ]}
            colour="#a9b468"
            weight={2}
          />
          <ChanceTape
            meanM={6100}
            sdM={420}
            skeinM={170}
            skeins={36}
            verb="buy"
            chances={[
              { skeins: 36, probabilityShort: 0.48 },
              { skeins: 37, probabilityShort: 0.33 },
            ]}
            colour="#f2ead9"
            weight={6}
          />
          <ChanceTape
            meanM={150}
            sdM={0}
            skeinM={200}
            skeins={0}
            chances={[
              { skeins: 0, probabilityShort: 1 },
              { skeins: 1, probabilityShort: 0 },
            ]}
            colour="#1c1a22"
            weight={1}
          />
        </div>
      </section>
    </div>
  );
}
