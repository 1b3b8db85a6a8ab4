import { EXAMPLE_PLAN } from '../lib/plan/examplePlan';
import type { MadeMotifInput } from '../schemas/madeMotif';
import type { MotifInput } from '../schemas/motif';
import type { OwnStitchInput } from '../schemas/ownStitch';
import type { PatternReadInput } from '../schemas/pattern';
import type { PlanInput } from '../schemas/plan';

/** Examples of requests that several routes share. */
export const EXAMPLE_ID = '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41';
export const OTHER_EXAMPLE_ID = '9b7a4c02-1f63-4d8e-8f55-0c7e2a9d6b13';
export const PLAN_EXAMPLE = structuredClone(EXAMPLE_PLAN) as unknown as PlanInput;

export const STITCH_EXAMPLE: OwnStitchInput = {
  abbreviation: 'lst',
  name: 'long stitch',
  moves: { wraps: 1, draws: 1, throughs: 3 },
  heightOverWidth: null,
  takes: 1,
  symbol: null,
};

export const PATTERN_EXAMPLE: PatternReadInput = {
  text:
    'Ch 4, join with sl st to form ring.\n' +
    'Rnd 1: Ch 3 (counts as dc), 2 dc in ring, ch 2, *3 dc in ring, ch 2; rep from * 2 more times; ' +
    'join with sl st in top of beg ch-3. (12 dc, 4 ch-2 sps)',
  terms: 'us',
  sides: 4,
};

export const MOTIF_EXAMPLE: MotifInput = {
  name: 'One round of groups',
  text: PATTERN_EXAMPLE.text,
  terms: 'us',
  sides: 4,
  size: 0,
  stitches: [],
};

export const MADE_MOTIF_EXAMPLE: MadeMotifInput = {
  motifKey: 'group-square',
  motifVersion: null,
  madeOn: '2026-11-28',
  rounds: 4,
  swatchId: null,
  weightCategory: 4,
  putUp: { massG: 100, lengthM: 200 },
  sizes: [
    { round: 2, acrossMm: 72 },
    { round: 4, acrossMm: 131 },
  ],
  weighed: { count: 4, massG: 44, resolutionG: 1, yarns: 4 },
  blocked: false,
  notes: '',
};
