import { useId } from 'react';
import type { BlanketFace } from '../../lib/plan/blanketFace';

interface BlanketThumbProps {
  face: BlanketFace | undefined;
  rows: number;
  columns: number;
  widthMm: number;
  heightMm: number;
  pxPerMm: number;
  /** What it shows, in words; decoration without. */
  label?: string;
}

const BORDER_PX = 1.5;
/** Share of a cell that its motif takes; the rest is join. */
const MOTIF = 0.86;

/** A blanket in small, its size to scale beside the others and its colours in place. */
export function BlanketThumb(props: BlanketThumbProps) {
  const { face, rows, columns, widthMm, heightMm, pxPerMm, label } = props;
  const id = useId();
  const width = widthMm * pxPerMm;
  const height = heightMm * pxPerMm;
  const cell = {
    width: (width - 2 * BORDER_PX) / columns,
    height: (height - 2 * BORDER_PX) / rows,
  };
  const count = face?.colourways.length ?? 0;
  return (
    <svg
      {...(label ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true })}
      {...{ width, height }}
      viewBox={`0 0 ${width} ${height}`}
      className="keeps-colour block shrink-0"
    >
      {face && count > 0 ? (
        <>
          <pattern
            id={id}
            patternUnits="userSpaceOnUse"
            x={BORDER_PX}
            y={BORDER_PX}
            width={cell.width * count}
            height={cell.height * count}
          >
            <rect width={cell.width * count} height={cell.height * count} fill={face.join} />
            {Array.from({ length: count * count }, (_, at) => {
              const row = Math.floor(at / count);
              const column = at % count;
              return (
                <Motif
                  key={at}
                  hexes={face.colourways[(row + column) % count] ?? []}
                  isRound={face.sides !== 4}
                  centre={[(column + 0.5) * cell.width, (row + 0.5) * cell.height]}
                  size={MOTIF * Math.min(cell.width, cell.height)}
                />
              );
            })}
          </pattern>
          <rect {...{ width, height }} fill={face.border ?? face.join} />
          <rect
            x={BORDER_PX}
            y={BORDER_PX}
            width={width - 2 * BORDER_PX}
            height={height - 2 * BORDER_PX}
            fill={`url(#${id})`}
          />
        </>
      ) : (
        <rect {...{ width, height }} className="fill-sunk" />
      )}
      <rect
        x="0.5"
        y="0.5"
        width={width - 1}
        height={height - 1}
        fill="none"
        className="stroke-edge"
      />
    </svg>
  );
}

interface MotifProps {
  hexes: readonly string[];
  isRound: boolean;
  centre: readonly [x: number, y: number];
  size: number;
}

/** Its rounds as rings, from the outermost in. */
function Motif({ hexes, isRound, centre: [x, y], size }: MotifProps) {
  return (
    <>
      {hexes.toReversed().map((hex, i) => {
        const side = (size * (hexes.length - i)) / hexes.length;
        return (
          <rect
            key={i}
            x={x - side / 2}
            y={y - side / 2}
            width={side}
            height={side}
            rx={isRound ? side / 2 : 0}
            fill={hex}
          />
        );
      })}
    </>
  );
}
