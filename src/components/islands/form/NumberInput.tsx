import { useState } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { NumberField } from '../../ui/NumberField';
import type { NumberLimits } from '../../ui/readNumber';

interface NumberInputProps<Values extends FieldValues> extends Omit<NumberLimits, 'min' | 'max'> {
  control: Control<Values>;
  name: FieldPath<Values>;
  label: string;
  hint?: string;
  labelHidden?: boolean;
  step?: number;
  className?: string;
  /** How many of the stored unit one of the shown unit is: 10 for mm shown in cm. */
  factor?: number;
}

/** Digits that a typed figure keeps through its conversion and back. */
const DIGITS = 5;

/**
 * A number of a form, shown in the person's unit and stored in the program's. What cannot be read
 * is NaN in the form, so that the form is refused; an empty field is null.
 */
export function NumberInput<Values extends FieldValues>(props: NumberInputProps<Values>) {
  const { control, name, factor = 1, ...rest } = props;
  const { field, fieldState } = useController({ control, name });
  const stored = field.value as number | null;
  // While the text cannot be read, the field is told of the last number that could.
  const [readable, setReadable] = useState(stored);
  const isUnreadable = Number.isNaN(stored);
  const value = isUnreadable ? readable : stored;
  return (
    <NumberField
      {...rest}
      id={name}
      name={name}
      // Empty is refused by the form's schema, in the words of its field.
      optional
      value={
        value === null ? null : Number((value / factor).toPrecision(factor === 1 ? 12 : DIGITS))
      }
      error={isUnreadable ? undefined : fieldState.error?.message}
      onCommit={(reading) => {
        const next = reading.ok ? reading.value && reading.value * factor : NaN;
        if (reading.ok) setReadable(next);
        field.onChange(next);
      }}
    />
  );
}
