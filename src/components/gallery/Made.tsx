import { gaugeOf } from '../../lib/gauge/gauge';
import { readyMotif } from '../../lib/motifs/readyMotifs';
import type { Units } from '../../lib/units/display';
import { MadeMotifs } from '../islands/made/MadeMotifs';
import { WithQueries } from '../islands/WithQueries';
import { Section } from './Section';

const motif = readyMotif('group-square', 4);

/** What was made of a motif, kept on this device, and the form to measure one. */
export function Made({ units }: { units: Units }) {
  return (
    <Section title="Made motifs">
      <WithQueries>
        {motif && (
          <MadeMotifs
            motif={motif}
            motifKey="group-square"
            motifVersion={null}
            gauge={gaugeOf(null, 4)}
            gaugeName="4 Medium yarn"
            swatchId={null}
            category={4}
            signedIn={false}
            initial={[]}
            units={units}
            onPlan={() => {}}
          />
        )}
      </WithQueries>
    </Section>
  );
}
