import { chartSvg } from '../../lib/chart/chartSvg';
import type { Chart } from '../../lib/chart/layoutChart';

/** Longer side of the picture. */
const LONG_SIDE_PX = 2400;

/** The chart as a PNG, drawn by the browser from its SVG. Rejects where the browser cannot. */
export async function chartPng(
  chart: Chart,
  title: string,
  inks: readonly number[],
): Promise<Blob> {
  const svg = chartSvg(chart, title, inks);
  const image = new Image();
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(svg)}`;
  await image.decode();
  const scale = LONG_SIDE_PX / Math.max(image.naturalWidth, image.naturalHeight);
  const canvas = document.createElement('canvas');
  canvas.width = Math.round(image.naturalWidth * scale);
  canvas.height = Math.round(image.naturalHeight * scale);
  canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height);
  return new Promise((resolve, reject) =>
    canvas.toBlob(
      (blob) => (blob ? resolve(blob) : reject(new Error('No picture came of it.'))),
      'image/png',
    ),
  );
}

/** "Classic group square" is "classic-group-square". */
export const fileName = (title: string): string =>
  title
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-|-$/g, '') || 'motif';
