import { bypassSecondPeakCheck } from '../checks/bypass-second-peak';
import type { Bypass } from '../../shared/model/limiter';
import type { Figures } from '../../shared/model/figure';
import { givenPhase, findingOf, orNever, type Studied } from './studied';
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

/**
 * Second peak of a closing contact. A contact's operating time is known to no fraction of a half cycle, so the
 * closing is moved over the half cycle that follows its nominal instant and the worst instant counts; in the
 * search the angle of that delay takes the place of the switch-on angle, which is held.
 */
export const studySecondPeak = (trials: Trials, index: number, bypass: Bypass): Studied => {
  const { limits, cautionBelow, source } = trials.scenario;
  const switchOn = givenPhase(trials.scenario) ?? Math.PI / 2;
  const closes = (levels: Situation['levels']): number | null =>
    bypass.closes.when === 'time' ? bypass.closes.at : trials.charge({ levels, phase: switchOn }).figures.bypassClosedAt;
  const figuresAt = ({ levels, phase: delayAngle }: Situation): Figures | null => {
    const nominal = closes(levels);
    if (nominal === null) return null;
    const { frequency } = trials.path(levels, switchOn).source;
    const at = nominal + (frequency > 0 ? delayAngle / (2 * Math.PI * frequency) : 0);
    const followed = frequency > 0 ? FOLLOWED / (2 * frequency) : nominal;
    return trials.until(at + followed, { levels, phase: switchOn }, closingAt(at, index)).figures;
  };
  const peakAt = (one: Situation): number | null => figuresAt(one)?.bypassSecondPeak ?? null;
  const found = worstCase({
    ranges: trials.ranges,
    objective: (levels, phase) => orNever(peakAt({ levels, phase })),
    phase: source.kind === 'dc' ? 0 : null,
  });
  const worst = { levels: found.worst.levels, phase: switchOn };
  const finding = {
    ...findingOf(trials, { worst, nominal: worst }, () => peakAt(found.worst)),
    nominal: peakAt({ levels: {}, phase: 0 }),
  };
  const check = bypassSecondPeakCheck(
    {
      element: index,
      finding,
      makingCurrent: bypass.makingCurrent,
      limit: limits.peakCurrent,
      contactVoltage: figuresAt(found.worst)?.bypassVoltage ?? null,
    },
    cautionBelow,
  );
  return { check, situation: worst };
};
