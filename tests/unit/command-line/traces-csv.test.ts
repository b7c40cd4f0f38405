import { tracesCsv } from '../../../server/bin/simulate/traces-csv';

const traces = {
  foldAt: 0.1,
  waveform: { time: [0, 0.01], current: [0, -3.5], bus: [0, 120], temperature: [[298, 299]], resistance: [[10, 9.5]], energy: [[0, 0.2]], i2t: [0, 0.05] },
  soak: { time: [0.1], peakCurrent: [2], rmsCurrent: [0.8], bus: [300], temperature: [[310]], resistance: [[7]], energy: [[12]], i2t: [1.5] },
};

describe('traces as CSV', () => {
  it('one row an instant, then one a half period, every row as wide as the header', () => {
    expect(tracesCsv(traces)).toBe(
      [
        'scale,time_s,current_A,rms_current_A,bus_V,i2t_A2s,temperature_1_K,resistance_1_ohm,energy_1_J',
        'waveform,0,0,,0,0,298,10,0',
        'waveform,0.01,-3.5,,120,0.05,299,9.5,0.2',
        'soak,0.1,2,0.8,300,1.5,310,7,12',
        '',
      ].join('\n'),
    );
  });

  it('without a limiter there is no element column', () => {
    const none = { foldAt: 0, waveform: { ...traces.waveform, temperature: [], resistance: [], energy: [] }, soak: { ...traces.soak, time: [], temperature: [], resistance: [], energy: [] } };
    expect(tracesCsv(none).split('\n')[0]).toBe('scale,time_s,current_A,rms_current_A,bus_V,i2t_A2s');
  });
});
