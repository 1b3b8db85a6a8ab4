import { readyJoin } from '../lib/joins/readyJoins';
import { layoutFacts, layoutFor } from '../lib/layout/layouts';
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

  checkMotifs(plan, wrong);

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

/** Every motif must have the shape of its places. */
function checkMotifs(
  { motifs, layout, secondMotif, colourways }: Plan,
  wrong: (path: (string | number)[], message: string) => void,
): void {
  const mains = motifs.flatMap((motif, index) => (index === secondMotif ? [] : [{ motif, index }]));
  const sides = mains[0]?.motif.sides;
  if (sides === undefined) {
    wrong(['secondMotif'], 'The second motif cannot be the only one');
    return;
  }
  const facts = layoutFacts(layout ?? layoutFor(sides));
  for (const { motif, index } of mains) {
    if (motif.sides !== sides) {
      wrong(
        ['motifs', index, 'sides'],
        'All motifs of a blanket must have the same number of sides',
      );
    }
  }
  if (!facts.sides.includes(sides)) {
    wrong(['layout'], `Motifs of ${sides} sides cannot lie in the layout “${facts.name}”`);
  }
  const second = secondMotif === null ? null : motifs[secondMotif];
  if (facts.secondSides === null && second !== null) {
    wrong(['secondMotif'], `The layout “${facts.name}” has no place for a second motif`);
  }
  if (facts.secondSides !== null && second?.sides !== facts.secondSides) {
    wrong(
      ['secondMotif'],
      `The layout “${facts.name}” needs a second motif of ${facts.secondSides} sides`,
    );
  }
  const isWorked = (isSecond: boolean): boolean =>
    colourways.some(({ motifIndex }) => (motifIndex === secondMotif) === isSecond);
  if (!isWorked(false)) wrong(['colourways'], 'The main motif has no colourway');
  if (facts.secondSides !== null && !isWorked(true)) {
    wrong(['colourways'], 'The second motif has no colourway');
  }
}
