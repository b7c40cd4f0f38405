import type { Bulk } from '../../shared/model/bulk';
import type { Level } from '../../shared/model/corner';
import type { Load } from '../../shared/model/load';
import type { Toleranced } from '../../shared/model/quantity';
import type { Scenario } from '../../shared/model/scenario';
import type { PathLoad, PathSource, PowerPath } from '../circuit/path';
import { pathElement } from '../elements/element-of-part';
import { levelOf, type Levels } from './levels';
import { impedanceAt } from './source-impedance';

/** Share of the start voltage at which a converter stops, where the record has none (common practice). */
const STOP_SHARE = 0.7;
/** Of the nominal bus, below which a converter's input current is clamped. */
const CLAMP_SHARE = 0.3;
/** V; keeps the clamp above zero where the diodes would take the whole supply. */
const LOWEST_BUS = 0.1;

export const atLevel = (band: Toleranced, level: Level): number => ({ low: band.min, nominal: band.nominal, high: band.max })[level];

/** Hz at a level; 0 for DC. */
export const frequencyAt = ({ source }: Scenario, level: Level): number => {
  if (source.kind === 'dc') return 0;
  if (level === 'low') return Math.min(...source.frequencies);
  return level === 'high' ? Math.max(...source.frequencies) : (source.frequencies[0] ?? 50);
};

/** The supply voltage of a corner: V rms and crest; equal for DC. */
export const voltageAt = ({ source }: Scenario, levels: Levels): { rms: number; peak: number } => {
  const rms = atLevel(source.voltage, levelOf(levels, 'line'));
  return { rms, peak: source.kind === 'ac' ? Math.SQRT2 * rms : rms };
};

export const ambientAt = ({ ambient }: Scenario, levels: Levels): number => atLevel(ambient, levelOf(levels, 'ambient'));

const isLowestAmbient = (scenario: Scenario, levels: Levels): boolean => ambientAt(scenario, levels) === scenario.ambient.min;

/** Capacitance (F) and ESR (Ω) of a corner; at the lowest ambient with the factors given for it. */
export const bulkAt = (scenario: Scenario, levels: Levels): { capacitance: number; esr: number } => {
  const { capacitance, esr, atLowAmbient }: Bulk = scenario.bulk;
  const cold = isLowestAmbient(scenario, levels) ? atLowAmbient : undefined;
  return {
    capacitance: atLevel(capacitance, levelOf(levels, 'capacitance')) * (cold?.capacitanceFactor ?? 1),
    esr: atLevel(esr, levelOf(levels, 'esr')) * (cold?.esrFactor ?? 1),
  };
};

const sourceAt = (scenario: Scenario, levels: Levels, phase: number): PathSource => {
  const { source, fuse } = scenario;
  const frequency = frequencyAt(scenario, levelOf(levels, 'frequency'));
  const { resistance, inductance } = impedanceAt(source, levelOf(levels, 'sourceImpedance'), frequency);
  return {
    kind: source.kind,
    amplitude: voltageAt(scenario, levels).peak,
    frequency,
    phase: source.kind === 'ac' ? phase : 0,
    resistance: resistance + (fuse?.resistance ?? 0),
    inductance,
    programme: source.programme,
  };
};

/** √2·V_nom − 2·V_f behind a bridge; V */
const nominalBus = ({ source, rectifier }: Scenario): number =>
  (source.kind === 'ac' ? Math.SQRT2 : 1) * source.voltage.nominal - (rectifier.kind === 'bridge' ? 2 * rectifier.forwardVoltage : 0);

const loadOf = (scenario: Scenario, load: Load): PathLoad =>
  load.kind === 'constant-power'
    ? {
        kind: 'constant-power',
        power: load.power,
        startVoltage: load.startVoltage,
        stopVoltage: load.stopVoltage ?? STOP_SHARE * load.startVoltage,
        startDelay: load.startDelay,
        rampTime: load.rampTime,
        clampVoltage: CLAMP_SHARE * Math.max(nominalBus(scenario), LOWEST_BUS),
      }
    : load;

/** The path of a scenario with every range set to its level, and the switch-on angle (rad). */
export const resolvePath = (scenario: Scenario, levels: Levels, phase: number): PowerPath => {
  const { rectifier, bulk, fault } = scenario;
  return {
    source: sourceAt(scenario, levels, phase),
    elements: scenario.limiter.map((element) =>
      pathElement(element, { resistance: levelOf(levels, 'elementResistance'), b: levelOf(levels, 'elementB') }),
    ),
    rectifier: rectifier.kind === 'bridge' ? { kind: 'bridge', forwardVoltage: rectifier.forwardVoltage, slopeResistance: rectifier.slopeResistance } : rectifier,
    bulk: { ...bulkAt(scenario, levels), initialVoltage: bulk.initialVoltage, bleeder: bulk.bleeder ?? null },
    load: loadOf(scenario, scenario.load),
    fault: fault ? { at: fault.at, resistance: fault.resistance } : null,
    ambient: ambientAt(scenario, levels),
  };
};
