interface Contradiction {
  mutation: string;
  /** The field that must be named. */
  field: string;
  /** Dotted path and value, written one after another into any valid scenario. */
  writes: readonly (readonly [path: string, value: unknown])[];
}

const PTC = { kind: 'polymer-ptc', name: 'Contradiction', thermal: { dissipation: '15m', heatCapacity: 0.3 }, law: { law: 'sigmoid', low: '0.1', high: '100k', midpoint: '125 °C', width: '5' } };
const NTC = { kind: 'ntc', name: 'Contradiction', thermal: { dissipation: '15m', timeConstant: 60 }, law: { law: 'b-value', r25: 10, b: 3000 } };
const LOAD = { kind: 'constant-power', power: 10, startVoltage: 50 };
const points = (...pairs: [number, number][]) => pairs.map(([temperature, resistance]) => ({ temperature, resistance }));
const table = (...pairs: [number, number][]): Contradiction['writes'] => [['limiter', [{ part: { ...NTC, law: { law: 'table', points: points(...pairs) } } }]]];
const rated = (ratings: object): Contradiction['writes'] => [['limiter', [{ part: { ...NTC, ratings } }]], ['ambient', 298.15]];

/** Values that are each in range but cannot all be true. */
export const CONTRADICTIONS: readonly Contradiction[] = [
  { mutation: 'stop voltage at the start voltage', field: 'load.stopVoltage', writes: [['load', LOAD], ['load.stopVoltage', 50]] },
  { mutation: 'impedance in both ways', field: 'source.impedance', writes: [['source.impedance', { resistance: 1, inductance: 0, prospectiveCurrent: 100, reactanceRatio: 1 }]] },
  { mutation: 'impedance of resistance alone', field: 'source.impedance', writes: [['source.impedance', { resistance: 1 }]] },
  { mutation: 'no impedance', field: 'source.impedance', writes: [['source.impedance', {}]] },
  { mutation: 'tolerance beside limits', field: 'bulk.capacitance', writes: [['bulk.capacitance', { nominal: 1e-4, tolerance: 0.1, min: 1e-5 }]] },
  { mutation: 'minimum above nominal', field: 'bulk.capacitance', writes: [['bulk.capacitance', { nominal: 1e-4, min: 2e-4 }]] },
  { mutation: 'maximum below nominal', field: 'source.voltage', writes: [['source.voltage', { nominal: 100, max: 99 }]] },
  { mutation: 'tolerance of more than everything', field: 'bulk.esr', writes: [['bulk.esr', { nominal: 1, tolerance: '150 %' }]] },
  { mutation: 'tolerance in per cent of a temperature', field: 'ambient', writes: [['ambient', '25 °C ±10 %']] },
  { mutation: 'programme that begins with on', field: 'source.programme.0', writes: [['source.programme', [{ at: 0.01, switch: 'on' }]]] },
  { mutation: 'programme of two offs', field: 'source.programme.1', writes: [['source.programme', [{ at: 0.01, switch: 'off' }, { at: 0.015, switch: 'off' }]]] },
  { mutation: 'programme out of order', field: 'source.programme.1', writes: [['source.programme', [{ at: 0.015, switch: 'off' }, { at: 0.01, switch: 'on' }]]] },
  { mutation: 'programme at zero', field: 'source.programme.0', writes: [['source.programme', [{ at: 0, switch: 'off' }]]] },
  { mutation: 'programme beyond the end', field: 'source.programme.0', writes: [['duration', 1], ['source.programme', [{ at: 1, switch: 'off' }]]] },
  { mutation: 'programme without end', field: 'source.programme', writes: [['source.programme', Array.from({ length: 21 }, (_, index) => ({ at: (index + 1) / 1e4, switch: index % 2 ? 'on' : 'off' }))]] },
  { mutation: 'fault beyond the end', field: 'fault.at', writes: [['duration', 1], ['source.programme', []], ['fault', { kind: 'resistance', at: 2, resistance: 1 }]] },
  { mutation: 'AC without a bridge', field: 'rectifier.kind', writes: [['source', { kind: 'ac', voltage: 230, frequencies: [50], impedance: { resistance: 1, inductance: 0 } }], ['rectifier', { kind: 'none' }]] },
  { mutation: 'no frequency', field: 'source.frequencies', writes: [['source', { kind: 'ac', voltage: 230, frequencies: [], impedance: { resistance: 1, inductance: 0 } }]] },
  { mutation: 'DC with a frequency', field: 'source.frequencies', writes: [['source', { kind: 'dc', voltage: 230, frequencies: [50], impedance: { resistance: 1, inductance: 0 } }]] },
  { mutation: 'three elements', field: 'limiter', writes: [['limiter', [{ part: NTC }, { part: NTC }, { part: NTC }]]] },
  { mutation: 'NTC with the law of a PTC', field: 'limiter.0.part.law', writes: [['limiter', [{ part: { ...NTC, law: PTC.law } }]]] },
  { mutation: 'two thermal descriptions', field: 'limiter.0.part.thermal', writes: [['limiter', [{ part: { ...NTC, thermal: { dissipation: 0.01, timeConstant: 10, heatCapacity: 1 } } }]]] },
  { mutation: 'no heat capacity', field: 'limiter.0.part.thermal', writes: [['limiter', [{ part: { ...NTC, thermal: { dissipation: 0.01 } } }]]] },
  { mutation: 'PTC that does not rise', field: 'limiter.0.part.law.high', writes: [['limiter', [{ part: { ...PTC, law: { ...PTC.law, low: 10, high: 10 } } }]]] },
  { mutation: 'empty table', field: 'limiter.0.part.law.points', writes: table() },
  { mutation: 'table of two rows', field: 'limiter.0.part.law.points', writes: table([273, 30], [298, 10]) },
  { mutation: 'table whose temperature falls', field: 'limiter.0.part.law.points.1', writes: table([298, 30], [273, 10], [323, 4]) },
  { mutation: 'table whose temperature stands', field: 'limiter.0.part.law.points.2', writes: table([273, 30], [298, 10], [298, 4]) },
  { mutation: 'table whose resistance rises', field: 'limiter.0.part.law.points.2', writes: table([273, 30], [298, 10], [323, 11]) },
  { mutation: 'Steinhart–Hart with the wrong sign', field: 'limiter.0.part.law', writes: [['limiter', [{ part: { ...NTC, law: { law: 'steinhart-hart', a: 0.001, b: -0.0003, c: 1e-7 } } }]]] },
  { mutation: 'Steinhart–Hart of zeros', field: 'limiter.0.part.law', writes: [['limiter', [{ part: { ...NTC, law: { law: 'steinhart-hart', a: 0, b: 0, c: 0 } } }]]] },
  { mutation: 'body rated below the ambient', field: 'limiter.0.part.ratings.maximumTemperature', writes: [...rated({ maximumTemperature: '65 °C' }), ['ambient', '70 °C']] },
  { mutation: 'current rated above the highest body temperature', field: 'limiter.0.part.ratings.steadyCurrent.ambient', writes: rated({ maximumTemperature: '90 °C', steadyCurrent: { current: 1, ambient: '95 °C' } }) },
  { mutation: 'energy rated from above the highest body temperature', field: 'limiter.0.part.ratings.energy.startTemperature', writes: rated({ maximumTemperature: '90 °C', energy: { energy: 1, basis: 'absorbed', startTemperature: '95 °C' } }) },
  { mutation: 'derating out of order', field: 'limiter.0.part.ratings.steadyCurrent.derating.1', writes: rated({ steadyCurrent: { current: 1, ambient: '25 °C', derating: [{ ambient: '80 °C', share: 0.5 }, { ambient: '70 °C', share: 0 }] } }) },
  { mutation: 'pre-arcing curve out of order', field: 'fuse.preArcing.1', writes: [['fuse', { ratedCurrent: 1, preArcing: [{ time: 0.1, i2t: 1 }, { time: 0.01, i2t: 2 }] }]] },
  { mutation: 'peak where rms is meant', field: 'fuse.ratedCurrent', writes: [['fuse', { ratedCurrent: '2 A peak' }]] },
  { mutation: 'rms where peak is meant', field: 'limits.peakCurrent', writes: [['limits', { peakCurrent: '20 A rms' }]] },
  { mutation: 'volt where ohm is meant', field: 'bulk.esr', writes: [['bulk.esr', '0.1 V']] },
  { mutation: 'mega where milli is meant', field: 'bulk.esr', writes: [['bulk.esr', '10 MΩ']] },
  { mutation: 'check that does not exist', field: 'setAside.0.check', writes: [['setAside', [{ check: 'peak', reason: 'covered elsewhere' }]]] },
  { mutation: 'set aside without a reason', field: 'setAside.0.reason', writes: [['setAside', [{ check: 'peak-current', reason: '  ' }]]] },
];
