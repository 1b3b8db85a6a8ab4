import { borderNotices } from '../border/borderNotices';
import { expectedM, learnHand, handVarianceM2 } from '../hand/hand';
import { joinFit } from '../joins/fit';
import { mainMotif, type Plan } from '../plan/plan';
import { stitchWidthRangeMm, YARN_CATEGORIES } from '../yarnCategories';
import type { Blanket } from './blanketOf';
import { joinStitches } from './pieces';
import { evidenceOf } from './evidenceOf';
import type { Notice } from './ledger';

/** A gauge this far outside its category's published range is questioned (ours). */
export const GAUGE_TOLERANCE = 0.2;
/** A weight this many standard deviations from what the hand could take is questioned (ours). */
export const READING_TOLERANCE = 3;
/** Motifs of one blanket that differ by more than this are questioned (ours). */
const SIDE_TOLERANCE = 0.03;
/** Up to this size a blanket may be meant for a baby (published crib sizes reach 45 × 60 in). */
const BABY_LONGEST_MM = 1150;

/** What a person should know before trusting an estimate: questions, notes and cautions. */
export function noticesOf(blanket: Blanket): Notice[] {
  return [
    ...gaugeNotices(blanket.plan),
    ...readingNotices(blanket),
    ...fitNotices(blanket),
    ...flatnessNotices(blanket),
    ...borderNotices(blanket),
    ...secondMotifNotices(blanket),
    ...partNotices(blanket),
    ...cautions(blanket),
  ];
}

function gaugeNotices({ swatch, yarn }: Plan): Notice[] {
  if (!swatch) return [];
  const widthMm = swatch.widthMm / swatch.stitches;
  const [narrowest, widest] = stitchWidthRangeMm(yarn.weightCategory);
  if (widthMm >= narrowest * (1 - GAUGE_TOLERANCE) && widthMm <= widest * (1 + GAUGE_TOLERANCE))
    return [];
  const name = YARN_CATEGORIES[yarn.weightCategory]?.name ?? '';
  return [
    {
      code: 'gauge-outside-category',
      severity: 'question',
      message: `A stitch of ${widthMm.toFixed(1)} mm is unusual for weight ${yarn.weightCategory} ${name} (${narrowest.toFixed(1)} to ${widest.toFixed(1)} mm). Check the stitches counted, the width, and the yarn's weight.`,
    },
  ];
}

/** Each reading against what the hand could take before it was weighed. */
function readingNotices({ plan, gauge }: Blanket): Notice[] {
  return evidenceOf(plan, gauge.stitchWidthMm).flatMap((evidence, i): Notice[] => {
    const hand = learnHand(gauge.stitchWidthMm, [...evidence.use.loops.keys()], []);
    const usualM = expectedM(hand, evidence.use);
    const sdM = Math.sqrt(handVarianceM2(hand, evidence.use) + evidence.varianceM2);
    if (Math.abs(evidence.lengthM - usualM) <= READING_TOLERANCE * sdM) return [];
    return [
      {
        code: 'reading-contradicts-gauge',
        severity: 'question',
        message: `Measured piece ${i + 1} took ${evidence.lengthM.toFixed(1)} m; at this gauge such a piece usually takes about ${usualM.toFixed(1)} m. Check its weight, its counts and the skein's metres.`,
      },
    ];
  });
}

function fitNotices({ plan, join, sideStitches }: Blanket): Notice[] {
  const motif = mainMotif(plan);
  const { fits, words } = joinFit(join, motif, sideStitches);
  const mains = plan.motifs.filter((_, i) => i !== plan.secondMotif);
  const counts = [...new Set(mains.map(joinStitches))];
  return [
    ...(fits ? [] : [question('join-does-not-fit', `${join.name} on ${motif.name}: ${words}`)]),
    ...(counts.length > 1
      ? [
          question(
            'sides-differ-in-stitches',
            `The motifs have ${counts.join(' and ')} stitches a side: the join is planned for ${sideStitches}.`,
          ),
        ]
      : []),
  ];
}

const question = (code: string, message: string): Notice => ({
  code,
  severity: 'question',
  message,
});

function flatnessNotices({ plan, geometries }: Blanket): Notice[] {
  const sides = geometries.flatMap(({ acrossMm }, i) => (i === plan.secondMotif ? [] : [acrossMm]));
  const differ = Math.max(...sides) > (1 + SIDE_TOLERANCE) * Math.min(...sides);
  return [
    ...geometries.flatMap(({ trouble }, i): Notice[] =>
      trouble
        ? [
            {
              code: `motif-${trouble.kind}`,
              severity: 'note',
              message: `${plan.motifs[i]?.name ?? 'The motif'} ${trouble.kind} from ${trouble.label} at this gauge: its stitches and its height disagree. Measure a finished one.`,
            },
          ]
        : [],
    ),
    ...(differ
      ? [
          {
            code: 'motifs-differ-in-size',
            severity: 'question' as const,
            message: `The motifs differ in size (${Math.min(...sides).toFixed(0)} to ${Math.max(...sides).toFixed(0)} mm). The grid is planned for the largest.`,
          },
        ]
      : []),
  ];
}

/** Whether the second motif is as large as its places. */
function secondMotifNotices({ plan, arrangement, geometries, size }: Blanket): Notice[] {
  const second = geometries[plan.secondMotif ?? -1];
  const main = geometries.find((_, i) => i !== plan.secondMotif);
  if (!second || !main) return [];
  const roomMm =
    arrangement.layout === 'octagons' ? main.sideMm : (main.acrossMm - size.seamMm) / 2;
  if (Math.abs(second.acrossMm - roomMm) <= SIDE_TOLERANCE * roomMm) return [];
  return [
    question(
      'second-motif-size',
      `The second motif is ${second.acrossMm.toFixed(0)} mm across, its places ${roomMm.toFixed(0)} mm: take more or fewer rounds of it.`,
    ),
  ];
}

/** What is planned by halves is not yet a pattern. */
function partNotices({ counts }: Blanket): Notice[] {
  const halves = counts.halves + counts.halfFillers;
  const quarters = counts.quarters + counts.quarterFillers;
  if (halves + quarters === 0) return [];
  const parts = [
    halves > 0 ? `${halves} half` : '',
    quarters > 0 ? `${quarters} quarter` : '',
  ].filter((words) => words !== '');
  return [
    {
      code: 'half-motifs',
      severity: 'note',
      message: `${parts.join(' and ')} motifs straighten the edge. They are planned with half or a quarter of each round's stitches; a written half motif differs a little.`,
    },
  ];
}

function cautions({ join, size }: Blanket): Notice[] {
  const baby = Math.max(size.widthMm, size.heightMm) <= BABY_LONGEST_MM;
  return [
    ...join.cautions.map((message, i): Notice => ({
      code: `join-caution-${i + 1}`,
      severity: 'caution',
      message,
    })),
    ...(baby
      ? [
          {
            code: 'infant-sleep',
            severity: 'caution' as const,
            message:
              'For a baby: no loose blanket in the sleep space under 12 months (American Academy of Pediatrics, 2022). Some UK bodies allow a light blanket, firmly tucked; follow local advice.',
          },
        ]
      : []),
  ];
}
