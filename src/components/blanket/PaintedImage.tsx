import { useEffect, useState } from 'react';
import type { Estimate } from '../../lib/ledger/ledger';
import type { BlanketMotif } from '../../lib/plan/blanketFaces';
import type { Plan } from '../../lib/plan/plan';
import { layStamps, stampsOf } from './paintBlanket';

interface PaintedImageProps {
  plan: Plan;
  estimate: Estimate;
  motifs: readonly BlanketMotif[];
}

/** Longest side of the image in pixels. */
const LONGEST_PX = 1400;

/** A large blanket as one image, painted once the browser has it. For use inside an svg in mm. */
export default function PaintedImage({ plan, estimate, motifs }: PaintedImageProps) {
  const [href, setHref] = useState<string | null>(null);
  const { widthMm, heightMm } = estimate.size;
  useEffect(() => {
    const canvas = document.createElement('canvas');
    const pxPerMm = LONGEST_PX / Math.max(widthMm, heightMm);
    canvas.width = Math.ceil(widthMm * pxPerMm);
    canvas.height = Math.ceil(heightMm * pxPerMm);
    const context = canvas.getContext('2d');
    if (!context) return;
    layStamps(context, motifs, stampsOf(plan, estimate, pxPerMm).stamps, pxPerMm);
    setHref(canvas.toDataURL());
  }, [plan, estimate, motifs, widthMm, heightMm]);
  return href && <image href={href} width={widthMm} height={heightMm} />;
}
