import type { GaugeSwatch } from '../../../lib/swatches/swatchRecord';
import type { Units } from '../../../lib/units/display';
import type { PresentedMadeMotif } from '../../../schemas/madeMotif';
import type { PresentedMotif, PresentedMotifVersion } from '../../../schemas/motif';
import type { PresentedOwnStitch } from '../../../schemas/ownStitch';
import type { Terms } from '../../planner/stitchWord';
import { WithQueries } from '../WithQueries';
import { OwnMotif } from './OwnMotif';
import { ReadyMotif } from './ReadyMotif';

export interface MotifPageProps {
  presented: PresentedMotif;
  /** Saves of a motif of one's own, newest first. */
  versions: PresentedMotifVersion[];
  stitches: PresentedOwnStitch[];
  /** Motifs that the person made of it and measured. */
  made: PresentedMadeMotif[];
  signedIn: boolean;
  swatches: GaugeSwatch[];
  units: Units;
  terms: Terms;
}

/** A motif: its pattern beside its chart, its rounds, and the joins that fit it. */
export function MotifPage(props: MotifPageProps) {
  return (
    <WithQueries>
      {props.presented.readyMade ? <ReadyMotif {...props} /> : <OwnMotif {...props} />}
    </WithQueries>
  );
}
