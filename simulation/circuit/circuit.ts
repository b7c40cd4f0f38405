import type { PathElement, PowerPath } from './path';

/** Direction of conduction: 0 blocked or open, +1 and −1 through the bridge; without one always +1, current both ways. */
export type Conduction = -1 | 0 | 1;

/** V; below it a constant-power load would ask for a current without bound. */
const TINY = 1e-9;
/** Time in which a following bus settles, as a share of 1/ω. */
const FOLLOWING = 2e-3;
/** s; what takes the place of 1/ω on DC. */
const DIRECT_SCALE = 0.01;

/**
 * The power-up path as a set of differential equations with a discrete state.
 * State vector: [v_C, T_1 … T_n, i], i the magnitude in the direction of conduction (A, V, K).
 * Source of the equations: Kirchhoff's laws and the lumped heat balance C_th·dT/dt = i²R − δ(T − T_a).
 */
export class Circuit {
  readonly count: number;
  readonly size: number;
  readonly bridge: boolean;
  conduction: Conduction = 0;
  /** False where the current is given by the voltages: L/R far below the accuracy asked for. */
  inductive: boolean;
  /** True while the bus follows the line: R·C far below the accuracy asked for. */
  follows = false;
  supplied = true;
  loadSince: number | null = null;
  faulted = false;
  readonly closed: boolean[];
  private readonly drop: number;
  private readonly slope: number;
  private readonly amplitude: number;
  private readonly phase: number;
  /** rad/s; 0 for DC. */
  private readonly omega: number;
  private readonly steadyConductance: number;
  /** R(T) is asked for several times at one instant: the last answer of each element is kept. */
  private readonly knownTemperature: Float64Array;
  private readonly knownResistance: Float64Array;

  constructor(readonly path: PowerPath) {
    const { rectifier, source } = path;
    this.count = path.elements.length;
    this.size = this.count + 2;
    this.bridge = rectifier.kind === 'bridge';
    this.drop = rectifier.kind === 'bridge' ? 2 * rectifier.forwardVoltage : 0;
    this.slope = rectifier.kind === 'bridge' ? 2 * rectifier.slopeResistance : 0;
    this.amplitude = source.amplitude;
    this.phase = source.phase;
    this.omega = source.kind === 'dc' ? 0 : 2 * Math.PI * source.frequency;
    this.inductive = source.inductance > 0;
    this.closed = path.elements.map(({ bypass }) => bypass?.behaviour === 'welded');
    this.knownTemperature = new Float64Array(this.count).fill(NaN);
    this.knownResistance = new Float64Array(this.count);
    const { bulk, load } = path;
    this.steadyConductance = (bulk.bleeder === null ? 0 : 1 / bulk.bleeder) + (load.kind === 'resistance' ? 1 / load.resistance : 0);
  }

  /** Resistance of one body, Ω. */
  private bodyResistance(index: number, temperature: number): number {
    if (this.knownTemperature[index] !== temperature) {
      this.knownTemperature[index] = temperature;
      this.knownResistance[index] = this.path.elements[index]!.law.resistance(temperature);
    }
    return this.knownResistance[index]!;
  }

  /** Source voltage, V; zero while the supply is off. */
  sourceVoltage(t: number): number {
    if (!this.supplied) return 0;
    return this.omega === 0 ? this.amplitude : this.amplitude * Math.sin(this.omega * t + this.phase);
  }

  sourceSlope(t: number): number {
    return this.omega === 0 || !this.supplied ? 0 : this.amplitude * this.omega * Math.cos(this.omega * t + this.phase);
  }

  /** Resistance that the line current meets in one element, contact included, Ω. */
  private lineResistance(element: PathElement, index: number, temperature: number): number {
    const body = this.bodyResistance(index, temperature);
    if (!this.closed[index]) return body;
    const contact = element.bypass!.contactResistance;
    return (body * contact) / (body + contact);
  }

  /** The limiter elements in series, contacts included, Ω. */
  elementsResistance(y: Float64Array): number {
    let sum = 0;
    const { elements } = this.path;
    for (let k = 0; k < this.count; k += 1) sum += this.lineResistance(elements[k]!, k, y[1 + k]!);
    return sum;
  }

