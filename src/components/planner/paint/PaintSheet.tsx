import { Lock, LockOpen, Minus, Plus, Redo2, Undo2 } from 'lucide-react';
import { useState } from 'react';
import { withoutPaint, withPainted } from '../../../lib/colour/paintEdits';
import type { Estimate } from '../../../lib/ledger/ledger';
import { blanketFaces } from '../../../lib/plan/blanketFaces';
import type { Plan } from '../../../lib/plan/plan';
import type { Units } from '../../../lib/units/display';
import { PLAN_LIMITS } from '../../../schemas/limits';
import { Button } from '../../ui/Button';
import { Checkbox } from '../../ui/Checkbox';
import { Sheet } from '../../ui/Dialog';
import { Notice } from '../../ui/Notice';
import { SegmentedControl } from '../../ui/SegmentedControl';
import type { PlanEditing } from '../usePlan';
import { BrushFields } from './BrushFields';
import { ContrastList } from './ContrastList';
import { PaintCanvas, type Brush, type Tool } from './PaintCanvas';
import { PlacementFields } from './PlacementFields';

interface PaintSheetProps {
  plan: Plan;
  estimate: Estimate;
  units: Units;
  editing: PlanEditing;
  onClose: () => void;
}

const ZOOMS = [1, 1.5, 2.5, 4, 6] as const;

/** Which colourway lies where: painted by hand, or placed by a rule. */
export default function PaintSheet({ plan, estimate, units, editing, onClose }: PaintSheetProps) {
  const { change, undo, redo, canUndo, canRedo } = editing;
  const [tool, setTool] = useState<Tool>('paint');
  const [picked, setBrush] = useState<Brush>({ of: 'colourway', colourway: 0 });
  const [zoom, setZoom] = useState(0);
  const [grey, setGrey] = useState(false);
  const laid = blanketFaces(plan, estimate);
  const brush = stillThere(plan, picked);
  const painted = plan.placement.painted.length > 0;
  const tooMany = plan.placement.painted.length > PLAN_LIMITS.paintedRuns;

  function pick(motif: number) {
    const colourway = laid.motifs[motif]?.colourway ?? 0;
    const colour = plan.colourways[colourway]?.roundColours[brush.of === 'round' ? brush.round : 0];
    setBrush(
      brush.of === 'round' && colour ? { ...brush, colour } : { of: 'colourway', colourway },
    );
    setTool('paint');
  }

  return (
    <Sheet
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title="Which colours lie where"
      description="Paint motifs or single rounds, or let a rule place them. What you paint stays, whatever the rule."
    >
      <div className="grid grid-cols-[minmax(0,1fr)] gap-5 pb-5 lg:grid-cols-[minmax(0,1fr)_19rem] lg:grid-rows-[auto_1fr]">
        <div className="grid min-w-0 content-start gap-3 max-lg:order-2 lg:row-span-2">
          <div className="flex flex-wrap items-center gap-x-3 gap-y-2">
            <SegmentedControl
              label="Tool"
              value={tool}
              onChange={setTool}
              options={[
                { value: 'paint', word: 'Paint' },
                { value: 'fill', word: 'Fill' },
                { value: 'pick', word: 'Pick' },
                { value: 'move', word: 'Move' },
              ]}
            />
            <span className="flex">
              <Button kind="quiet" small icon={Undo2} onClick={undo} disabled={!canUndo}>
                Undo
              </Button>
              <Button kind="quiet" small icon={Redo2} onClick={redo} disabled={!canRedo}>
                Redo
              </Button>
              <Button
                kind="quiet"
                small
                icon={Minus}
                onClick={() => setZoom(zoom - 1)}
                disabled={zoom === 0}
              >
                Farther
              </Button>
              <Button
                kind="quiet"
                small
                icon={Plus}
                onClick={() => setZoom(zoom + 1)}
                disabled={zoom === ZOOMS.length - 1}
              >
                Closer
              </Button>
            </span>
            <Checkbox
              label="In grey"
              checked={grey}
              onChange={({ target }) => setGrey(target.checked)}
            />
          </div>
          <PaintCanvas
            {...{ plan, estimate, change, tool, brush, grey }}
            onPick={pick}
            zoom={ZOOMS[zoom] ?? 1}
          />
          {tooMany && (
            <Notice kind="problem" live>
              So many single motifs cannot be kept. Undo, or paint in longer runs.
            </Notice>
          )}
          <Counts plan={plan} estimate={estimate} />
          <ContrastList plan={plan} laid={laid} />
        </div>
        <div className="max-lg:order-1">
          <BrushFields {...{ plan, estimate, brush }} onBrush={setBrush} />
        </div>
        <div className="grid content-start gap-6 max-lg:order-3">
          <PlacementFields {...{ plan, estimate, units, change }} />
          <div className="flex flex-wrap gap-2">
            <Button
              small
              icon={Lock}
              onClick={() => change((old) => withPainted(old, laid.motifs))}
            >
              Lock all as they lie
            </Button>
            <Button
              small
              kind="quiet"
              icon={LockOpen}
              disabled={!painted}
              onClick={() => change(withoutPaint)}
            >
              Unlock all
            </Button>
          </div>
        </div>
      </div>
    </Sheet>
  );
}

/** The brush as far as the plan still has what it holds. */
function stillThere(plan: Plan, brush: Brush): Brush {
  if (brush.of === 'colourway') {
    return { of: 'colourway', colourway: Math.min(brush.colourway, plan.colourways.length - 1) };
  }
  const known = plan.colours.some(({ key }) => key === brush.colour);
  return known ? brush : { ...brush, colour: plan.colours[0]?.key ?? '' };
}

function Counts({ plan, estimate }: { plan: Plan; estimate: Estimate }) {
  const parts = estimate.counts.halves + estimate.counts.quarters;
  return (
    <p className="text-sm text-ink-2">
      {plan.colourways
        .map((_, i) => `Colourway ${i + 1}: ${estimate.colourwayMotifs[i] ?? 0}`)
        .join(' · ')}
      {parts > 0 && ' · half motifs at the edge besides'}
    </p>
  );
}
