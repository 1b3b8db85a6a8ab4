import { ChevronDown } from 'lucide-react';
import { useId, type ComponentProps } from 'react';
import { describedBy, FieldShell, type FieldFrame } from './Field';

export interface SelectOption {
  value: string;
  word: string;
  disabled?: boolean;
  /** Heading that it stands under, together with its neighbours of the same group. */
  group?: string;
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
          {inGroups(options).map(({ group, members }) =>
            group === undefined ? (
              members.map(optionOf)
            ) : (
              <optgroup key={group} label={group}>
                {members.map(optionOf)}
              </optgroup>
            ),
          )}
        </select>
        <ChevronDown size={16} aria-hidden className="pointer-events-none absolute right-2.5" />
      </div>
    </FieldShell>
  );
}

const optionOf = ({ value, word, disabled }: SelectOption) => (
  <option key={value} value={value} disabled={disabled}>
    {word}
  </option>
);

function inGroups(options: readonly SelectOption[]) {
  const groups: { group: string | undefined; members: SelectOption[] }[] = [];
  for (const option of options) {
    const last = groups.at(-1);
    if (last && last.group === option.group) last.members.push(option);
    else groups.push({ group: option.group, members: [option] });
  }
  return groups;
}
