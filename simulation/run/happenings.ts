import type { RunEvent } from '../../shared/model/result';
import type { Circuit } from '../circuit/circuit';
import type { Watch } from './crossing';
import type { StartState } from './options';
import type { Scheduled, Waveform } from './waveform';

/** An element has tripped when its resistance is this many times its value at the start (common practice). */
export const TRIP_FACTOR = 10;

/** Waits of the load that came to nothing, one after another with nothing between, after which all will. */
const IN_VAIN = 8;

/** What switches in a run: supply, load, contacts, fault, trips; each with its event. */
export class Happenings {
  readonly events: RunEvent[] = [];
  readonly startResistance: number[];
  readonly tripped: boolean[];
  /** The first closing of a contact, with the voltage over it just before; s, V. */
  firstClosing: { at: number; voltage: number } | null = null;
  private wave!: Waveform;
  private loadTimer: Scheduled | null = null;
  private inVain = 0;
  private supplyGoing = false;
  private current: readonly Watch[] = [];
  private stale = true;

  constructor(
    private readonly circuit: Circuit,
    temperatures: readonly number[],
  ) {
    this.startResistance = circuit.path.elements.map(({ law }, k) => law.resistance(temperatures[k]!));
    this.tripped = circuit.path.elements.map(() => false);
  }

  begin(wave: Waveform, start: StartState | undefined): void {
    this.wave = wave;
    wave.onBlocked = () => this.openIfBlocked();
    this.record('switch-on', 0);
    start?.contactsClosedFor.forEach((time, k) => {
      if (time === null || this.circuit.path.elements[k]?.bypass?.behaviour === 'never-closes') return;
      this.circuit.closed[k] = true;
      this.openContact(k, time);
    });
    this.armContacts(0);
    const { source, fault } = this.circuit.path;
    for (const step of source.programme)
      wave.schedule({ at: step.at, apply: () => (step.switch === 'off' ? this.askOff() : this.switchOn(step.at)) });
    if (fault) wave.schedule({ at: fault.at, apply: () => this.startFault(fault.at) });
  }

  watches = (): readonly Watch[] => {
    if (this.stale) [this.current, this.stale] = [this.list(), false];
    return this.current;
  };

  /** To be asked after every step: an AC supply that is to go off opens at the first instant without current. */
  openIfBlocked(): void {
    const { circuit } = this;
    if (!this.supplyGoing || (circuit.path.source.kind === 'ac' && circuit.conduction !== 0)) return;
    this.supplyGoing = false;
    this.circuit.supplied = false;
    this.loseInductiveEnergy();
    const at = this.wave.t;
    this.record('switch-off', at);
    this.circuit.path.elements.forEach(({ bypass }, k) => {
      if (bypass && this.circuit.closed[k] && bypass.behaviour === 'works') this.openContact(k, at + bypass.releaseTime);
    });
  }

  /** A DC supply opens under current: what the source inductance held is lost in the opening contact. */
  private loseInductiveEnergy(): void {
    const { circuit, wave } = this;
    const held = circuit.storedEnergy(wave.y);
    circuit.conduction = 0;
    wave.y[circuit.size - 1] = 0;
    wave.tally.dissipated += held - circuit.storedEnergy(wave.y);
  }

  get supplyGoesOff(): boolean {
    return this.supplyGoing;
  }

  get loadPending(): boolean {
    return this.loadTimer !== null;
  }

  /** Bus voltages that something happens at on the way up and on the way down, V. */
  thresholds(): { rising: number[]; falling: number[] } {
    const { circuit } = this;
    const { load, elements } = circuit.path;
    const contacts = elements.flatMap(({ bypass }, k) =>
      bypass?.closes.when === 'bus-voltage' && bypass.behaviour === 'works' && !circuit.closed[k] ? [bypass.closes.above] : [],
    );
    if (load.kind !== 'constant-power') return { rising: contacts, falling: [] };
    const runsOrWaits = circuit.loadSince !== null || this.loadPending;
    return runsOrWaits ? { rising: contacts, falling: [load.stopVoltage] } : { rising: [...contacts, load.startVoltage], falling: [] };
  }

  /** Whether the load waits to start in every cycle and is stopped in every cycle before its delay is over. */
  get loadWaitsInVain(): boolean {
    return this.inVain >= IN_VAIN;
  }

  /** Instant of the next happening, s; a load that waits in vain is none. */
  nextHappening(): number {
    return this.wave.nextScheduled(this.loadWaitsInVain ? this.loadTimer : null);
  }

