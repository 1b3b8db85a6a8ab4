import { downloadBlob } from '../../client/download';
import type { Estimate } from '../../lib/ledger/ledger';
import { blanketFaces } from '../../lib/plan/blanketFaces';
import { blanketSvg } from '../../lib/plan/blanketSvg';
import type { Plan } from '../../lib/plan/plan';
import { drawBorder, layStamps, stampsOf } from './paintBlanket';

/** Longest side of the picture in pixels. */
const LONGEST_PX = 3_000;

/** Hands the blanket to the person as a picture, or as a drawing to scale. */
export function downloadPicture(plan: Plan, estimate: Estimate, as: 'png' | 'svg'): void {
  if (as === 'svg') {
    downloadBlob('blanket.svg', new Blob([blanketSvg(plan, estimate)], { type: 'image/svg+xml' }));
    return;
  }
  const { widthMm, heightMm } = estimate.size;
  const pxPerMm = LONGEST_PX / Math.max(widthMm, heightMm);
  const canvas = document.createElement('canvas');
  canvas.width = Math.ceil(widthMm * pxPerMm);
  canvas.height = Math.ceil(heightMm * pxPerMm);
  const context = canvas.getContext('2d');
  if (!context) return;
  drawBorder(context, plan, estimate, pxPerMm);
  const { motifs } = blanketFaces(plan, estimate);
  layStamps(context, motifs, stampsOf(plan, estimate, pxPerMm).stamps, pxPerMm);
  canvas.toBlob((blob) => blob && downloadBlob('blanket.png', blob));
}
