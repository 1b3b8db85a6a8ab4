import type { Units } from '../../../lib/units/display';
import type { PresentedLot } from '../../../schemas/stash';
import type { Terms } from '../../planner/stitchWord';
import type { Money, PresentedColourway, PresentedYarn } from '../../../schemas/yarn';
import { AddLotSheet } from './AddLotSheet';
import { ColourSheet } from './ColourSheet';
import { LotSheet } from './LotSheet';
import { blankEntry, EXAMPLE_ENTRY } from './stashForm';
import { YarnSheet } from './YarnSheet';

export type OpenSheet =
  | { is: 'add'; yarnId?: string }
  | { is: 'example' }
  | { is: 'lot'; lot: PresentedLot }
  | { is: 'yarn'; yarn: PresentedYarn }
  | { is: 'colour'; yarn: PresentedYarn; colour: PresentedColourway };

interface StashSheetsProps {
  sheet: OpenSheet | null;
  setSheet: (sheet: OpenSheet | null) => void;
  yarns: readonly PresentedYarn[];
  units: Units;
  terms: Terms;
  currency: Money['currency'];
  onChange: () => void;
  onDelete: (lot: PresentedLot) => void;
}

/** Whatever is open beside the page. */
export function StashSheets(props: StashSheetsProps) {
  const { sheet, setSheet, yarns, units, terms, currency, onChange, onDelete } = props;
  const shared = { units, currency, onChange, onClose: () => setSheet(null) };
  switch (sheet?.is) {
    case undefined:
      return null;
    case 'add':
      return (
        <AddLotSheet {...shared} {...{ yarns, terms }} initial={blankEntry(yarns, sheet.yarnId)} />
      );
    case 'example':
      return <AddLotSheet {...shared} {...{ yarns, terms }} initial={EXAMPLE_ENTRY} />;
    case 'yarn':
      return <YarnSheet {...shared} terms={terms} yarn={sheet.yarn} />;
    case 'colour':
      return <ColourSheet {...shared} yarn={sheet.yarn} colour={sheet.colour} />;
    case 'lot': {
      const { lot } = sheet;
      const yarn = yarns.find(({ id }) => id === lot.yarn.id);
      const colour = yarn?.colourways.find(({ id }) => id === lot.colourway.id);
      return (
        <LotSheet
          {...shared}
          lot={lot}
          onEditColour={() => yarn && colour && setSheet({ is: 'colour', yarn, colour })}
          onDelete={() => {
            onDelete(lot);
            setSheet(null);
          }}
        />
      );
    }
  }
}
