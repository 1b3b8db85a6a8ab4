import type { Estimate } from '../../lib/ledger/ledger';
import type { PresentedEstimate } from '../../schemas/estimate';

/** The library's own value: any other would lose a digit. */
export const presentEstimate = (estimate: Estimate): PresentedEstimate =>
  estimate as PresentedEstimate;
