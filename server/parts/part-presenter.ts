import type { PartRecord, PartSummary } from '../../shared/contracts/part';
import { resistanceCurve } from '../../simulation';
import type { ScenarioRow } from '../scenarios/scenario-entity';
import type { PartRow } from './part-entity';

export const presentPart = (row: PartRow): PartSummary => ({
  id: row.id,
  revision: row.revision,
  approvedBy: row.approvedBy?.name ?? null,
  part: row.document,
});

export const presentPartRecord = (row: PartRow, usedIn: readonly ScenarioRow[]): PartRecord => ({
  ...presentPart(row),
  curve: resistanceCurve(row.document),
  provenance: row.provenance,
  usedIn: usedIn.map(({ id, name, verdict }) => ({ id, name, status: verdict?.status ?? null })),
});
