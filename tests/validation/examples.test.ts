import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

import { readScenario } from '../../server/bin/simulate/read-scenario';
import { assess } from '../../simulation';

const FOLDER = join(__dirname, '../../assets/examples');
const files = readdirSync(FOLDER).filter((name) => name.endsWith('.json'));
const readme = readFileSync(join(FOLDER, 'README.md'), 'utf8');
const scenarioOf = (file: string) => readScenario(readFileSync(join(FOLDER, file), 'utf8'));

/** The check that leads each verdict; null where nothing but passes is claimed. */
const GOVERNING: Readonly<Record<string, string | null>> = {
  'bypass-by-time-restart.json': 'restart-peak-current',
  'cold-start-table.json': 'cold-start-hold',
  'contact-never-closes.json': 'limiter-steady-temperature',
  'dc-link-precharge-resistor.json': null,
  'dc-rail-polymer-ptc-fault.json': null,
  'mains-supply-ntc.json': null,
  'no-limiter-no-load.json': 'peak-current',
  'not-assessed-set-aside.json': 'peak-current',
  'over-energy-high-line.json': 'limiter-energy',
  'si-numbers-prospective-current.json': null,
  'two-in-series-resistive-load.json': 'limiter-energy',
};

it('there are eight examples or more, and each has its claim', () => {
  expect(files.length).toBeGreaterThanOrEqual(8);
  expect(Object.keys(GOVERNING).sort()).toEqual(files.sort());
});

it('between them they have every block and variant', () => {
  const text = files.map((file) => readFileSync(join(FOLDER, file), 'utf8')).join('\n');
  const words = [
    '"ac"', '"dc"', 'prospectiveCurrent', '"worst"', '"programme"', '"fuse"', 'preArcing', 'pulseFactor', '"b-value"', '"steinhart-hart"', '"table"',
    '"polymer-ptc"', '"resistor"', 'heatCapacity', 'timeConstant', '"when": "time"', '"when": "bus-voltage"', 'behaviour', '"bridge"', '"none"', 'surge',
    '"esr"', 'initialVoltage', 'bleeder', 'atLowAmbient', '"constant-power"', 'stopVoltage', 'startDelay', 'rampTime', '"resistance"', '"fault"', '"limits"',
    '"setAside"', 'cautionBelow', 'derating', '"half-cv2-peak"', '"unknown"', '"absorbed"', 'maximumVoltage', 'maximumCurrent',
  ];
  expect(words.filter((word) => !text.includes(word))).toEqual([]);
});

describe.each(files)('%s', (file) => {
  const scenario = scenarioOf(file);
  const claimed = /Verdict: ([a-z-]+)\.$/.exec(scenario.notes)?.[1];
  const assessment = assess(scenario, { envelope: false });

  it('comes to the verdict that its notes and the list claim', () => {
    expect(assessment.verdict.status).toBe(claimed);
    expect(readme).toMatch(new RegExp(`\\[${file}\\].*\\| ${claimed} \\|`));
  });

  it('is governed by the check it is about', () => {
    const governing = GOVERNING[file];
    const worst = assessment.checks.filter(({ status, setAside }) => status === assessment.verdict.status && setAside === null);
    if (governing) expect(worst.map(({ id }) => id)).toContain(governing);
    else expect(new Set(assessment.checks.filter(({ setAside }) => setAside === null).map(({ status }) => status))).toEqual(new Set(['pass']));
  });

  it('runs to its end with a clean audit', () => {
    expect(assessment.run.stopped).toBeNull();
    expect(assessment.run.audit).toMatchObject({ clean: true });
    expect(assessment.run.audit.worstResidual).toBeLessThan(1e-3);
  });
});