  /** Everything in series ahead of the bus, Ω. */
  seriesResistance(y: Float64Array): number {
    return this.path.source.resistance + this.slope + this.elementsResistance(y);
  }

  /** Heat of everything in series ahead of the bus: source, diodes, elements and contacts; W. */
  seriesLoss(y: Float64Array, line: number): number {
    return line * line * this.seriesResistance(y) + this.drop * Math.abs(line);
  }

  /** Energy held in the bulk capacitor and in the source inductance while its current is a state; J. */
  storedEnergy(y: Float64Array): number {
    const inductance = this.inductive && this.conduction !== 0 ? this.path.source.inductance : 0;
    return 0.5 * this.path.bulk.capacitance * y[0]! ** 2 + 0.5 * inductance * y[this.count + 1]! ** 2;
  }

  /** Current through the body of an element for a line current, A. */
  bodyCurrent(index: number, y: Float64Array, line: number): number {
    if (!this.closed[index]) return line;
    const element = this.path.elements[index]!;
    const contact = element.bypass!.contactResistance;
    return (line * contact) / (contact + this.bodyResistance(index, y[1 + index]!));
  }

  bodyPower(index: number, y: Float64Array, line: number): number {
    const current = this.bodyCurrent(index, y, line);
    return current * current * this.bodyResistance(index, y[1 + index]!);
  }

  /** Conductances across the bus, S. */
  busConductance(): number {
    const { fault } = this.path;
    return this.faulted && fault ? this.steadyConductance + 1 / fault.resistance : this.steadyConductance;
  }

  /** Current that the running constant-power load draws, A. */
  loadCurrent(capacitorVoltage: number, t: number): number {
    const { load } = this.path;
    if (load.kind !== 'constant-power' || this.loadSince === null) return 0;
    const ramp = load.rampTime > 0 ? Math.min(1, Math.max(0, (t - this.loadSince) / load.rampTime)) : 1;
    return (ramp * load.power) / Math.max(capacitorVoltage, load.clampVoltage, TINY);
  }

  busVoltage(y: Float64Array, line: number, t: number): number {
    const { esr } = this.path.bulk;
    return (y[0]! + esr * (line - this.loadCurrent(y[0]!, t))) / (1 + esr * this.busConductance());
  }

  /** Voltage that drives conduction in direction `s` at no current, V: conduction starts where it passes zero. */
  drive(y: Float64Array, t: number, s: number): number {
    return s * this.sourceVoltage(t) - this.drop - this.busVoltage(y, 0, t);
  }

  /** Line current in the direction of conduction, A. */
  lineCurrent(y: Float64Array, t: number): number {
    const s = this.conduction;
    if (s === 0) return 0;
    if (this.inductive) return y[this.count + 1]!;
    const current = this.follows ? this.followingCurrent(y, t) : this.drivenCurrent(y, t);
    return this.bridge ? Math.max(0, current) : current;
  }

  /** Line current that the voltages drive at once, without inductance, A. */
  drivenCurrent(y: Float64Array, t: number): number {
    const { esr } = this.path.bulk;
    return this.drive(y, t, this.conduction) / (this.seriesResistance(y) + esr / (1 + esr * this.busConductance()));
  }

  /**
   * Line current where the bus follows the line, A: C·d|v|/dt and the loads, and what brings the bus to where it
   * belongs within `settling()`, far longer than R·C and far shorter than anything else.
   */
  followingCurrent(y: Float64Array, t: number): number {
    const { capacitance, esr } = this.path.bulk;
    const series = this.seriesResistance(y);
    const conductance = this.busConductance();
    const drawn = this.loadCurrent(y[0]!, t);
    const divided = 1 + series * conductance;
    const charging = (capacitance * this.conduction * this.sourceSlope(t)) / divided;
    const belongs = (this.conduction * this.sourceVoltage(t) - this.drop - series * (drawn + charging)) / divided - esr * charging;
    const line = charging + drawn + conductance * (y[0]! + esr * charging);
    return line + (capacitance * (belongs - y[0]!)) / this.settling();
  }

