import type { Motif, MotifRound } from './motif';

type RoundFacts = Omit<MotifRound, 'label' | 'travel' | 'spaces' | 'cornerSpace'> &
  Partial<Pick<MotifRound, 'travel' | 'spaces' | 'cornerSpace'>>;

const asRounds = (rounds: readonly RoundFacts[]): MotifRound[] =>
  rounds.map((round, i) => ({
    label: `Rnd ${i + 1}`,
    travel: {},
    spaces: {},
    cornerSpace: null,
    ...round,
  }));

const MAGIC_RING = { chains: 0, made: {} } as const;
const CHAIN_RING = { chains: 4, made: { ch: 4, 'sl st': 1 } } as const;

const WALK = { 'sl st': 3 } as const;

/** Four corners of (3 dc, ch 2, 3 dc), groups of 3 dc between, ch 1 apart. */
const groupSquare: Motif = {
  key: 'group-square',
  name: 'Classic group square',
  sides: 4,
  ring: CHAIN_RING,
  rounds: asRounds([
    {
      made: { ch: 11, dc: 11, 'sl st': 1 },
      tally: { dc: 12 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 3,
      height: 'dc',
    },
    {
      made: { ch: 15, dc: 23, 'sl st': 4 },
      travel: WALK,
      tally: { dc: 24 },
      spaces: { 'ch-2': 4, 'ch-1': 4 },
      cornerSpace: 'ch-2',
      perSide: 7,
      height: 'dc',
    },
    {
      made: { ch: 19, dc: 35, 'sl st': 4 },
      travel: WALK,
      tally: { dc: 36 },
      spaces: { 'ch-2': 4, 'ch-1': 8 },
      cornerSpace: 'ch-2',
      perSide: 11,
      height: 'dc',
    },
    {
      made: { ch: 23, dc: 47, 'sl st': 4 },
      travel: WALK,
      tally: { dc: 48 },
      spaces: { 'ch-2': 4, 'ch-1': 12 },
      cornerSpace: 'ch-2',
      perSide: 15,
      height: 'dc',
    },
    {
      made: { ch: 27, dc: 59, 'sl st': 4 },
      travel: WALK,
      tally: { dc: 60 },
      spaces: { 'ch-2': 4, 'ch-1': 16 },
      cornerSpace: 'ch-2',
      perSide: 19,
      height: 'dc',
    },
    {
      made: { ch: 31, dc: 71, 'sl st': 4 },
      travel: WALK,
      tally: { dc: 72 },
      spaces: { 'ch-2': 4, 'ch-1': 20 },
      cornerSpace: 'ch-2',
      perSide: 23,
      height: 'dc',
    },
    {
      made: { ch: 35, dc: 83, 'sl st': 4 },
      travel: WALK,
      tally: { dc: 84 },
      spaces: { 'ch-2': 4, 'ch-1': 24 },
      cornerSpace: 'ch-2',
      perSide: 27,
      height: 'dc',
    },
    {
      made: { ch: 39, dc: 95, 'sl st': 4 },
      travel: WALK,
      tally: { dc: 96 },
      spaces: { 'ch-2': 4, 'ch-1': 28 },
      cornerSpace: 'ch-2',
      perSide: 31,
      height: 'dc',
    },
  ]),
};

/** A dc in every dc, (2 dc, ch 2, 2 dc) in every corner. */
const solidSquare: Motif = {
  key: 'solid-square',
  name: 'Solid dc square',
  sides: 4,
  ring: CHAIN_RING,
  rounds: asRounds([
    {
      made: { ch: 11, dc: 11, 'sl st': 1 },
      tally: { dc: 12 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 3,
      height: 'dc',
    },
    {
      made: { ch: 11, dc: 27, 'sl st': 1 },
      tally: { dc: 28 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 7,
      height: 'dc',
    },
    {
      made: { ch: 11, dc: 43, 'sl st': 1 },
      tally: { dc: 44 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 11,
      height: 'dc',
    },
    {
      made: { ch: 11, dc: 59, 'sl st': 1 },
      tally: { dc: 60 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 15,
      height: 'dc',
    },
    {
      made: { ch: 11, dc: 75, 'sl st': 1 },
      tally: { dc: 76 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 19,
      height: 'dc',
    },
    {
      made: { ch: 11, dc: 91, 'sl st': 1 },
      tally: { dc: 92 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 23,
      height: 'dc',
    },
  ]),
};

/** Three rounds of a dc circle, squared off with tr corners, then a solid round. */
const circleInSquare: Motif = {
  key: 'circle-in-square',
  name: 'Circle in a square',
  sides: 4,
  ring: MAGIC_RING,
  rounds: asRounds([
    { made: { ch: 3, dc: 11, 'sl st': 1 }, tally: { dc: 12 }, perSide: 3, height: 'dc' },
    { made: { ch: 3, dc: 23, 'sl st': 1 }, tally: { dc: 24 }, perSide: 6, height: 'dc' },
    { made: { ch: 3, dc: 35, 'sl st': 1 }, tally: { dc: 36 }, perSide: 9, height: 'dc' },
    {
      made: { ch: 12, tr: 15, dc: 16, hdc: 8, sc: 8, 'sl st': 1 },
      tally: { tr: 16, dc: 16, hdc: 8, sc: 8 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 12,
      height: 'sc',
    },
    {
      made: { ch: 11, dc: 63, 'sl st': 1 },
      tally: { dc: 64 },
      spaces: { 'ch-2': 4 },
      cornerSpace: 'ch-2',
      perSide: 16,
      height: 'dc',
    },
  ]),
};

/** (dc, ch 2, dc) in each of six corners, a dc in every dc between. */
const hexagon: Motif = {
  key: 'hexagon',
  name: 'Solid hexagon',
  sides: 6,
  ring: MAGIC_RING,
  rounds: asRounds([
    {
      made: { ch: 15, dc: 11, 'sl st': 1 },
      tally: { dc: 12 },
      spaces: { 'ch-2': 6 },
      cornerSpace: 'ch-2',
      perSide: 2,
      height: 'dc',
    },
    {
      made: { ch: 15, dc: 23, 'sl st': 1 },
      tally: { dc: 24 },
      spaces: { 'ch-2': 6 },
      cornerSpace: 'ch-2',
      perSide: 4,
      height: 'dc',
    },
    {
      made: { ch: 15, dc: 35, 'sl st': 1 },
      tally: { dc: 36 },
      spaces: { 'ch-2': 6 },
      cornerSpace: 'ch-2',
      perSide: 6,
      height: 'dc',
    },
    {
      made: { ch: 15, dc: 47, 'sl st': 1 },
      tally: { dc: 48 },
      spaces: { 'ch-2': 6 },
      cornerSpace: 'ch-2',
      perSide: 8,
      height: 'dc',
    },
    {
      made: { ch: 15, dc: 59, 'sl st': 1 },
      tally: { dc: 60 },
      spaces: { 'ch-2': 6 },
      cornerSpace: 'ch-2',
      perSide: 10,
      height: 'dc',
    },
  ]),
};

/** Twelve more dc in every round. */
const circle: Motif = {
  key: 'circle',
  name: 'Flat dc circle',
  sides: 0,
  ring: MAGIC_RING,
  rounds: asRounds([
    { made: { ch: 3, dc: 11, 'sl st': 1 }, tally: { dc: 12 }, perSide: 12, height: 'dc' },
    { made: { ch: 3, dc: 23, 'sl st': 1 }, tally: { dc: 24 }, perSide: 24, height: 'dc' },
    { made: { ch: 3, dc: 35, 'sl st': 1 }, tally: { dc: 36 }, perSide: 36, height: 'dc' },
    { made: { ch: 3, dc: 47, 'sl st': 1 }, tally: { dc: 48 }, perSide: 48, height: 'dc' },
    { made: { ch: 3, dc: 59, 'sl st': 1 }, tally: { dc: 60 }, perSide: 60, height: 'dc' },
  ]),
};

/** Eight sc round a ring, then 3 sc in every corner; meant for two colours, turn about. */
const twoColourSquare: Motif = {
  key: 'two-colour-square',
  name: 'Two-colour sc square',
  sides: 4,
  ring: MAGIC_RING,
  rounds: asRounds([
    { made: { ch: 1, sc: 8, 'sl st': 1 }, tally: { sc: 8 }, perSide: 1, height: 'sc' },
    { made: { ch: 1, sc: 16, 'sl st': 1 }, tally: { sc: 16 }, perSide: 3, height: 'sc' },
    { made: { ch: 1, sc: 24, 'sl st': 1 }, tally: { sc: 24 }, perSide: 5, height: 'sc' },
    { made: { ch: 1, sc: 32, 'sl st': 1 }, tally: { sc: 32 }, perSide: 7, height: 'sc' },
    { made: { ch: 1, sc: 40, 'sl st': 1 }, tally: { sc: 40 }, perSide: 9, height: 'sc' },
    { made: { ch: 1, sc: 48, 'sl st': 1 }, tally: { sc: 48 }, perSide: 11, height: 'sc' },
    { made: { ch: 1, sc: 56, 'sl st': 1 }, tally: { sc: 56 }, perSide: 13, height: 'sc' },
    { made: { ch: 1, sc: 64, 'sl st': 1 }, tally: { sc: 64 }, perSide: 15, height: 'sc' },
  ]),
};

/** Ready-made motifs, each with every round it can be worked to. */
export const READY_MOTIFS: readonly Motif[] = [
  groupSquare,
  solidSquare,
  circleInSquare,
  hexagon,
  circle,
  twoColourSquare,
];

/** The ready-made motif of this key, worked to `rounds` rounds at most; null when there is none. */
export function readyMotif(key: string, rounds = Infinity): Motif | null {
  const motif = READY_MOTIFS.find((each) => each.key === key);
  return motif ? { ...motif, rounds: motif.rounds.slice(0, rounds) } : null;
}
