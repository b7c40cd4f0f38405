import { Circuit } from '../circuit/circuit';
import type { CycleOptions, SteadyCycle } from './steady-cycle';

/** Where the current into the bus and the current out of it agree on DC, seen from the stable upper branch; A, V. */
export const directBalance = ({ path, loadRuns, faulted }: CycleOptions, resistance: number): SteadyCycle | null => {
  const circuit = new Circuit({ ...path, elements: [] });
  circuit.faulted = faulted;
  circuit.loadSince = loadRuns ? -Infinity : null;
  const drop = path.rectifier.kind === 'bridge' ? 2 * path.rectifier.forwardVoltage : 0;
  const slope = path.rectifier.kind === 'bridge' ? 2 * path.rectifier.slopeResistance : 0;
  const series = path.source.resistance + slope + resistance;
  const open = path.source.amplitude - drop;
  const conductance = circuit.busConductance();
  const asked = (v: number) => circuit.loadCurrent(v, Infinity) + conductance * v;
  let v = open;
  for (let k = 0; k < 80; k += 1) {
    const gap = open - v - series * asked(v);
    const rate = -1 - series * ((asked(v * (1 + 1e-7)) - asked(v)) / (v * 1e-7));
    const next = v - gap / rate;
    if (!(rate < 0) || !(next > 0)) return null;
    const done = Math.abs(next - v) < 1e-12 * open;
    v = next;
    if (done) break;
  }
  const line = asked(v);
  return { rms: line, peak: line, lowestBus: v, highestBus: v, sourcePower: path.source.amplitude * line, capacitorVoltage: v, lineCurrent: line };
};
