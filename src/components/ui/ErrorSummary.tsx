import { useEffect, useRef } from 'react';
import { capitalised, countInWords } from './inWords';
import { Notice } from './Notice';

export interface FieldError {
  /** Id of the field's input. */
  field: string;
  message: string;
}

interface ErrorSummaryProps {
  errors: readonly FieldError[];
  /** Changes with every attempt to send, so that the cursor moves each time. */
  attempt: number;
}

/** After a refused form: every error with a link to its field, and the cursor on the first one. */
export function ErrorSummary({ errors, attempt }: ErrorSummaryProps) {
  const first = useRef<string | undefined>(undefined);
  first.current = errors[0]?.field;
  useEffect(() => {
    if (attempt > 0 && first.current) document.getElementById(first.current)?.focus();
  }, [attempt]);

  if (errors.length === 0) return null;
  const title = `${capitalised(countInWords(errors.length))} ${errors.length === 1 ? 'thing' : 'things'} to put right`;
  return (
    <Notice kind="problem" title={title} live>
      <ul className="space-y-0.5">
        {errors.map(({ field, message }) => (
          <li key={field}>
            <a
              className="link inline-flex items-center text-madder coarse:min-h-11"
              href={`#${field}`}
              onClick={(event) => {
                event.preventDefault();
                document.getElementById(field)?.focus();
              }}
            >
              {message}
            </a>
          </li>
        ))}
      </ul>
    </Notice>
  );
}
