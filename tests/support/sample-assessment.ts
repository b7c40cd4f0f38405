import { FIGURES, type FigureId, type Figures } from '../../shared/model/figure-list';
import type { Check } from '../../shared/model/check';
import type { Assessment } from '../../shared/model/result';
import { sampleCheck } from './sample-record';

const noFigures = Object.fromEntries((Object.keys(FIGURES) as FigureId[]).map((id) => [id, null])) as Figures;
const series = [0, 0.05, 0.1];

/** A result in the shape of the engine's, with made-up numbers; the verdict follows from the checks. */
export const sampleAssessment = (checks: Check[] = [sampleCheck()]): Assessment => {
  const counts = { fail: 0, 'not-assessed': 0, caution: 0, pass: 0, 'set-aside': 0 };
  for (const check of checks) counts[check.setAside === null ? check.status : 'set-aside'] += 1;
  const status = (['fail', 'not-assessed', 'caution'] as const).find((one) => counts[one] > 0) ?? 'pass';
  return {
    engineVersion: 'sample',
    verdict: { status, counts },
    checks,
    run: {
      stopped: null,
      figures: { ...noFigures, peakCurrent: 30, highestBus: 325 },
      elements: [],
      events: [],
      traces: {
        foldAt: 0.1,
        waveform: { time: series, current: series, bus: series, temperature: [], resistance: [], energy: [], i2t: series },
        soak: { time: [], peakCurrent: [], rmsCurrent: [], bus: [], temperature: [], resistance: [], energy: [], i2t: [] },
      },
      audit: { clean: true, worstResidual: 1e-4, elementEnergy: [], sourceEnergy: 1e-4, pulses: { expected: 1, found: 1 }, soak: null, notes: [] },
      remarks: ['Two diodes conduct at a time'],
    },
    envelope: null,
    corners: [],
    restart: null,
  };
};
