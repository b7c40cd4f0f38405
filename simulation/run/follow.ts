import type { RunEvent } from '../../shared/model/result';
import { Circuit } from '../circuit/circuit';
import type { PowerPath } from '../circuit/path';
import { Crest } from './crest';
import { CycleMap } from './cycle-map';
import { Drift, type DriftResult } from './drift';
import { FirstPulse } from './first-pulse';
import { Happenings } from './happenings';
import { History } from './history';
import type { RunOptions } from './options';
import { Periods } from './periods';
import { Soak, type SoakPoint } from './soak';
import type { SteadyCycle } from './steady-cycle';
import { TripRecord } from './trip-record';
import { Waveform } from './waveform';

/** s; where the plot folds from the waveform to the soak. */
export const FOLD = 0.1;
const TOLERANCE = 1e-5;
const SOAK_TOLERANCE = 1e-6;
/** Right-hand sides; some two seconds. */
const BUDGET = 1_500_000;
/** Load stops after which a hiccup counts as endless. */
const HICCUPS = 8;
/** Periods that must be free of known events for a soak to be worth its start, and that are waited after one failed. */
const WORTHWHILE = 6;
const PATIENCE = 10;
/** Periods that are left to the waveform at the end of a drift. */
const LAST = 8;
/** s; longest look at a DC path that is blocked. */
const IDLE = 1;
/** Share of its resistance that an element may ripple in a soak, and cycles that are rather followed one by one. */
const RIPPLE = 0.02;
const AFFORDABLE = 4000;
/** Share of the amplitude by which the bus may miss the repeating cycle. */
const SETTLED = 2e-3;

/** Follows one path from switch-on through waveform and soak to its end. */
export class Follow {
  readonly circuit: Circuit;
  readonly wave: Waveform;
  readonly happenings: Happenings;
  readonly periods: Periods;
  readonly history: History;
  readonly pulse: FirstPulse;
  /** Of the whole run, soaks apart. */
  readonly crest: Crest;
  readonly soaked: { from: number; points: SoakPoint[]; offset: { i2t: number; source: number; energy: number[] } }[] = [];
  readonly startTemperatures: number[];
  readonly pulses = { expected: 0, found: 0 };
  readonly sourceBalance = { residual: 0, energy: 0 };
  /** Cycle at the end, where the run ended in a soak. */
  endCycle: SteadyCycle | null = null;
  lastMap: CycleMap | null = null;
  soakSides = 0;
  hiccups = false;
  readonly hottest: number[];
  readonly bypass = { closedAt: null as number | null, voltage: null as number | null, crest: null as Crest | null };
  underLoad = { start: null as number | null, lowest: Infinity, ended: false };
  readonly trip: TripRecord;
  private readonly budget: number;
  private waitUntil = 0;
  private known = 0;

  constructor(
    readonly path: PowerPath,
    readonly options: RunOptions,
  ) {
    this.budget = options.waveformOnly ? Infinity : BUDGET;
    this.circuit = new Circuit(path);
    this.startTemperatures = [...(options.start?.temperatures ?? path.elements.map(() => path.ambient))];
    const y = Float64Array.of(options.start?.busVoltage ?? path.bulk.initialVoltage, ...this.startTemperatures, 0);
    this.hottest = [...this.startTemperatures];
    this.happenings = new Happenings(this.circuit, this.startTemperatures);
    const limits = { tolerance: options.tolerance ?? TOLERANCE, budget: this.budget };
    this.wave = new Waveform(this.circuit, { t: 0, y }, limits, this.happenings.watches, this.onStep);
    this.happenings.begin(this.wave, options.start);
    this.periods = new Periods(this.wave);
    this.history = new History(this.wave);
    this.pulse = new FirstPulse(this.wave);
    this.crest = new Crest(this.wave);
    this.trip = new TripRecord(this.wave, this.periods);
    this.run();
  }

  private run(): void {
    const { wave, periods, options } = this;
    while (wave.t < options.duration - 1e-9 && !wave.stoppedAs && !this.finished()) {
      const boundary = Math.max(periods.next(wave.t), Math.min(this.idleUntil(), wave.nextScheduled()));
      this.balanced(() => wave.run(Math.min(boundary, options.duration), () => this.finished()));
      if (wave.t >= boundary - 1e-12 || wave.t >= options.duration - 1e-9) periods.cut();
      if (!options.waveformOnly && this.readyToSoak() && !this.soak()) this.drift();
      if (wave.sides + this.soakSides > this.budget) wave.stoppedAs = 'step-budget';
    }
  }

  /** While nothing comes in there is no cycle to look at; a bus above a DC supply may fall below it again. */
  private idleUntil(): number {
    const { circuit, wave, path } = this;
    if (!circuit.supplied) return Infinity;
    return path.source.kind === 'dc' && circuit.bridge && circuit.drive(wave.y, wave.t, 1) < 0 ? wave.t + IDLE : 0;
  }

