import { diffArrays } from 'diff';
import { classNames } from '../../ui/classNames';

interface TextChangesProps {
  before: string;
  after: string;
}

const SIGNS = {
  added: { word: 'added', sign: '+', look: 'bg-teal-soft' },
  removed: { word: 'taken out', sign: '−', look: 'bg-madder-soft' },
} as const;

/** What differs between two texts, line by line; lines that are the same are only counted. */
export function TextChanges({ before, after }: TextChangesProps) {
  const parts = diffArrays(before.split('\n'), after.split('\n'));
  if (parts.every(({ added, removed }) => !added && !removed))
    return <p className="text-ink-2">The text is the same.</p>;
  return (
    <ol className="grid gap-1 font-mono text-sm">
      {parts.map(({ added, removed, value, count }, i) => {
        const change = added ? SIGNS.added : removed ? SIGNS.removed : null;
        if (!change)
          return (
            <li key={i} className="font-sans text-ink-2">
              {count === 1 ? '1 line the same' : `${count} lines the same`}
            </li>
          );
        return (
          <li key={i} className={classNames('px-2 py-1 whitespace-pre-wrap', change.look)}>
            <span aria-hidden>{change.sign} </span>
            <span className="sr-only">{change.word}: </span>
            {value.join('\n')}
          </li>
        );
      })}
    </ol>
  );
}
