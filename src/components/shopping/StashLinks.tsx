import { showMass, showYarn, type Units } from '../../lib/units/display';
import type { BlanketShopping } from '../../schemas/shoppingList';
import { Select } from '../ui/Select';

/** A colourway of the person's stash, to choose. */
export interface StashChoice {
  id: string;
  name: string;
  yarnName: string;
}

interface StashLinksProps {
  shopping: BlanketShopping;
  colourways: readonly StashChoice[];
  units: Units;
  busy: boolean;
  /** "by name", "none" or the id of a colourway. */
  onLink: (colour: string, choice: string) => void;
}

type Line = BlanketShopping['lines'][number];

/** Which of the stash serves which colour, and the lots that were counted. */
export function StashLinks({ shopping, colourways, units, busy, onLink }: StashLinksProps) {
  if (colourways.length === 0) {
    return (
      <p className="text-ink-2" data-chrome>
        Your stash is empty.{' '}
        <a className="link" href="/stash">
          Put in what you have
        </a>{' '}
        and the list takes it off.
      </p>
    );
  }
  const options = [
    { value: 'by name', word: 'whatever has its name' },
    { value: 'none', word: 'nothing from the stash' },
    ...colourways.map(({ id, name, yarnName }) => ({ value: id, word: `${name} · ${yarnName}` })),
  ];
  return (
    <section data-chrome>
      <h2>From the stash</h2>
      <ul className="mt-2 grid gap-4">
        {shopping.lines
          .filter(({ neededM }) => neededM > 0)
          .map((line) => (
            <li
              key={line.colour}
              className="grid gap-x-4 gap-y-1 border-t border-line pt-3 sm:grid-cols-2"
            >
              <Select
                label={`${line.name} is served by`}
                value={choiceOf(line)}
                disabled={busy}
                options={options}
                onChange={(event) => onLink(line.colour, event.target.value)}
              />
              <p className="self-end text-sm text-ink-2">{lotsInWords(line, units)}</p>
            </li>
          ))}
      </ul>
    </section>
  );
}

const choiceOf = ({ stash }: Line): string => {
  if (stash.match === 'linked' && stash.colourway) return stash.colourway.id;
  return stash.match === 'kept out' ? 'none' : 'by name';
};

function lotsInWords({ stash }: Line, units: Units): string {
  if (stash.match === 'kept out') return 'Kept out of the stash.';
  if (!stash.colourway) return 'Nothing in the stash has this name and weight.';
  const { name, yarnName } = stash.colourway;
  const differs = stash.weightDiffers ? ' It is of another weight than the plan’s yarn.' : '';
  if (stash.lots.length === 0) return `${name}, ${yarnName}: none left.${differs}`;
  const lots = stash.lots.map(
    ({ lotCode, totalM, totalG }) =>
      `lot ${lotCode}: ${showYarn(totalM, units)} (${showMass(totalG, units)})`,
  );
  return `${name}, ${yarnName}: ${lots.join('; ')}.${differs}`;
}
