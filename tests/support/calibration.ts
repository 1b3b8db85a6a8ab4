import {
  estimate,
  gaugeOf,
  lengthM,
  massG,
  READY_JOINS,
  readyMotif,
  type ColourEstimate,
  type Confidence,
  type Motif,
  type Plan,
} from '../../src/lib';
import { quantileM, skeinsFor } from '../../src/lib/skeins/skeins';
import { buildPlan } from './plans';
import { pick, seeded, type Random } from './random';
import {
  blanketM,
  drawMaker,
  groupsOf,
  skeinsM,
  usualM,
  weigh,
  type Weighing,
} from './simulatedMaker';

/** How one way of deciding how much to own turned out, over all makers and colours. */
export interface Outcome {
  readonly makers: number;
  readonly colours: number;
  /** Share of colours that ran short. */
  readonly short: number;
  /** Standard error of that share; makers are independent, the colours of one are not. */
  readonly standardError: number;
  /** Mean of what was left over what was used. */
  readonly surplus: number;
}

const MOTIFS: readonly (readonly [key: string, rounds: number])[] = [
  ['group-square', 4],
  ['group-square', 7],
  ['solid-square', 4],
  ['hexagon', 4],
  ['circle', 4],
  ['two-colour-square', 8],
];
const COLOURS = ['c1', 'c2', 'c3'] as const;

/** A plan as people make them: a ready motif in three colours, any join and border. */
export function drawPlan(random: Random): Plan {
  const [key, rounds] = pick(random, MOTIFS);
  const motif = readyMotif(key, rounds) as Motif;
  const between = (least: number, most: number): number =>
    least + Math.floor(random() * (most - least + 1));
  const base = buildPlan();
  return {
    ...base,
    yarn: { ...base.yarn, putUp: { massG: massG(50), lengthM: lengthM(between(60, 120)) } },
    colours: base.colours.slice(0, 3),
    evidence: [],
    motifs: [motif],
    colourways: Array.from({ length: between(1, 3) }, () => ({
      motifIndex: 0,
      roundColours: motif.rounds.map(() => pick(random, COLOURS)),
    })),
    size: { by: 'grid', rows: between(4, 16), columns: between(4, 14) },
    join: { key: pick(random, READY_JOINS).key, colour: pick(random, COLOURS) },
    border: Array.from({ length: between(0, 4) }, () => ({
      stitch: 'sc',
      colour: pick(random, COLOURS),
    })),
  };
}

/** One colour of one maker: what her plan says, what she used, what whoever wrote the pattern used. */
export interface Case {
  readonly maker: number;
  readonly colour: ColourEstimate;
  readonly usedM: number;
  readonly publishedM: number;
  readonly putUpM: number;
}

/** Makers drawn from the stated spread, each with a plan, a habit of weighing, and the blanket made. */
export function simulate(seed: number, makers: number, weighings: readonly Weighing[]): Case[] {
  const random = seeded(seed);
  return Array.from({ length: makers }, (_, maker) => {
    const plan = drawPlan(random);
    const { stitchWidthMm: widthMm } = gaugeOf(plan.swatch, plan.yarn.weightCategory);
    const hand = drawMaker(random, widthMm);
    const designer = drawMaker(random, widthMm);
    const evidence = weighings.map((each) => weigh(random, hand, plan, each));
    const groups = groupsOf(plan);
    return estimate({ ...plan, evidence })
      .colours.filter(({ meanM }) => meanM > 0)
      .map((colour): Case => {
        const ofColour = groups.filter((group) => group.colour === colour.colour);
        return {
          maker,
          colour,
          usedM: blanketM(random, hand, ofColour),
          publishedM: usualM(designer, ofColour),
          putUpM: plan.yarn.putUp.lengthM,
        };
      });
  }).flat();
}

/** What the plan says to own at a confidence, in metres. */
export const metresAt =
  (confidence: Confidence) =>
  ({ colour: { meanM, sdM } }: Case): number =>
    quantileM({ meanM, varianceM2: sdM ** 2 }, confidence);

/** What the skeins that the plan asks for at a confidence hold in fact. */
export const skeinsAt =
  (confidence: Confidence, random: Random) =>
  ({ colour: { meanM, sdM }, putUpM }: Case): number =>
    skeinsM(random, skeinsFor({ meanM, varianceM2: sdM ** 2 }, putUpM, confidence), putUpM);

/** The pattern's yardage and a share more, in whole skeins, whoever the maker is. */
export const publishedAnd =
  (share: number, random: Random) =>
  ({ publishedM, putUpM }: Case): number =>
    skeinsM(random, Math.ceil((publishedM * (1 + share)) / putUpM), putUpM);

/** Share that ran short and mean surplus when so much is owned of every colour. */
export function outcomeOf(cases: readonly Case[], ownedM: (each: Case) => number): Outcome {
  const shortOf = new Map<number, { short: number; colours: number }>();
  let surplus = 0;
  for (const each of cases) {
    const owned = ownedM(each);
    const of = shortOf.get(each.maker) ?? { short: 0, colours: 0 };
    of.colours += 1;
    if (owned < each.usedM) of.short += 1;
    shortOf.set(each.maker, of);
    surplus += (owned - each.usedM) / each.usedM;
  }
  const makers = [...shortOf.values()];
  const short = makers.reduce((sum, each) => sum + each.short, 0) / cases.length;
  const squares = makers.reduce((sum, each) => sum + (each.short - short * each.colours) ** 2, 0);
  return {
    makers: makers.length,
    colours: cases.length,
    short,
    standardError: Math.sqrt(squares) / cases.length,
    surplus: surplus / cases.length,
  };
}
