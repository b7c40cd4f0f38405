import type { Traces } from '../../../shared/model/result';

type Column = readonly (number | undefined)[];

const lines = (scale: string, columns: readonly Column[], length: number): string[] =>
  Array.from({ length }, (_, row) => [scale, ...columns.map((column) => column[row] ?? '')].join(','));

const perElement = (series: { temperature: Column[]; resistance: Column[]; energy: Column[] }): Column[] =>
  series.temperature.flatMap((temperature, index) => [temperature, series.resistance[index] ?? [], series.energy[index] ?? []]);

/**
 * The nominal run's traces, comma-separated, in SI. `waveform` rows are instants; a `soak` row is a
 * half period (DC: an instant), its current the peak and its bus the lowest in it.
 */
export const tracesCsv = ({ waveform, soak }: Traces): string => {
  const elements = waveform.temperature.map((_, index) => index + 1);
  const header = [
    'scale', 'time_s', 'current_A', 'rms_current_A', 'bus_V', 'i2t_A2s',
    ...elements.flatMap((number) => [`temperature_${number}_K`, `resistance_${number}_ohm`, `energy_${number}_J`]),
  ];
  return [
    header.join(','),
    ...lines('waveform', [waveform.time, waveform.current, [], waveform.bus, waveform.i2t, ...perElement(waveform)], waveform.time.length),
    ...lines('soak', [soak.time, soak.peakCurrent, soak.rmsCurrent, soak.bus, soak.i2t, ...perElement(soak)], soak.time.length),
    '',
  ].join('\n');
};
