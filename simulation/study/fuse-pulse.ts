import { fuseRunningI2tCheck, fuseUse, type FuseUse } from '../checks/fuse-running-i2t';
import type { Run } from '../../shared/model/result';
import type { Closing } from './closing-instant';
import { findingOf, orNever, searchWorst, type Studied } from './studied';
import type { Trials, Variant } from './trials';
import type { Situation } from './worst-case';

/** Cumulative I²t of a run over both its time scales. */
const runningOf = ({ traces: { waveform, soak } }: Run) => ({
  time: [...waveform.time, ...soak.time],
  i2t: [...waveform.i2t, ...soak.i2t],
});

/** The situation whose traces use up most of the fuse. */
interface Pulse {
  situation: Situation;
  use: FuseUse | null;
}

const shareOf = ({ use }: Pulse): number => (use ? use.value / use.rating : -Infinity);

/**
 * Running I²t against the minimum pre-arcing curve. The corner and angle are those of the highest I²t to the end of
 * charging, or of the second pulse of a contact where that uses up more; the use itself is taken from the traces.
 */
export const studyFusePulse = (trials: Trials, contacts: readonly Closing[]): Studied[] => {
  const { fuse, cautionBelow } = trials.scenario;
  if (!fuse) return [];
  const pulseOf = (situation: Situation, variant?: Variant): Pulse => ({
    situation,
    use: fuseUse(runningOf(trials.traced(situation, variant).run), fuse),
  });
  const found = searchWorst(trials, (levels, phase) => {
    const { chargeI2t, firstPulseI2t } = trials.charge({ levels, phase }).figures;
    return orNever(chargeI2t ?? firstPulseI2t);
  });
  const later = contacts.flatMap(({ pulse }) => (pulse ? [pulseOf(pulse.situation, pulse.variant)] : []));
  const worst = [pulseOf(found.worst), ...later].reduce((a, b) => (shareOf(b) > shareOf(a) ? b : a));
  const nominal = pulseOf(found.nominal);
  const finding = {
    ...findingOf(trials, { worst: worst.situation, nominal: found.nominal }, () => null),
    value: worst.use?.value ?? null,
    nominal: nominal.use?.value ?? null,
  };
  const ratings = { worst: worst.use?.rating ?? null, nominal: nominal.use?.rating ?? null };
  return [{ check: fuseRunningI2tCheck(finding, ratings, fuse, cautionBelow), situation: worst.situation }];
};
