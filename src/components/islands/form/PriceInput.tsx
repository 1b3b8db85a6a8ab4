import { useState } from 'react';
import { useController, useFormContext } from 'react-hook-form';
import { currencyDecimals } from '../../../lib/units/display';
import type { Money } from '../../../schemas/yarn';
import { NumberField } from '../../ui/NumberField';

interface PriceInputProps {
  name: string;
  label: string;
  hint?: string;
  /** Of a price not given yet. */
  currency: Money['currency'];
  className?: string;
}

/** An amount of money of a form, typed in its currency's decimals; empty is none. */
export function PriceInput({ name, currency, ...frame }: PriceInputProps) {
  const { control } = useFormContext();
  const { field, fieldState } = useController({ control, name });
  const stored = field.value as Money | null;
  const code = stored?.currency ?? currency;
  const decimals = currencyDecimals(code);
  const minor = 10 ** decimals;
  const isUnreadable = stored !== null && Number.isNaN(stored.priceMinor);
  const [readable, setReadable] = useState(stored);
  const shown = isUnreadable ? readable : stored;
  const error = fieldState.error as
    { priceMinor?: { message?: string }; message?: string } | undefined;
  return (
    <NumberField
      {...frame}
      id={`${name}.priceMinor`}
      unit={code}
      optional
      step={0.5}
      decimals={decimals}
      value={shown && shown.priceMinor / minor}
      error={isUnreadable ? undefined : (error?.priceMinor?.message ?? error?.message)}
      onCommit={(reading) => {
        if (!reading.ok) return field.onChange({ priceMinor: NaN, currency: code });
        const next =
          reading.value === null
            ? null
            : { priceMinor: Math.round(reading.value * minor), currency: code };
        setReadable(next);
        field.onChange(next);
      }}
    />
  );
}
