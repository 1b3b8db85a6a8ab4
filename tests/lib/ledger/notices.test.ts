import { describe, expect, it } from 'vitest';
import { blanketOf } from '../../../src/lib/ledger/blanketOf';
import { noticesOf } from '../../../src/lib/ledger/notices';
import type { Motif } from '../../../src/lib/motifs/motif';
import { readyMotif } from '../../../src/lib/motifs/readyMotifs';
import type { Plan } from '../../../src/lib/plan/plan';
import { widthMm } from '../../../src/lib/units/quantities';
import { buildPlan, plainPlan, weighed } from '../../support/plans';

const notices = (plan: Plan) => noticesOf(blanketOf(plan));
const codes = (plan: Plan): string[] => notices(plan).map(({ code }) => code);
const closed = { key: 'slip-stitch', colour: 'c1' };

describe('noticesOf', () => {
  it('has nothing to ask about a plan in order', () => {
    expect(codes(buildPlan({ join: closed }))).toEqual(['join-caution-1']);
  });

  it('passes on the cautions of the join', () => {
    expect(notices(buildPlan()).map(({ message }) => message)).toEqual([
      expect.stringMatching(/small fingers/),
      expect.stringMatching(/washing machine/),
    ]);
    expect(codes(buildPlan({ join: { key: 'sc-ridge', colour: 'c1' } }))).toEqual([]);
  });

  it("questions a gauge far outside its category's range, and not one that is just outside", () => {
    // medium 7.26 to 9.24 mm, a fifth more either way: 5.81 to 11.08
    const swatchOf = (each: number) => ({
      stitch: 'sc',
      stitches: 20,
      rows: 20,
      widthMm: widthMm(20 * each),
      heightMm: widthMm(20 * each * 0.92),
    });
    const asked = (each: number) =>
      codes(buildPlan({ join: closed, evidence: [], swatch: swatchOf(each) }));
    expect(asked(5.7)).toContain('gauge-outside-category');
    expect(asked(5.9)).not.toContain('gauge-outside-category');
    expect(asked(11)).not.toContain('gauge-outside-category');
    expect(asked(11.2)).toContain('gauge-outside-category');
    const [notice] = notices(buildPlan({ swatch: swatchOf(4) }));
    expect(notice).toEqual({
      code: 'gauge-outside-category',
      severity: 'question',
      message:
        "A stitch of 4.0 mm is unusual for weight 4 Medium (7.3 to 9.2 mm). Check the stitches counted, the width, and the yarn's weight.",
    });
  });

  it('questions a weight that no hand takes at this gauge', () => {
    // four motifs are expected to take 84.4 + 3.6 m, ± some 17 m: 44 g; 10 g and 90 g are not
    const evidence = (pieceG: number): Plan['evidence'] => [
      { piece: 'motifs', count: 4, motifIndex: 0, reading: weighed(pieceG, 1) },
    ];
    const asked = (pieceG: number) =>
      codes(buildPlan({ join: closed, evidence: evidence(pieceG) }));
    expect(asked(44)).not.toContain('reading-contradicts-gauge');
    expect(asked(60)).not.toContain('reading-contradicts-gauge');
    expect(asked(10)).toContain('reading-contradicts-gauge');
    expect(asked(90)).toContain('reading-contradicts-gauge');
    expect(notices(buildPlan({ evidence: evidence(90) }))[0]?.message).toBe(
      "Measured piece 1 took 180.0 m; at this gauge such a piece usually takes about 88.0 m. Check its weight, its counts and the skein's metres.",
    );
  });

  it('questions a join that does not fit the side', () => {
    const join = { key: 'flat-braid', colour: 'c1' };
    const [notice] = notices(plainPlan('hexagon', { join }));
    expect(notice).toMatchObject({ code: 'join-does-not-fit', severity: 'question' });
    expect(notice?.message).toMatch(/^Flat braid on Solid hexagon: 10 stitches a side do not fit/);
  });

  it('says from which round a motif no longer lies flat', () => {
    // dc half as tall as they are usually: too many stitches for the height
    const swatch = {
      stitch: 'dc',
      stitches: 10,
      rows: 10,
      widthMm: widthMm(80),
      heightMm: widthMm(100),
    };
    const plan = plainPlan('solid-square', { swatch, join: { key: 'sc-ridge', colour: 'c1' } });
    expect(notices(plan)[0]).toMatchObject({
      code: 'motif-ruffles',
      severity: 'note',
      message: expect.stringMatching(/^Solid dc square ruffles from Rnd \d at this gauge/),
    });
  });

  it('questions motifs of different sizes in one blanket', () => {
    const motifs = [readyMotif('group-square', 3), readyMotif('group-square', 4)] as Motif[];
    const colourways = [
      { motifIndex: 0, roundColours: ['c1', 'c1', 'c1'] },
      { motifIndex: 1, roundColours: ['c1', 'c1', 'c1', 'c1'] },
    ];
    expect(codes(buildPlan({ join: closed, motifs, colourways, evidence: [] }))).toContain(
      'motifs-differ-in-size',
    );
  });

  it('cautions about infants for a blanket of their size and not for a larger one', () => {
    const size = { by: 'grid', rows: 6, columns: 6 } as const;
    const small = notices(buildPlan({ join: closed, size })).at(-1);
    expect(small).toMatchObject({ code: 'infant-sleep', severity: 'caution' });
    // published: American Academy of Pediatrics, Pediatrics 150(1), 2022
    expect(small?.message).toMatch(/under 12 months \(American Academy of Pediatrics, 2022\)/);
    expect(codes(buildPlan({ join: closed }))).not.toContain('infant-sleep');
  });
});
