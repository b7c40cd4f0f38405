import type { PartRecord, PartSummary, ResistanceCurve } from '../../shared/contracts/part';
import { resistanceAt25, resistanceCurve } from '../../simulation';
import type { ScenarioRow } from '../scenarios/scenario-entity';
import type { PartRow } from './part-entity';

export const presentPart = (row: PartRow): PartSummary => ({
  id: row.id,
  revision: row.revision,
  approvedBy: row.approvedBy?.name ?? null,
  part: row.document,
  resistance25: resistanceAt25(row.document),
});

/** A law without end (a fixed resistor) holds as far as the curve goes; JSON has no infinity. */
const withinCurve = ({ valid, ...curve }: ResistanceCurve): ResistanceCurve => {
  const [coldest, hottest] = [Math.min(...curve.temperature), Math.max(...curve.temperature)];
  return { ...curve, valid: { min: Math.max(valid.min, coldest), max: Math.min(valid.max, hottest) } };
};

export const presentPartRecord = (row: PartRow, usedIn: readonly ScenarioRow[]): PartRecord => ({
  ...presentPart(row),
  curve: withinCurve(resistanceCurve(row.document)),
  provenance: row.provenance,
  usedIn: usedIn.map(({ id, name, verdict }) => ({ id, name, status: verdict?.status ?? null })),
});
