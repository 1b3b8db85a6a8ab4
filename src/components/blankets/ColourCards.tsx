import { WoundCard } from '../ui/WoundCard';
import { classNames } from '../ui/classNames';

interface ColourCardsProps {
  colours: readonly { key: string; name: string; hex: string }[];
  className?: string;
}

/** Most cards side by side before the rest is a number. */
const MOST_CARDS = 6;

/** The colours of a blanket as a row of small cards, each named for whoever cannot see it. */
export function ColourCards({ colours, className }: ColourCardsProps) {
  const more = colours.length - MOST_CARDS;
  return (
    <ul className={classNames('flex flex-wrap items-center gap-1.5', className)}>
      {colours.slice(0, MOST_CARDS).map(({ key, name, hex }) => (
        <li key={key} title={name}>
          <WoundCard colour={hex} weight={4} size="sm" label={name} />
        </li>
      ))}
      {more > 0 && <li className="text-sm text-ink-2">and {more} more</li>}
    </ul>
  );
}
