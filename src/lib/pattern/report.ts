import type { Diagnostic, DiagnosticCode, Fix, Severity } from './diagnostic';
import { PATTERN_LIMITS } from './limits';
import { positionFinder } from './position';
import type { Span } from './span';

/** Collects what there is to say about a text: each thing once, in the order of the text. */
export class Report {
  private readonly said = new Map<string, Diagnostic>();
  private readonly positionOf: ReturnType<typeof positionFinder>;

  constructor(text: string) {
    this.positionOf = positionFinder(text);
  }

  say(severity: Severity, code: DiagnosticCode, span: Span, message: string, fix?: Fix): void {
    const key = `${code} ${span.begin} ${span.end}`;
    if (this.said.has(key) || this.said.size >= PATTERN_LIMITS.diagnostics) return;
    const { begin, end } = span;
    this.said.set(key, {
      code,
      severity,
      begin,
      end,
      ...this.positionOf(begin),
      message,
      ...(fix && { fix }),
    });
  }

  /** Whether anything with this code has been said of this stretch. */
  has(code: DiagnosticCode, span: Span): boolean {
    return this.said.has(`${code} ${span.begin} ${span.end}`);
  }

  diagnostics(): Diagnostic[] {
    return [...this.said.values()].sort((a, b) => a.begin - b.begin || a.end - b.end);
  }
}
