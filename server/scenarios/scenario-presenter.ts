import type { PathGlyph, ScenarioRecord, ScenarioSummary } from '../../shared/contracts/scenario';
import type { Bypass } from '../../shared/model/limiter';
import type { Part } from '../../shared/model/part';
import type { Scenario } from '../../shared/model/scenario';
import { formatQuantity } from '../../shared/quantity/format';
import type { Identity } from '../sessions/identity';
import { mayWriteScenarios } from './scenario-policy';
import type { ScenarioRow } from './scenario-entity';

const FIGURE_DIGITS = 3;

export const pathGlyph = (scenario: Scenario): PathGlyph => ({
  source: scenario.source.kind,
  fuse: scenario.fuse !== undefined,
  elements: scenario.limiter.map(({ part, bypass }) => ({ kind: part.kind, bypass: bypass !== undefined })),
  rectifier: scenario.rectifier.kind,
  load: scenario.load.kind,
});

const KIND_WORD = { ntc: 'NTC', 'polymer-ptc': 'PTC', resistor: 'R' } as const;

const resistanceOf = ({ law }: Part): number | null => {
  if (law.law === 'b-value') return law.r25.nominal;
  if (law.law === 'sigmoid') return law.low.nominal;
  return law.law === 'fixed' ? law.resistance.nominal : null;
};

const partText = (part: Part): string => {
  const resistance = resistanceOf(part);
  return resistance === null ? KIND_WORD[part.kind] : `${KIND_WORD[part.kind]} ${formatQuantity(resistance, 'resistance', FIGURE_DIGITS)}`;
};

const bypassText = ({ closes }: Bypass): string =>
  closes.when === 'time'
    ? `bypass ${formatQuantity(closes.at, 'time', FIGURE_DIGITS)}`
    : `bypass at ${formatQuantity(closes.above, 'voltage', FIGURE_DIGITS)}`;

/** One line that tells scenarios apart in a list, such as 230 V, NTC 10 Ω, bypass 300 ms. */
export const keyFigures = (scenario: Scenario): string => {
  const { source, limiter } = scenario;
  const supply = `${formatQuantity(source.voltage.nominal, 'voltage', FIGURE_DIGITS)}${source.kind === 'dc' ? ' DC' : ''}`;
  const elements = limiter.flatMap(({ part, bypass }) => (bypass ? [partText(part), bypassText(bypass)] : [partText(part)]));
  return [supply, ...(elements.length > 0 ? elements : ['no limiter'])].join(', ');
};

export const presentSummary = (row: ScenarioRow): ScenarioSummary => ({
  id: row.id,
  name: row.name,
  version: row.version,
  path: pathGlyph(row.document),
  keyFigures: keyFigures(row.document),
  verdict: row.verdict,
  closest: row.closest,
  updatedAt: row.updatedAt.toISOString(),
  updatedBy: row.updatedBy.name,
});

export const presentRecord = (row: ScenarioRow, reader: Identity): ScenarioRecord => ({
  ...presentSummary(row),
  scenario: row.document,
  mayEdit: mayWriteScenarios(reader.roles),
});
