import type { Blanket, BlanketRevision } from '../../../db/models';
import type {
  BlanketSummary,
  PresentedBlanket,
  PresentedRevision,
  RevisionWithPlan,
} from '../../schemas/blanket';
import { blanketFigures } from './blanketFigures';

export function presentBlanket(row: Blanket): PresentedBlanket {
  return { ...presentFields(row), plan: row.plan };
}

export function presentBlanketSummary(row: Blanket): BlanketSummary {
  const { plan } = row;
  return {
    ...presentFields(row),
    yarnName: plan.yarn.name,
    confidence: plan.confidence,
    currency: plan.yarn.price?.currency ?? null,
    colours: plan.colours.map(({ key, name, hex }) => ({ key, name, hex })),
    figures: blanketFigures(row),
  };
}

function presentFields(row: Blanket) {
  return {
    id: row.id,
    version: row.version,
    title: row.title,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
    deletedAt: row.deletedAt?.toISOString() ?? null,
  };
}

export function presentRevision(row: BlanketRevision, currentVersion: number): PresentedRevision {
  return {
    version: row.version,
    title: row.title,
    savedAt: row.savedAt.toISOString(),
    isCurrent: row.version === currentVersion,
  };
}

export function presentRevisionWithPlan(
  row: BlanketRevision,
  currentVersion: number,
): RevisionWithPlan {
  return { ...presentRevision(row, currentVersion), plan: row.plan };
}
