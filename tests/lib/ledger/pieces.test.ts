import { describe, expect, it } from 'vitest';
import { blanketOf } from '../../../src/lib/ledger/blanketOf';
import {
  joinSidesOf,
  motifPieces,
  piecesOf,
  type PieceGroup,
} from '../../../src/lib/ledger/pieces';
import type { Motif } from '../../../src/lib/motifs/motif';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';
import type { Plan } from '../../../src/lib/plan/plan';
import { buildPlan, plainPlan } from '../../support/plans';

const motif = (key: string, rounds: number): Motif => readyMotif(key, rounds) as Motif;
const coloured = (...roundColours: string[]) => ({ motifIndex: 0, roundColours });
const groupsOf = (plan: Plan): PieceGroup[] => piecesOf(blanketOf(plan));
const ofPart = (plan: Plan, part: string): PieceGroup[] =>
  groupsOf(plan).filter(({ lines }) => lines.some((line) => line.part === part));

describe('joinSidesOf', () => {
  it('is every side, and four places to touch for a circle', () => {
    expect(joinSidesOf(motif('hexagon', 2))).toBe(6);
    expect(joinSidesOf(motif('circle', 2))).toBe(4);
  });
});

describe('motifPieces', () => {
  const plan = buildPlan({ motifs: [motif('group-square', 3)] });

  it('works one colour on from round to round: the ring, the travel, one pair of tails', () => {
    expect(motifPieces({ plan }, coloured('c1', 'c1', 'c1'), 5)).toEqual([
      {
        colour: 'c1',
        count: 5,
        lines: [
          {
            part: 'rounds',
            label: 'Rnd 1',
            made: { ch: 15, dc: 11, 'sl st': 2 }, // with the ring's 4 chains and slip stitch
            tails: 2,
            seamMm: 0,
          },
          {
            part: 'rounds',
            label: 'Rnd 2',
            made: { ch: 15, dc: 23, 'sl st': 4 },
            tails: 0,
            seamMm: 0,
          },
          {
            part: 'rounds',
            label: 'Rnd 3',
            made: { ch: 19, dc: 35, 'sl st': 4 },
            tails: 0,
            seamMm: 0,
          },
        ],
      },
    ]);
  });

  it('attaches a new colour in place: no travel, two more tails', () => {
    const pieces = motifPieces({ plan }, coloured('c1', 'c2', 'c1'), 5);
    expect(pieces.map(({ colour, lines }) => [colour, lines.map(({ label }) => label)])).toEqual([
      ['c1', ['Rnd 1', 'Rnd 3']],
      ['c2', ['Rnd 2']],
    ]);
    const lines = pieces.flatMap((group) => group.lines);
    expect(lines.map(({ tails }) => tails)).toEqual([2, 2, 2]);
    expect(lines.map(({ made }) => made['sl st'])).toEqual([2, 1, 1]);
  });
});

