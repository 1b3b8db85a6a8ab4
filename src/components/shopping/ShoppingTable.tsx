import type { ShoppingLine, ShoppingList } from '../../lib/shopping/shoppingList';
import type { WeightCategory } from '../../lib/plan/plan';
import { showMass, showPrice, showYarn, type Units } from '../../lib/units/display';
import { classNames } from '../ui/classNames';
import { WoundCard } from '../ui/WoundCard';

interface ShoppingTableProps {
  list: ShoppingList;
  weight: WeightCategory;
  units: Units;
  /** Without a stash the column "have" says nothing. */
  hasStash: boolean;
}

/** What to buy, a line for each colour, with its sum. */
export function ShoppingTable({ list, weight, units, hasStash }: ShoppingTableProps) {
  const { lines, currency, costMinor, toBuySkeins } = list;
  const used = lines.filter(({ neededM }) => neededM > 0);
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Shopping list</caption>
      <thead className="text-sm text-ink-2">
        <tr>
          <Heading start>Colour</Heading>
          <Heading>needed</Heading>
          {hasStash && <Heading>have</Heading>}
          <Heading>to buy</Heading>
          {currency && <Heading wide>price</Heading>}
        </tr>
      </thead>
      <tbody>
        {used.map((line) => (
          <tr key={line.colour} className="border-t border-line">
            <th scope="row" className="py-2 text-start font-normal">
              <WoundCard colour={line.hex} weight={weight} size="sm" name={line.name} beside />
            </th>
            <Quantity lengthM={line.neededM} massG={line.neededG} units={units} />
            {hasStash && <Quantity lengthM={line.haveM} massG={line.haveG} units={units} />}
            <ToBuy line={line} price={priceOf(line.costMinor, currency)} />
            {currency && (
              <td className="figures ps-3 text-end max-sm:hidden">
                {priceOf(line.costMinor, currency)}
              </td>
            )}
          </tr>
        ))}
      </tbody>
      <tfoot>
        <tr className="border-t-2 border-ink font-bold">
          <th scope="row" className="py-2 text-start" colSpan={hasStash ? 3 : 2}>
            In all
          </th>
          <td className="ps-3 text-end text-lg tabular-nums">
            {toBuySkeins}
            <span className="figures block text-sm sm:hidden">{priceOf(costMinor, currency)}</span>
          </td>
          {currency && (
            <td className="figures ps-3 text-end max-sm:hidden">{priceOf(costMinor, currency)}</td>
          )}
        </tr>
      </tfoot>
    </table>
  );
}

const priceOf = (costMinor: number | null, currency: string | null): string =>
  costMinor === null || currency === null ? '' : showPrice(costMinor, currency);

interface HeadingProps {
  children: string;
  start?: boolean;
  /** Only where there is room; on a phone the price stands under the skeins. */
  wide?: boolean;
}

function Heading({ children, start, wide }: HeadingProps) {
  return (
    <th
      scope="col"
      className={classNames(
        'pb-1 font-normal',
        start ? 'text-start' : 'ps-3 text-end',
        wide && 'max-sm:hidden',
      )}
    >
      {children}
    </th>
  );
}

function Quantity({ lengthM, massG, units }: { lengthM: number; massG: number; units: Units }) {
  return (
    <td className="figures ps-3 text-end">
      <span className="block">{showYarn(lengthM, units)}</span>
      <span className="block text-sm text-ink-2">{showMass(massG, units)}</span>
    </td>
  );
}

function ToBuy({ line, price }: { line: ShoppingLine; price: string }) {
  return (
    <td className="ps-3 text-end">
      <span className="block text-lg font-bold tabular-nums">{line.toBuySkeins}</span>
      <span className="figures block text-sm sm:hidden">{price}</span>
      <span className="block text-sm text-ink-2">
        {line.toBuySkeins === 0
          ? 'enough in hand'
          : line.mixesLots
            ? 'mixes dye lots'
            : 'one dye lot'}
      </span>
    </td>
  );
}
