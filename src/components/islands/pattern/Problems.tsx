import {
  ArrowDown,
  CircleAlert,
  CircleCheck,
  Info,
  Plus,
  TriangleAlert,
  Wand,
  type LucideIcon,
} from 'lucide-react';
import type { Diagnostic, Fix, Severity } from '../../../lib/pattern/diagnostic';
import { Button } from '../../ui/Button';
import { useSettled } from '../../ui/useSettled';

interface ProblemsProps {
  id: string;
  problems: readonly Diagnostic[];
  onGo: (problem: Diagnostic) => void;
  /** To the first problem after the cursor, or round to the first of all. */
  onNext: () => void;
  /** None where the text is only looked at. */
  onFix: ((fix: Fix) => void) | null;
  /** Takes a word that is not understood for a stitch of the person's own. */
  onAddStitch?: (problem: Diagnostic) => void;
}

const LOOKS: Readonly<Record<Severity, { icon: LucideIcon; word: string; ink: string }>> = {
  error: { icon: CircleAlert, word: 'Error', ink: 'text-madder' },
  warning: { icon: TriangleAlert, word: 'Check', ink: 'text-amber-ink' },
  note: { icon: Info, word: 'Note', ink: 'text-teal' },
};

/** Everything there is to say about the text, in its order; none hidden behind the first. */
export function Problems({ id, problems, onGo, onNext, onFix, onAddStitch }: ProblemsProps) {
  const words = problemsInWords(problems);
  const settled = useSettled(words);
  return (
    <section aria-labelledby={id} className="not-printed mt-4">
      <div className="flex flex-wrap items-center justify-between gap-2">
        <h2 id={id} className="flex items-center gap-2">
          {problems.every(({ severity }) => severity === 'note') && (
            <CircleCheck size={18} aria-hidden className="text-teal" />
          )}
          {words}
        </h2>
        {problems.length > 1 && (
          <Button
            small
            kind="quiet"
            icon={ArrowDown}
            aria-keyshortcuts="F8"
            onClick={() => onNext()}
          >
            Next problem <kbd className="max-sm:hidden">F8</kbd>
          </Button>
        )}
      </div>
      <p role="status" className="sr-only">
        {settled}
      </p>
      {problems.length > 0 && (
        <ol className="mt-2 lg:max-h-112 lg:overflow-y-auto" tabIndex={0} aria-labelledby={id}>
          {problems.map((problem) => (
            <Problem
              key={`${problem.code} ${problem.begin} ${problem.end}`}
              {...{ problem, onGo, onFix, onAddStitch }}
            />
          ))}
        </ol>
      )}
    </section>
  );
}

type ProblemProps = Omit<ProblemsProps, 'id' | 'problems' | 'onNext'> & { problem: Diagnostic };

function Problem({ problem, onGo, onFix, onAddStitch }: ProblemProps) {
  const { severity, line, column, message, fix } = problem;
  const { icon: Icon, word, ink } = LOOKS[severity];
  return (
    <li className="grid grid-cols-[1.5rem_1fr] border-t border-line py-2">
      <Icon size={18} aria-hidden className={`mt-0.5 ${ink}`} />
      <div>
        <p>
          <b className={ink}>{word}</b>{' '}
          <button
            type="button"
            className="link min-h-6 font-normal coarse:min-h-11"
            onClick={() => onGo(problem)}
          >
            line {line}, column {column}
          </button>
          : {message}
        </p>
        <div className="mt-1.5 flex flex-wrap gap-2 empty:hidden">
          {fix && onFix && (
            <Button small icon={Wand} onClick={() => onFix(fix)}>
              {fix.label}
            </Button>
          )}
          {onAddStitch && problem.code === 'unknown-word' && (
            <Button small icon={Plus} onClick={() => onAddStitch(problem)}>
              Add it as a stitch of your own
            </Button>
          )}
        </div>
      </div>
    </li>
  );
}

/** "2 errors, 1 to check", "Reads without a problem" */
export function problemsInWords(problems: readonly Diagnostic[]): string {
  const count = (wanted: Severity) => problems.filter(({ severity }) => severity === wanted).length;
  const [errors, warnings, notes] = [count('error'), count('warning'), count('note')];
  const parts = [
    errors > 0 && `${errors} ${errors === 1 ? 'error' : 'errors'}`,
    warnings > 0 && `${warnings} to check`,
    notes > 0 && `${notes} ${notes === 1 ? 'note' : 'notes'}`,
  ].filter(Boolean);
  if (errors + warnings > 0) return parts.join(', ');
  return notes > 0 ? `Reads well, ${parts.join('')}` : 'Reads without a problem';
}

/** The problem after (or, going back, before) a place of the text; past the last comes the first. */
export function nextProblem(
  problems: readonly Diagnostic[],
  offset: number,
  back: boolean,
): Diagnostic | undefined {
  return back
    ? (problems.findLast(({ begin }) => begin < offset) ?? problems.at(-1))
    : (problems.find(({ begin }) => begin > offset) ?? problems[0]);
}
