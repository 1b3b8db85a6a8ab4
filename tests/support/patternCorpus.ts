import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { MotifSides, ReadOptions, Severity } from '../../src/lib';

/** A round as the corpus expects it: the counts that a hand would write down. */
export interface ExpectedRound {
  label: string;
  made: Record<string, number>;
  tally: Record<string, number>;
  spaces: Record<string, number>;
  perSide: number;
}

/** A problem as the corpus expects it: the words it is about, and some of what it says. */
export interface ExpectedDiagnostic {
  code: string;
  severity: Severity;
  at: string;
  says: string;
}

export interface CorpusCase {
  name: string;
  options: ReadOptions;
  text: string;
  rounds: ExpectedRound[];
  diagnostics: ExpectedDiagnostic[];
}

const folder = join(import.meta.dirname, '../lib/pattern/corpus');

/** The motif texts of `right` or `wrong`, each with its counts derived by hand in its comment. */
export function corpus(kind: 'right' | 'wrong'): CorpusCase[] {
  return readdirSync(join(folder, kind))
    .sort()
    .map((name) => parsed(name, readFileSync(join(folder, kind, name), 'utf8')));
}

function parsed(name: string, file: string): CorpusCase {
  const [before = '', rest = ''] = file.split('--- text\n');
  const [text = '', expected = ''] = rest.split('\n--- expected\n');
  const [, terms, sides, , size] = /^(us|uk) terms, (\d) sides(, size (\d))?$/m.exec(before) ?? [];
  const lines = (word: string): unknown[] =>
    expected
      .split('\n')
      .filter((line) => line.startsWith(`${word} `))
      .map((line): unknown => JSON.parse(line.slice(word.length)));
  return {
    name: name.replace(/^\d+-|\.txt$/g, ''),
    options: {
      terms: terms as 'us' | 'uk',
      sides: Number(sides) as MotifSides,
      ...(size !== undefined && { size: Number(size) }),
    },
    text,
    rounds: lines('round') as ExpectedRound[],
    diagnostics: lines('diagnostic') as ExpectedDiagnostic[],
  };
}
