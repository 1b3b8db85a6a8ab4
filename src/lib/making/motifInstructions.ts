import { readyJoin } from '../joins/readyJoins';
import type { CornerReason, JoiningStep } from '../joining/joiningSteps';
import { SLOT_FACTS } from '../layout/face';
import type { BlanketMotif } from '../plan/blanketFaces';
import type { Plan } from '../plan/plan';

/** One round of the motif at hand. */
export interface RoundToWork {
  readonly label: string;
  readonly colour: string;
  /** Linked to neighbours as it is worked; else worked plain. */
  readonly links: boolean;
}

export interface LinkToMake {
  /** "left side", "top right corner". */
  readonly where: string;
  /** What to do there: "link to row 1, motif 2", "leave open". */
  readonly what: string;
  /** Why there and now; null where it goes without saying. */
  readonly why: string | null;
}

/** Everything to do for one motif. */
export interface MotifInstructions {
  readonly rounds: readonly RoundToWork[];
  readonly links: readonly LinkToMake[];
  /** Joined only once the motifs are finished: the links tell where, not when. */
  readonly afterwards: boolean;
}

const REASONS: Readonly<Record<CornerReason, string>> = {
  edge: 'outer edge: link now',
  gathered: 'inside: every corner that arrives links here',
  crossed: 'inside: it crosses to the motif opposite',
  open: 'inside: the motif opposite closes it later',
};

/** What to work for the motif of a step: rounds plain and linked, then side by side and corner by corner. */
export function motifInstructions(
  plan: Plan,
  motifs: readonly BlanketMotif[],
  step: JoiningStep,
): MotifInstructions {
  const colourway = plan.colourways[motifs[step.face]?.colourway ?? 0];
  const motif = plan.motifs[colourway?.motifIndex ?? 0];
  const join = readyJoin(plan.join.key);
  const added = join?.roundsAdded ?? 0;
  const asWorked = join !== null && join.attached !== 'line';
  const own = (motif?.rounds ?? []).map(({ label }, i): RoundToWork => ({
    label,
    colour: colourway?.roundColours[i] ?? '',
    links: asWorked && added === 0 && i === (motif?.rounds.length ?? 0) - 1,
  }));
  const ofJoin = Array.from({ length: added }, (_, i): RoundToWork => ({
    label: added === 1 ? (join?.name ?? '') : `${join?.name ?? ''}, round ${i + 1}`,
    colour: plan.join.colour,
    links: i === added - 1,
  }));
  const to = (face: number): string => `link to ${placeWords(motifs, face, step.face)}`;
  return {
    rounds: [...own, ...ofJoin],
    links: [
      ...step.sides.map((side): LinkToMake => ({
        where: `${side.side} side`,
        what: asWorked ? to(side.to) : `seam with ${placeWords(motifs, side.to, step.face)}`,
        why: null,
      })),
      ...(asWorked ? step.corners : []).map((corner): LinkToMake => ({
        where: `${corner.corner} corner`,
        what: corner.to === null ? 'leave open' : to(corner.to),
        why: REASONS[corner.reason],
      })),
    ],
    afterwards: !asWorked,
  };
}

/** Where a motif lies, in words: "row 2, motif 3"; those between or beside the main ones say so. */
export function placeWords(motifs: readonly BlanketMotif[], face: number, from?: number): string {
  const place = motifs[face]?.face;
  if (!place) return '';
  const isSecond = (i: number | undefined): boolean => {
    const slot = motifs[i ?? -1]?.face.slot;
    return slot !== undefined && SLOT_FACTS[slot].second;
  };
  const word = isSecond(face) ? (isSecond(from) ? 'motif' : 'small motif') : 'motif';
  return `row ${place.row + 1}, ${word} ${place.column + 1}`;
}
