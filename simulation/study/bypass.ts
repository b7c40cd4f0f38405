import { bypassLoadCoincidenceCheck } from '../checks/bypass-load-coincidence';
import { bypassNeverClosesCheck } from '../checks/bypass-never-closes';
import { bypassWeldedCheck } from '../checks/bypass-welded';
import { surgeRating } from '../checks/diode-surge';
import type { Element } from '../../shared/model/limiter';
import { ambientAt } from './resolve-path';
import { searchSteady } from './steady';
import { findingOf, orNever, searchWorst, type Studied } from './studied';
import { isExtrapolated, riseUse } from './temperature-rise';
import { contactThat, type Trials } from './trials';
import type { Situation } from './worst-case';

/** Closing against load start, in the corner where the load is earliest. */
const studyCoincidence = (trials: Trials, index: number): Studied[] => {
  const { load, cautionBelow } = trials.scenario;
  if (load.kind !== 'constant-power') return [];
  const figures = (one: Situation) => trials.whole(one).run.figures;
  const found = searchSteady(trials, (levels, phase) => {
    const { bypassClosedAt, loadStartAt } = figures({ levels, phase });
    return loadStartAt === null ? -Infinity : orNever(bypassClosedAt) / Math.max(loadStartAt, 1e-9);
  });
  const finding = findingOf(trials, found, (one) => figures(one).bypassClosedAt, false);
  const loadStart = { worst: figures(found.worst).loadStartAt, nominal: figures(found.nominal).loadStartAt };
  return [{ check: bypassLoadCoincidenceCheck(index, finding, loadStart, cautionBelow), situation: found.worst }];
};

const studyNeverCloses = (trials: Trials, index: number, { part }: Element): Studied => {
  const variant = contactThat('never-closes', index);
  const { maximumTemperature } = part.ratings;
  const at = (one: Situation): number | null => trials.whole(one, variant).run.elements[index]?.peakTemperature ?? null;
  const found = searchSteady(trials, (levels, phase) =>
    riseUse(at({ levels, phase }), ambientAt(trials.scenario, levels), maximumTemperature),
  );
  const finding = findingOf(trials, found, at, false);
  const one = {
    element: index,
    finding,
    ambient: { worst: ambientAt(trials.scenario, found.worst.levels), nominal: trials.scenario.ambient.nominal },
    maximum: maximumTemperature,
    extrapolated: isExtrapolated(trials, index, found.worst, finding.value),
  };
  return { check: bypassNeverClosesCheck(one, trials.scenario.cautionBelow), situation: null };
};

const studyWelded = (trials: Trials, index: number): Studied => {
  const { rectifier, limits, cautionBelow } = trials.scenario;
  const variant = contactThat('welded', index);
  const surge = rectifier.kind === 'bridge' ? rectifier.surge : undefined;
  const figures = (one: Situation) => trials.firstPulse(one, variant).figures;
  const widthAt = (one: Situation): number | null => figures(one).pulseWidthTenth;
  const found = searchWorst(trials, (levels, phase) => {
    const { peakCurrent, pulseWidthTenth } = figures({ levels, phase });
    return orNever(peakCurrent) / (surge && pulseWidthTenth !== null ? surgeRating(surge, pulseWidthTenth) : 1);
  });
  const one = {
    element: index,
    finding: findingOf(trials, found, (situation) => figures(situation).peakCurrent),
    surge,
    width: { worst: widthAt(found.worst), nominal: widthAt(found.nominal) },
    limit: limits.peakCurrent,
    hasRectifier: rectifier.kind === 'bridge',
  };
  return { check: bypassWeldedCheck(one, cautionBelow), situation: null };
};

/** Sequence of each contact with the load, and what its two failures do. */
export const studyBypass = (trials: Trials): Studied[] =>
  trials.scenario.limiter.flatMap((element, index) => {
    if (!element.bypass) return [];
    const sequence = element.bypass.behaviour === 'works' ? studyCoincidence(trials, index) : [];
    return [...sequence, studyNeverCloses(trials, index, element), studyWelded(trials, index)];
  });
