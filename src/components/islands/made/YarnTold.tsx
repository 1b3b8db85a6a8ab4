import { showMass, showYarn, type Units } from '../../../lib/units/display';
import type { MadeFigures } from './madeFigures';
import { yarnGiveOrTake } from './madeWords';

/** Metres and grams of one motif, before and after it was weighed. */
export function YarnTold({ figures, units }: { figures: MadeFigures; units: Units }) {
  const { yarn } = figures;
  if (!yarn) {
    return (
      <p className="text-ink-2">
        Weigh it, and say how much a skein holds: this then says how much yarn one takes in your
        hand.
      </p>
    );
  }
  const { before, after, gramsPerM } = yarn;
  const mass = (lengthM: number) => showMass(lengthM * gramsPerM, 'metric');
  return (
    <div>
      <p className="text-ink-2">Yarn in each</p>
      <p className="text-2xl font-bold tabular-nums">
        {showYarn(after.meanM, units)}{' '}
        <span className="text-base font-normal text-ink-2">
          {mass(after.meanM)}, give or take {yarnGiveOrTake(after.sdM, units)}
        </span>
      </p>
      <p className="text-ink-2 tabular-nums">
        By the gauge alone {showYarn(before.meanM, units)}, {mass(before.meanM)}, give or take{' '}
        {yarnGiveOrTake(before.sdM, units)}; the scale alone says {showYarn(yarn.readM, units)}.{' '}
        <a className="link font-normal" href="/how-it-works#hand">
          How this is worked out
        </a>
      </p>
    </div>
  );
}
