import { useId } from 'react';

/** Stand-ins for the real drawings, in mm: a motif of groups of three in a square of 142, and a blanket of them. */
const joining = '#2d5872';
const colourways = [
  ['#b8432f', '#eadfc8', '#b8432f', '#a9b468', '#eadfc8'],
  ['#eadfc8', '#a9b468', '#eadfc8', '#562a46', '#eadfc8'],
  ['#a9b468', '#562a46', '#eadfc8', '#b8432f', '#eadfc8'],
  ['#eadfc8', '#b8432f', '#562a46', '#eadfc8', '#a9b468'],
];

const depth = 13;
const turns = [0, 90, 180, 270];

/** One side of a round: groups of three upright stitches, with a space between groups. */
function Side({ round }: { round: number }) {
  const outer = 5 + depth * round;
  const groups = round;
  const room = (2 * outer - 5) / groups;
  const post = (room - 4.5) / 3;
  return Array.from({ length: groups * 3 }, (_, index) => {
    const group = Math.floor(index / 3);
    const x = -outer + 2.5 + 2.25 + group * room + (index % 3) * post;
    return (
      <rect
        key={index}
        x={x + 0.25}
        y={-outer + 0.9}
        width={post - 0.5}
        height={depth - 1.6}
        rx={Math.min(2.4, post / 3)}
      />
    );
  });
}

export function SampleMotif({ colourway = 0 }: { colourway?: number }) {
  const id = useId();
  const colours = colourways[colourway] ?? [];
  return (
    <g transform="translate(71 71)">
      <clipPath id={id}>
        <path d="M0 0.5L-71 -70.5H71Z" />
      </clipPath>
      <rect x="-70.5" y="-70.5" width="141" height="141" fill={joining} />
      {colours.map((colour, index) => (
        <g key={index} fill={colour}>
          {turns.map((turn) => (
            <g key={turn} transform={`rotate(${turn})`}>
              <g clipPath={`url(#${id})`}>
                <Side round={index + 1} />
              </g>
            </g>
          ))}
        </g>
      ))}
      <circle r="3.5" fill={joining} />
    </g>
  );
}

export function SampleBlanket() {
  const cells = Array.from({ length: 80 }, (_, index) => ({
    row: Math.floor(index / 8),
    column: index % 8,
  }));
  return (
    <>
      <rect width="1180" height="1470" rx="8" fill={joining} />
      <rect x="14" y="14" width="1152" height="1442" fill="none" stroke="#eadfc8" strokeWidth="5" />
      {cells.map(({ row, column }) => (
        <g
          key={`${row}-${column}`}
          transform={`translate(${27 + column * 141} ${30 + row * 141.2}) scale(0.97)`}
        >
          <SampleMotif colourway={(row * 5 + column * 3 + ((row * column) % 3)) % 4} />
        </g>
      ))}
    </>
  );
}
