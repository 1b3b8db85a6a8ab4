import { RadioGroup } from 'radix-ui';
import { classNames } from './classNames';

interface SegmentedControlProps<Value extends string> {
  label: string;
  options: readonly { value: Value; word: string }[];
  value: Value;
  onChange: (value: Value) => void;
  disabled?: boolean;
  /** The choices are figures or units: set in the mono face. */
  figures?: boolean;
  className?: string;
}

/** One of a few choices, all in sight: a radio group, so arrows move and the choice follows. */
export function SegmentedControl<Value extends string>(props: SegmentedControlProps<Value>) {
  const { label, options, value, onChange, disabled, figures, className } = props;
  return (
    <RadioGroup.Root
      aria-label={label}
      orientation="horizontal"
      value={value}
      onValueChange={(next) => onChange(next as Value)}
      disabled={disabled}
      className={classNames('segments', figures && 'figures', className)}
    >
      {options.map((option) => (
        <RadioGroup.Item key={option.value} value={option.value} className="segment">
          {option.word}
        </RadioGroup.Item>
      ))}
    </RadioGroup.Root>
  );
}
