import { useMemo, useReducer } from 'react';

/** The part of a drawing in sight, in mm: how many times larger than whole, and its top left corner. */
export interface View {
  zoom: number;
  leftMm: number;
  topMm: number;
}

interface Room {
  widthMm: number;
  heightMm: number;
}

/** A place in what is in sight, or a way across it: shares of its width and height, from its top left. */
export type InSight = readonly [across: number, down: number];

type Move =
  | { by: 'zoom'; factor: number; at: InSight }
  | { by: 'pan'; way: InSight }
  | { by: 'show'; atMm: readonly [number, number] }
  | { by: 'whole' };

const MOST_ZOOM = 12;
const WHOLE: View = { zoom: 1, leftMm: 0, topMm: 0 };

/** Looks closer at a drawing, never past its edges. */
export function moved(view: View, move: Move, room: Room): View {
  if (move.by === 'whole') return WHOLE;
  const zoom =
    move.by === 'zoom' ? Math.min(MOST_ZOOM, Math.max(1, view.zoom * move.factor)) : view.zoom;
  const seen = { width: room.widthMm / zoom, height: room.heightMm / zoom };
  let { leftMm, topMm } = view;
  if (move.by === 'pan') {
    leftMm += move.way[0] * seen.width;
    topMm += move.way[1] * seen.height;
  } else if (move.by === 'zoom') {
    // What is under the finger stays there.
    leftMm += move.at[0] * (room.widthMm / view.zoom - seen.width);
    topMm += move.at[1] * (room.heightMm / view.zoom - seen.height);
  } else {
    const [x, y] = move.atMm;
    const isSeen = x > leftMm && x < leftMm + seen.width && y > topMm && y < topMm + seen.height;
    if (isSeen) return view;
    leftMm = x - seen.width / 2;
    topMm = y - seen.height / 2;
  }
  return {
    zoom,
    leftMm: Math.min(room.widthMm - seen.width, Math.max(0, leftMm)),
    topMm: Math.min(room.heightMm - seen.height, Math.max(0, topMm)),
  };
}

export type Zoom = ReturnType<typeof useZoom>;

export function useZoom({ widthMm, heightMm }: Room) {
  const [stored, act] = useReducer(
    (view: View, { move, room }: { move: Move; room: Room }) => moved(view, move, room),
    WHOLE,
  );
  // The drawing may have shrunk since: what is out of it now is not shown.
  const { zoom, leftMm, topMm } = moved(stored, { by: 'pan', way: [0, 0] }, { widthMm, heightMm });
  return useMemo(
    () => ({
      view: { zoom, leftMm, topMm },
      zoomBy: (factor: number, at: InSight = [0.5, 0.5]) =>
        act({ move: { by: 'zoom', factor, at }, room: { widthMm, heightMm } }),
      pan: (way: InSight) => act({ move: { by: 'pan', way }, room: { widthMm, heightMm } }),
      show: (atMm: readonly [number, number]) =>
        act({ move: { by: 'show', atMm }, room: { widthMm, heightMm } }),
      whole: () => act({ move: { by: 'whole' }, room: { widthMm, heightMm } }),
    }),
    [zoom, leftMm, topMm, widthMm, heightMm],
  );
}
