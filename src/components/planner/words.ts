import type { Cause, LedgerLine, LoopSource, NextMeasurement, Part } from '../../lib/ledger/ledger';
import type { Plan } from '../../lib/plan/plan';

export const PART_WORDS: Record<Part, string> = {
  rounds: 'Motif rounds',
  join: 'Joins',
  border: 'Border',
  tails: 'Tails',
  allowance: 'Allowance',
};

export const CAUSE_WORDS: Record<Cause, string> = {
  hand: 'Your hand: how much yarn you pull into a loop',
  stitch: 'How each stitch differs from your other stitches',
  sewing: 'How much yarn a sewn seam takes',
  motifs: 'How one motif differs from the next',
  tails: 'How long the tails are',
  skeins: 'Skeins a little short or long',
};

export const SOURCE_WORDS: Record<LoopSource, string> = {
  measured: 'from a piece you measured',
  'carried over': 'carried over from your other stitches',
  published: 'from published proportions and the stitch width',
  'not loops': 'by length, not by loops',
};

/** What a colour is used for: "rounds 1, 4; joins; border". */
export function colourUse(plan: Plan, key: string): string {
  const rounds = new Set<number>();
  for (const { roundColours } of plan.colourways) {
    roundColours.forEach((colour, i) => colour === key && rounds.add(i + 1));
  }
  const uses: string[] = [];
  if (rounds.size > 0) {
    uses.push(
      `${rounds.size === 1 ? 'round' : 'rounds'} ${[...rounds].sort((a, b) => a - b).join(', ')}`,
    );
  }
  if (plan.join.colour === key && plan.join.key !== 'last-round') uses.push('joins');
  if (plan.border.some(({ colour }) => colour === key)) uses.push('border');
  return uses.join('; ') || 'not used';
}

/** What to do next, as an instruction: "Weigh 8 motifs together". */
export function measurementWords({ kind, motifs, resolutionG }: NextMeasurement): string {
  switch (kind) {
    case 'weigh the swatch':
      return `Weigh the swatch on a scale to ${resolutionG} g`;
    case 'unravel the swatch':
      return 'Unravel the swatch and measure its yarn';
    case 'weigh motifs together':
      return motifs === 1 ? 'Weigh one motif' : `Weigh ${motifs} motifs together`;
    case 'read a finer scale':
      return `Weigh the same pieces on a scale to ${resolutionG} g`;
  }
}

/** A ledger line's factors in words: "840 sc × 2 loops × 40.1 mm". */
export function lineFormula(line: LedgerLine, stitchName: string): string {
  const count = figure(line.count, 0);
  if (line.stitch !== null) {
    return `${count} ${stitchName} × ${line.loopsEach} ${line.loopsEach === 1 ? 'loop' : 'loops'} × ${figure(line.eachMm, 1)} mm`;
  }
  if (line.part === 'tails') return `${count} tails × ${figure(line.eachMm, 0)} mm`;
  if (line.part === 'allowance') return 'what being this sure takes';
  return `${figure(line.count, 1)} m of seam × ${figure(line.eachMm / 1000, 2)}`;
}

const figure = (value: number, decimals: number): string =>
  new Intl.NumberFormat('en', { maximumFractionDigits: decimals }).format(value);

/** "± 5.3 %", from a share of the whole. */
export const percent = (share: number): string => `${(100 * share).toFixed(1)}\u00a0%`;
