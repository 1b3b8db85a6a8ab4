import type { Terms } from '../../../lib/pattern/reading';
import { Disclosure } from '../../ui/Disclosure';
import { OwnStitchesPanel } from '../stitches/OwnStitchesPanel';
import type { useOwnStitches } from '../stitches/useOwnStitches';

interface StitchesSectionProps {
  own: ReturnType<typeof useOwnStitches>;
  terms: Terms;
  onInsert: (abbreviation: string) => void;
}

/** The stitches of the person's own, beside the text that may use them. */
export function StitchesSection({ own, terms, onInsert }: StitchesSectionProps) {
  const count = own.stitches.length;
  return (
    <Disclosure
      className="not-printed mt-5"
      summary={count === 0 ? 'Stitches of your own' : `Stitches of your own: ${count}`}
    >
      <OwnStitchesPanel {...own.panelProps} {...{ terms, onInsert }} />
    </Disclosure>
  );
}
