import { nodeAt } from '@/hooks/scenario/draft-tree';

import { detached } from './detached';
import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { BlockIssue, PickRow } from './rows';

/** Dissipation factor, with the time constant or the heat capacity (C_th = δ·τ). */
export const ThermalRows = ({ base, typed }: { base: string; typed: boolean }) => {
  const { draft, edit, reader } = useEditor();
  const byCapacity = nodeAt(draft, `${base}.heatCapacity`) !== undefined;
  const swap = () => {
    const dissipation = nodeAt(draft, `${base}.dissipation`);
    const factor = typeof dissipation === 'number' ? dissipation : (reader?.valueAt(draft, `${base}.dissipation`, 'dissipation') ?? null);
    const from = byCapacity ? 'heatCapacity' : 'timeConstant';
    const node = nodeAt(draft, `${base}.${from}`);
    const value = typeof node === 'number' ? node : (reader?.valueAt(draft, `${base}.${from}`, byCapacity ? 'heatCapacity' : 'time') ?? null);
    const converted = factor && value !== null ? Number((byCapacity ? value / factor : value * factor).toPrecision(6)) : '';
    edit(base, byCapacity ? { dissipation, timeConstant: converted } : { dissipation, heatCapacity: converted }, detached(draft, base));
  };
  return (
    <>
      <QuantityRow path={`${base}.dissipation`} />
      {typed ? <PickRow label="How fast it warms, given as" hideLabel options={[{ value: 'time', label: 'Time constant' }, { value: 'capacity', label: 'Heat capacity' }]} value={byCapacity ? 'capacity' : 'time'} onPick={swap} /> : null}
      <QuantityRow path={byCapacity ? `${base}.heatCapacity` : `${base}.timeConstant`} />
      <BlockIssue path={base} />
    </>
  );
};
