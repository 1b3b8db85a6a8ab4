import { gaugeOf } from '../../lib/gauge/gauge';
import { readyJoin } from '../../lib/joins/readyJoins';
import { SLOT_FACTS } from '../../lib/layout/face';
import type { Estimate } from '../../lib/ledger/ledger';
import { apothemsAcross } from '../../lib/motifs/geometry';
import type { Motif } from '../../lib/motifs/motif';
import { motifStrokes } from '../../lib/motifs/motifStrokes';
import { polygonPoints } from '../../lib/motifs/polygonPoints';
import { blanketFaces, type BlanketMotif } from '../../lib/plan/blanketFaces';
import { borderBands, MITRE_LIMIT, outerOutlines } from '../../lib/plan/borderBands';
import type { Plan } from '../../lib/plan/plan';
import { hexOf } from '../../lib/plan/hexOf';
import { shadeOf } from './shadeOf';

/** A colourway drawn once, to be laid wherever it lies. */
export type Stamp = CanvasImageSource & { readonly width: number; readonly height: number };

/** Motifs narrower than this many pixels show their rounds, but no stitches. */
const STITCHES_FROM_PX = 24;

/** One stamp for each colourway of the plan, at `pxPerMm`. Those of `before` that look alike are kept. */
export function stampsOf(
  plan: Plan,
  estimate: Estimate,
  pxPerMm: number,
  before: ReadonlyMap<string, Stamp> = new Map(),
): { stamps: Stamp[]; known: Map<string, Stamp> } {
  const known = new Map<string, Stamp>();
  const stamps = plan.colourways.map(({ motifIndex, roundColours }) => {
    const hexes = roundColours.map((key) => hexOf(plan, key));
    const acrossMm = estimate.motifs[motifIndex]?.acrossMm ?? 0;
    const motif = plan.motifs[motifIndex] as Motif;
    const joinHex = hexOf(plan, plan.join.colour);
    const key = JSON.stringify([
      motif.key,
      motif.rounds.length,
      acrossMm,
      hexes,
      joinHex,
      plan.join.key,
      pxPerMm,
    ]);
    const stamp = known.get(key) ?? before.get(key) ?? drawStamp();
    known.set(key, stamp);
    return stamp;

    function drawStamp(): Stamp {
      const cellMm = acrossMm / apothemsAcross(motif.sides) + estimate.size.seamMm / 2;
      const corners = motif.sides === 0 ? 4 : motif.sides;
      const reachMm = cellMm / Math.cos(Math.PI / corners);
      const canvas = document.createElement('canvas');
      canvas.width = canvas.height = Math.ceil(2 * reachMm * pxPerMm) + 2;
      const context = canvas.getContext('2d') as CanvasRenderingContext2D;
      context.setTransform(pxPerMm, 0, 0, pxPerMm, canvas.width / 2, canvas.height / 2);
      const open = readyJoin(plan.join.key)?.openness !== 'closed';
      context.fillStyle = open ? shadeOf(joinHex) : joinHex;
      // A little over its cell, so that no line of ground shows between neighbours.
      context.fill(new Path2D(`M${polygonPoints(corners, cellMm + 0.6 / pxPerMm)}Z`));
      const gauge = gaugeOf(plan.swatch, plan.yarn.weightCategory);
      const rounds = motifStrokes(motif, gauge, acrossMm);
      context.lineCap = 'round';
      rounds.toReversed().forEach(({ ground, strands, strandMm }, i) => {
        const hex = hexes[rounds.length - 1 - i] ?? '#888888';
        const plain = acrossMm * pxPerMm < STITCHES_FROM_PX;
        context.fillStyle = plain ? hex : shadeOf(hex);
        context.fill(new Path2D(ground));
        if (plain) return;
        context.strokeStyle = hex;
        context.lineWidth = strandMm;
        context.stroke(new Path2D(strands));
      });
      return canvas;
    }
  });
  return { stamps, known };
}

/** Lays motifs of a blanket down, each with the stamp of its colourway. */
export function layStamps(
  context: CanvasRenderingContext2D,
  motifs: readonly BlanketMotif[],
  stamps: readonly Stamp[],
  pxPerMm: number,
): void {
  for (const { face, colourway, centreMm, outlineMm } of motifs) {
    const stamp = stamps[colourway];
    if (!stamp) continue;
    context.save();
    if (SLOT_FACTS[face.slot].share < 1) {
      const path = new Path2D();
      outlineMm.forEach(([x, y], i) =>
        i === 0 ? path.moveTo(x * pxPerMm, y * pxPerMm) : path.lineTo(x * pxPerMm, y * pxPerMm),
      );
      path.closePath();
      context.clip(path);
    }
    context.translate(centreMm[0] * pxPerMm, centreMm[1] * pxPerMm);
    if (face.turnDeg !== 0) context.rotate((face.turnDeg * Math.PI) / 180);
    context.drawImage(stamp, -stamp.width / 2, -stamp.height / 2);
    context.restore();
  }
}

/** The border, beneath the motifs: each round over the one outside it. */
export function drawBorder(
  context: CanvasRenderingContext2D,
  plan: Plan,
  estimate: Estimate,
  scale: number,
): void {
  const path = new Path2D(outerOutlines(blanketFaces(plan, estimate).motifs));
  context.save();
  context.scale(scale, scale);
  context.lineJoin = 'miter';
  context.miterLimit = MITRE_LIMIT;
  for (const { reachMm, colour } of borderBands(plan, estimate)) {
    context.fillStyle = context.strokeStyle = hexOf(plan, colour);
    context.lineWidth = Math.max(0.01, 2 * reachMm);
    context.stroke(path);
    context.fill(path);
  }
  context.restore();
}
