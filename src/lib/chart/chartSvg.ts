import { inkOf } from './inks';
import type { Chart } from './layoutChart';
import { SIZES } from './sizes';
import type { ChartSymbol } from './symbol';
import { symbolPath } from './symbolPath';

/** The chart as a drawing of its own, dark on white, in mm: for print and for other programs; `inks` of the rounds; each stitch has an id. */
export function chartSvg(chart: Chart, title: string, inks: readonly number[] = []): string {
  const { widthMm, heightMm, overMm, originMm, stitchWidthMm } = chart;
  const marginMm = overMm + 0.5 * stitchWidthMm;
  const [x, y] = [-originMm[0] - marginMm, -originMm[1] - marginMm];
  const [width, height] = [widthMm + 2 * marginMm, heightMm + 2 * marginMm];
  const number = (value: number): string => String(Math.round(value * 100) / 100 + 0);
  const groups = [chart.ring, ...chart.rounds].map((symbols, i) => {
    const ink = inkOf(inks[i - 1] ?? i - 1).light;
    const drawn = symbols.map((symbol) => symbolElement(symbol, ink)).join('');
    return `<g id="round-${i}" stroke="${ink}">${drawn}</g>`;
  });
  const ring =
    chart.magicRingMm === null
      ? ''
      : `<circle r="${number(chart.magicRingMm)}" stroke="${inkOf(0).light}"/>`;
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${number(width)}mm" height="${number(height)}mm" viewBox="${[x, y, width, height].map(number).join(' ')}">`,
    `<title>${escaped(title)}</title>`,
    `<rect x="${number(x)}" y="${number(y)}" width="${number(width)}" height="${number(height)}" fill="#ffffff"/>`,
    `<g fill="none" stroke-linecap="round" stroke-linejoin="round" stroke-width="${number(SIZES.line * stitchWidthMm)}">`,
    ring + groups.join(''),
    '</g></svg>',
  ].join('\n');
}

/** One object for each stitch, so that drawing programs can take hold of it. */
function symbolElement(symbol: ChartSymbol, ink: string): string {
  const { line, solid } = symbolPath(symbol);
  const id = `id="stitch-${symbol.round + 1}-${symbol.stitch + 1}"`;
  const filled = `d="${solid}" fill="${ink}" stroke="none"`;
  if (solid === '') return `<path ${id} d="${line}"/>`;
  return line === ''
    ? `<path ${id} ${filled}/>`
    : `<g ${id}><path d="${line}"/><path ${filled}/></g>`;
}

const escaped = (text: string): string =>
  text.replace(/[&<>"]/g, (mark) => `&#${mark.charCodeAt(0)};`);
