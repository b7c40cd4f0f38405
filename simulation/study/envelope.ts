import type { Envelope, Traces } from '../../shared/model/result';
import { emptyBand, widen, type Band, type Series } from './band';

const joined = (first: Series, second: Series): Series => ({
  time: [...first.time, ...second.time],
  value: [...first.value, ...second.value],
});

/** Current over both scales: instantaneous up to the fold, after it the crest of each half period in both directions. */
const currents = ({ waveform, soak }: Traces, alternating: boolean): Series[] => {
  const crest: Series = { time: soak.time, value: soak.peakCurrent };
  const opposite: Series = { time: soak.time, value: alternating ? soak.peakCurrent.map((value) => -value) : soak.peakCurrent };
  const instant: Series = { time: waveform.time, value: waveform.current };
  return [joined(instant, crest), joined(instant, opposite)];
};

/** Crest against time over both scales. */
const crests = ({ waveform, soak }: Traces): Series =>
  joined({ time: waveform.time, value: waveform.current.map(Math.abs) }, { time: soak.time, value: soak.peakCurrent });

const perElement = (traces: Traces, field: 'temperature' | 'energy'): Series[] =>
  traces.waveform[field].map((value, index) =>
    joined({ time: traces.waveform.time, value }, { time: traces.soak.time, value: traces.soak[field][index] ?? [] }),
  );

const bandsOn = (axis: readonly number[], all: readonly Traces[], currentOf: (traces: Traces) => Series[]) => {
  const bandOf = (series: readonly Series[]): Band => {
    const band = emptyBand(axis.length);
    series.forEach((one) => widen(band, axis, one));
    return band;
  };
  const elements = all[0]?.waveform.temperature.map((_, index) => index) ?? [];
  const element = (field: 'temperature' | 'energy') => elements.map((index) => bandOf(all.flatMap((traces) => perElement(traces, field)[index] ?? [])));
  return { time: [...axis], current: bandOf(all.flatMap(currentOf)), temperature: element('temperature'), energy: element('energy') };
};

/** Lowest and highest of all runs at each time of the nominal run's two axes. The nominal run is one of them. */
export const envelopeOf = (nominal: Traces, others: readonly Traces[], alternating: boolean): Envelope => {
  const all = [nominal, ...others];
  return {
    waveform: bandsOn(nominal.waveform.time, all, (traces) => currents(traces, alternating)),
    soak: bandsOn(nominal.soak.time, all, (traces) => [crests(traces)]),
  };
};
