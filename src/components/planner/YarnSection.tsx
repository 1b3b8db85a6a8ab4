import type { Plan, PlanYarn, WeightCategory } from '../../lib/plan/plan';
import { currencyDecimals, type Units } from '../../lib/units/display';
import { massG, priceMinor } from '../../lib/units/quantities';
import { PLAN_LIMITS } from '../../schemas/limits';
import { NumberField } from '../ui/NumberField';
import { Select } from '../ui/Select';
import { weightOptions } from '../yarnWeights';
import { YarnLengthField } from './QuantityFields';
import { Section } from './Section';
import type { Terms } from './stitchWord';
import type { ChangePlan } from './usePlan';

interface YarnSectionProps {
  plan: Plan;
  units: Units;
  terms: Terms;
  /** Of prices typed here, where the yarn has none yet. */
  currency: string;
  change: ChangePlan;
}

/** What one skein holds and costs, and how thick the yarn is. */
export function YarnSection({ plan, units, terms, currency, change }: YarnSectionProps) {
  const { yarn } = plan;
  const set = (part: Partial<PlanYarn>, about: string) =>
    change((old) => ({ ...old, yarn: { ...old.yarn, ...part } }), about);
  return (
    <Section title="Yarn">
      <div className="col-span-2">
        <NumberField
          label="Skein"
          unit="g"
          min={1}
          max={PLAN_LIMITS.skeinMassG}
          step={5}
          value={yarn.putUp.massG}
          onCommit={(reading) =>
            reading.ok &&
            reading.value !== null &&
            set({ putUp: { ...yarn.putUp, massG: massG(reading.value) } }, 'skein mass')
          }
        />
      </div>
      <div className="col-span-2">
        <YarnLengthField
          label="holds"
          units={units}
          maxM={PLAN_LIMITS.skeinLengthM}
          valueM={yarn.putUp.lengthM}
          onChange={(lengthM) => set({ putUp: { ...yarn.putUp, lengthM } }, 'skein length')}
        />
      </div>
      <div className="col-span-2">
        <PriceField {...{ yarn, currency, set }} />
      </div>
      <div className="col-span-6">
        <Select
          label="Weight"
          value={String(yarn.weightCategory)}
          onChange={(event) =>
            set({ weightCategory: Number(event.target.value) as WeightCategory }, 'weight')
          }
          options={weightOptions(terms)}
        />
      </div>
    </Section>
  );
}

interface PriceFieldProps {
  yarn: PlanYarn;
  currency: string;
  set: (part: Partial<PlanYarn>, about: string) => void;
}

function PriceField({ yarn, currency, set }: PriceFieldProps) {
  const code = yarn.price?.currency ?? currency;
  const decimals = currencyDecimals(code);
  const minor = 10 ** decimals;
  return (
    <NumberField
      label="costs"
      unit={code}
      optional
      min={0}
      max={PLAN_LIMITS.priceMinor / minor}
      step={0.5}
      decimals={decimals}
      value={yarn.price && yarn.price.priceMinor / minor}
      onCommit={(reading) =>
        reading.ok &&
        set(
          {
            price:
              reading.value === null
                ? null
                : { priceMinor: priceMinor(Math.round(reading.value * minor)), currency: code },
          },
          'price',
        )
      }
    />
  );
}
