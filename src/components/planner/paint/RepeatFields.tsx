import { useState } from 'react';
import { withoutPaint, withRule } from '../../../lib/colour/paintEdits';
import { SLOT_FACTS } from '../../../lib/layout/face';
import { blanketFaces } from '../../../lib/plan/blanketFaces';
import type { Plan } from '../../../lib/plan/plan';
import { PLAN_LIMITS } from '../../../schemas/limits';
import { Button } from '../../ui/Button';
import { NumberField } from '../../ui/NumberField';
import type { PlacementProps } from './placementProps';

/** A repeat is painted, not typed: the top left corner of what is shown is taken for it. */
export function RepeatFields({ plan, estimate, change }: Omit<PlacementProps, 'units'>) {
  const [columns, setColumns] = useState(3);
  const [rows, setRows] = useState(3);
  const field = (label: string, value: number, set: (value: number) => void) => (
    <NumberField
      label={label}
      whole
      min={1}
      max={PLAN_LIMITS.tileSide}
      value={value}
      onCommit={(reading) => reading.ok && reading.value !== null && set(reading.value)}
    />
  );
  return (
    <div className="grid grid-cols-2 gap-2">
      {field('Motifs across', columns, setColumns)}
      {field('down', rows, setRows)}
      <Button
        className="col-span-2"
        onClick={() =>
          change((old) =>
            withRule(withoutPaint(old), {
              by: 'repeat',
              tile: cornerOf(plan, estimate, rows, columns),
            }),
          )
        }
      >
        Repeat the top left corner
      </Button>
      <p className="col-span-2 text-sm text-ink-2">Paint one repeat there first.</p>
    </div>
  );
}

function cornerOf(
  plan: Plan,
  estimate: PlacementProps['estimate'],
  rows: number,
  columns: number,
): number[][] {
  const tile = Array.from({ length: rows }, () => Array.from({ length: columns }, () => 0));
  for (const { face, colourway } of blanketFaces(plan, estimate).motifs) {
    const row = SLOT_FACTS[face.slot].second ? undefined : tile[face.row];
    if (row && face.column < columns) row[face.column] = colourway;
  }
  return tile;
}
