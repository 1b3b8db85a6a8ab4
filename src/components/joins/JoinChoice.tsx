import { READY_JOINS } from '../../lib/joins/readyJoins';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Disclosure } from '../ui/Disclosure';

interface JoinChoiceProps {
  chosen: readonly string[];
  onChoose: (keys: string[]) => void;
}

/** Which joins are compared. */
export function JoinChoice({ chosen, onChoose }: JoinChoiceProps) {
  const all = READY_JOINS.map(({ key }) => key);
  return (
    <Disclosure summary={`Joins compared: ${chosen.length} of ${all.length}`}>
      <fieldset>
        <legend className="sr-only">Joins compared</legend>
        <div className="grid gap-x-6 gap-y-2 sm:grid-cols-2 lg:grid-cols-3">
          {READY_JOINS.map(({ key, name }) => (
            <Checkbox
              key={key}
              label={name}
              checked={chosen.includes(key)}
              onChange={({ target }) =>
                onChoose(
                  all.filter((each) => (each === key ? target.checked : chosen.includes(each))),
                )
              }
            />
          ))}
        </div>
      </fieldset>
      <Button
        kind="quiet"
        small
        className="-ms-3 mt-2"
        onClick={() => onChoose(chosen.length === all.length ? [] : all)}
      >
        {chosen.length === all.length ? 'Clear all' : 'Choose all'}
      </Button>
    </Disclosure>
  );
}
