import { RadioGroup } from 'radix-ui';
import type { ReactNode } from 'react';
import { MotifDrawing } from '../../blanket/MotifDrawing';
import { hexOf } from '../../../lib/plan/hexOf';
import { gaugeOf } from '../../../lib/gauge/gauge';
import type { Estimate } from '../../../lib/ledger/ledger';
import type { Motif } from '../../../lib/motifs/motif';
import { mainMotif, type Plan } from '../../../lib/plan/plan';
import { SegmentedControl } from '../../ui/SegmentedControl';
import { Select } from '../../ui/Select';
import { WoundCard } from '../../ui/WoundCard';
import { coloursInWords } from './motifInWords';
import type { Brush } from './PaintCanvas';

interface BrushFieldsProps {
  plan: Plan;
  estimate: Estimate;
  brush: Brush;
  onBrush: (brush: Brush) => void;
}

/** What to paint with: a colourway, or a colour for one round. */
export function BrushFields({ plan, estimate, brush, onBrush }: BrushFieldsProps) {
  const first = plan.colours[0]?.key ?? '';
  return (
    <section className="grid gap-3">
      <SegmentedControl
        className="justify-self-start"
        label="Paint with"
        value={brush.of}
        onChange={(of) =>
          onBrush(of === 'colourway' ? { of, colourway: 0 } : { of, round: 0, colour: first })
        }
        options={[
          { value: 'colourway', word: 'Whole motifs' },
          { value: 'round', word: 'One round' },
        ]}
      />
      {brush.of === 'colourway' ? (
        <Choices
          label="Colourway"
          value={String(brush.colourway)}
          onChange={(value) => onBrush({ of: 'colourway', colourway: Number(value) })}
          choices={plan.colourways.map((_, i) => ({
            value: String(i),
            words: `Colourway ${i + 1}: ${coloursInWords(plan, i)}`,
            picture: <ColourwayPicture {...{ plan, estimate }} index={i} />,
            caption: String(i + 1),
          }))}
        />
      ) : (
        <>
          <Select
            label="Round"
            value={String(brush.round)}
            onChange={({ target }) => onBrush({ ...brush, round: Number(target.value) })}
            options={mainMotif(plan).rounds.map(({ label }, i) => ({
              value: String(i),
              word: label,
            }))}
          />
          <Choices
            label="Colour"
            value={brush.colour}
            onChange={(colour) => onBrush({ ...brush, colour })}
            choices={plan.colours.map(({ key, name, hex }) => ({
              value: key,
              words: name,
              picture: <WoundCard colour={hex} weight={plan.yarn.weightCategory} size="sm" />,
              caption: name,
            }))}
          />
        </>
      )}
    </section>
  );
}

interface Choice {
  value: string;
  words: string;
  picture: ReactNode;
  caption: string;
}

function Choices({
  label,
  value,
  onChange,
  choices,
}: {
  label: string;
  value: string;
  onChange: (value: string) => void;
  choices: readonly Choice[];
}) {
  return (
    <RadioGroup.Root
      aria-label={label}
      value={value}
      onValueChange={onChange}
      className="flex max-h-24 flex-wrap gap-2 overflow-y-auto p-1 lg:max-h-64"
    >
      {choices.map(({ value: each, words, picture, caption }) => (
        <RadioGroup.Item
          key={each}
          value={each}
          aria-label={words}
          title={words}
          className="grid min-h-11 min-w-14 justify-items-center gap-0.5 rounded-control border border-line p-1.5 text-xs data-[state=checked]:border-teal data-[state=checked]:bg-teal-soft data-[state=checked]:font-bold"
        >
          {picture}
          <span>{caption}</span>
        </RadioGroup.Item>
      ))}
    </RadioGroup.Root>
  );
}

const PICTURE_PX = 44;

function ColourwayPicture({
  plan,
  estimate,
  index,
}: Pick<BrushFieldsProps, 'plan' | 'estimate'> & { index: number }) {
  const colourway = plan.colourways[index];
  const motifIndex = colourway?.motifIndex ?? 0;
  const acrossMm = estimate.motifs[motifIndex]?.acrossMm ?? 100;
  const reachMm = acrossMm * 0.62;
  return (
    <svg
      aria-hidden
      width={PICTURE_PX}
      height={PICTURE_PX}
      viewBox={`${-reachMm} ${-reachMm} ${2 * reachMm} ${2 * reachMm}`}
    >
      <MotifDrawing
        motif={plan.motifs[motifIndex] as Motif}
        gauge={gaugeOf(plan.swatch, plan.yarn.weightCategory)}
        acrossMm={acrossMm}
        roundHexes={colourway?.roundColours.map((key) => hexOf(plan, key)) ?? []}
      />
    </svg>
  );
}
