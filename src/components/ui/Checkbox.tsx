import { useId, type ComponentProps, type ReactNode } from 'react';
import { classNames } from './classNames';

interface CheckboxProps extends Omit<ComponentProps<'input'>, 'type'> {
  label: ReactNode;
  labelHidden?: boolean;
  hint?: ReactNode;
  /** Some of what it stands for is chosen, not all. */
  mixed?: boolean;
}

export function Checkbox({
  label,
  labelHidden,
  hint,
  mixed,
  className,
  ref,
  ...input
}: CheckboxProps) {
  const ownId = useId();
  const id = input.id ?? ownId;
  return (
    <div className={classNames('flex min-h-6 items-center gap-2.5 coarse:min-h-11', className)}>
      <input
        {...input}
        id={id}
        type="checkbox"
        ref={(element) => {
          // Only a property says "mixed"; there is no attribute for it.
          if (element) element.indeterminate = !!mixed;
          if (typeof ref === 'function') ref(element);
          else if (ref) ref.current = element;
        }}
        className="size-5 shrink-0"
        aria-describedby={hint ? `${id}-hint` : undefined}
      />
      <span className={labelHidden ? 'sr-only' : ''}>
        <label htmlFor={id}>{label}</label>
        {hint && (
          <span id={`${id}-hint`} className="block text-sm text-ink-2">
            {hint}
          </span>
        )}
      </span>
    </div>
  );
}
