import { capitalised, countInWords, percentInWords } from './inWords';

export interface SkeinChance {
  skeins: number;
  probabilityShort: number;
}

/** Above this chance of running short, the useful comparison is one skein more; below, one fewer. */
const RISKY = 0.1;

/** "Seven skeins leave 0.1 % chance of running short. Six would leave 41 %." */
export function chanceSentence(skeins: number, chances: readonly SkeinChance[]): string {
  const chanceOf = (count: number) =>
    chances.find((chance) => chance.skeins === count)?.probabilityShort;
  const short = chanceOf(skeins);
  if (short === undefined) return '';
  const main =
    skeins === 0
      ? 'With no skein in hand, running short is certain.'
      : `${capitalised(countInWords(skeins))} ${skeins === 1 ? 'skein leaves' : 'skeins leave'} ${percentInWords(short)} chance of running short.`;
  const other = short > RISKY ? skeins + 1 : skeins - 1;
  const otherShort = other > 0 ? chanceOf(other) : undefined;
  if (otherShort === undefined) return main;
  return `${main} ${capitalised(countInWords(other))} would leave ${percentInWords(otherShort)}.`;
}

export interface TapeSpan {
  fromSkeins: number;
  toSkeins: number;
}

/** The stretch of tape worth showing: where the need may lie, the mark, and half a skein around them. */
export function tapeSpan(meanSkeins: number, sdSkeins: number, skeins: number): TapeSpan {
  const reach = 3.3 * sdSkeins;
  return {
    fromSkeins: Math.max(0, Math.min(meanSkeins - reach, skeins) - 0.5),
    toSkeins: Math.max(meanSkeins + reach, skeins) + 0.5,
  };
}

/** Whole skeins to number on the tape, at most one every `minPx`. */
export function tapeNumbers(span: TapeSpan, pxPerSkein: number, minPx = 22): number[] {
  const steps = [1, 2, 5, 10, 20, 50, 100, 200, 500, 1000];
  const step = steps.find((size) => size * pxPerSkein >= minPx) ?? 5000;
  const first = Math.ceil(span.fromSkeins / step) * step;
  const count = Math.max(0, Math.floor((span.toSkeins - first) / step) + 1);
  return Array.from({ length: count }, (_, index) => first + index * step);
}

const BELL_POINTS = 80;

/** The normal density scaled to 1 at its top: points across four deviations, closed at both ends of the span. */
export function bellPoints(meanSkeins: number, sdSkeins: number, span: TapeSpan) {
  const points = Array.from({ length: BELL_POINTS + 1 }, (_, index) => {
    const z = -4 + (8 * index) / BELL_POINTS;
    return { skeins: meanSkeins + z * sdSkeins, height: Math.exp(-(z * z) / 2) };
  });
  const seen = points.filter(({ skeins }) => skeins > span.fromSkeins && skeins < span.toSkeins);
  const heightAt = (skeins: number) => Math.exp(-(((skeins - meanSkeins) / sdSkeins) ** 2) / 2);
  return [
    { skeins: span.fromSkeins, height: heightAt(span.fromSkeins) },
    ...seen,
    { skeins: span.toSkeins, height: heightAt(span.toSkeins) },
  ];
}
