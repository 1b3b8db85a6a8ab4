import type { PresentedMadeMotif } from '../../../schemas/madeMotif';
import { MadeMotifs } from '../made/MadeMotifs';
import type { ShownMotif } from '../pattern/PatternEditor';
import { JoinFits } from './JoinFits';

interface BelowMotifProps {
  shown: ShownMotif;
  motifKey: string;
  motifVersion: number | null;
  signedIn: boolean;
  made: PresentedMadeMotif[];
}

/** What follows the rounds of a motif that has an address: what those made of it measured, and its joins. */
export function BelowMotif({ shown, made, ...motif }: BelowMotifProps) {
  const { gaugeChoice, units, onPlan } = shown;
  return (
    <>
      {gaugeChoice && (
        <MadeMotifs
          {...motif}
          motif={shown.motif}
          gauge={shown.gauge}
          gaugeName={gaugeChoice.word}
          swatchId={gaugeChoice.swatch && gaugeChoice.key}
          category={gaugeChoice.category}
          initial={made}
          {...{ units, onPlan }}
        />
      )}
      <JoinFits {...shown} />
    </>
  );
}
