/** A motif of groups of three, round by round, drawn in mm in a square of 142. */
const colourways = [
  ['#eadfc8', '#b8432f', '#a9b468', '#eadfc8'],
  ['#eadfc8', '#a9b468', '#562a46', '#eadfc8'],
  ['#eadfc8', '#562a46', '#b8432f', '#eadfc8'],
  ['#eadfc8', '#b8432f', '#562a46', '#eadfc8'],
];

function Groups({ round, colour }: { round: number; colour: string }) {
  const depth = 15.5;
  const reach = 6 + depth * round;
  const size = (2 * reach) / (round + 1);
  const along = Array.from({ length: round + 1 }, (_, index) => -reach + index * size);
  return (
    <g fill={colour}>
      {[0, 90, 180, 270].map((turn) => (
        <g key={turn} transform={`rotate(${turn})`}>
          {along.slice(0, -1).map((at) =>
            [0, 1, 2].map((post) => (
              <rect
                key={`${at}${post}`}
                x={at + 1.2 + (post * (size - 2.4)) / 3}
                y={-reach + 0.8}
                width={(size - 2.4) / 3 - 0.7}
                height={depth - 1.6}
                rx="2.2"
              />
            )),
          )}
        </g>
      ))}
    </g>
  );
}

export function SampleMotif({ colourway = 0 }: { colourway?: number }) {
  const colours = colourways[colourway] ?? [];
  return (
    <g transform="translate(71 71)">
      <rect x="-70" y="-70" width="140" height="140" rx="3" fill="#2d5872" />
      <circle r="6" fill="none" stroke={colours[0]} strokeWidth="3" />
      {colours.map((colour, index) => (
        <Groups key={index} round={index + 1} colour={colour} />
      ))}
    </g>
  );
}

export function SampleBlanket() {
  const cells = Array.from({ length: 80 }, (_, index) => ({ row: Math.floor(index / 8), column: index % 8 }));
  return (
    <>
      <rect width="1180" height="1470" rx="8" fill="#2d5872" />
      <rect x="14" y="14" width="1152" height="1442" fill="none" stroke="#eadfc8" strokeWidth="5" />
      {cells.map(({ row, column }) => (
        <g key={`${row}-${column}`} transform={`translate(${28 + column * 141} ${28 + row * 141.6}) scale(0.955)`}>
          <SampleMotif colourway={(row * 5 + column * 3 + ((row * column) % 3)) % 4} />
        </g>
      ))}
    </>
  );
}
