import { mixed } from '../colour/perceived';
import { gaugeOf } from '../gauge/gauge';
import { readyJoin } from '../joins/readyJoins';
import { SLOT_FACTS } from '../layout/face';
import type { Estimate } from '../ledger/ledger';
import { apothemsAcross } from '../motifs/geometry';
import type { Motif } from '../motifs/motif';
import { motifStrokes } from '../motifs/motifStrokes';
import { fixed, polygonPoints } from '../motifs/polygonPoints';
import { blanketFaces, type BlanketMotif } from './blanketFaces';
import { borderBands, MITRE_LIMIT, outerOutlines } from './borderBands';
import { hexOf } from './hexOf';
import type { Plan } from './plan';

/** What shows between the strands of a yarn. */
const SHADOW = '#10181a';
const YARN_SHARE = 0.62;

/**
 * The blanket as an SVG file to scale in millimetres: each colourway once, every motif a use of it.
 * `estimate` must be that of the plan.
 */
export function blanketSvg(plan: Plan, estimate: Estimate): string {
  const { widthMm, heightMm } = estimate.size;
  const { motifs } = blanketFaces(plan, estimate);
  const size = `width="${fixed(widthMm)}mm" height="${fixed(heightMm)}mm" viewBox="0 0 ${fixed(widthMm)} ${fixed(heightMm)}"`;
  const ways = plan.colourways.map((_, i) => `<g id="w${i}">${colourwayOf(plan, estimate, i)}</g>`);
  const cuts = motifs.flatMap((motif, i) =>
    isPart(motif) ? [`<clipPath id="c${i}"><path d="${pathOf(motif)}"/></clipPath>`] : [],
  );
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" ${size}>`,
    `<defs>${ways.join('')}${cuts.join('')}</defs>`,
    borderOf(plan, estimate, motifs),
    ...motifs.map((motif, i) => placed(motif, i)),
    '</svg>',
  ].join('\n');
}

const isPart = ({ face }: BlanketMotif): boolean => SLOT_FACTS[face.slot].share < 1;

const pathOf = ({ outlineMm }: BlanketMotif): string =>
  `M${outlineMm.map(([x, y]) => `${fixed(x)} ${fixed(y)}`).join('L')}Z`;

function placed(motif: BlanketMotif, i: number): string {
  const { face, centreMm, colourway } = motif;
  const turn = face.turnDeg === 0 ? '' : ` rotate(${face.turnDeg})`;
  const use = `<use href="#w${colourway}" transform="translate(${fixed(centreMm[0])} ${fixed(centreMm[1])})${turn}"/>`;
  return isPart(motif) ? `<g clip-path="url(#c${i})">${use}</g>` : use;
}

function borderOf(plan: Plan, estimate: Estimate, motifs: readonly BlanketMotif[]): string {
  const path = outerOutlines(motifs);
  const rounds = borderBands(plan, estimate).map(({ reachMm, colour }) => {
    const hex = hexOf(plan, colour);
    return `<path d="${path}" fill="${hex}" stroke="${hex}" stroke-width="${fixed(2 * reachMm)}" stroke-miterlimit="${MITRE_LIMIT}"/>`;
  });
  return rounds.join('');
}

function colourwayOf(plan: Plan, estimate: Estimate, index: number): string {
  const { motifIndex = 0, roundColours = [] } = plan.colourways[index] ?? {};
  const motif = plan.motifs[motifIndex] as Motif;
  const acrossMm = estimate.motifs[motifIndex]?.acrossMm ?? 0;
  const cellMm = acrossMm / apothemsAcross(motif.sides) + estimate.size.seamMm / 2;
  const joinHex = hexOf(plan, plan.join.colour);
  const isClosed = readyJoin(plan.join.key)?.openness === 'closed';
  const ground = isClosed ? joinHex : mixed(joinHex, SHADOW, YARN_SHARE);
  const corners = motif.sides === 0 ? 4 : motif.sides;
  const rounds = motifStrokes(motif, gaugeOf(plan.swatch, plan.yarn.weightCategory), acrossMm);
  return [
    `<polygon points="${polygonPoints(corners, cellMm)}" fill="${ground}"/>`,
    ...rounds.toReversed().map(({ ground: fabric, strands, strandMm }, i) => {
      const hex = hexOf(plan, roundColours[rounds.length - 1 - i] ?? '');
      return (
        `<path d="${fabric}" fill="${mixed(hex, SHADOW, YARN_SHARE)}"/>` +
        `<path d="${strands}" fill="none" stroke="${hex}" stroke-width="${fixed(strandMm)}" stroke-linecap="round"/>`
      );
    }),
  ].join('');
}
