import { CircleAlert } from 'lucide-react';
import { useId, type ComponentProps, type ReactNode } from 'react';
import { classNames } from './classNames';

/** What every field has, whatever is typed or chosen in it. */
export interface FieldFrame {
  label: ReactNode;
  hint?: ReactNode;
  /** In words, with what would be right. Shown beside the field and read out with it. */
  error?: string | undefined;
  /** Keeps the label for screen readers only, where the column heading already says it. */
  labelHidden?: boolean;
  className?: string;
}

interface FieldShellProps extends FieldFrame {
  id: string;
  children: ReactNode;
}

/** Ids of the hint and the error, for `aria-describedby`. */
export function describedBy(id: string, hint: ReactNode, error?: string): string | undefined {
  const ids = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean);
  return ids.length > 0 ? ids.join(' ') : undefined;
}

export function FieldShell({
  id,
  label,
  hint,
  error,
  labelHidden,
  className,
  children,
}: FieldShellProps) {
  return (
    <div className={classNames('min-w-0', className)}>
      <label htmlFor={id} className={labelHidden ? 'sr-only' : 'label mb-1'}>
        {label}
      </label>
      {children}
      {hint && (
        <p id={`${id}-hint`} className="mt-1 text-sm text-ink-2">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="mt-1 flex gap-1.5 text-sm text-madder">
          <CircleAlert size={15} aria-hidden className="mt-px shrink-0" />
          {error}
        </p>
      )}
    </div>
  );
}

interface FieldProps extends FieldFrame, Omit<ComponentProps<'input'>, 'className'> {
  /** Shown inside the box after what is typed. */
  unit?: string;
}

/** A line of text. Spread a form library's registration over it. */
export function Field({ label, hint, error, labelHidden, className, unit, ...input }: FieldProps) {
  const ownId = useId();
  const id = input.id ?? ownId;
  return (
    <FieldShell {...{ id, label, hint, error, labelHidden, className }}>
      <div className="control">
        <input
          {...input}
          id={id}
          className="px-2.5"
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, hint, error)}
        />
        {unit && <UnitSuffix>{unit}</UnitSuffix>}
      </div>
    </FieldShell>
  );
}

interface TextAreaProps extends FieldFrame, Omit<ComponentProps<'textarea'>, 'className'> {
  /** For pattern text, where columns matter. */
  mono?: boolean;
}

export function TextArea({
  label,
  hint,
  error,
  labelHidden,
  className,
  mono,
  ...area
}: TextAreaProps) {
  const ownId = useId();
  const id = area.id ?? ownId;
  return (
    <FieldShell {...{ id, label, hint, error, labelHidden, className }}>
      <textarea
        rows={4}
        {...area}
        id={id}
        className={classNames('control', mono && 'font-mono')}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, hint, error)}
      />
    </FieldShell>
  );
}

export function UnitSuffix({ children }: { children: ReactNode }) {
  return <span className="shrink-0 pe-2.5 text-sm text-ink-2">{children}</span>;
}
