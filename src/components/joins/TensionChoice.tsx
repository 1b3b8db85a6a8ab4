import { Trash2 } from 'lucide-react';
import type { GaugeSwatch } from '../../lib/swatches/swatchRecord';
import { showFabric, type Units } from '../../lib/units/display';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Disclosure } from '../ui/Disclosure';
import { MOST_TENSIONS, OWN_TENSION, type Tension } from './tension';
import { TypedTension } from './TypedTension';

interface TensionChoiceProps {
  tensions: readonly Tension[];
  onChoose: (tensions: Tension[]) => void;
  /** Swatches kept in the account. */
  kept: readonly GaugeSwatch[];
  units: Units;
}

/** Whose hands the joins are compared for: the plan's own, kept swatches, and gauges typed in. */
export function TensionChoice({ tensions, onChoose, kept, units }: TensionChoiceProps) {
  const names = tensions.map(({ name }) => name).join(', ');
  const full = tensions.length >= MOST_TENSIONS;
  const without = (id: string) => tensions.filter((each) => each.id !== id);
  const others = tensions.filter(
    ({ id }) => id !== OWN_TENSION.id && !kept.some((swatch) => swatch.id === id),
  );
  return (
    <Disclosure summary={`Tension of: ${names}`}>
      <div className="grid gap-4">
        {kept.length > 0 && (
          <fieldset className="grid gap-2 sm:grid-cols-2">
            <legend className="label mb-1">Swatches you keep</legend>
            {kept.map(({ id, name, swatch }) => {
              const checked = tensions.some((each) => each.id === id);
              return (
                <Checkbox
                  key={id}
                  label={name}
                  hint={gaugeInWords(swatch, units)}
                  checked={checked}
                  disabled={full && !checked}
                  onChange={() =>
                    onChoose(checked ? without(id) : [...tensions, { id, name, swatch }])
                  }
                />
              );
            })}
          </fieldset>
        )}
        {others.length > 0 && (
          <ul className="grid gap-1">
            {others.map(({ id, name, swatch }) => (
              <li key={id} className="flex flex-wrap items-center gap-x-4">
                <span>
                  {name}
                  <span className="text-ink-2">{swatch && `: ${gaugeInWords(swatch, units)}`}</span>
                </span>
                <Button
                  kind="quiet"
                  small
                  icon={Trash2}
                  aria-label={`Remove ${name}`}
                  onClick={() => onChoose(without(id))}
                >
                  Remove
                </Button>
              </li>
            ))}
          </ul>
        )}
        {full ? (
          <p className="text-ink-2">{MOST_TENSIONS} at once is the most.</p>
        ) : (
          <TypedTension
            units={units}
            taken={tensions.map(({ name }) => name)}
            onAdd={(tension) => onChoose([...tensions, tension])}
          />
        )}
      </div>
    </Disclosure>
  );
}

const gaugeInWords = ({ stitches, widthMm }: { stitches: number; widthMm: number }, units: Units) =>
  `${stitches} stitches in ${showFabric(widthMm, units)}`;
