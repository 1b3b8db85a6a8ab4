import type { Diagnostic, Severity } from '../../../lib/pattern/diagnostic';
import type { Span } from '../../../lib/pattern/span';

/** A stretch of one line of the text that is drawn alike. */
export interface TextPiece extends Span {
  readonly severity: Severity | null;
  readonly isLit: boolean;
}

const RANK: Readonly<Record<Severity, number>> = { note: 1, warning: 2, error: 3 };

/**
 * The text cut into lines, and each line into pieces at every boundary of a problem, a lit stretch or
 * an instruction. Where problems lie over one another the gravest shows.
 */
export function textPieces(
  text: string,
  problems: readonly Diagnostic[],
  lit: Span | null,
  instructions: readonly Span[],
): TextPiece[][] {
  const cuts = new Set<number>();
  for (const { begin, end } of [...problems, ...instructions, ...(lit ? [lit] : [])]) {
    cuts.add(begin);
    cuts.add(end);
  }
  const sorted = [...cuts].sort((a, b) => a - b);
  const byBegin = [...problems].sort((a, b) => a.begin - b.begin);
  let at = 0;
  let from = 0;
  return text.split('\n').map((line) => {
    const [begin, end] = [from, from + line.length];
    from = end + 1;
    const pieces: TextPiece[] = [];
    let last = begin;
    while ((sorted[at] ?? Infinity) <= begin) at += 1;
    while ((sorted[at] ?? Infinity) < end) {
      pieces.push(piece(last, sorted[at] as number));
      last = sorted[at] as number;
      at += 1;
    }
    if (end > last) pieces.push(piece(last, end));
    return pieces;
  });

  function piece(begin: number, end: number): TextPiece {
    let severity: Severity | null = null;
    for (const problem of byBegin) {
      if (problem.begin > begin) break;
      const covers =
        problem.end >= end || (problem.begin === problem.end && problem.begin === begin);
      if (covers && RANK[problem.severity] > (severity ? RANK[severity] : 0))
        severity = problem.severity;
    }
    return { begin, end, severity, isLit: lit !== null && lit.begin <= begin && lit.end >= end };
  }
}
