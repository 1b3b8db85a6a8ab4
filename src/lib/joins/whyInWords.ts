import type { Terms } from '../pattern/reading';
import { stitch } from '../stitches/stitchTable';
import { showYarn, type Units } from '../units/display';
import type { JoinComparison, JoinYarn } from './compareJoins';
import { worked, type Why, type YarnCause } from './whyCheapest';

/** A reason of less than this share of the difference goes unsaid. */
const WORTH_SAYING = 0.03;
/** A stitch that makes up this share of a join's stitches stands for all of them. */
const MAIN_SHARE = 0.9;

/**
 * The reason in one sentence: "Slip stitch, back loops takes 41 m less than single crochet ridge:
 * 30 m because a slip stitch lays 1 loop and not 2, 11 m because it leaves 18 tails and not 92."
 */
export function whyInWords(why: Why, units: Units, terms: Terms): string {
  const { cheapest, alike, next, lessM, reasons } = why;
  const like = alike.length > 0 ? `, like ${alike.map(nameWithin).join(' and ')},` : '';
  const said = reasons.filter((each) => Math.abs(each.lessM) >= WORTH_SAYING * lessM);
  const because = (cause: YarnCause) => causeInWords(cause, cheapest, next, units, terms);
  const [forIt, against] = [said.filter((r) => r.lessM > 0), said.filter((r) => r.lessM < 0)];
  const pros = forIt.map((r) =>
    said.length === 1
      ? `because ${because(r.cause)}`
      : `${showYarn(r.lessM, units)} because ${because(r.cause)}`,
  );
  const cons = against.map((r) => `${showYarn(-r.lessM, units)} more because ${because(r.cause)}`);
  return (
    `${cheapest.join.name}${like} takes ${showYarn(lessM, units)} less than ${nameWithin(next)}` +
    `${said.length === 1 ? ', ' : ': '}${listed(pros)}` +
    `${cons.length > 0 ? `; against that, ${listed(cons)}` : ''}.`
  );
}

function causeInWords(
  cause: YarnCause,
  { join, yarn }: JoinComparison,
  next: JoinComparison,
  units: Units,
  terms: Terms,
): string {
  const [low, high] = [worked(yarn), worked(next.yarn)];
  switch (cause) {
    case 'sewing':
      return `${seamInWords(yarn, units)} and ${seamInWords(next.yarn, units)}`;
    case 'stitches': {
      const added = next.join.roundsAdded - join.roundsAdded;
      const rounds =
        added > 0
          ? ` (${nameWithin(next)} adds ${roundsInWords(next.join.roundsAdded)} to every motif)`
          : '';
      return `it has ${count(low.count)} stitches and chains and not ${count(high.count)}${rounds}`;
    }
    case 'loops': {
      const main = mainStitch(yarn, terms);
      const lays = main ? `a ${main} lays` : 'its stitches lay, in the mean,';
      return `${lays} ${loops(low.loopsEach)} and not ${figure.format(high.loopsEach)}${otherStitch(next.yarn, terms)}`;
    }
    case 'loop length':
      return `its loops take ${mm(low.eachM)} of yarn each and not ${mm(high.eachM)}`;
    case 'tails':
      return `it leaves ${yarn.tails === 0 ? 'no' : count(yarn.tails)} tails and not ${count(next.yarn.tails)}`;
  }
}

function seamInWords(yarn: JoinYarn, units: Units): string {
  const { loopsM } = worked(yarn);
  return yarn.sewnM > 0
    ? `sewing takes ${showYarn(yarn.sewnM + loopsM, units)}`
    : `stitches take ${showYarn(loopsM, units)}`;
}

function mainStitch({ stitches }: JoinYarn, terms: Terms): string | null {
  const [most] = stitches;
  const all = stitches.reduce((sum, each) => sum + each.count, 0);
  if (!most || most.count < MAIN_SHARE * all) return null;
  const found = stitch(most.stitch);
  return found?.[terms] ?? most.stitch;
}

function otherStitch(yarn: JoinYarn, terms: Terms): string {
  const main = mainStitch(yarn, terms);
  return main ? ` as a ${main}` : '';
}

const nameWithin = ({ join: { name } }: JoinComparison): string =>
  name.charAt(0).toLowerCase() + name.slice(1);

const figure = new Intl.NumberFormat('en', { maximumFractionDigits: 1 });
const whole = new Intl.NumberFormat('en', { maximumFractionDigits: 0 });
const count = (n: number): string => whole.format(n);
const loops = (n: number): string =>
  `${figure.format(n)} ${figure.format(n) === '1' ? 'loop' : 'loops'}`;
const mm = (eachM: number): string => `${figure.format(1000 * eachM)} mm`;
const roundsInWords = (n: number): string => `${n} ${n === 1 ? 'round' : 'rounds'}`;

const listed = (items: readonly string[]): string =>
  items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')}, and ${items.at(-1) ?? ''}`;
