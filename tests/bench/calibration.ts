import { CONFIDENCES } from '../../src/lib';
import {
  metresAt,
  outcomeOf,
  publishedAnd,
  simulate,
  skeinsAt,
  type Outcome,
} from '../support/calibration';
import { seeded } from '../support/random';
import type { Weighing } from '../support/simulatedMaker';
import { heading, line, percent, table } from './report.ts';

const MAKERS = 4000;
const SEED = 1;

const HABITS: readonly (readonly [name: string, weighings: readonly Weighing[]])[] = [
  ['nothing weighed', []],
  ['swatch weighed, 1 g scale', [{ piece: 'swatch', count: 0, resolutionG: 1 }]],
  ['1 motif weighed, 1 g scale', [{ piece: 'motifs', count: 1, resolutionG: 1 }]],
  ['4 motifs weighed, 1 g scale', [{ piece: 'motifs', count: 4, resolutionG: 1 }]],
  [
    '4 motifs and swatch, 0.1 g scale',
    [
      { piece: 'motifs', count: 4, resolutionG: 0.1 },
      { piece: 'swatch', count: 0, resolutionG: 0.1 },
    ],
  ],
];

/** Makers drawn from the stated spread: how often what is planned runs short, and what is left over. */
export function benchCalibration(): void {
  heading(`Calibration: ${MAKERS} simulated makers for each habit, two or three colours each`);
  const rows: string[][] = [];
  const results: (() => void)[] = [];
  const skeinRandom = seeded(SEED + 1);
  const shown = ({ short, standardError, surplus }: Outcome): string[] => [
    `${percent(short)} ± ${percent(standardError)}`,
    percent(surplus),
  ];
  HABITS.forEach(([name, weighings], i) => {
    const cases = simulate(SEED + i, MAKERS, weighings);
    for (const confidence of CONFIDENCES) {
      const metres = outcomeOf(cases, metresAt(confidence));
      const skeins = outcomeOf(cases, skeinsAt(confidence, skeinRandom));
      rows.push([`${name}, ${percent(confidence)}`, ...shown(metres), ...shown(skeins)]);
      if (confidence !== 0.95) continue;
      const most = 5 + 200 * skeins.standardError;
      const limit = { most, why: '5 % and two standard errors' };
      results.push(() => {
        line(`short at 95 %, ${name}`, 100 * skeins.short, '%', limit);
        line(`surplus at 95 %, ${name}`, 100 * skeins.surplus, '%');
      });
    }
    if (i > 0) return;
    const habit = outcomeOf(cases, publishedAnd(0.1, skeinRandom));
    rows.push(["the pattern's yardage and 10 %", '', '', ...shown(habit)]);
    results.push(() => {
      line("short with the pattern's yardage and 10 %", 100 * habit.short, '%');
      line("surplus with the pattern's yardage and 10 %", 100 * habit.surplus, '%');
    });
  });
  table(['', 'short, metres', 'surplus', 'short, whole skeins', 'surplus'], rows);
  for (const print of results) print();
}
