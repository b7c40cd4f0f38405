import { powerUp } from '../../../simulation/run/power-up';
import { integrate, type Reference } from './reference';
import { SETUPS } from './scenarios';
import { enginePath, type Setup } from './setup';

/** What the product claims of its engine. */
const ALLOWED = { peak: 0.002, energy: 0.005, kelvin: 0.3, time: 0.005, volts: 0.002 };
const EVENTS: Record<string, string> = { closes: 'contact-closes', off: 'switch-off', on: 'switch-on', fault: 'fault-begins', 'load starts': 'load-starts', 'load stops': 'load-stops' };

const largest = (values: readonly number[]) => values.reduce((most, one) => Math.max(most, one), -Infinity);

const expectWithin = (what: string, value: number | null | undefined, expected: number, relative: number) => {
  const miss = Math.abs((value ?? NaN) / expected - 1);
  if (!(miss < relative)) throw new Error(`${what}: ${value} instead of ${expected}, ${(100 * miss).toPrecision(3)} % apart`);
};

const crossing = ({ time }: Reference, column: readonly number[], level: number, from: number, rising: boolean): number => {
  const k = column.findIndex((one, index) => time[index]! > from && (rising ? one >= level : one <= level));
  const [a, b, t0, t1] = [column[k - 1]!, column[k]!, time[k - 1]!, time[k]!];
  return a === b ? t1 : t0 + ((level - a) / (b - a)) * (t1 - t0);
};

describe.each(SETUPS.map((setup) => [setup.name, setup] as const))('%s', (_name, setup: Setup) => {
  const reference = integrate(setup);
  const { run } = powerUp(enginePath(setup), { duration: setup.duration });
  const { figures } = run;
  const times = (kind: string) => reference.events.filter((one) => one.kind === kind);

  it('is followed to its end by both, with a clean audit', () => {
    expect(run.stopped).toBeNull();
    expect(run.audit).toMatchObject({ clean: true, notes: [] });
  });

  it('has the same peak current', () => expectWithin('peak current', figures.peakCurrent, largest(reference.current.map(Math.abs)), ALLOWED.peak));

  it('has the same events at the same times', () => {
    for (const [kind, engineKind] of Object.entries(EVENTS)) {
      const found = run.events.filter((one) => one.kind === engineKind && one.at > 0).map(({ at }) => at);
      const expected = times(kind);
      expect({ kind, count: found.length }).toEqual({ kind, count: expected.length });
      expected.forEach(({ at }, k) => expectWithin(kind, found[k], at, ALLOWED.time));
    }
  });

  it('has the same highest bus voltage', () => expectWithin('highest bus', figures.highestBus, largest(reference.bus), ALLOWED.volts));

  it('has the same temperatures', () => {
    run.elements.forEach(({ peakTemperature, finalTemperature }, k) => {
      expect(Math.abs(peakTemperature - reference.hottest[k]!)).toBeLessThan(ALLOWED.kelvin);
      expect(Math.abs(finalTemperature - reference.temperatures[k]!)).toBeLessThan(ALLOWED.kelvin);
    });
  });

  it('has the same energies and I²t', () => {
    expectWithin('source energy', figures.sourceEnergy, reference.sourceEnergy, ALLOWED.energy);
    expectWithin('I²t', figures.totalI2t, reference.i2t, ALLOWED.energy);
    run.elements.forEach(({ energy }, k) => expectWithin(`energy of ${k}`, energy, reference.energies[k]!, ALLOWED.energy));
  });

  if (setup.source.kind === 'ac')
    it('has the same peak in its last cycle', () => {
      const cycle = 1 / setup.source.frequency;
      const last = Math.floor(setup.duration / cycle + setup.source.degrees / 360 + 1e-9) * cycle - (setup.source.degrees / 360) * cycle;
      const inCycle = reference.current.filter((_, k) => reference.time[k]! > last - cycle && reference.time[k]! <= last);
      expectWithin('steady peak', figures.steadyPeakCurrent, largest(inCycle.map(Math.abs)), 5 * ALLOWED.peak);
    });

  if (setup.bodies.some(({ contact }) => contact))
    it('has the same second peak after the contact closes', () => {
      const { at } = times('closes')[0]!;
      const after = reference.current.filter((_, k) => reference.time[k]! >= at);
      expectWithin('second peak', figures.bypassSecondPeak, largest(after.map(Math.abs)), ALLOWED.peak);
    });

  const first = reference.firstPulse;
  if (first)
    it('has the same first pulse', () => {
      expectWithin('I²t of the first pulse', figures.firstPulseI2t, first.i2t, ALLOWED.energy);
      expectWithin('energy of the first pulse', figures.firstPulseEnergy, first.energy, ALLOWED.energy);
    });

  if (setup.load && 'power' in setup.load)
    it('has the same bus at load start', () => expectWithin('bus at load start', figures.busAtLoadStart, times('load starts')[0]!.bus, ALLOWED.volts));

  const fault = setup.fault;
  if (fault)
    it('trips after the same time, lets through the same I²t', () => {
      const during = reference.current.map((one, k) => (reference.time[k]! > fault.at ? Math.abs(one) : 0));
      const trip = crossing(reference, during, largest(during) / 2, reference.time[during.indexOf(largest(during))]!, false);
      expectWithin('time to trip', figures.timeToTrip, trip - fault.at, ALLOWED.time);
      let i2t = 0;
      reference.time.forEach((t, k) => {
        if (k > 0 && t > fault.at && t <= trip) i2t += ((during[k]! ** 2 + during[k - 1]! ** 2) / 2) * (t - reference.time[k - 1]!);
      });
      expectWithin('let-through I²t', figures.letThroughI2t, i2t, ALLOWED.energy);
      expectWithin('tripped current', figures.trippedCurrent, Math.abs(reference.current[reference.current.length - 1]!), ALLOWED.energy);
    });
});
