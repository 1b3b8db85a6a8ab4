import { Plus } from 'lucide-react';
import { useDeferredValue, useMemo, useState } from 'react';
import type { Edging } from '../../../lib/border/edging';
import { readEdging, type EdgingReading } from '../../../lib/border/readEdging';
import { PLAN_LIMITS } from '../../../schemas/limits';
import { Button } from '../../ui/Button';
import { Disclosure } from '../../ui/Disclosure';
import { Field, TextArea } from '../../ui/Field';
import { codeWord, type Terms } from '../stitchWord';

interface TypedEdgingProps {
  terms: Terms;
  onAdd: (edging: Edging) => void;
}

/** A round of border typed as pattern text, read as it is typed. */
export function TypedEdging({ terms, onAdd }: TypedEdgingProps) {
  const [name, setName] = useState('');
  const [text, setText] = useState('');
  const settled = useDeferredValue(text);
  const reading = useMemo(() => readEdging(settled, { terms }), [settled, terms]);
  const { edging } = reading;

  function add() {
    if (!edging) return;
    onAdd({ name: name.trim() || 'Own edging', ...edging });
    setName('');
    setText('');
  }

  return (
    <Disclosure summary="Type an edging of your own">
      <div className="grid gap-3">
        <Field
          label="Name"
          value={name}
          maxLength={PLAN_LIMITS.nameLength}
          onChange={({ target }) => setName(target.value)}
        />
        <TextArea
          label={`One round, in ${terms === 'us' ? 'US' : 'UK'} terms`}
          mono
          value={text}
          maxLength={PLAN_LIMITS.edgingLength}
          onChange={({ target }) => setText(target.value)}
        />
        <div role="status">
          {settled.trim() !== '' && (
            <Read {...{ reading, terms, text: settled }} onText={setText} />
          )}
        </div>
        <Button
          className="justify-self-start"
          icon={Plus}
          disabled={!edging || settled !== text}
          onClick={add}
        >
          Add it as the outermost round
        </Button>
      </div>
    </Disclosure>
  );
}

interface ReadProps {
  reading: EdgingReading;
  terms: Terms;
  text: string;
  onText: (text: string) => void;
}

/** What the reader makes of it: its repeat, or what is wrong. */
function Read({ reading: { edging, problem, problems }, terms, text, onText }: ReadProps) {
  if (edging) {
    const { least, multipleOf } = edging.over;
    const besides = least % multipleOf;
    const made = Object.entries(edging.made.perRepeat);
    return (
      <p>
        {multipleOf === 1 ? 'Any number of stitches' : `A multiple of ${multipleOf} stitches`}
        {besides > 0 && ` and ${besides}`}; in each repeat{' '}
        {made.map(([code, count]) => `${count} ${codeWord(code, terms)}`).join(', ')}.
      </p>
    );
  }
  return (
    <>
      <p className="text-madder">{problem}</p>
      <ul className="mt-1 grid gap-1">
        {problems.map(({ message, fix }) => (
          <li key={message} className="flex flex-wrap items-center gap-x-3">
            {message}
            {fix && (
              <Button
                small
                onClick={() =>
                  onText(text.slice(0, fix.begin) + fix.replacement + text.slice(fix.end))
                }
              >
                {fix.label}
              </Button>
            )}
          </li>
        ))}
      </ul>
    </>
  );
}
