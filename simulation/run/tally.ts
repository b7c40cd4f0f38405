import type { Circuit } from '../circuit/circuit';

/** What flows at one instant; W and A². Elements in order. */
class Flow {
  line = 0;
  bus = 0;
  source = 0;
  dissipated = 0;
  readonly body: Float64Array;
  readonly given: Float64Array;

  constructor(count: number) {
    this.body = new Float64Array(count);
    this.given = new Float64Array(count);
  }

  read(circuit: Circuit, y: Float64Array, t: number): void {
    const { path } = circuit;
    const line = circuit.lineCurrent(y, t);
    const bus = circuit.busVoltage(y, line, t);
    const drawn = circuit.loadCurrent(y[0]!, t) + circuit.busConductance() * bus;
    this.line = line;
    this.bus = bus;
    this.source = circuit.sourcePower(y, t, line);
    this.dissipated = circuit.seriesLoss(y, line) + bus * drawn + path.bulk.esr * (line - drawn) ** 2;
    for (let k = 0; k < circuit.count; k += 1) {
      const element = path.elements[k]!;
      this.body[k] = circuit.bodyPower(k, y, line);
      this.given[k] = element.dissipation * (y[1 + k]! - path.ambient);
    }
  }
}

/**
 * Running integrals, by Simpson's rule over the two halves' common points of each step. Kept out of the state
 * vector on purpose: Runge–Kutta keeps linear invariants exactly, so a balance of integrals inside it proves nothing.
 */
export class Tally {
  i2t = 0;
  source = 0;
  dissipated = 0;
  readonly body: Float64Array;
  readonly given: Float64Array;
  readonly start: Flow;
  readonly middle: Flow;
  readonly end: Flow;

  constructor(private readonly circuit: Circuit) {
    const { count } = circuit;
    this.body = new Float64Array(count);
    this.given = new Float64Array(count);
    [this.start, this.middle, this.end] = [new Flow(count), new Flow(count), new Flow(count)];
  }

  add(h: number, from: Float64Array, middle: Float64Array, to: Float64Array, t: number): void {
    const { circuit, start: a, middle: b, end: c } = this;
    a.read(circuit, from, t);
    b.read(circuit, middle, t + h / 2);
    c.read(circuit, to, t + h);
    const sixth = h / 6;
    this.i2t += sixth * (a.line ** 2 + 4 * b.line ** 2 + c.line ** 2);
    this.source += sixth * (a.source + 4 * b.source + c.source);
    this.dissipated += sixth * (a.dissipated + 4 * b.dissipated + c.dissipated);
    for (let k = 0; k < circuit.count; k += 1) {
      this.body[k]! += sixth * (a.body[k]! + 4 * b.body[k]! + c.body[k]!);
      this.given[k]! += sixth * (a.given[k]! + 4 * b.given[k]! + c.given[k]!);
    }
  }
}
