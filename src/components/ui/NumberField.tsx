import { useId, useState, type KeyboardEvent } from 'react';
import { describedBy, FieldShell, UnitSuffix, type FieldFrame } from './Field';
import { readNumber, stepNumber, type NumberLimits, type NumberReading } from './readNumber';

interface NumberFieldProps extends FieldFrame, NumberLimits {
  /** In the unit shown; null is an empty field. */
  value: number | null;
  /** Every keystroke that can be read, and every one that cannot. */
  onCommit: (reading: NumberReading) => void;
  step?: number;
  /** Decimals always shown, as for money, until the person types. */
  decimals?: number;
  id?: string;
  name?: string;
  disabled?: boolean;
}

const show = (value: number | null, decimals?: number) => {
  if (value === null) return '';
  return decimals === undefined ? String(Number(value.toPrecision(12))) : value.toFixed(decimals);
};

/**
 * A number as a person types it. Keeps every character until the number changes from outside
 * (an undo, another unit), so "12." or "abc" is never snatched away.
 */
export function NumberField(props: NumberFieldProps) {
  const { label, hint, error, labelHidden, className, value, onCommit, step = 1, ...rest } = props;
  const { decimals } = rest;
  const { min, max, whole, optional, unit, id: givenId, name, disabled } = rest;
  const limits: NumberLimits = { min, max, whole, optional, unit };
  const ownId = useId();
  const id = givenId ?? ownId;

  const [typed, setTyped] = useState(show(value, decimals));
  const [committed, setCommitted] = useState(value);
  const [touched, setTouched] = useState(false);
  if (value !== committed) {
    setCommitted(value);
    setTyped(show(value, decimals));
  }

  const reading = readNumber(typed, limits);
  const shownError = error ?? (touched && !reading.ok ? reading.error : undefined);

  function type(text: string) {
    const next = readNumber(text, limits);
    setTyped(text);
    setTouched(true);
    if (next.ok) setCommitted(next.value);
    onCommit(next);
  }

  function stepWithArrows(event: KeyboardEvent) {
    const direction = event.key === 'ArrowUp' ? 1 : event.key === 'ArrowDown' ? -1 : null;
    if (!direction || !reading.ok) return;
    event.preventDefault();
    type(show(stepNumber(reading.value ?? min ?? 0, direction, step, limits)));
  }

  return (
    <FieldShell {...{ id, label, hint, error: shownError, labelHidden, className }}>
      <div className="control">
        <input
          id={id}
          name={name}
          className="px-2.5 font-mono"
          inputMode={whole ? 'numeric' : 'decimal'}
          autoComplete="off"
          value={typed}
          disabled={disabled}
          onChange={(event) => type(event.target.value)}
          onKeyDown={stepWithArrows}
          aria-invalid={shownError ? true : undefined}
          aria-describedby={describedBy(id, hint, shownError)}
        />
        {unit && <UnitSuffix>{unit}</UnitSuffix>}
      </div>
    </FieldShell>
  );
}