  /** Voltage by which a following bus misses Kirchhoff's law, V: it lags where R(T) moves faster than it settles. */
  followingLag(y: Float64Array, t: number): number {
    return (this.seriesResistance(y) + this.path.bulk.esr) * Math.abs(this.drivenCurrent(y, t) - this.followingCurrent(y, t));
  }

  /** Time constant of the bus behind a resistance, with what lies across it, s. */
  private chargingTime(resistance: number): number {
    return (resistance * this.path.bulk.capacitance) / (1 + resistance * this.busConductance());
  }

  private settling(): number {
    return FOLLOWING * (this.omega > 0 ? 1 / this.omega : DIRECT_SCALE);
  }

  /** Whether R·C is far below what else happens, and the bus is where the following current would have it. */
  mayFollow(y: Float64Array, t: number): boolean {
    const resistance = this.seriesResistance(y) + this.path.bulk.esr;
    if (this.inductive || this.chargingTime(resistance) > 0.1 * this.settling()) return false;
    const driven = this.drivenCurrent(y, t);
    return Math.abs(driven - this.followingCurrent(y, t)) <= 0.01 * Math.abs(driven);
  }

  /** Power from the source, W. */
  sourcePower(y: Float64Array, t: number, line: number): number {
    return this.conduction * this.sourceVoltage(t) * line;
  }

  /**
   * Whether the current needs to be a state: not where L/R is far below both RC and 1/ω. A start onto a standing
   * voltage needs its rise; a pulse that begins at zero volts does not.
   */
  needsInductance(y: Float64Array, hardStart: boolean): boolean {
    const { source, bulk } = this.path;
    const resistance = this.seriesResistance(y) + bulk.esr;
    const scale = this.omega > 0 ? 1 / this.omega : DIRECT_SCALE;
    const charging = this.chargingTime(resistance);
    // Once a start is over, a ringing far faster than the line tells nothing more than the line itself.
    const slowest = !hardStart && charging < FOLLOWING * scale ? scale : Math.min(charging, this.omega > 0 ? scale : Infinity);
    return source.inductance > (hardStart ? 1e-4 : 5e-3) * resistance * slowest;
  }

  /** The shortest time constant of line current and bus in the present state, s. */
  fastestTime(y: Float64Array): number {
    const { source, bulk } = this.path;
    const conductance = this.busConductance();
    const drained = 1 + bulk.esr * conductance;
    const busRate = conductance / (drained * bulk.capacitance);
    if (this.conduction === 0) return y[0] === 0 ? Infinity : 1 / busRate;
    const resistance = this.seriesResistance(y) + bulk.esr / drained;
    if (this.follows) return this.settling();
    const lineRate = this.inductive ? resistance / source.inductance : 1 / (resistance * bulk.capacitance);
    return 1 / Math.max(busRate, lineRate);
  }

  /** The same equations as above in one pass: each quantity once, for this is where nearly all time is spent. */
  derivative = (dydt: Float64Array, y: Float64Array, t: number): void => {
    const { bulk, elements, ambient } = this.path;
    const s = this.conduction;
    const v = y[0]!;
    const drawn = this.loadCurrent(v, t);
    const conductance = this.busConductance();
    const divided = 1 + bulk.esr * conductance;
    const line = this.lineCurrent(y, t);
    const bus = (v + bulk.esr * (line - drawn)) / divided;
    dydt[0] = (line - drawn - conductance * bus) / bulk.capacitance;
    for (let k = 0; k < this.count; k += 1) {
      const { dissipation, heatCapacity } = elements[k]!;
      dydt[1 + k] = (this.bodyPower(k, y, line) - dissipation * (y[1 + k]! - ambient)) / heatCapacity;
    }
    dydt[this.count + 1] =
      s !== 0 && this.inductive
        ? (s * this.sourceVoltage(t) - this.seriesResistance(y) * line - this.drop - bus) / this.path.source.inductance
        : 0;
  };
}
