import { useEffect, useState } from 'react';
import type { SwatchFigures } from '../../../lib/swatches/swatchFigures';
import type { YarnChoice } from '../../../lib/swatches/swatchRecord';
import type { PresentedSwatch } from '../../../schemas/swatch';

/** Figures by the save they were worked out from; null of a swatch without a size. */
export type FiguresBySave = Readonly<Record<string, SwatchFigures | null>>;

export const saveKey = ({ id, version }: Pick<PresentedSwatch, 'id' | 'version'>): string =>
  `${id} ${version}`;

/**
 * Figures of the swatches in a list. The page brings those it was drawn with; what changed since
 * is worked out here, with code that is fetched only then.
 */
export function useSwatchFigures(
  swatches: readonly PresentedSwatch[],
  yarns: readonly YarnChoice[],
  known: FiguresBySave,
): FiguresBySave {
  const [figures, setFigures] = useState(known);
  useEffect(() => {
    const unknown = swatches.filter((swatch) => figures[saveKey(swatch)] === undefined);
    if (unknown.length === 0) return;
    let isCurrent = true;
    import('../../../lib/swatches/swatchFigures').then(
      ({ swatchFigures }) => {
        if (!isCurrent) return;
        const worked = unknown.map((swatch) => {
          const yarn = yarns.find(({ id }) => id === swatch.yarnId) ?? null;
          return [saveKey(swatch), swatchFigures({ ...swatch, yarn })] as const;
        });
        setFigures((old) => ({ ...old, ...Object.fromEntries(worked) }));
      },
      // Without a connection the figures stay away; the list stands without them.
      () => undefined,
    );
    return () => {
      isCurrent = false;
    };
  }, [swatches, yarns, figures]);
  return figures;
}
