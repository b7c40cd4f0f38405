import { bypassSecondPeakCheck } from '../checks/bypass-second-peak';
import type { Bypass } from '../../shared/model/limiter';
import type { Figures } from '../../shared/model/figure';
import { givenPhase, findingOf, orNever, type Studied } from './studied';
import { NOMINAL, type Levels } from './levels';
import { UNDISTURBED, type Trials, type Variant } from './trials';
import { worstCase, type Situation } from './worst-case';

/** The contact closes at a time of its own instead of at its own condition. */
const closingAt = (at: number, index: number): Variant => ({
  name: `closing-${index}-${at.toFixed(7)}`,
  change: (path) => ({
    ...UNDISTURBED.change(path),
    elements: path.elements.map((one, position) =>
      position === index && one.bypass ? { ...one, bypass: { ...one.bypass, closes: { when: 'time', at } } } : one,
    ),
  }),
});

/** Half cycles that are followed after the closing. */
const FOLLOWED = 3;

/** A closing contact, with the run in which its pulse is highest. */
export interface Closing {
  studied: Studied;
  pulse: { situation: Situation; variant: Variant } | null;
}

/**
 * Second peak of a closing contact. A contact's operating time is known to no fraction of a half cycle, so the
 * closing is moved over the half cycle that follows its nominal instant and the worst instant counts; in the
 * search the angle of that delay takes the place of the switch-on angle, which is held.
 */
const studySecondPeak = (trials: Trials, index: number, bypass: Bypass): Closing => {
  const { limits, cautionBelow, source } = trials.scenario;
  const switchOn = givenPhase(trials.scenario) ?? Math.PI / 2;
  const nominalClosing = (levels: Levels): number | null =>
    bypass.closes.when === 'time' ? bypass.closes.at : trials.charge({ levels, phase: switchOn }).figures.bypassClosedAt;
  const closing = ({ levels, phase: delayAngle }: Situation): number | null => {
    const { frequency } = trials.path(levels, switchOn).source;
    const nominal = nominalClosing(levels);
    return nominal === null ? null : nominal + (frequency > 0 ? delayAngle / (2 * Math.PI * frequency) : 0);
  };
  const figuresAt = (one: Situation): Figures | null => {
    const at = closing(one);
    if (at === null) return null;
    const { frequency } = trials.path(one.levels, switchOn).source;
    const followed = frequency > 0 ? FOLLOWED / (2 * frequency) : at;
    return trials.until(at + followed, { levels: one.levels, phase: switchOn }, closingAt(at, index)).figures;
  };
  const peakAt = (one: Situation): number | null => figuresAt(one)?.bypassSecondPeak ?? null;
  const found = worstCase({
    ranges: trials.ranges,
    objective: (levels, phase) => orNever(peakAt({ levels, phase })),
    phase: source.kind === 'dc' ? 0 : null,
  });
  const situation = { levels: found.worst.levels, phase: switchOn };
  const finding = {
    ...findingOf(trials, { worst: situation, nominal: situation }, () => peakAt(found.worst)),
    nominal: peakAt({ levels: NOMINAL, phase: 0 }),
  };
  const contactVoltage = figuresAt(found.worst)?.bypassVoltage ?? null;
  const check = bypassSecondPeakCheck({ element: index, finding, makingCurrent: bypass.makingCurrent, limit: limits.peakCurrent, contactVoltage }, cautionBelow);
  const at = closing(found.worst);
  return { studied: { check, situation }, pulse: at === null ? null : { situation, variant: closingAt(at, index) } };
};

/** The second peak of every contact that works. */
export const studySecondPeaks = (trials: Trials): Closing[] =>
  trials.scenario.limiter.flatMap(({ bypass }, index) => (bypass?.behaviour === 'works' ? [studySecondPeak(trials, index, bypass)] : []));
