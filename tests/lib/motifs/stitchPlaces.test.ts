import { describe, expect, it } from 'vitest';
import { gaugeOf, READY_MOTIFS, readyMotif, type Motif } from '../../../src/lib';
import { placedRounds, type StitchPlace } from '../../../src/lib/motifs/stitchPlaces';
import { totalCount } from '../../../src/lib/stitches/counts';

const gauge = gaugeOf(null, 4);
const ACROSS_MM = 120;
const placed = (key: string) => {
  const motif = readyMotif(key) as Motif;
  return { motif, rounds: placedRounds(motif, gauge, ACROSS_MM) };
};

const reach = ([x, y]: StitchPlace['head']) => Math.hypot(x, y);

describe.each(READY_MOTIFS.map(({ key, name }) => [name, key] as const))(
  'placedRounds of %s',
  (_, key) => {
    const { motif, rounds } = placed(key);

    it('lays the rounds one round the other, out to the size given', () => {
      expect(rounds.map(({ label }) => label)).toEqual(motif.rounds.map(({ label }) => label));
      rounds.forEach(({ innerMm, outerMm }, i) => {
        expect(outerMm).toBeGreaterThan(innerMm);
        if (i > 0) expect(innerMm).toBeCloseTo(rounds[i - 1]?.outerMm ?? NaN, 9);
      });
      const apothems = motif.sides === 3 ? 3 : 2;
      expect(apothems * (rounds.at(-1)?.outerMm ?? 0)).toBeCloseTo(ACROSS_MM, 9);
    });

    it('places every stitch that the pattern counts, once', () => {
      rounds.forEach(({ stitches }, i) => {
        expect(stitches).toHaveLength(totalCount(motif.rounds[i]?.tally ?? {}));
        const heads = stitches.map(({ head }) => head.map((mm) => mm.toFixed(3)).join());
        if (motif.sides === 0) expect(new Set(heads).size).toBe(heads.length);
      });
    });

    it('keeps every stitch inside its motif', () => {
      const corner = motif.sides === 0 ? 1 : 1 / Math.cos(Math.PI / motif.sides);
      for (const { stitches, outerMm } of rounds) {
        for (const { foot, head } of stitches) {
          expect(reach(head)).toBeLessThanOrEqual(outerMm * corner + 1e-9);
          expect(reach(foot)).toBeLessThanOrEqual(reach(head) + 1e-9);
        }
      }
    });

    it('looks the same after a turn by one side', () => {
      const turn = (2 * Math.PI) / (motif.sides || rounds[0]?.stitches.length || 1);
      const key3 = ([x, y]: readonly [number, number]) =>
        `${(x + 0).toFixed(4)} ${(y + 0).toFixed(4)}`.replaceAll('-0.0000', '0.0000');
      for (const { stitches } of motif.sides === 0 ? rounds.slice(0, 1) : rounds) {
        const heads = new Set(stitches.map(({ head }) => key3(head)));
        for (const {
          head: [x, y],
        } of stitches) {
          const turned = [
            x * Math.cos(turn) - y * Math.sin(turn),
            x * Math.sin(turn) + y * Math.cos(turn),
          ] as const;
          expect(heads).toContain(key3(turned));
        }
      }
    });
  },
);

describe('placedRounds', () => {
  it('gathers the three dc of a group in one space: feet nearer together than heads', () => {
    const { rounds } = placed('group-square');
    const [first, second, third] = rounds[2]?.stitches.slice(3, 6) ?? [];
    const across = (
      from: StitchPlace | undefined,
      to: StitchPlace | undefined,
      end: 'foot' | 'head',
    ) => Math.abs((from?.[end][0] ?? NaN) - (to?.[end][0] ?? NaN));
    expect(across(first, third, 'foot')).toBeLessThan(across(first, third, 'head'));
    expect(across(first, second, 'head')).toBeCloseTo(across(second, third, 'head'), 9);
  });

  it('has a circle for the rounds of a circle in a square until they turn corners', () => {
    const { rounds } = placed('circle-in-square');
    expect(rounds[0]?.shape).toBe('circle');
    expect(rounds.at(-1)?.shape).toBe('polygon');
    expect(placed('circle').rounds.every(({ shape }) => shape === 'circle')).toBe(true);
  });
});