  /** A load that still ramps up makes no cycle that repeats. */
  private ramps(): boolean {
    const { circuit, path, wave } = this;
    return path.load.kind === 'constant-power' && circuit.loadSince !== null && wave.t < circuit.loadSince + path.load.rampTime;
  }

  private finished(): boolean {
    const { stopAt } = this.options;
    if (this.hiccups) return true;
    if (stopAt === 'first-pulse') return this.pulse.ended;
    return stopAt === 'charged' && this.isCharged();
  }

  private isCharged(): boolean {
    const rows = this.periods.rows;
    const [before, last] = [rows[rows.length - 2], rows[rows.length - 1]];
    if (!before || !last) return false;
    const rise = last.highestBus - before.highestBus;
    return this.pulse.ended && rise < 3e-3 * this.path.source.amplitude && last.highestBus > 0.3 * this.path.source.amplitude;
  }

  /** Runs a stretch of waveform and adds up how far source energy, heat and stored energy disagree. */
  private balanced(stretch: () => void): void {
    const { wave, circuit, sourceBalance } = this;
    const [source, dissipated, stored] = [wave.tally.source, wave.tally.dissipated, circuit.storedEnergy(wave.y)];
    stretch();
    const given = wave.tally.source - source;
    sourceBalance.energy += Math.abs(given);
    sourceBalance.residual += given - (wave.tally.dissipated - dissipated) - (circuit.storedEnergy(wave.y) - stored);
  }

  private onStep = (wave: Waveform, from: number, h: number): void => {
    const { pulse, history, periods, happenings } = this;
    pulse.add(from, h);
    this.crest.add(from, h);
    periods.add();
    if (wave.t <= FOLD || !pulse.ended) history.add(from, h);
    for (let k = 0; k < this.hottest.length; k += 1) this.hottest[k] = Math.max(this.hottest[k]!, wave.y[1 + k]!);
    this.countPulse();
    this.followEvents();
    this.followBypass(from, h);
    this.followLoad();
    this.trip.byCurrent();
    happenings.openIfBlocked();
  };

  private countPulse(): void {
    const { circuit, wave } = this;
    const { kind, amplitude, frequency } = this.path.source;
    if (kind === 'dc' || !circuit.supplied) return;
    if (Math.abs(circuit.sourceSlope(wave.t)) > 1e-6 * amplitude * frequency) return;
    const conducts = circuit.conduction !== 0;
    const sign = circuit.sourceVoltage(wave.t) < 0 ? -1 : 1;
    if (conducts || circuit.drive(wave.y, wave.t, sign) > 1e-3 * amplitude) this.pulses.expected += 1;
    if (conducts) this.pulses.found += 1;
  }

  private followEvents(): void {
    const { events } = this.happenings;
    for (; this.known < events.length; this.known += 1) {
      const event = events[this.known]!;
      const { wave } = this;
      // What happens after the last soak makes another cycle.
      this.endCycle = null;
      if (event.kind === 'load-starts' && this.underLoad.start === null) this.underLoad.start = wave.tally.start.bus;
      if (event.kind === 'load-stops') {
        this.underLoad.ended = true;
        this.underLoad.lowest = Math.min(this.underLoad.lowest, wave.tally.end.bus);
        this.hiccups = events.filter((one) => one.kind === 'load-stops').length >= HICCUPS && this.circuit.supplied;
      }
      if (event.kind === 'fault-begins') this.trip.faultBegins(event.at);
      if (event.kind === 'trips') this.trip.byResistance();
    }
  }

  private followBypass(from: number, h: number): void {
    const { bypass, wave, periods, happenings } = this;
    if (happenings.firstClosing && bypass.closedAt === null) {
      const { at, voltage } = happenings.firstClosing;
      Object.assign(bypass, { closedAt: at, voltage, crest: new Crest(wave) });
    }
    if (bypass.closedAt === null || wave.t > bypass.closedAt + Math.max(2 * periods.length, 0.05)) return;
    bypass.crest!.add(from, h);
  }

  private followLoad(): void {
    if (this.circuit.loadSince === null || this.underLoad.ended) return;
    const { start, middle, end } = this.wave.tally;
    this.underLoad.lowest = Math.min(this.underLoad.lowest, start.bus, middle.bus, end.bus);
  }

  private readyToSoak(): boolean {
    const { wave, periods, circuit, happenings, options } = this;
    const soon = wave.t + WORTHWHILE * periods.length;
    if (!circuit.supplied || happenings.supplyGoesOff || wave.t < this.waitUntil || !periods.repeats || this.ramps()) return false;
    const until = Math.min(happenings.nextHappening(), options.duration);
    return soon < until && this.isCalm() && !(this.ripples() && (until - wave.t) / periods.length < AFFORDABLE);
  }

  /** Whether a resistance moves so much within one cycle that averaging over it would tell in the temperature. */
  private ripples(): boolean {
    const row = this.periods.rows[this.periods.rows.length - 1]!;
    return this.path.elements.some(({ law, heatCapacity }, k) => {
      const [temperature, swing] = [row.temperature[k]!, (row.bodyPower[k]! * this.periods.length) / heatCapacity];
      return this.path.source.kind === 'ac' && Math.abs(swing * law.slope(temperature)) > RIPPLE * law.resistance(temperature);
    });
  }

