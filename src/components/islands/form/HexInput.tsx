import { useController, useFormContext } from 'react-hook-form';
import { describedBy, FieldShell } from '../../ui/Field';

interface HexInputProps {
  name: string;
  label: string;
  className?: string;
}

const HEX = /^#[0-9a-f]{6}$/i;

/** A colour: picked by eye, or typed as its six digits. */
export function HexInput({ name, label, className }: HexInputProps) {
  const { control } = useFormContext();
  const { field, fieldState } = useController({ control, name });
  const typed = field.value as string;
  const error = fieldState.error?.message;
  return (
    <FieldShell id={name} label={label} error={error} className={className}>
      <div className="control gap-2 ps-1.5">
        <input
          type="color"
          aria-label={`${label}, picked by eye`}
          className="keeps-colour h-7 max-w-9 shrink-0"
          value={HEX.test(typed) ? typed : '#888888'}
          onChange={(event) => field.onChange(event.target.value)}
        />
        <input
          id={name}
          className="pe-2 font-mono"
          autoComplete="off"
          spellCheck={false}
          value={typed}
          onChange={(event) => field.onChange(event.target.value)}
          onBlur={field.onBlur}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(name, undefined, error)}
        />
      </div>
    </FieldShell>
  );
}
