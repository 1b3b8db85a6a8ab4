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

/** Decimals of a figure that was typed in another unit: 150 mm are 5.91 in. */
const CONVERTED_DECIMALS = 2;

/** The last number that could be read, as it was typed. */
interface Typed {
  stored: number | null;
  shown: number | null;
  factor: number;
}

/**
 * A number of a form, shown in the person's unit and stored in the program's. What cannot be read
 * is NaN in the form, so that the form is refused; an empty field is null.
 */
export function NumberInput<Values extends FieldValues>(props: NumberInputProps<Values>) {
  const { control, name, factor = 1, ...rest } = props;
  const { field, fieldState } = useController({ control, name });
  const stored = field.value as number | null;
  const [typed, setTyped] = useState<Typed>({ stored, shown: inUnit(stored, factor), factor });
  const isUnreadable = Number.isNaN(stored);
  const isAsTyped = isUnreadable || (typed.stored === stored && typed.factor === factor);
  return (
    <NumberField
      {...rest}
      id={name}
      name={name}
      // Empty is refused by the form's schema, in the words of its field.
      optional
      value={isAsTyped ? typed.shown : inUnit(stored, factor)}
      error={isUnreadable ? undefined : fieldState.error?.message}
      onCommit={(reading) => {
        if (!reading.ok) return field.onChange(NaN);
        const next = reading.value === null ? null : reading.value * factor;
        setTyped({ stored: next, shown: reading.value, factor });
        field.onChange(next);
      }}
    />
  );
}

function inUnit(stored: number | null, factor: number): number | null {
  if (stored === null || factor === 1) return stored;
  return Number((stored / factor).toFixed(CONVERTED_DECIMALS));
}
