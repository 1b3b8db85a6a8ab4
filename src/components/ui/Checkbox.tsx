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
  const id = useId();
  return (
    // The label is the whole box, so that the finger need not find the square.
    <label
      className={classNames(
        'flex min-h-6 items-center gap-2.5 coarse:min-h-11',
        labelHidden && 'min-w-6 justify-center coarse:min-w-11',
        className,
      )}
    >
      <input
        {...input}
        type="checkbox"
        ref={(element) => {
          // Only a property says "mixed"; there is no attribute for it.
          if (element) element.indeterminate = !!mixed;
          if (typeof ref === 'function') ref(element);
          else if (ref) ref.current = element;
        }}
        className="checkbox"
        aria-labelledby={`${id}-label`}
        aria-describedby={hint ? `${id}-hint` : undefined}
      />
      <span className={labelHidden ? 'sr-only' : ''}>
        <span id={`${id}-label`}>{label}</span>
        {hint && (
          <span id={`${id}-hint`} className="block text-sm text-ink-2">
            {hint}
          </span>
        )}
      </span>
    </label>
  );
}
