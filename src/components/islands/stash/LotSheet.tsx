import { Palette, Trash2 } from 'lucide-react';
import { lotContent, updateLot } from '../../../client/queries/stash';
import type { Units } from '../../../lib/units/display';
import { showMass, showYarn } from '../../../lib/units/display';
import type { PresentedLot } from '../../../schemas/stash';
import { lotFormSchema, type LotForm } from '../../../schemas/stashEntry';
import type { Money } from '../../../schemas/yarn';
import { Button } from '../../ui/Button';
import { WoundCard } from '../../ui/WoundCard';
import { differencesOf } from '../form/differences';
import { useVersionedForm } from '../form/useVersionedForm';
import { EditSheet } from './EditSheet';
import { LotFields } from './LotFields';
import { lotWording } from './stashWords';

interface LotSheetProps {
  lot: PresentedLot;
  units: Units;
  currency: Money['currency'];
  onChange: () => void;
  onEditColour: () => void;
  onDelete: () => void;
  onClose: () => void;
}

const valuesOf = (lot: PresentedLot): LotForm => ({ lot: lotContent(lot) });

/** A dye lot one has: counted, weighed, moved, or used up. */
export function LotSheet(props: LotSheetProps) {
  const { lot, units, currency, onChange, onEditColour, onDelete, onClose } = props;
  const { yarn, colourway } = lot;
  const editing = useVersionedForm<LotForm, PresentedLot>({
    schema: lotFormSchema,
    initial: lot,
    blank: valuesOf(lot),
    valuesOf,
    prefix: 'lot',
    save: (values, from) => updateLot(from ?? lot, values.lot),
    onSaved: () => {
      onChange();
      onClose();
    },
  });
  const { conflict } = editing;
  return (
    <EditSheet
      title={`${yarn.name}, ${colourway.name}`}
      description={`A skein is ${showMass(yarn.putUp.massG, 'metric')}, ${showYarn(yarn.putUp.lengthM, units)}.`}
      what="dye lot"
      editing={editing}
      differences={
        conflict && differencesOf(conflict.yours.lot, lotContent(conflict.theirs), lotWording)
      }
      more={
        <Button kind="quiet" icon={Trash2} className="text-madder" onClick={onDelete}>
          Take out of the stash
        </Button>
      }
      onClose={onClose}
    >
      <div className="flex items-center gap-4">
        <WoundCard colour={colourway.hex} weight={yarn.weightCategory} size="lg" />
        <Button icon={Palette} onClick={onEditColour}>
          Name and colour
        </Button>
      </div>
      <LotFields skein={yarn.putUp} {...{ units, currency }} />
    </EditSheet>
  );
}
