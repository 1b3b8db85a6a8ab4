/** The same turn, less than half a turn from `near`: `nearestTurn(0.9, 0)` is -0.1. */
export const nearestTurn = (turn: number, near: number): number => turn - Math.round(turn - near);

/** Mean of directions in turns, null of none or where they cancel out. */
export function meanTurn(turns: readonly (number | undefined)[]): number | null {
  let [x, y] = [0, 0];
  for (const turn of turns) {
    if (turn === undefined) continue;
    x += Math.cos(2 * Math.PI * turn);
    y += Math.sin(2 * Math.PI * turn);
  }
  return Math.hypot(x, y) < 1e-9 ? null : Math.atan2(y, x) / (2 * Math.PI);
}