  /** To be told when time was moved on from a cycle into the same cycle later. */
  movedOn(by: number): void {
    if (!this.loadTimer || !this.loadWaitsInVain) return;
    this.wave.unschedule(this.loadTimer);
    this.loadTimer.at += by;
    this.wave.schedule(this.loadTimer);
  }

  private record(kind: RunEvent['kind'], at: number, element: number | null = null): void {
    this.events.push({ kind, at, element });
    this.inVain = 0;
    this.stale = true;
  }

  private askOff(): void {
    this.supplyGoing = true;
    this.openIfBlocked();
  }

  private switchOn(at: number): void {
    this.supplyGoing = false;
    if (this.circuit.supplied) return;
    this.circuit.supplied = true;
    this.record('switch-on', at);
    this.armContacts(at);
  }

  private startFault(at: number): void {
    this.circuit.faulted = true;
    this.record('fault-begins', at);
  }

  private armContacts(from: number): void {
    this.circuit.path.elements.forEach(({ bypass }, k) => {
      if (bypass?.behaviour !== 'works' || bypass.closes.when !== 'time') return;
      const at = from + bypass.closes.at;
      this.wave.schedule({ at, apply: () => this.circuit.supplied && this.closeContact(k) });
    });
  }

  private closeContact(k: number): void {
    const { circuit, wave } = this;
    if (circuit.closed[k]) return;
    const voltage = Math.abs(circuit.lineCurrent(wave.y, wave.t)) * circuit.path.elements[k]!.law.resistance(wave.y[1 + k]!);
    this.firstClosing ??= { at: wave.t, voltage };
    circuit.closed[k] = true;
    this.record('contact-closes', wave.t, k);
  }

  private openContact(k: number, at: number): void {
    this.wave.schedule({
      at,
      apply: () => {
        this.circuit.closed[k] = false;
        this.record('contact-opens', at, k);
      },
    });
  }

  private list(): Watch[] {
    return [...this.loadWatch(), ...this.contactWatch(), ...this.tripWatch()];
  }

  private loadWatch(): Watch[] {
    const { load } = this.circuit.path;
    if (load.kind !== 'constant-power') return [];
    if (this.circuit.loadSince === null && !this.loadTimer) {
      const reached = (y: Float64Array) => y[0]! - load.startVoltage;
      if (reached(this.wave.y) >= 0) this.startTimer(load.startDelay);
      else return [{ value: reached, rising: true, apply: () => this.startTimer(load.startDelay) }];
    }
    return [{ value: (y) => y[0]! - load.stopVoltage, rising: false, apply: () => this.stopLoad() }];
  }

  private startTimer(delay: number): void {
    this.stale = true;
    const timer: Scheduled = {
      at: this.wave.t + delay,
      apply: () => {
        this.loadTimer = null;
        this.circuit.loadSince = timer.at;
        this.record('load-starts', timer.at);
      },
    };
    this.loadTimer = timer;
    this.wave.schedule(timer);
  }

  private stopLoad(): void {
    if (this.loadTimer) this.inVain += 1;
    this.wave.unschedule(this.loadTimer);
    this.loadTimer = null;
    this.stale = true;
    if (this.circuit.loadSince === null) return;
    this.circuit.loadSince = null;
    this.record('load-stops', this.wave.t);
  }

  private contactWatch(): Watch[] {
    return this.circuit.path.elements.flatMap(({ bypass }, k) => {
      const closes = bypass?.closes;
      if (bypass?.behaviour !== 'works' || closes?.when !== 'bus-voltage' || this.circuit.closed[k]) return [];
      const value = (y: Float64Array, t: number) => this.circuit.busVoltage(y, this.circuit.lineCurrent(y, t), t) - closes.above;
      return [{ value, rising: true, apply: () => this.closeContact(k) }];
    });
  }

  private tripWatch(): Watch[] {
    return this.circuit.path.elements.flatMap(({ kind, law }, k) => {
      if (kind !== 'polymer-ptc') return [];
      const excess = (y: Float64Array) => Math.log(law.resistance(y[1 + k]!) / (TRIP_FACTOR * this.startResistance[k]!));
      const toTripped = !this.tripped[k];
      const apply = () => {
        this.tripped[k] = toTripped;
        this.record(toTripped ? 'trips' : 'resets', this.wave.t, k);
      };
      return [{ value: excess, rising: toTripped, apply }];
    });
  }
}
