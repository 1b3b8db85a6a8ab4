import { useId } from 'react';
import { knownStitch } from '../../../lib/stitches/stitchTable';
import type { StitchCode } from '../../../lib/stitches/stitch';

interface SwatchDrawingProps {
  stitch: StitchCode;
  stitches: number;
  rows: number;
  widthMm: number;
  heightMm: number;
  hex: string;
}

/** Share of a stitch width by which the edge draws in between two rows. */
const EDGE = 0.22;

/**
 * A flat swatch in mm, for use inside an svg: two turned rows of one stitch drawn once and
 * repeated, so that a large swatch costs no more than a small one.
 */
export function SwatchDrawing(props: SwatchDrawingProps) {
  const { stitch, stitches, rows, widthMm, heightMm, hex } = props;
  const id = useId();
  const w = widthMm / stitches;
  const h = heightMm / rows;
  const drawn = {
    w,
    h,
    crown: Math.min(0.98 * h, 0.95 * w),
    wraps: knownStitch(stitch).wraps,
    hex,
  };
  return (
    <g className="keeps-colour">
      <pattern id={id} patternUnits="userSpaceOnUse" width={w} height={2 * h}>
        <rect width={w} height={2 * h} fill={shade(hex, 60)} />
        <g fill="none" strokeLinecap="round" strokeLinejoin="round">
          <FrontStitch {...drawn} />
          <g transform={`translate(0 ${h})`}>
            <BackStitch {...drawn} />
          </g>
        </g>
      </pattern>
      <path
        d={edge(widthMm, heightMm, rows, EDGE * w)}
        fill={`url(#${id})`}
        className="stroke-edge"
        vectorEffect="non-scaling-stroke"
      />
    </g>
  );
}

interface StitchProps {
  w: number;
  h: number;
  /** How far the top of the stitch reaches down. */
  crown: number;
  wraps: number;
  hex: string;
}

/** Seen from the front: the V of its top over its post. */
function FrontStitch({ w, h, crown, wraps, hex }: StitchProps) {
  return (
    <>
      <Post {...{ w, h, crown, wraps, hex }} />
      <path
        d={`M${0.15 * w} ${0.2 * crown}L${0.5 * w} ${0.88 * crown}L${0.85 * w} ${0.2 * crown}`}
        stroke={hex}
        strokeWidth={0.31 * w}
      />
    </>
  );
}

/** Seen from the back: the bump that crosses it, over its post or its two legs. */
function BackStitch({ w, h, crown, wraps, hex }: StitchProps) {
  const legs = `M${0.5 * w} ${0.5 * crown}L${0.2 * w} ${0.92 * h}M${0.5 * w} ${0.5 * crown}L${0.8 * w} ${0.92 * h}`;
  return (
    <>
      {wraps > 0 ? (
        <Post {...{ w, h, crown, wraps, hex }} />
      ) : (
        <path d={legs} stroke={shade(hex, 86)} strokeWidth={0.26 * w} />
      )}
      <path
        d={`M${0.24 * w} ${0.34 * crown}H${0.76 * w}`}
        stroke={hex}
        strokeWidth={0.42 * crown}
      />
    </>
  );
}

/** The upright part of a tall stitch, with a slanting strand for each wrap; a short stitch has none. */
function Post({ w, h, crown, wraps, hex }: StitchProps) {
  if (wraps === 0) return null;
  const reach = h - 0.8 * crown;
  const strands = Array.from({ length: wraps }, (_, i) => {
    const y = 0.9 * crown + ((i + 0.6) * reach) / (wraps + 0.2);
    return `M${0.27 * w} ${y + 0.14 * w}L${0.73 * w} ${y - 0.14 * w}`;
  });
  return (
    <>
      <path
        d={`M${0.36 * w} ${0.5 * crown}V${h}M${0.64 * w} ${0.5 * crown}V${h}`}
        stroke={shade(hex, 88)}
        strokeWidth={0.25 * w}
      />
      <path d={strands.join('')} stroke={hex} strokeWidth={0.22 * w} />
    </>
  );
}

const shade = (hex: string, percent: number): string =>
  `color-mix(in oklab, ${hex} ${percent}%, #10181a)`;

/** The outline: each row swells a little at both ends, where the work was turned. */
function edge(widthMm: number, heightMm: number, rows: number, inMm: number): string {
  const h = heightMm / rows;
  const down = `q${2 * inMm} ${h / 2} 0 ${h}`.repeat(rows);
  const up = `q${-2 * inMm} ${-h / 2} 0 ${-h}`.repeat(rows);
  return `M${inMm} 0H${widthMm - inMm}${down}H${inMm}${up}Z`;
}
