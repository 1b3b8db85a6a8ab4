import { ChevronDown } from 'lucide-react';
import { useId, type ComponentProps } from 'react';
import { describedBy, FieldShell, type FieldFrame } from './Field';

export interface SelectOption {
  value: string;
  word: string;
  disabled?: boolean;
}

interface SelectProps extends FieldFrame, Omit<ComponentProps<'select'>, 'className' | 'children'> {
  options: readonly SelectOption[];
}

/** The system's own list, in our box: it is what a phone and a screen reader handle best. */
export function Select({
  label,
  hint,
  error,
  labelHidden,
  className,
  options,
  ...select
}: SelectProps) {
  const ownId = useId();
  const id = select.id ?? ownId;
  return (
    <FieldShell {...{ id, label, hint, error, labelHidden, className }}>
      <div className="control relative">
        <select
          {...select}
          id={id}
          className="appearance-none truncate ps-2.5 pe-8"
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, hint, error)}
        >
          {options.map(({ value, word, disabled }) => (
            <option key={value} value={value} disabled={disabled}>
              {word}
            </option>
          ))}
        </select>
        <ChevronDown size={16} aria-hidden className="pointer-events-none absolute right-2.5" />
      </div>
    </FieldShell>
  );
}
