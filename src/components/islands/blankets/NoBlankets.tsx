import type { ReactNode } from 'react';
import { blanketFace } from '../../../lib/plan/blanketFace';
import { EXAMPLE_PLAN } from '../../../lib/plan/examplePlan';
import { BlanketThumb } from '../../blankets/BlanketThumb';
import { EmptyState } from '../../ui/EmptyState';

export function NoBlankets({ action }: { action: ReactNode }) {
  return (
    <EmptyState
      drawing={<BlanketDrawing />}
      action={action}
      example={
        <a className="link" href="/">
          Look at the example
        </a>
      }
    >
      A blanket is a plan that saves itself: motif, colours, size, join and border, with the yarn it
      takes and how sure that is.
    </EmptyState>
  );
}

/** The example in small. */
export function BlanketDrawing() {
  return (
    <BlanketThumb
      face={blanketFace(EXAMPLE_PLAN)}
      rows={10}
      columns={8}
      widthMm={1180}
      heightMm={1470}
      pxPerMm={0.14}
    />
  );
}
