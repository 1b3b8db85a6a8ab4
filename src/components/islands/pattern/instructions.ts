import type { Reading } from '../../../lib/pattern/reading';
import type { Span } from '../../../lib/pattern/span';
import type { StitchAddress } from '../../chart/SymbolChart';

/** Every stretch of the text that makes stitches, once. */
export function instructionSpans({ rounds, ring }: Reading): Span[] {
  const spans = new Map<string, Span>();
  if (ring.span) spans.set('ring', ring.span);
  for (const { stitches } of rounds)
    for (const { span } of stitches) spans.set(`${span.begin} ${span.end}`, span);
  return [...spans.values()];
}

/** The stitches that the innermost instruction at this place of the text makes. */
export function stitchesAt({ rounds, ring }: Reading, offset: number): StitchAddress[] {
  let best = Infinity;
  let found: StitchAddress[] = [];
  const covers = ({ begin, end }: Span): boolean => begin <= offset && offset <= end;
  rounds.forEach(({ stitches, span: line }, round) => {
    if (!covers(line)) return;
    stitches.forEach(({ span }, stitch) => {
      const length = span.end - span.begin;
      if (!covers(span) || length > best) return;
      if (length < best) found = [];
      best = length;
      found.push({ round, stitch });
    });
  });
  if (found.length > 0 || !ring.span || !covers(ring.span)) return found;
  const count = Object.values(ring.made).reduce((sum, each) => sum + each, 0);
  return Array.from({ length: count }, (_, stitch) => ({ round: -1, stitch }));
}

/** Every stitch of a round. */
export const stitchesOfRound = ({ rounds }: Reading, round: number): StitchAddress[] =>
  rounds[round]?.stitches.map((_, stitch) => ({ round, stitch })) ?? [];