  private isCalm(): boolean {
    const rows = this.periods.rows;
    const [before, last] = [rows[rows.length - 2]!, rows[rows.length - 1]!];
    return this.path.elements.every(({ law }, k) => {
      const change = Math.log(law.resistance(last.temperature[k]!) / law.resistance(before.temperature[k]!));
      return Math.abs(change) < 0.01;
    });
  }

  /** False where the cycle that would repeat for good has not been reached yet. */
  private soak(): boolean {
    const { wave, circuit, periods, happenings, options, path } = this;
    const temperatures = Float64Array.from(wave.y.subarray(1, 1 + circuit.count));
    const loadRuns = circuit.loadSince !== null;
    const map = new CycleMap({ path, loadRuns, faulted: circuit.faulted, tolerance: options.tolerance ?? TOLERANCE }, circuit.elementsResistance(wave.y), wave.y[0]!);
    const cycle = map.at(circuit.elementsResistance(wave.y));
    const amplitude = path.source.amplitude;
    this.waitUntil = wave.t + PATIENCE * periods.length;
    if (!cycle || Math.abs(cycle.capacitorVoltage - wave.y[0]!) > SETTLED * amplitude) return false;
    const to = Math.min(happenings.nextHappening(), options.duration);
    const whole = path.source.kind === 'dc' ? to : periods.next(to) - periods.length;
    const { load } = path;
    const result = new Soak(circuit, map, temperatures).run({
      from: wave.t, to: whole, period: periods.length, tolerance: SOAK_TOLERANCE,
      // A bus that swings past the start voltage in every cycle without a start will go on so.
      startsAt: load.kind === 'constant-power' && !loadRuns && !happenings.loadPending && cycle.highestBus < load.startVoltage ? load.startVoltage : null,
      stopsAt: load.kind === 'constant-power' && loadRuns ? load.stopVoltage : null,
    });
    this.soakSides += result.sides;
    if (result.cycle && result.points.length > 0) this.resume(result.cycle, result, map);
    return true;
  }

  /** Many half periods at once while bus and bodies move slowly towards a cycle that repeats. */
  private drift(): void {
    const { wave, circuit, periods, happenings, options, path } = this;
    if (path.source.kind === 'dc' || circuit.conduction !== 0) return;
    const to = Math.min(happenings.nextHappening(), options.duration) - LAST * periods.length;
    const span = { from: wave.t, to, ...happenings.thresholds(), tolerance: SOAK_TOLERANCE };
    const result = new Drift(circuit).run(wave.y[0]!, Float64Array.from(wave.y.subarray(1, 1 + circuit.count)), span);
    if (!result) return;
    this.soakSides += result.sides;
    this.moveOn(result, result.points);
    wave.y[0] = result.bus;
    wave.y.set(result.temperatures, 1);
    this.waitUntil = wave.t + 4 * periods.length;
  }

  private resume(cycle: SteadyCycle, result: ReturnType<Soak['run']>, map: CycleMap): void {
    const { wave, circuit, periods, options } = this;
    const { y } = wave;
    this.moveOn(result, result.points);
    y[0] = cycle.capacitorVoltage;
    y.set(result.temperatures, 1);
    const flowing = cycle.lineCurrent > 0 && this.path.source.kind === 'ac';
    if (this.path.source.kind === 'ac' && !flowing) circuit.conduction = 0;
    y[circuit.size - 1] = circuit.conduction === 0 ? 0 : cycle.lineCurrent;
    this.lastMap = map;
    this.endCycle = result.t >= options.duration - 2 * periods.length ? cycle : null;
    this.waitUntil = wave.t + 4 * periods.length;
  }

  /** Takes over the time and the integrals of a stretch that was not followed as a waveform. */
  private moveOn({ t, i2t, source, body, given }: Pick<DriftResult, 't' | 'i2t' | 'source'> & { body: ArrayLike<number>; given: ArrayLike<number> }, points: SoakPoint[]): void {
    const { wave, circuit, periods } = this;
    const { tally } = wave;
    this.soaked.push({ from: wave.t, points, offset: { i2t: tally.i2t, source: tally.source, energy: Array.from(tally.body) } });
    this.happenings.movedOn(t - wave.t);
    wave.jump(t);
    tally.i2t += i2t;
    tally.source += source;
    for (let k = 0; k < circuit.count; k += 1) {
      tally.body[k]! += body[k]!;
      tally.given[k]! += given[k]!;
      for (const { temperature } of points) this.hottest[k] = Math.max(this.hottest[k]!, temperature[k]!);
    }
    periods.restart();
  }

  /** All events in order of time; the end of charging among them. */
  eventsInOrder(): RunEvent[] {
    return [...this.happenings.events].sort((a, b) => a.at - b.at);
  }
}
