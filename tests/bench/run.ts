/**
 * `npm run bench`: time, right-hand sides and difference of the engine on its standard case; `--json` for a program.
 * Times are printed, never asserted.
 */
import { readFileSync } from 'node:fs';
import path from 'node:path';

import { scenarioSchema } from '../../shared/model/scenario';
import { assess } from '../../simulation/index';
import type { RunOptions } from '../../simulation/run/options';
import { powerUp, type PowerUp } from '../../simulation/run/power-up';
import { resolvePath } from '../../simulation/study/resolve-path';
import { BENCH_SCENARIO } from './case';

const WARM_UP = 20;
const TIMED = 21;
const PATH = resolvePath(BENCH_SCENARIO, {}, Math.PI / 2);

const timed = <T>(work: () => T): { milliseconds: number; result: T } => {
  const began = performance.now();
  const result = work();
  return { milliseconds: performance.now() - began, result };
};

const median = (values: number[]): number => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)]!;

const measured = <T>(work: () => T, repeats: number): { milliseconds: number; result: T } => {
  const runs = Array.from({ length: repeats }, () => timed(work));
  return { milliseconds: median(runs.map(({ milliseconds }) => milliseconds)), result: runs[0]!.result };
};

const afterWarmUp = (options: RunOptions) => {
  for (let k = 0; k < WARM_UP; k += 1) powerUp(PATH, options);
  return measured(() => powerUp(PATH, options), TIMED);
};

const row = (name: string, { milliseconds, result }: { milliseconds: number; result: PowerUp }) => ({
  case: name,
  milliseconds: Number(milliseconds.toFixed(2)),
  'right-hand sides': result.sides,
  'residual of the audit': result.run.audit.worstResidual,
});

const difference = (quick: PowerUp, whole: PowerUp) => {
  const relative = (a: number | null | undefined, b: number | null | undefined) => (a == null || b == null ? null : a / b - 1);
  return {
    'final temperature, K': quick.run.elements[0]!.finalTemperature - whole.run.elements[0]!.finalTemperature,
    'steady rms current, relative': relative(quick.run.figures.steadyRmsCurrent, whole.run.figures.steadyRmsCurrent),
    'I²t, relative': relative(quick.run.figures.totalI2t, whole.run.figures.totalI2t),
    'peak current, relative': relative(quick.run.figures.peakCurrent, whole.run.figures.peakCurrent),
  };
};

const assessed = (name: string) => {
  const scenario = scenarioSchema.parse(JSON.parse(readFileSync(path.resolve(__dirname, '../../assets/examples', `${name}.json`), 'utf8')));
  assess(scenario);
  return { scenario: name, milliseconds: Math.round(measured(() => assess(scenario), 3).milliseconds) };
};

const { duration } = BENCH_SCENARIO;
const balance = afterWarmUp({ duration });
const withoutTraces = afterWarmUp({ duration, traces: false });
const firstPulse = afterWarmUp({ duration: 0.5, stopAt: 'first-pulse', traces: false });
const charge = afterWarmUp({ duration: 5, stopAt: 'charged', traces: false });
const halfSecond = afterWarmUp({ duration: 0.5, waveformOnly: true });
const whole = timed(() => powerUp(PATH, { duration, waveformOnly: true }));

const report = {
  runs: [
    row('600 s to thermal balance', balance),
    row('600 s without traces', withoutTraces),
    row('whole waveform, 600 s', whole),
    row('waveform, 0.5 s', halfSecond),
    row('to the end of charging', charge),
    row('first pulse', firstPulse),
  ],
  'to balance against the whole waveform': { ...difference(balance.result, whole.result), 'times faster': whole.milliseconds / balance.milliseconds, 'whole waveform finished': whole.result.run.stopped === null },
  'all checks, corners and phases': ['mains-supply-ntc', 'bypass-by-time-restart', 'dc-link-precharge-resistor'].map(assessed),
};

if (process.argv.includes('--json')) console.log(JSON.stringify(report, null, 2));
else {
  console.table(report.runs);
  console.table(report['to balance against the whole waveform']);
  console.table(report['all checks, corners and phases']);
}
