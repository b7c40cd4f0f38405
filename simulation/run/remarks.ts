import type { Follow } from './follow';

const inCelsius = (kelvin: number) => `${Math.round(kelvin - 273.15)} °C`;

const extrapolations = ({ path, hottest, startTemperatures }: Follow): string[] =>
  path.elements.flatMap(({ name, law }, k) => {
    const [coldest, highest] = [startTemperatures[k]!, hottest[k]!];
    if (coldest >= law.valid.min && highest <= law.valid.max) return [];
    return [`R(T) of ${name} is extrapolated: it holds from ${inCelsius(law.valid.min)} to ${inCelsius(law.valid.max)}, the body went from ${inCelsius(coldest)} to ${inCelsius(highest)}`];
  });

/** Assumptions, reductions and extrapolations that entered a run. */
export const remarksOf = (run: Follow): string[] => {
  const { path, hiccups, wave } = run;
  return [
    ...(path.elements.length > 0 ? ['Each body is one thermal node; a short pulse heats a real body unevenly, so its peak temperature is optimistic.'] : []),
    ...(path.source.inductance > 0 && !wave.everInductive ? ['The source inductance is too small to matter here; the current follows the voltages at once.'] : []),
    ...(hiccups ? ['The load starts and stops without end; the run was followed until that was plain.'] : []),
    ...extrapolations(run),
  ];
};
