import { readyJoin } from '../lib/joins/readyJoins';
import { layoutFor } from '../lib/layout/layouts';
import type { Plan } from '../lib/plan/plan';

interface Issues {
  addIssue(issue: { code: 'custom'; path: (string | number)[]; message: string }): void;
}

/** What the parts of a plan ask of one another. */
export function checkPlan(plan: Plan, issues: Issues): void {
  const wrong = (path: (string | number)[], message: string) =>
    issues.addIssue({ code: 'custom', path, message });
  const keys = new Set<string>();
  plan.colours.forEach(({ key }, index) => {
    if (keys.has(key)) wrong(['colours', index, 'key'], `Two colours have the key ${key}`);
    keys.add(key);
  });
  const needsColour = (key: string, path: (string | number)[]) => {
    if (!keys.has(key)) wrong(path, `There is no colour with the key ${key}`);
  };

  const sides = plan.motifs[0]?.sides;
  if (sides !== undefined && layoutFor(sides) === null) {
    wrong(['motifs', 0, 'sides'], `Motifs of ${sides} sides cannot be laid out yet`);
  }
  plan.motifs.forEach((motif, index) => {
    if (motif.sides !== sides) {
      wrong(
        ['motifs', index, 'sides'],
        'All motifs of a blanket must have the same number of sides',
      );
    }
  });

  plan.colourways.forEach(({ motifIndex, roundColours }, index) => {
    const motif = plan.motifs[motifIndex];
    if (!motif) {
      wrong(['colourways', index, 'motifIndex'], `There is no motif number ${motifIndex}`);
    } else if (roundColours.length !== motif.rounds.length) {
      wrong(
        ['colourways', index, 'roundColours'],
        `${motif.name} has ${motif.rounds.length} rounds, but ${roundColours.length} colours are given`,
      );
    }
    roundColours.forEach((key, round) =>
      needsColour(key, ['colourways', index, 'roundColours', round]),
    );
  });

  if (!readyJoin(plan.join.key)) wrong(['join', 'key'], `There is no join named ${plan.join.key}`);
  needsColour(plan.join.colour, ['join', 'colour']);
  plan.border.forEach((round, index) => needsColour(round.colour, ['border', index, 'colour']));

  plan.evidence.forEach((piece, index) => {
    if (piece.piece === 'swatch' && plan.swatch === null) {
      wrong(['evidence', index, 'piece'], 'A weighed swatch needs its stitches, rows and size');
    }
    if (piece.piece === 'motifs' && !plan.motifs[piece.motifIndex]) {
      wrong(['evidence', index, 'motifIndex'], `There is no motif number ${piece.motifIndex}`);
    }
  });
}
