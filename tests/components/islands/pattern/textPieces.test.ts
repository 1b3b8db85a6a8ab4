import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { textPieces } from '../../../../src/components/islands/pattern/textPieces';
import type { Diagnostic } from '../../../../src/lib';

const problem = (begin: number, end: number, severity: Diagnostic['severity']): Diagnostic => ({
  ...{ begin, end, severity, code: 'unknown-word', line: 1, column: 1, message: '' },
});

describe('textPieces', () => {
  it('cuts a line where a problem begins and ends, and shows the gravest of several', () => {
    const [line] = textPieces(
      'ch 3, dcc',
      [problem(0, 9, 'note'), problem(6, 9, 'error')],
      null,
      [],
    );
    expect(line).toEqual([
      { begin: 0, end: 6, severity: 'note', isLit: false },
      { begin: 6, end: 9, severity: 'error', isLit: false },
    ]);
  });

  it('lights a stretch across lines', () => {
    const lines = textPieces('a b\nc d', [], { begin: 2, end: 5 }, []);
    expect(lines.flat().filter(({ isLit }) => isLit)).toEqual([
      { begin: 2, end: 3, severity: null, isLit: true },
      { begin: 4, end: 5, severity: null, isLit: true },
    ]);
  });

  it('loses no character, whatever lies over the text', () => {
    const spans = fc.array(fc.tuple(fc.nat(60), fc.nat(60)), { maxLength: 12 });
    fc.assert(
      fc.property(
        fc.string({ unit: fc.constantFrom('a', ' ', '\n'), maxLength: 50 }),
        spans,
        (text, all) => {
          const problems = all.map(([a, b]) => problem(Math.min(a, b), Math.max(a, b), 'warning'));
          const lines = textPieces(text, problems, null, []);
          const put = lines.map((pieces) =>
            pieces.map(({ begin, end }) => text.slice(begin, end)).join(''),
          );
          expect(put.join('\n')).toBe(text);
        },
      ),
      { seed: 3 },
    );
  });
});
