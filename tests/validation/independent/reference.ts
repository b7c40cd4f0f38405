import { followLeg, type Guard } from './leg';
import type { BodyLaw, Setup } from './setup';

/** What the independent integration found; SI. */
export interface Reference {
  time: number[];
  /** Signed. */
  current: number[];
  bus: number[];
  hottest: number[];
  temperatures: number[];
  energies: number[];
  sourceEnergy: number;
  i2t: number;
  firstPulse: { i2t: number; energy: number } | null;
  events: { kind: string; at: number; bus: number }[];
}

/** R(T) from the formulas alone: B-value (IEC 60539-1, from memory), logistic rise, constant. */
const resistanceOf = (law: BodyLaw, temperature: number): number => {
  if ('r25' in law) return law.r25 * Math.exp(law.b / temperature - law.b / 298.15);
  if ('ohms' in law) return law.ohms;
  const [low, high] = [Math.log10(law.low), Math.log10(law.high)];
  return 10 ** (low + (high - low) / (1 + Math.exp((law.midpoint - temperature) / law.width)));
};

interface Timer {
  at: number;
  act: () => void;
}

/** State: bus capacitor, line current (signed), temperatures, energies of the bodies, source energy, ∫i². */
class Bench {
  private readonly n: number;
  private mode: -1 | 0 | 1 = 0;
  private supplied = true;
  private opening = false;
  private loadSince: number | null = null;
  private loadTimer: Timer | null = null;
  private faulted = false;
  private readonly closed: boolean[];
  private timers: Timer[] = [];
  private y: number[];
  private t = 0;
  private lastEvent = 0;
  private readonly found: Reference;

  constructor(private readonly setup: Setup) {
    this.n = setup.bodies.length;
    this.closed = setup.bodies.map(() => false);
    this.y = [0, 0, ...setup.bodies.map(() => setup.ambient), ...setup.bodies.map(() => 0), 0, 0];
    this.found = {
      time: [], current: [], bus: [], hottest: setup.bodies.map(() => setup.ambient), temperatures: [], energies: [], sourceEnergy: 0, i2t: 0, firstPulse: null, events: [],
    };
    for (const { at, on } of setup.switches) this.timers.push({ at, act: () => (on ? this.switchOn() : this.switchOff()) });
    if (setup.fault) this.timers.push({ at: setup.fault.at, act: () => { this.faulted = true; this.note('fault'); } });
    this.armContacts();
  }

  private note(kind: string): void {
    this.found.events.push({ kind, at: this.t, bus: this.node(this.y, this.t).bus });
    this.lastEvent = this.t;
  }

  private armContacts(): void {
    this.setup.bodies.forEach(({ contact }, k) => {
      if (contact?.closesAt !== undefined) this.timers.push({ at: this.t + contact.closesAt, act: () => this.close(k) });
    });
  }

  private close(k: number): void {
    if (!this.supplied || this.closed[k]) return;
    this.closed[k] = true;
    this.note('closes');
  }

  private switchOff(): void {
    this.opening = true;
    if (this.setup.source.kind === 'dc' || this.mode === 0) this.open();
  }

  private open(): void {
    this.opening = false;
    this.supplied = false;
    this.mode = 0;
    this.y[1] = 0;
    this.note('off');
    this.setup.bodies.forEach(({ contact }, k) => {
      if (contact && this.closed[k]) this.timers.push({ at: this.t + contact.release, act: () => { this.closed[k] = false; } });
    });
  }

  private switchOn(): void {
    this.supplied = true;
    this.note('on');
    this.armContacts();
  }

  private voltage(t: number): number {
    const { kind, amplitude, frequency, degrees } = this.setup.source;
    if (!this.supplied) return 0;
    return kind === 'dc' ? amplitude : amplitude * Math.sin(2 * Math.PI * frequency * t + (degrees * Math.PI) / 180);
  }

  private drop(): number {
    return this.setup.diodes ? 2 * this.setup.diodes.drop : 0;
  }

  /** Current of everything across the bus, apart from the capacitor: a conductance and what the power load draws. */
  private across(y: number[], t: number): { conductance: number; drawn: number } {
    const { bleeder, load, fault } = this.setup;
    let conductance = bleeder ? 1 / bleeder : 0;
    if (load && 'ohms' in load) conductance += 1 / load.ohms;
    if (this.faulted) conductance += 1 / fault!.ohms;
    if (!load || 'ohms' in load || this.loadSince === null) return { conductance, drawn: 0 };
    const share = load.ramp > 0 ? Math.min(1, (t - this.loadSince) / load.ramp) : 1;
    return { conductance, drawn: (share * load.power) / Math.max(y[0]!, load.clamp) };
  }

  /** Kirchhoff's current law at the bus: line = capacitor + drawn + G·bus, bus = v_C + ESR·capacitor. */
  private node(y: number[], t: number): { line: number; bus: number; capacitor: number; resistances: number[] } {
    const { source, bodies, diodes, esr } = this.setup;
    const { conductance, drawn } = this.across(y, t);
    const resistances = bodies.map(({ law, contact }, k) => {
      const body = resistanceOf(law, y[2 + k]!);
      return this.closed[k] ? 1 / (1 / body + 1 / contact!.resistance) : body;
    });
    const series = resistances.reduce((sum, one) => sum + one, source.resistance + (diodes ? 2 * diodes.slope : 0));
    const shared = 1 / (1 + esr * conductance);
    const idle = y[0]! - esr * shared * (drawn + conductance * y[0]!);
    const free = (this.mode * this.voltage(t) - this.drop() - idle) / (series + esr * shared);
    const line = this.mode === 0 ? 0 : source.inductance > 0 ? this.mode * y[1]! : free;
    const capacitor = (line - drawn - conductance * y[0]!) * shared;
    return { line, bus: y[0]! + esr * capacitor, capacitor, resistances };
  }

