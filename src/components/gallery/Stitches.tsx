import { OwnStitchesPanel } from '../islands/stitches/OwnStitchesPanel';
import { useOwnStitches } from '../islands/stitches/useOwnStitches';
import { WithQueries } from '../islands/WithQueries';
import { Section } from './Section';

/** The stitches of this device, and the form to write one. */
export function Stitches() {
  return (
    <Section title="Stitches of one’s own">
      <WithQueries>
        <DeviceStitches />
      </WithQueries>
    </Section>
  );
}

function DeviceStitches() {
  const { panelProps } = useOwnStitches({ signedIn: false, initial: [] });
  return (
    <OwnStitchesPanel {...panelProps} terms="us" usedAbbreviations={['lst']} onInsert={() => {}} />
  );
}
