import { handVarianceM2, type Hand } from '../hand/hand';
import { addUse, NO_YARN } from '../hand/yarnUse';
import { fitOf } from '../joins/fit';
import type { Plan } from '../plan/plan';
import { probabilityShort, quantileM, SKEIN_SPREAD, skeinsFor } from '../skeins/skeins';
import { normalQuantile } from '../stats/normal';
import { blanketOf, type Blanket } from './blanketOf';
import { colourLedger, type ColourLedger } from './colourLedger';
import { handOf } from './handOf';
import { PARTS, type ColourEstimate, type Estimate, type LedgerLine } from './ledger';
import { nextMeasurements } from './nextMeasurements';
import { noticesOf } from './notices';
import { piecesOf } from './pieces';
import { uncertaintyOf } from './uncertainty';
import { workingTimeS } from './workingTime';

/**
 * The whole answer for a plan: size, yarn by colour, part and stitch, skeins at the plan's
 * confidence, what the uncertainty is made of and which measurement would cut it.
 * Cost grows with the number of colourways, not with the area.
 * Throws DomainError for an unknown join or stitch, or motifs of a shape that has no layout.
 *
 * Example: the front page's plan; tests pin its figures.
 */
export function estimate(plan: Plan): Estimate {
  const blanket = blanketOf(plan);
  const groups = piecesOf(blanket);
  const hand = handOf(blanket, groups);
  const ledgers = plan.colours.map(({ key }) => colourLedger(hand, key, groups));
  const colours = ledgers.map((ledger) => colourEstimate(plan, ledger));
  const lines = ledgers.flatMap((ledger, i) => [
    ...ledger.lines,
    ...allowance(ledger, colours[i] as ColourEstimate),
  ]);
  const skeins = colours.reduce((sum, colour) => sum + colour.skeins, 0);
  return {
    ...blanket.arrangement,
    rows: blanket.rows,
    columns: blanket.columns,
    counts: blanket.counts,
    colourwayMotifs: blanket.places.map(({ motifs, fillers }) => motifs + fillers),
    size: blanket.size,
    stitchWidthMm: blanket.gauge.stitchWidthMm,
    motifs: blanket.geometries,
    fit: fitOf(blanket.sideStitches, blanket.join.fit),
    sideStitches: blanket.sideStitches,
    colours,
    parts: partTotals(lines),
    ledger: lines,
    uncertainty: uncertaintyOf(
      hand,
      ledgers,
      skeins * (SKEIN_SPREAD * plan.yarn.putUp.lengthM) ** 2,
    ),
    next: nextMeasurements(plan, hand, ledgers),
    notices: noticesOf(blanket),
    totals: totalsOf(plan, blanket, hand, ledgers, colours, lines),
  };
}

const varianceM2 = (ledger: ColourLedger): number =>
  ledger.handVarianceM2 + ledger.pieceVarianceM2 + ledger.tailVarianceM2;

function colourEstimate({ yarn, confidence }: Plan, ledger: ColourLedger): ColourEstimate {
  const need = { meanM: ledger.meanM, varianceM2: varianceM2(ledger) };
  const putUpM = yarn.putUp.lengthM;
  const skeins = skeinsFor(need, putUpM, confidence);
  const neededM = quantileM(need, confidence);
  const around = need.meanM > 0 ? [skeins - 1, skeins, skeins + 1].filter((n) => n > 0) : [];
  return {
    colour: ledger.colour,
    meanM: need.meanM,
    sdM: Math.sqrt(need.varianceM2),
    neededM,
    neededG: (neededM * yarn.putUp.massG) / putUpM,
    skeins,
    chances: around.map((n) => ({
      skeins: n,
      probabilityShort: probabilityShort(need, n, putUpM),
    })),
    costMinor: yarn.price && skeins * yarn.price.priceMinor,
  };
}

function allowance(ledger: ColourLedger, { neededM, meanM }: ColourEstimate): LedgerLine[] {
  if (meanM === 0) return [];
  return [
    {
      colour: ledger.colour,
      part: 'allowance',
      label: 'Allowance',
      stitch: null,
      count: 1,
      loopsEach: 0,
      loops: 0,
      eachMm: (neededM - meanM) * 1000,
      lengthM: neededM - meanM,
      varianceM2: 0,
      source: 'not loops',
    },
  ];
}

function partTotals(lines: readonly LedgerLine[]): Estimate['parts'] {
  const totals = new Map<string, Estimate['parts'][number]>();
  for (const { part, colour, lengthM } of lines) {
    const key = `${part} ${colour}`;
    totals.set(key, { part, colour, lengthM: (totals.get(key)?.lengthM ?? 0) + lengthM });
  }
  return [...totals.values()].sort(
    (left, right) => PARTS.indexOf(left.part) - PARTS.indexOf(right.part),
  );
}

function totalsOf(
  plan: Plan,
  blanket: Blanket,
  hand: Hand,
  ledgers: readonly ColourLedger[],
  colours: readonly ColourEstimate[],
  lines: readonly LedgerLine[],
): Estimate['totals'] {
  const sum = <T>(items: readonly T[], of: (item: T) => number): number =>
    items.reduce((total, item) => total + of(item), 0);
  const whole = ledgers.reduce((use, ledger) => addUse(use, ledger.use), NO_YARN);
  const meanM = sum(ledgers, (ledger) => ledger.meanM);
  const sdM = Math.sqrt(
    handVarianceM2(hand, whole) +
      sum(ledgers, (each) => each.pieceVarianceM2 + each.tailVarianceM2),
  );
  const { price } = plan.yarn;
  return {
    meanM,
    sdM,
    marginFraction: meanM > 0 ? (normalQuantile(plan.confidence) * sdM) / meanM : 0,
    skeins: sum(colours, ({ skeins }) => skeins),
    stitches: sum(lines, ({ stitch, count }) => (stitch === null ? 0 : count)),
    tails: sum(ledgers, ({ tails }) => tails),
    ...workingTimeS(plan, blanket, lines),
    massG: (meanM * plan.yarn.putUp.massG) / plan.yarn.putUp.lengthM,
    costMinor: price && sum(colours, ({ costMinor }) => costMinor ?? 0),
  };
}
