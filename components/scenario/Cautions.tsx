import { Caution } from '@/components/ui/Caution';
import type { Assessment } from '@/shared/model/result';
import type { Scenario } from '@/shared/model/scenario';
import { formatQuantity } from '@/shared/quantity/format';

import { STORED_FROM, storedCharge } from './stored-charge';
import type { BlockKey } from './strip-blocks';

const FIRST = 'Local codes and licensed practice come first.';
/** Touchable voltages, common practice: 50 V AC, 60 V DC. */
const TOUCH_AC = 50;
/** A surface of metal that burns in a short touch, common practice: 60 °C. */
const HOT_SURFACE = 333.15;

const MainsCaution = ({ scenario: { source } }: { scenario: Scenario }) => {
  const live = source.voltage.max > (source.kind === 'ac' ? TOUCH_AC : STORED_FROM);
  if (!live) return null;
  return (
    <Caution title={source.kind === 'ac' ? 'Mains voltage' : 'Dangerous voltage'}>
      The whole path is live at up to {formatQuantity(source.voltage.max, 'voltage', 3)}{source.kind === 'ac' ? ' rms' : ''} when switched on. Isolate and prove it dead before work. {FIRST}
    </Caution>
  );
};

const ChargeCaution = ({ scenario, assessment }: { scenario: Scenario; assessment: Assessment | null }) => {
  const charge = storedCharge(scenario, assessment);
  if (!charge) return null;
  const time = charge.dischargesIn === null
    ? `nothing in the path is sure to empty it: there is no bleeder`
    : `below ${STORED_FROM} V after ${formatQuantity(charge.dischargesIn, 'time', 3)}`;
  return (
    <Caution title="Stored charge">
      The bus holds {formatQuantity(charge.voltage, 'voltage', 3)} after switch-off; {time}. Measure before touching. {FIRST}
    </Caution>
  );
};

const HeatCaution = ({ assessment, element }: { assessment: Assessment | null; element: number }) => {
  const hottest = (assessment?.checks ?? [])
    .filter((check) => check.dimension === 'temperature' && (check.element ?? 0) === element && check.value !== null)
    .reduce((highest, check) => Math.max(highest, check.value ?? 0), assessment?.run.elements[element]?.peakTemperature ?? 0);
  if (hottest < HOT_SURFACE) return null;
  return (
    <Caution title="Hot surface">
      The body reaches {formatQuantity(hottest, 'temperature', 3)} in the worst case. Keep neighbours and fingers away. {FIRST}
    </Caution>
  );
};

/** The caution of the block that is being looked at: each stands once, where it matters. */
export const BlockCaution = ({ block, scenario, assessment }: { block: BlockKey; scenario: Scenario; assessment: Assessment | null }) => {
  if (block === 'source') return <MainsCaution scenario={scenario} />;
  if (block === 'bulk') return <ChargeCaution scenario={scenario} assessment={assessment} />;
  if (block.startsWith('limiter')) return <HeatCaution assessment={assessment} element={block === 'limiter.1' ? 1 : 0} />;
  return null;
};
