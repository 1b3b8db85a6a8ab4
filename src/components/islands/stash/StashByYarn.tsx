import { Pencil, Plus } from 'lucide-react';
import { showMass, showYarn, type Units } from '../../../lib/units/display';
import type { PresentedLot } from '../../../schemas/stash';
import type { PresentedYarn } from '../../../schemas/yarn';
import { Button } from '../../ui/Button';
import { WoundCard } from '../../ui/WoundCard';
import { amountWords, lotName, weightWords } from './stashWords';

interface StashByYarnProps {
  yarns: readonly PresentedYarn[];
  lots: readonly PresentedLot[];
  units: Units;
  onLot: (lot: PresentedLot) => void;
  onYarn: (yarn: PresentedYarn) => void;
  onAdd: (yarnId: string) => void;
}

/** The stash as it lies there: each yarn with a wound card for every dye lot. */
export function StashByYarn({ yarns, lots, ...rest }: StashByYarnProps) {
  return (
    <ul className="divide-y divide-line border-t border-line">
      {yarns.map((yarn) => (
        <YarnGroup
          key={yarn.id}
          yarn={yarn}
          lots={lots.filter((lot) => lot.yarn.id === yarn.id)}
          {...rest}
        />
      ))}
    </ul>
  );
}

interface YarnGroupProps extends Omit<StashByYarnProps, 'yarns'> {
  yarn: PresentedYarn;
}

function YarnGroup({ yarn, lots, units, onLot, onYarn, onAdd }: YarnGroupProps) {
  const totalM = lots.reduce((sum, lot) => sum + lot.totalM, 0);
  const { putUp } = yarn;
  return (
    <li className="grid gap-x-10 gap-y-4 py-6 lg:grid-cols-[17rem_minmax(0,1fr)]">
      <div>
        <h2>{yarn.name}</h2>
        <p className="text-ink-2">
          {yarn.maker && <>{yarn.maker} · </>}
          {weightWords(yarn.weightCategory)}
          <br />
          {showMass(putUp.massG, 'metric')} holds {showYarn(putUp.lengthM, units)}
        </p>
        <p className="mt-2 text-xl font-bold tabular-nums">{showYarn(totalM, units)}</p>
        <div className="-ms-2 mt-1 flex flex-wrap">
          <Button kind="quiet" icon={Plus} onClick={() => onAdd(yarn.id)}>
            Add a lot
          </Button>
          <Button kind="quiet" icon={Pencil} onClick={() => onYarn(yarn)}>
            Edit yarn
          </Button>
        </div>
      </div>
      {lots.length === 0 ? (
        <p className="self-center text-ink-2">Nothing of it in the stash.</p>
      ) : (
        <ul className="-m-2 flex flex-wrap content-start gap-x-2 gap-y-1">
          {lots.map((lot) => (
            <li key={lot.id}>
              <LotCard lot={lot} units={units} onOpen={() => onLot(lot)} />
            </li>
          ))}
        </ul>
      )}
    </li>
  );
}

function LotCard({ lot, units, onOpen }: { lot: PresentedLot; units: Units; onOpen: () => void }) {
  const { colourway, yarn, lotCode, location } = lot;
  return (
    <button
      type="button"
      onClick={onOpen}
      aria-label={`${lotName(lot)}: ${amountWords(lot)}, ${showYarn(lot.totalM, units)}. Edit`}
      className="flex w-34 flex-col items-center rounded-control p-2 text-center hover:bg-sunk"
    >
      <WoundCard
        colour={colourway.hex}
        weight={yarn.weightCategory}
        size="lg"
        name={colourway.name}
        lot={lotCode || undefined}
        amount={showYarn(lot.totalM, units)}
      />
      <span className="text-sm text-ink-2">{amountWords(lot)}</span>
      {location && <span className="text-sm text-ink-2">{location}</span>}
    </button>
  );
}
