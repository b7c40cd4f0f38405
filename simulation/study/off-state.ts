import type { PathElement, PathLoad, PowerPath } from '../circuit/path';

/** Body temperature (K) after `time` (s) without current: T_a + (T − T_a)·e^(−δ·t/C_th). */
export const cooled = ({ dissipation, heatCapacity }: PathElement, from: number, ambient: number, time: number): number =>
  ambient + (from - ambient) * Math.exp((-dissipation * time) / heatCapacity);

type Supply = Pick<PowerPath['bulk'], 'capacitance' | 'bleeder'>;

/** v and its time when a current-type and a conductance-type draw discharge C from `from` to `to`: one closed form each way. */
const constantCurrent = (current: number, conductance: number, capacitance: number) => ({
  at: (from: number, time: number): number =>
    conductance > 0
      ? (from + current / conductance) * Math.exp((-conductance * time) / capacitance) - current / conductance
      : from - (current * time) / capacitance,
  until: (from: number, to: number): number =>
    conductance > 0
      ? (capacitance / conductance) * Math.log((from * conductance + current) / (to * conductance + current))
      : (capacitance * (from - to)) / current,
});

type ConstantPower = Extract<PathLoad, { kind: 'constant-power' }>;

/**
 * Discharge of C by constant power beside a bleeder: u = v² follows du/dt = −2·(P + u·G)/C, until v reaches the
 * voltage at which the load's current is clamped or the load stops; then constant current; then the bleeder.
 */
const underConstantPower = (load: ConstantPower, { capacitance }: Supply, conductance: number, from: number, time: number): number => {
  const squares = constantCurrent(2 * load.power, 2 * conductance, capacitance);
  const clamp = Math.max(load.stopVoltage, Math.min(load.clampVoltage, from));
  const untilClamp = from > clamp ? squares.until(from ** 2, clamp ** 2) : 0;
  if (time <= untilClamp) return Math.sqrt(squares.at(from ** 2, time));
  const clamped = constantCurrent(load.power / load.clampVoltage, conductance, capacitance);
  const start = Math.min(from, clamp);
  const untilStop = start > load.stopVoltage ? clamped.until(start, load.stopVoltage) : 0;
  if (time - untilClamp <= untilStop) return clamped.at(start, time - untilClamp);
  const rest = time - untilClamp - untilStop;
  return Math.min(start, load.stopVoltage) * Math.exp((-conductance * rest) / capacitance);
};

/**
 * Bus voltage (V) after `time` (s) without supply, from `from` (V): the load draws on until its stop threshold,
 * then the bleeder alone. The drop over the ESR is left out.
 */
export const dischargedBus = (bulk: Supply, load: PathLoad, loadRuns: boolean, from: number, time: number): number => {
  const bleeder = bulk.bleeder === null ? 0 : 1 / bulk.bleeder;
  if (load.kind === 'resistance') return from * Math.exp((-(bleeder + 1 / load.resistance) * time) / bulk.capacitance);
  if (load.kind === 'constant-power' && loadRuns && from > load.stopVoltage) return underConstantPower(load, bulk, bleeder, from, time);
  return from * Math.exp((-bleeder * time) / bulk.capacitance);
};
