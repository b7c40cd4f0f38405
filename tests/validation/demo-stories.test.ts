import { DEMO_PARTS } from '../../server/demo/parts';
import { DEMO_SCENARIOS } from '../../server/demo/scenarios';
import type { CheckId } from '../../shared/model/check-id';
import type { Status } from '../../shared/model/check';
import { scenarioSchema } from '../../shared/model/scenario';
import { assess } from '../../simulation';

interface Story {
  name: string;
  status: Status;
  /** The check that leads the verdict; null where every check passes. */
  governing: CheckId | null;
  /** What must be within rating for the story to be true. */
  within: readonly CheckId[];
}

const STORIES: readonly Story[] = [
  { name: 'Instrument supply, 300 W', status: 'fail', governing: 'restart-peak-current', within: ['peak-current', 'limiter-energy', 'cold-start-reach', 'cold-start-hold', 'bypass-second-peak', 'bypass-never-closes', 'fuse-running-i2t'] },
  { name: 'Bench charger, contact fails open', status: 'fail', governing: 'bypass-never-closes', within: ['peak-current', 'restart-peak-current', 'limiter-steady-temperature', 'limiter-energy'] },
  { name: 'Outdoor lamp driver, cold start', status: 'fail', governing: 'cold-start-hold', within: ['peak-current', 'cold-start-reach', 'limiter-energy', 'limiter-steady-current'] },
  { name: 'Tool charger, energy at high line', status: 'fail', governing: 'limiter-energy', within: ['peak-current', 'restart-peak-current', 'limiter-steady-current', 'cold-start-reach'] },
  { name: 'Door controller, 40 W', status: 'pass', governing: null, within: ['peak-current', 'restart-peak-current', 'limiter-energy', 'fuse-running-i2t', 'cold-start-hold'] },
  { name: 'Camera rail, 24 V DC with a fault', status: 'pass', governing: null, within: ['ptc-hold', 'ptc-inrush', 'ptc-source-capability', 'ptc-time-to-trip', 'ptc-maximum-current', 'ptc-maximum-voltage', 'ptc-voltage-drop'] },
  { name: 'Meter supply, rating not found', status: 'not-assessed', governing: 'limiter-energy', within: ['peak-current', 'restart-peak-current', 'cold-start-reach', 'cold-start-hold'] },
  { name: 'Drive link, precharge from 400 V DC', status: 'pass', governing: null, within: ['peak-current', 'bypass-second-peak', 'bypass-never-closes', 'limiter-energy'] },
];

it('each demo scenario has its story, and the first is the hot restart', () => {
  expect(DEMO_SCENARIOS.map(({ scenario }) => scenario.name)).toEqual(STORIES.map(({ name }) => name));
  expect(new Set(DEMO_SCENARIOS.map(({ id }) => id)).size).toBe(DEMO_SCENARIOS.length);
});

it('every part in a demo scenario is the library part that it names', () => {
  for (const { scenario } of DEMO_SCENARIOS)
    for (const { part } of scenario.limiter ?? []) {
      const { libraryId, ...embedded } = part;
      expect(DEMO_PARTS.find(({ id }) => id === libraryId)?.part).toEqual(embedded);
    }
});

describe.each(STORIES)('$name', ({ name, status, governing, within }) => {
  const scenario = scenarioSchema.parse(DEMO_SCENARIOS.find((one) => one.scenario.name === name)?.scenario);
  const { verdict, checks, run } = assess(scenario, { envelope: false });

  it(`comes to "${status}"`, () => expect(verdict.status).toBe(status));

  it(governing ? `is governed by ${governing}` : 'has nothing but passes', () => {
    if (governing) expect(checks[0]).toMatchObject({ id: governing, status, setAside: null });
    else expect(new Set(checks.filter(({ setAside }) => setAside === null).map((check) => check.status))).toEqual(new Set(['pass']));
  });

  it('is within rating in all else that the story needs', () => {
    for (const id of within) {
      const found = checks.filter((check) => check.id === id);
      expect({ id, count: found.length }).toEqual({ id, count: Math.max(1, found.length) });
      for (const check of found) expect({ id, status: check.status }).toEqual({ id, status: expect.stringMatching(/^(pass|caution)$/) });
    }
  });

  it('runs to its end with a clean audit', () => {
    expect(run.stopped).toBeNull();
    expect(run.audit).toMatchObject({ clean: true });
  });
});
