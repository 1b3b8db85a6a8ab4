import { EXAMPLE_PLAN } from '../lib/plan/examplePlan';
import type { MotifInput } from '../schemas/motif';
import type { OwnStitchInput } from '../schemas/ownStitch';
import type { PatternReadInput } from '../schemas/pattern';
import type { PlanInput } from '../schemas/plan';

/** Examples of requests that several routes share. */
export const EXAMPLE_ID = '3f1d9d6e-58b2-4f0e-9a3c-6d2b8f0a7c41';
export const OTHER_EXAMPLE_ID = '9b7a4c02-1f63-4d8e-8f55-0c7e2a9d6b13';
export const PLAN_EXAMPLE = structuredClone(EXAMPLE_PLAN) as unknown as PlanInput;

const { key: _key, version: _version, ...motif } = PLAN_EXAMPLE.motifs[0]!;
export const MOTIF_EXAMPLE: MotifInput = { ...motif, name: 'Four rounds of groups' };

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
