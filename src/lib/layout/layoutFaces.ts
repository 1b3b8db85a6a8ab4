import type { Face } from './face';
import { brickFaces } from './faces/brickFaces';
import { hexagonFaces } from './faces/hexagonFaces';
import { largeAndSmallFaces } from './faces/largeAndSmallFaces';
import { octagonFaces } from './faces/octagonFaces';
import { onPointFaces } from './faces/onPointFaces';
import { squareFaces } from './faces/squareFaces';
import { triangleFaces } from './faces/triangleFaces';
import type { Arrangement, Layout } from './layouts';
import { planeMap, type PlaneMap } from './planeMap';

const BUILDERS: Readonly<
  Record<Layout, (rows: number, columns: number, straight: boolean) => Face[]>
> = {
  square: squareFaces,
  brick: brickFaces,
  'on-point': onPointFaces,
  'large-and-small': largeAndSmallFaces,
  'offset-hexagons': hexagonFaces,
  triangles: triangleFaces,
  octagons: octagonFaces,
};

/** Every motif of a layout of `rows` × `columns`, row by row; second motifs and infill among or after them. */
export const layoutFaces = ({ layout, edge }: Arrangement, rows: number, columns: number): Face[] =>
  BUILDERS[layout](rows, columns, edge === 'straight');

/** The plane map of faces: which sides they share, and where their corners meet. */
export const mapOf = (faces: readonly Face[]): PlaneMap =>
  planeMap(faces.map(({ points }) => points.map(([x, y]) => `${x},${y}`)));