describe('piecesOf', () => {
  it('sews along every joined side and leaves two tails to each long line', () => {
    // 4 × 3 squares: 3 × 3 + 4 × 2 = 17 seams, 3 + 2 lines
    const plan = plainPlan('solid-square', { join: { key: 'whip-stitch', colour: 'c1' } });
    const [seams, corners, tails] = ofPart(plan, 'join') as [PieceGroup, PieceGroup, PieceGroup];
    const side = blanketOf(plan).geometries[0]?.sideMm;
    expect(seams).toMatchObject({ count: 17, lines: [{ made: {}, seamMm: side, tails: 0 }] });
    expect(corners).toMatchObject({ count: 1, lines: [{ made: {}, seamMm: 0 }] });
    expect(tails).toMatchObject({ count: 5, lines: [{ made: {}, tails: 2 }] });
  });

  it('works a crocheted seam stitch by stitch and a chain at every link', () => {
    // side of 23 after six rounds; crossed: 3 × 2 inside × 2 + edge 2 × 3 + 2 × 2 = 22 links
    const [seams, corners] = ofPart(plainPlan('solid-square'), 'join') as [PieceGroup, PieceGroup];
    expect(seams).toMatchObject({ count: 17, lines: [{ made: { 'sl st': 23 } }] });
    expect(corners.lines[0]?.made).toEqual({ ch: 22 });
  });

  it('gathers three corners at every inside junction where asked to', () => {
    const [, corners] = ofPart(plainPlan('solid-square', { corners: 'gathered' }), 'join');
    expect(corners?.lines[0]?.made).toEqual({ ch: 6 * 3 + 10 });
  });

  it('adds rounds to every motif on all its sides, and two tails unless the yarn carries on', () => {
    // braid on a side of 23 = 2 × 11 + 1: 12 sc, 55 ch; corners of 7 ch
    const join = { key: 'flat-braid', colour: 'c1' };
    const added = ofPart(plainPlan('solid-square', { join }), 'join').at(-1);
    expect(added).toMatchObject({
      count: 12,
      lines: [{ made: { sc: 4 * 12, ch: 4 * (55 + 7) }, tails: 0 }],
    });
    const colours = buildPlan().colours;
    const other = plainPlan('solid-square', { colours, join: { ...join, colour: 'c2' } });
    expect(ofPart(other, 'join').at(-1)).toMatchObject({ colour: 'c2', lines: [{ tails: 2 }] });
  });

  it('links the last round in the yarn of the motifs themselves', () => {
    // group square of 8 rounds: 7 spaces a side; 17 sides × 7 + 22 corners over 12 motifs
    const plan = plainPlan('group-square', { join: { key: 'last-round', colour: 'c1' } });
    const [links] = ofPart(plan, 'join');
    expect(links).toMatchObject({ colour: 'c1', count: 12, lines: [{ tails: 0 }] });
    expect((links?.lines[0]?.made['sl st'] as number) * 12).toBeCloseTo(17 * 7 + 22, 10);
  });

  it('works a border in pieces, one for each outer side, that make up its rounds', () => {
    // 14 sides × 23 + 10 junctions × 2 + 12 = 354; attached anew where the colour changes
    const border = ['c1', 'c1', 'c2'].map((colour) => ({ stitch: 'sc', colour }));
    const rounds = ofPart(plainPlan('solid-square', { border }), 'border');
    expect(rounds.map(({ count }) => count)).toEqual([14, 14, 14]);
    const total = rounds.map(({ count, lines }) => count * (lines[0]?.made.sc as number));
    [354, 362, 370].forEach((sc, i) => expect(total[i]).toBeCloseTo(sc, 9));
    const tails = rounds.map(({ count, lines }) => count * (lines[0]?.tails as number));
    [2, 0, 2].forEach((count, i) => expect(tails[i]).toBeCloseTo(count, 9));
  });

  it('has no join and no border on a single motif without one', () => {
    const plan = plainPlan('solid-square', { size: { by: 'grid', rows: 1, columns: 1 } });
    expect(ofPart(plan, 'border')).toEqual([]);
    expect(ofPart(plan, 'join').flatMap(({ lines }) => lines.map(({ made }) => made))).toEqual([
      { ch: 0 },
    ]);
  });

  it('joins circles where they touch and borders them by the quarter', () => {
    // 60 stitches: 7 touch each neighbour, 15 lie outside each outer side; no corners to link
    const border = [{ stitch: 'sc', colour: 'c1' }];
    const plan = plainPlan('circle', { border });
    const [seams, corners] = ofPart(plan, 'join') as [PieceGroup, PieceGroup];
    expect(seams).toMatchObject({ count: 17, lines: [{ made: { 'sl st': 7 } }] });
    expect(corners.lines[0]?.made).toEqual({ ch: 0 });
    const [round] = ofPart(plan, 'border') as [PieceGroup];
    expect((round.lines[0]?.made.sc as number) * 14).toBeCloseTo(14 * 15 + 20 + 12, 9);
  });

  it('adds a round all the way round a circle', () => {
    // a quarter of 60 is 15 = 2 × 7 + 1: 8 sc and 35 ch, four times, no corner
    const plan = plainPlan('circle', { join: { key: 'flat-braid', colour: 'c1' } });
    expect(ofPart(plan, 'join').at(-1)?.lines[0]?.made).toEqual({ sc: 32, ch: 140 });
  });
});
