import { View } from 'react-native';

import { isBranch, nodeAt, type DraftNode } from '@/hooks/scenario/draft-tree';

import { useEditor } from './editor-context';
import { convertedImpedance } from './impedance';
import { ProgrammeRows } from './ProgrammeRows';
import { QuantityRow } from './QuantityRow';
import { BlockIssue, PickRow, Section } from './rows';
import { TolerancedRow } from './TolerancedRow';

/** Tolerances of the supply: common practice, ±10 %; the wide range as stated. */
const VOLTAGES: Record<string, { label: string; voltage: DraftNode }> = {
  '100': { label: '100', voltage: { nominal: 100, tolerance: 0.1 } },
  '120': { label: '120', voltage: { nominal: 120, tolerance: 0.1 } },
  '230': { label: '230', voltage: { nominal: 230, tolerance: 0.1 } },
  '240': { label: '240', voltage: { nominal: 240, tolerance: 0.1 } },
  wide: { label: '90–264 V', voltage: { nominal: 230, min: 90, max: 264 } },
};
const PRESETS = Object.entries(VOLTAGES).map(([value, { label }]) => ({ value, label }));

const FREQUENCIES: Record<string, readonly number[]> = { '50': [50], '60': [60], both: [50, 60] };
const FREQUENCY_OPTIONS = [{ value: '50', label: '50 Hz' }, { value: '60', label: '60 Hz' }, { value: 'both', label: 'Both' }, { value: 'other', label: 'Other' }];

const presetOf = (voltage: DraftNode): string => {
  if (!isBranch(voltage)) return '';
  if (voltage.min === 90 && voltage.max === 264) return 'wide';
  return String(voltage.nominal);
};

const AcRows = () => {
  const { draft, edit } = useEditor();
  const frequencies = nodeAt(draft, 'source.frequencies');
  const list = Array.isArray(frequencies) ? frequencies : [];
  const chosen = Object.entries(FREQUENCIES).find(([, values]) => JSON.stringify(values) === JSON.stringify(list))?.[0] ?? 'other';
  const worst = nodeAt(draft, 'source.phase') === 'worst';
  return (
    <>
      <PickRow label="Preset, V" options={PRESETS} value={presetOf(nodeAt(draft, 'source.voltage'))} onPick={(key) => edit('source.voltage', VOLTAGES[key]?.voltage)} />
      <TolerancedRow path="source.voltage" switchable />
      <PickRow label="Line frequency" options={FREQUENCY_OPTIONS} value={chosen} onPick={(key) => edit('source.frequencies', FREQUENCIES[key] ?? [400])} />
      {chosen === 'other' ? list.map((_, index) => <QuantityRow key={index} path={`source.frequencies.${index}`} />) : null}
      <PickRow label="Switched on at" options={[{ value: 'worst', label: 'Worst angle' }, { value: 'angle', label: 'This angle' }]} value={worst ? 'worst' : 'angle'} onPick={(key) => edit('source.phase', key === 'worst' ? 'worst' : 90)} />
      {worst ? null : <QuantityRow path="source.phase" />}
    </>
  );
};

const ImpedanceRows = () => {
  const { draft, edit, scenario } = useEditor();
  const byCurrent = nodeAt(draft, 'source.impedance.prospectiveCurrent') !== undefined;
  return (
    <Section title="Source impedance" remark="no default">
      <PickRow label="Given as" hideLabel options={[{ value: 'elements', label: 'R and L' }, { value: 'current', label: 'Prospective current' }]} value={byCurrent ? 'current' : 'elements'} onPick={() => edit('source.impedance', convertedImpedance(scenario.source))} />
      {byCurrent ? (
        <>
          <TolerancedRow path="source.impedance.prospectiveCurrent" switchable />
          <QuantityRow path="source.impedance.reactanceRatio" />
        </>
      ) : (
        <>
          <TolerancedRow path="source.impedance.resistance" switchable />
          <TolerancedRow path="source.impedance.inductance" switchable />
        </>
      )}
      <BlockIssue path="source.impedance" />
    </Section>
  );
};

/** Supply: kind, voltage with its band, frequency, angle, impedance and the switching programme. */
export const SourceEditor = () => {
  const { draft, edit } = useEditor();
  const kind = nodeAt(draft, 'source.kind') === 'ac' ? 'ac' : 'dc';
  const change = (next: 'ac' | 'dc') => {
    const source = nodeAt(draft, 'source');
    if (!isBranch(source)) return;
    const { voltage, impedance, programme } = source;
    const common = { kind: next, voltage, impedance, programme };
    if (next === 'dc') return edit('source', common);
    const bridge = nodeAt(draft, 'rectifier.kind') === 'bridge' ? [] : [['rectifier', { kind: 'bridge', forwardVoltage: '', slopeResistance: '' }] as const];
    edit('source', { ...common, frequencies: [50], phase: 'worst' }, bridge);
  };
  return (
    <View style={{ gap: 14 }}>
      <Section title="Supply">
        <PickRow label="Kind of supply" hideLabel options={[{ value: 'ac', label: 'AC' }, { value: 'dc', label: 'DC' }]} value={kind} onPick={change} />
        {kind === 'ac' ? <AcRows /> : <TolerancedRow path="source.voltage" switchable />}
      </Section>
      <ImpedanceRows />
      <ProgrammeRows />
    </View>
  );
};
