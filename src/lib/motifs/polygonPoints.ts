/** Two decimals of a mm, and never "-0": server and browser must write the same text. */
export const fixed = (value: number): string => String(Math.round(value * 100) / 100 + 0);

/** Points of a regular polygon about 0,0 with a side at the top: `polygonPoints(4, 5)` begins "5,-5". */
export function polygonPoints(sides: number, apothemMm: number): string {
  const reachMm = apothemMm / Math.cos(Math.PI / sides);
  return Array.from({ length: sides }, (_, i) => {
    const angle = (2 * Math.PI * (i + 0.5)) / sides;
    return `${fixed(reachMm * Math.sin(angle))},${fixed(-reachMm * Math.cos(angle))}`;
  }).join(' ');
}
