import { useState } from 'react';
import { motifsFromYarn } from '../../../lib/colour/fromYarn';
import { withRule } from '../../../lib/colour/paintEdits';
import type { PlacementRule } from '../../../lib/colour/placement';
import { colourwayYarn } from '../../../lib/ledger/colourwayYarn';
import { YARN_UNIT } from '../../../lib/units/display';
import { Button } from '../../ui/Button';
import { Disclosure } from '../../ui/Disclosure';
import { NumberField } from '../../ui/NumberField';
import type { PlacementProps } from './placementProps';

/** As many of each colourway as the yarn in hand makes. */
export function FromYarn({
  plan,
  estimate,
  units,
  change,
  rule,
}: PlacementProps & { rule: PlacementRule & { by: 'random' } }) {
  const [inHandM, setInHandM] = useState<Readonly<Record<string, number>>>({});
  const { perMotifM, besidesM } = colourwayYarn(plan, estimate);
  const motifs = estimate.counts.motifs;
  const { counts, missing, short } = motifsFromYarn({
    perMotifM: perMotifM.map((metres, i) =>
      plan.colourways[i]?.motifIndex === plan.secondMotif ? { '': Infinity } : metres,
    ),
    besidesM,
    inHandM: { ...inHandM, '': 0 },
    motifs,
  });
  const nameOf = (key: string) => plan.colours.find((each) => each.key === key)?.name;
  const shortNames = short.flatMap((key) => nameOf(key) ?? []);
  return (
    <Disclosure summary="From the yarn in hand">
      <p className="text-sm text-ink-2">
        As many of each colourway as it makes, joins and border set aside. A colour left empty is
        not limited.
      </p>
      <div className="mt-2 grid grid-cols-2 gap-2">
        {plan.colours.map(({ key, name }) => (
          <NumberField
            key={key}
            label={name}
            unit={YARN_UNIT[units].word}
            optional
            min={0}
            max={100_000}
            value={inHandM[key] === undefined ? null : (inHandM[key] ?? 0) / YARN_UNIT[units].m}
            onCommit={(reading) => {
              if (!reading.ok) return;
              const { [key]: _, ...others } = inHandM;
              setInHandM(
                reading.value === null
                  ? others
                  : { ...others, [key]: reading.value * YARN_UNIT[units].m },
              );
            }}
          />
        ))}
      </div>
      <p className="mt-2 text-sm" role="status">
        {missing === 0
          ? `It makes all ${motifs}: ${counts.join(', ')}.`
          : `It makes ${motifs - missing} of ${motifs} motifs; ${shortNames.join(' and ')} ${shortNames.length === 1 ? 'is' : 'are'} used up first.`}
      </p>
      <Button
        small
        className="mt-2"
        disabled={missing > 0}
        onClick={() => change((old) => withRule(old, { ...rule, counts }))}
      >
        Place so many of each
      </Button>
    </Disclosure>
  );
}
