import { fuseRunningI2tCheck, fuseUse, type FuseUse } from '../checks/fuse-running-i2t';
import type { Run } from '../../shared/model/result';
import { findingOf, orNever, searchWorst, type Studied } from './studied';
import type { Trials } from './trials';
import type { Situation } from './worst-case';

/** Cumulative I²t of a run over both its time scales. */
const runningOf = ({ traces: { waveform, soak } }: Run) => ({
  time: [...waveform.time, ...soak.time],
  i2t: [...waveform.i2t, ...soak.i2t],
});

/**
 * Running I²t against the minimum pre-arcing curve. The corner and angle are those of the highest I²t to the end of
 * charging or, of a later pulse (a contact closing), of the whole run; the use itself is taken from the traces there.
 */
export const studyFusePulse = (trials: Trials): Studied[] => {
  const { fuse, cautionBelow } = trials.scenario;
  if (!fuse) return [];
  const useAt = (one: Situation): FuseUse | null => fuseUse(runningOf(trials.traced(one).run), fuse);
  const found = searchWorst(trials, (levels, phase) => {
    const { chargeI2t, firstPulseI2t } = trials.charge({ levels, phase }).figures;
    return orNever(chargeI2t ?? firstPulseI2t);
  });
  const [worst, nominal] = [useAt(found.worst), useAt(found.nominal)];
  const finding = { ...findingOf(trials, found, () => null), value: worst?.value ?? null, nominal: nominal?.value ?? null };
  const check = fuseRunningI2tCheck(finding, { worst: worst?.rating ?? null, nominal: nominal?.rating ?? null }, fuse, cautionBelow);
  return [{ check, situation: found.worst }];
};
