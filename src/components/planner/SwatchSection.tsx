import { BASIC_STITCHES } from '../../lib/stitches/stitchTable';
import type { Plan, PlanSwatch } from '../../lib/plan/plan';
import type { Units } from '../../lib/units/display';
import { widthMm } from '../../lib/units/quantities';
import { expectedStitchWidthMm } from '../../lib/yarnCategories';
import { PLAN_LIMITS } from '../../schemas/limits';
import { Button } from '../ui/Button';
import { NumberField } from '../ui/NumberField';
import { Select } from '../ui/Select';
import { FabricField } from './QuantityFields';
import { Section } from './Section';
import { stitchWord, type Terms } from './stitchWord';
import type { ChangePlan } from './usePlan';

interface SwatchSectionProps {
  plan: Plan;
  units: Units;
  terms: Terms;
  change: ChangePlan;
}

/** Stitches a swatch is worked in: those that make a fabric. */
const SWATCH_STITCHES = BASIC_STITCHES.filter(({ code }) => code !== 'ch' && code !== 'sl st');

/** The gauge: a flat piece counted and measured, or the yarn's usual one. */
export function SwatchSection({ plan, units, terms, change }: SwatchSectionProps) {
  const { swatch } = plan;
  const title = terms === 'us' ? 'Swatch' : 'Tension square';
  if (!swatch) return <NoSwatch {...{ plan, title, change }} />;
  const set = (part: Partial<PlanSwatch>, about: string) =>
    change((old) => ({ ...old, swatch: old.swatch && { ...old.swatch, ...part } }), about);
  const count = (label: string, key: 'stitches' | 'rows', max: number) => (
    <div className="col-span-2">
      <NumberField
        label={label}
        whole
        min={1}
        max={max}
        value={swatch[key]}
        onCommit={(reading) =>
          reading.ok && reading.value !== null && set({ [key]: reading.value }, `swatch ${key}`)
        }
      />
    </div>
  );
  const side = (label: string, key: 'widthMm' | 'heightMm') => (
    <div className="col-span-2">
      <FabricField
        label={label}
        units={units}
        maxMm={PLAN_LIMITS.swatchSizeMm}
        valueMm={swatch[key]}
        onChange={(value) => value !== null && set({ [key]: value }, `swatch ${key}`)}
      />
    </div>
  );
  return (
    <Section title={title}>
      <div className="col-span-2">
        <Select
          label="Worked in"
          value={swatch.stitch}
          onChange={(event) => set({ stitch: event.target.value }, 'swatch stitch')}
          options={SWATCH_STITCHES.map((each) => ({
            value: each.code,
            word: stitchWord(each, terms),
          }))}
        />
      </div>
      {count('Stitches', 'stitches', PLAN_LIMITS.swatchStitches)}
      {side('measure across', 'widthMm')}
      {count('Rows', 'rows', PLAN_LIMITS.swatchRows)}
      {side('measure tall', 'heightMm')}
      <Button
        kind="quiet"
        className="col-span-2 self-end justify-self-start"
        onClick={() => change((old) => ({ ...old, swatch: null }))}
      >
        No swatch
      </Button>
    </Section>
  );
}

function NoSwatch({ plan, title, change }: { plan: Plan; title: string; change: ChangePlan }) {
  const { weightCategory } = plan.yarn;
  const usualMm = expectedStitchWidthMm(weightCategory);
  const begin = () =>
    change((old) => ({
      ...old,
      swatch: {
        stitch: 'sc',
        stitches: 20,
        rows: 20,
        widthMm: widthMm(Math.round(20 * usualMm)),
        heightMm: widthMm(Math.round(20 * 0.92 * usualMm)),
      },
    }));
  return (
    <Section title={title}>
      <p className="col-span-6 text-ink-2">
        None yet: the figures use the usual gauge of weight {weightCategory}, and say how unsure
        that is.
      </p>
      <div className="col-span-6">
        <Button onClick={begin}>Enter a swatch</Button>
      </div>
    </Section>
  );
}
