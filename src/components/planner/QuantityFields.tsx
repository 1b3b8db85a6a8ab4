import { FABRIC_UNIT, YARN_UNIT, type Units } from '../../lib/units/display';
import { lengthM, widthMm, type LengthM, type WidthMm } from '../../lib/units/quantities';
import { NumberField } from '../ui/NumberField';

interface FabricFieldProps {
  label: string;
  hint?: string;
  valueMm: number | null;
  units: Units;
  maxMm: number;
  optional?: boolean;
  onChange: (value: WidthMm | null) => void;
}

/** A dimension of fabric, typed in cm or inches. */
export function FabricField({ valueMm, units, maxMm, onChange, ...field }: FabricFieldProps) {
  const { word, mm } = FABRIC_UNIT[units];
  return (
    <NumberField
      {...field}
      unit={word}
      min={0.1}
      max={Math.floor(maxMm / mm)}
      step={units === 'metric' ? 0.5 : 0.25}
      value={valueMm === null ? null : Number((valueMm / mm).toFixed(2))}
      onCommit={(reading) =>
        reading.ok && onChange(reading.value === null ? null : widthMm(reading.value * mm))
      }
    />
  );
}

interface YarnLengthFieldProps {
  label: string;
  valueM: number;
  units: Units;
  maxM: number;
  onChange: (value: LengthM) => void;
}

/** A length of yarn, typed in metres or yards. */
export function YarnLengthField({ valueM, units, maxM, onChange, label }: YarnLengthFieldProps) {
  const { word, m } = YARN_UNIT[units];
  return (
    <NumberField
      label={label}
      unit={word}
      min={1}
      max={Math.floor(maxM / m)}
      step={5}
      value={Number((valueM / m).toFixed(1))}
      onCommit={(reading) =>
        reading.ok && reading.value !== null && onChange(lengthM(reading.value * m))
      }
    />
  );
}
