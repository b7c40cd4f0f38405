import { isBranch, nodeAt, type DraftNode } from '@/hooks/scenario/draft-tree';

import { detached } from './detached';
import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { CoefficientRow, PickRow } from './rows';
import { TableField } from './TableField';
import { TolerancedRow } from './TolerancedRow';

const KINDS = [
  { value: 'ntc', label: 'NTC' },
  { value: 'polymer-ptc', label: 'PPTC' },
  { value: 'resistor', label: 'Resistor' },
] as const;
type Kind = (typeof KINDS)[number]['value'];

const NTC_LAWS = [
  { value: 'b-value', label: 'B-value' },
  { value: 'steinhart-hart', label: 'Coefficients' },
  { value: 'table', label: 'Table' },
] as const;
type NtcLaw = (typeof NTC_LAWS)[number]['value'];

const blankBand = { nominal: '', tolerance: 0 };
const NTC_BLANK: Record<NtcLaw, DraftNode> = {
  'b-value': { law: 'b-value', r25: blankBand, b: blankBand },
  'steinhart-hart': { law: 'steinhart-hart', a: '', b: '', c: '', tolerance: 0 },
  table: { law: 'table', points: [], tolerance: 0 },
};
const BLANK: Record<Kind, DraftNode> = {
  ntc: NTC_BLANK['b-value'],
  'polymer-ptc': { law: 'sigmoid', low: { nominal: '', min: '', max: '' }, high: '', midpoint: '', width: '' },
  resistor: { law: 'fixed', resistance: blankBand },
};

const NtcRows = ({ law, typed }: { law: string; typed: boolean }) => {
  const { draft, edit } = useEditor();
  const kind = NTC_LAWS.find(({ value }) => value === nodeAt(draft, `${law}.law`))?.value ?? 'b-value';
  return (
    <>
      {typed ? <PickRow label="R(T) given as" hideLabel options={NTC_LAWS} value={kind} onPick={(next) => edit(law, NTC_BLANK[next], detached(draft, law))} /> : null}
      {kind === 'b-value' ? (
        <>
          <TolerancedRow path={`${law}.r25`} />
          <TolerancedRow path={`${law}.b`} />
        </>
      ) : null}
      {kind === 'steinhart-hart' ? (
        <>
          <CoefficientRow path={`${law}.a`} label="A" remark="1/K" />
          <CoefficientRow path={`${law}.b`} label="B" remark="1/K" />
          <CoefficientRow path={`${law}.c`} label="C" remark="1/K" />
        </>
      ) : null}
      {kind === 'table' ? <TableField path={`${law}.points`} /> : null}
      {kind === 'b-value' ? null : <QuantityRow path={`${law}.tolerance`} />}
    </>
  );
};

/** Resistance against temperature by figures or by coefficients; kind and law are chosen only for a part that the person types. */
export const LawEditor = ({ base, typed }: { base: string; typed: boolean }) => {
  const { draft, edit } = useEditor();
  const law = `${base}.law`;
  const kind = KINDS.find(({ value }) => value === nodeAt(draft, `${base}.kind`))?.value ?? 'ntc';
  const change = (next: Kind) => {
    const part = nodeAt(draft, base);
    if (isBranch(part)) edit(base, { ...part, kind: next, law: BLANK[next], ratings: {}, libraryId: undefined });
  };
  return (
    <>
      {typed ? <PickRow label="Kind of element" hideLabel options={KINDS} value={kind} onPick={change} /> : null}
      {kind === 'ntc' ? <NtcRows law={law} typed={typed} /> : null}
      {kind === 'polymer-ptc' ? (
        <>
          <TolerancedRow path={`${law}.low`} alwaysEnds ends={['R_min', 'R_1max']} />
          <QuantityRow path={`${law}.high`} />
          <QuantityRow path={`${law}.midpoint`} />
          <QuantityRow path={`${law}.width`} />
        </>
      ) : null}
      {kind === 'resistor' ? <TolerancedRow path={`${law}.resistance`} /> : null}
    </>
  );
};
