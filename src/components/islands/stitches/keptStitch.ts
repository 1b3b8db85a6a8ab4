import type { OwnStitch } from '../../../lib/stitches/ownStitch';

/** A stitch of the person's own as it is kept: in the account, or on this device. */
export interface KeptStitch extends OwnStitch {
  /** On a device, its abbreviation. */
  readonly id: string;
  readonly version: number;
}

/** The stitch alone, as a pattern and a motif take it. */
export function stitchContent(kept: KeptStitch): OwnStitch {
  const { abbreviation, name, moves, heightOverWidth, takes, symbol } = kept;
  return { abbreviation, name, moves, heightOverWidth, takes, symbol };
}
