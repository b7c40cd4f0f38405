import type { ScenarioRecord } from '../../shared/contracts/scenario';
import type { Check } from '../../shared/model/check';
import { scenarioSchema, type Scenario, type ScenarioInput } from '../../shared/model/scenario';
import { sampleScenario } from './sample-scenario';

export const readScenario = (more: Partial<ScenarioInput> = {}): Scenario => scenarioSchema.parse(sampleScenario(more));

/** A scenario as the API answers with it. */
export const sampleRecord = (more: Partial<ScenarioRecord> = {}): ScenarioRecord => ({
  id: '5a0d8a3e-0b0e-4a4e-9a54-0d1f5c2b7a01',
  name: 'Sample',
  version: 3,
  path: { source: 'ac', fuse: false, elements: [{ kind: 'ntc', bypass: false }], rectifier: 'bridge', load: 'resistance' },
  keyFigures: '230 V, NTC 10 Ω',
  verdict: null,
  closest: null,
  updatedAt: '2026-05-04T08:12:00.000Z',
  updatedBy: 'Ines Tvarro',
  scenario: readScenario(),
  mayEdit: true,
  ...more,
});

/** One judged value, within rating unless told otherwise. */
export const sampleCheck = (more: Partial<Check> = {}): Check => ({
  id: 'peak-current',
  element: null,
  title: 'Peak current, cold start',
  status: 'pass',
  dimension: 'current',
  kind: 'peak',
  sense: 'at-most',
  value: 40,
  nominal: 30,
  rating: 80,
  ratio: 0.5,
  nominalRatio: 0.375,
  margin: 0.5,
  corner: null,
  phase: null,
  offTime: null,
  basis: 'common practice',
  remark: null,
  setAside: null,
  ...more,
});
