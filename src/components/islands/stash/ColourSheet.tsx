import { colourContent, updateColourway } from '../../../client/queries/yarns';
import { colourFormSchema, type ColourForm } from '../../../schemas/stashEntry';
import type { PresentedColourway, PresentedYarn } from '../../../schemas/yarn';
import { differencesOf } from '../form/differences';
import { useVersionedForm } from '../form/useVersionedForm';
import { ColourFields } from './ColourFields';
import { EditSheet } from './EditSheet';
import { colourWording } from './stashWords';

interface ColourSheetProps {
  yarn: PresentedYarn;
  colour: PresentedColourway;
  onChange: () => void;
  onClose: () => void;
}

const valuesOf = (colour: PresentedColourway): ColourForm => ({ colour: colourContent(colour) });

/** The name and the drawn colour of a colourway, for all its lots. */
export function ColourSheet({ yarn, colour, onChange, onClose }: ColourSheetProps) {
  const editing = useVersionedForm<ColourForm, PresentedColourway>({
    schema: colourFormSchema,
    initial: colour,
    blank: valuesOf(colour),
    valuesOf,
    prefix: 'colour',
    save: (values, from) => updateColourway(from ?? colour, values.colour),
    onSaved: () => {
      onChange();
      onClose();
    },
  });
  const { conflict } = editing;
  return (
    <EditSheet
      title={`${yarn.name}, ${colour.name}`}
      description="Changes every lot of this colour."
      what="colour"
      editing={editing}
      differences={
        conflict &&
        differencesOf(conflict.yours.colour, colourContent(conflict.theirs), colourWording)
      }
      onClose={onClose}
    >
      <ColourFields weight={yarn.weightCategory} />
    </EditSheet>
  );
}