  private derivative = (y: number[], t: number): number[] => {
    const { source, bodies, diodes, capacitance, ambient } = this.setup;
    const { line, bus, capacitor, resistances } = this.node(y, t);
    const series = resistances.reduce((sum, one) => sum + one, source.resistance + (diodes ? 2 * diodes.slope : 0));
    const rise = this.mode === 0 || source.inductance === 0 ? 0 : (this.voltage(t) - this.mode * (series * line + this.drop() + bus)) / source.inductance;
    const powers = bodies.map(({ law }, k) => (line * resistances[k]!) ** 2 / resistanceOf(law, y[2 + k]!));
    const warming = bodies.map(({ dissipation, heatCapacity }, k) => (powers[k]! - dissipation * (y[2 + k]! - ambient)) / heatCapacity);
    return [capacitor / capacitance, rise, ...warming, ...powers, this.mode * this.voltage(t) * line, line * line];
  };

  private forward(y: number[], t: number, s: number): number {
    const { conductance, drawn } = this.across(y, t);
    const { esr } = this.setup;
    return s * this.voltage(t) - this.drop() - (y[0]! - esr * drawn) / (1 + esr * conductance);
  }

  private guards(): Guard[] {
    return [...this.conductionGuards(), ...this.loadGuards(), ...this.contactGuards()];
  }

  private conductionGuards(): Guard[] {
    if (!this.setup.diodes || !this.supplied) return [];
    const start = (s: -1 | 1): Guard => ({ value: (y, t) => this.forward(y, t, s), then: () => { this.mode = s; } });
    if (this.mode === 0) return [start(1), start(-1)];
    return [{
      value: (y, t) => -this.node(y, t).line,
      then: () => {
        this.found.firstPulse ??= { i2t: this.y[this.y.length - 1]!, energy: this.bodyEnergy() };
        this.mode = 0;
        this.y[1] = 0;
        if (this.opening) this.open();
      },
    }];
  }

  private bodyEnergy(): number {
    return this.y.slice(2 + this.n, 2 + 2 * this.n).reduce((sum, one) => sum + one, 0);
  }

  private loadGuards(): Guard[] {
    const { load } = this.setup;
    if (!load || 'ohms' in load) return [];
    if (this.loadSince !== null || this.loadTimer) return [{ value: (y) => load.stop - y[0]!, then: () => this.stopLoad() }];
    return [{
      value: (y) => y[0]! - load.start,
      then: () => {
        this.loadTimer = { at: this.t + load.delay, act: () => this.startLoad() };
        this.timers.push(this.loadTimer);
      },
    }];
  }

  private startLoad(): void {
    [this.loadSince, this.loadTimer] = [this.t, null];
    this.note('load starts');
  }

  private stopLoad(): void {
    const ran = this.loadSince !== null;
    this.timers = this.timers.filter((one) => one !== this.loadTimer);
    [this.loadTimer, this.loadSince] = [null, null];
    if (ran) this.note('load stops');
  }

  private contactGuards(): Guard[] {
    return this.setup.bodies.flatMap(({ contact }, k) =>
      contact?.closesAbove === undefined || this.closed[k] ? [] : [{ value: (y: number[], t: number) => this.node(y, t).bus - contact.closesAbove!, then: () => this.close(k) }],
    );
  }

  private sample = (y: number[], t: number): void => {
    const { line, bus } = this.node(y, t);
    this.found.time.push(t);
    this.found.current.push(this.mode * line);
    this.found.bus.push(bus);
    this.found.hottest = this.found.hottest.map((hottest, k) => Math.max(hottest, y[2 + k]!));
  };

  /** Short after everything that happens, and short in every pulse of an AC line. */
  private longestStep(): number {
    if (this.setup.source.kind === 'ac') return this.mode === 0 ? 1e-3 : 2e-4;
    return Math.min(2e-3, Math.max(1e-5, (this.t - this.lastEvent) / 10));
  }

  run(): Reference {
    const { duration, source, diodes } = this.setup;
    while (this.t < duration) {
      const due = this.timers.filter(({ at }) => at <= this.t);
      this.timers = this.timers.filter(({ at }) => at > this.t);
      due.forEach(({ act }) => act());
      if (this.supplied && !diodes) this.mode = 1;
      for (const s of [1, -1] as const) if (this.supplied && diodes && this.mode === 0 && this.forward(this.y, this.t, s) > 0) this.mode = s;
      this.sample(this.y, this.t);
      const most = source.kind === 'ac' ? Infinity : this.t + Math.max(1e-3, this.t - this.lastEvent);
      const to = Math.min(duration, most, ...this.timers.map(({ at }) => at));
      const { y, t, met } = followLeg(this.y, { derivative: this.derivative, guards: this.guards(), from: this.t, to, longestStep: this.longestStep(), sample: this.sample });
      [this.y, this.t] = [[...y], t];
      met?.then();
    }
    const { y, n, found } = this;
    return { ...found, temperatures: y.slice(2, 2 + n), energies: y.slice(2 + n, 2 + 2 * n), sourceEnergy: y[2 + 2 * n]!, i2t: y[3 + 2 * n]! };
  }
}

/**
 * The path integrated from Kirchhoff's laws and the heat balance of each body, by another method and with other code
 * than the engine's; its events are its own as well.
 */
export const integrate = (setup: Setup): Reference => new Bench(setup).run();
