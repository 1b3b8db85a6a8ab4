import {
  expectedM,
  handCovarianceM2,
  handVarianceM2,
  loopLengthMm,
  sewnFactor,
  type Hand,
} from '../hand/hand';
import { MOTIF_SPREAD } from '../hand/readingVariance';
import { addUse, NO_YARN, type YarnUse } from '../hand/yarnUse';
import { loopsOf } from '../stitches/loops';
import type { StitchCode } from '../stitches/stitch';
import { knownStitch } from '../stitches/stitchTable';
import type { LedgerLine, LoopSource, Part } from './ledger';
import type { PieceGroup, PieceLine } from './pieces';
import { TAIL_M, TAIL_SPREAD } from './tails';

/** Everything known of one colour before it is turned into skeins. */
export interface ColourLedger {
  readonly colour: string;
  readonly use: YarnUse;
  readonly lines: readonly LedgerLine[];
  readonly meanM: number;
  readonly handVarianceM2: number;
  readonly pieceVarianceM2: number;
  readonly tailVarianceM2: number;
  readonly tails: number;
}

/** The ledger of one colour: a line for each part, label and stitch, and what its variance is made of. */
export function colourLedger(
  hand: Hand,
  colour: string,
  groups: readonly PieceGroup[],
): ColourLedger {
  const ofColour = groups.filter((group) => group.colour === colour && group.count > 0);
  const use = ofColour.reduce((sum, group) => addUse(sum, useOfGroup(group), group.count), NO_YARN);
  const lines = new Map<string, LedgerLine>();
  let pieceVarianceM2 = 0;
  let tailVarianceM2 = 0;
  let tails = 0;
  for (const group of ofColour) {
    const workedM = expectedM(hand, { ...useOfGroup(group), cutM: 0 });
    const groupVarianceM2 = group.count * (MOTIF_SPREAD * workedM) ** 2;
    pieceVarianceM2 += groupVarianceM2;
    for (const line of linesOfGroup(hand, group)) {
      const ownM2 =
        line.part === 'tails'
          ? line.count * (TAIL_SPREAD * TAIL_M) ** 2
          : handCovarianceM2(hand, useOfLine(line), use) +
            (workedM > 0 ? (groupVarianceM2 * line.lengthM) / (workedM * group.count) : 0);
      if (line.part === 'tails') {
        tailVarianceM2 += ownM2;
        tails += line.count;
      }
      addLine(lines, { ...line, varianceM2: ownM2 });
    }
  }
  return {
    colour,
    use,
    lines: [...lines.values()],
    meanM: expectedM(hand, use),
    handVarianceM2: handVarianceM2(hand, use),
    pieceVarianceM2,
    tailVarianceM2,
    tails,
  };
}

function addLine(lines: Map<string, LedgerLine>, line: LedgerLine): void {
  const key = [line.part, line.label, line.stitch].join('|');
  const before = lines.get(key);
  lines.set(
    key,
    before
      ? {
          ...line,
          count: before.count + line.count,
          loops: before.loops + line.loops,
          lengthM: before.lengthM + line.lengthM,
          varianceM2: before.varianceM2 + line.varianceM2,
        }
      : line,
  );
}

function linesOfGroup(hand: Hand, group: PieceGroup): LedgerLine[] {
  return group.lines.flatMap((line) => [
    ...Object.entries(line.made)
      .filter(([, count]) => count > 0)
      .map(([code, count]) => stitchLine(hand, group, line, code, whole(count * group.count))),
    ...seamLine(hand, group, line),
    ...tailLine(group, line),
  ]);
}

function stitchLine(
  hand: Hand,
  group: PieceGroup,
  line: PieceLine,
  code: StitchCode,
  count: number,
): LedgerLine {
  const loopsEach = loopsOf(knownStitch(code));
  const eachMm = loopLengthMm(hand, code);
  const loops = count * loopsEach;
  return {
    ...blank(group, line.part, line.label),
    stitch: code,
    count,
    loopsEach,
    loops,
    eachMm,
    lengthM: (loops * eachMm) / 1000,
    source: sourceOf(hand, code),
  };
}

/** Stitches shared out over like pieces add up to whole ones again; what is left is rounding. */
const whole = (count: number): number => Number(count.toPrecision(12));

function seamLine(hand: Hand, group: PieceGroup, line: PieceLine): LedgerLine[] {
  if (line.seamMm === 0) return [];
  const count = (line.seamMm * group.count) / 1000;
  const factor = sewnFactor(hand);
  return [
    {
      ...blank(group, line.part, line.label),
      count,
      eachMm: factor * 1000,
      lengthM: count * factor,
    },
  ];
}

function tailLine(group: PieceGroup, line: PieceLine): LedgerLine[] {
  const count = line.tails * group.count;
  if (count === 0) return [];
  return [
    { ...blank(group, 'tails', line.part), count, eachMm: TAIL_M * 1000, lengthM: count * TAIL_M },
  ];
}

const blank = ({ colour }: PieceGroup, part: Part, label: string): LedgerLine => ({
  colour,
  part,
  label,
  stitch: null,
  count: 0,
  loopsEach: 0,
  loops: 0,
  eachMm: 0,
  lengthM: 0,
  varianceM2: 0,
  source: 'not loops',
});

function sourceOf(hand: Hand, code: StitchCode): LoopSource {
  if (hand.measured.has(code)) return 'measured';
  return hand.measured.size > 0 ? 'carried over' : 'published';
}

/** Yarn use of one piece of a group. */
export const useOfGroup = ({ lines }: PieceGroup): YarnUse =>
  lines.reduce(
    (use, line) =>
      addUse(use, {
        loops: new Map(
          Object.entries(line.made).map(([code, count]) => [
            code,
            count * loopsOf(knownStitch(code)),
          ]),
        ),
        seamM: line.seamMm / 1000,
        cutM: line.tails * TAIL_M,
      }),
    NO_YARN,
  );

const useOfLine = (line: LedgerLine): YarnUse => ({
  loops: line.stitch === null ? new Map() : new Map([[line.stitch, line.loops]]),
  seamM: line.stitch === null && line.part === 'join' ? line.count : 0,
  cutM: 0,
});
