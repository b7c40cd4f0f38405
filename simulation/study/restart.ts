import type { Run } from '../../shared/model/result';
import { moved, type Levels } from './levels';
import { cooled, dischargedBus } from './off-state';
import type { Trials } from './trials';
import type { StartState } from '../run/options';

/** What the soak leaves behind when the supply goes: the hottest body at the lowest line, the bus in its trough. */
export interface SoakState {
  temperatures: readonly number[];
  busVoltage: number;
  loadRuns: boolean;
  /** Whether each element's contact is closed. */
  closed: readonly boolean[];
}

const loadRunsAtEnd = ({ events }: Run): boolean =>
  events.filter(({ kind }) => kind === 'load-starts' || kind === 'load-stops').at(-1)?.kind === 'load-starts';

const closedAtEnd = ({ events }: Run, element: number): boolean =>
  events.filter((event) => event.element === element && (event.kind === 'contact-closes' || event.kind === 'contact-opens')).at(-1)
    ?.kind === 'contact-closes';

const SOAK_PHASE = Math.PI / 2;

/** Restart at the highest line, whatever a search moves. */
export const restartLevels = (trials: Trials, levels: Levels): Levels =>
  trials.ranges.some(({ factor }) => factor === 'line') ? moved(levels, 'line', 'high') : levels;

/**
 * The line at which a body is hottest: a converter of constant power draws most current at the lowest, a
 * resistance at the highest. With the line at its nominal value the soak is nominal as well.
 */
const soakLine = (trials: Trials, levels: Levels) => {
  if (levels.line === undefined) return 'nominal';
  return trials.scenario.load.kind === 'constant-power' ? 'low' : 'high';
};

/** The state at thermal balance, full load, at the line of the hottest body, the corner's other factors kept. */
export const soakState = (trials: Trials, levels: Levels): SoakState => {
  const soak = { levels: moved(levels, 'line', soakLine(trials, levels)), phase: SOAK_PHASE };
  const { run, final } = trials.whole(soak);
  return {
    temperatures: final.temperatures,
    busVoltage: run.figures.finalBusLow ?? final.busVoltage,
    loadRuns: loadRunsAtEnd(run),
    closed: final.temperatures.map((_, element) => closedAtEnd(run, element)),
  };
};

/** The soak that stands for a corner while searching: only what moves the balance of a body most. */
export const searchSoak = (trials: Trials, { line, ambient, elementResistance, elementB }: Levels): SoakState =>
  soakState(trials, {
    ...(line && { line }),
    ...(ambient && { ambient }),
    ...(elementResistance && { elementResistance }),
    ...(elementB && { elementB }),
  });

/** The state at a restart after `offTime` (s): cooled bodies, a discharged bus, contacts that have not yet released. */
export const restartState = (trials: Trials, levels: Levels, soak: SoakState, offTime: number): StartState => {
  const path = trials.path(levels, SOAK_PHASE);
  return {
    temperatures: path.elements.map((element, index) => cooled(element, soak.temperatures[index] ?? path.ambient, path.ambient, offTime)),
    busVoltage: dischargedBus(path.bulk, path.load, soak.loadRuns, soak.busVoltage, offTime),
    // Power that returns before the release holds the contact: it never opens in this restart.
    contactsClosedFor: path.elements.map(({ bypass }, index) =>
      bypass && soak.closed[index] && offTime < bypass.releaseTime ? trials.scenario.duration : null,
    ),
  };
};
