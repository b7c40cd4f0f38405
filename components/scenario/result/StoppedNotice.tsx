import { Notice } from '@/components/ui/Notice';
import type { Stopped } from '@/shared/model/result';
import { formatQuantity } from '@/shared/quantity/format';

/** A run that ended before its time: when, why, and the way to the field to look at. */
export const StoppedNotice = ({ stopped, onGoTo }: { stopped: Stopped; onGoTo: (path: string) => void }) => (
  <Notice kind="error" title={`Stopped at ${formatQuantity(stopped.at, 'time', 3)}`} action={{ label: 'Go to the field', onPress: () => onGoTo(stopped.place) }}>
    {stopped.advice}
  </Notice>
);
