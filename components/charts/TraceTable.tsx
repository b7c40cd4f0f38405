import { useMemo } from 'react';

import { DataTable, type Column } from '@/components/ui/DataTable';
import { Quantity } from '@/components/ui/Quantity';
import { Text } from '@/components/ui/Text';
import type { RunEvent, Traces } from '@/shared/model/result';
import type { Dimension } from '@/shared/quantity/dimension';

import { traceRows, type TraceRow } from './trace-rows';

export interface TraceTableProps {
  traces: Traces;
  events: readonly RunEvent[];
  elementNames: readonly string[];
  element?: number;
}

const SIGNIFICANT = 3;
type Figure = 'time' | 'current' | 'rms' | 'bus' | 'temperature' | 'resistance' | 'energy';

const figure = (key: Figure, title: string, dimension: Dimension, width = 88): Column<TraceRow> => ({
  key, title, width, align: 'right',
  render: (row) => (row[key] === null ? <Text variant="label" tone="quiet">·</Text> : <Quantity variant="label" value={row[key]} dimension={dimension} significant={SIGNIFICANT} />),
});

const remark: Column<TraceRow> = { key: 'remark', title: 'Remark', width: 190, render: (row) => <Text variant="label" tone="quiet">{row.remark}</Text> };

/** The table behind the split-time plot: the same run in a few dozen rows, with every peak and event among them. */
export const TraceTable = ({ traces, events, elementNames, element = 0 }: TraceTableProps) => {
  const rows = useMemo(() => traceRows(traces, events, element), [traces, events, element]);
  const name = elementNames[element];
  const body = name === undefined ? [] : [figure('temperature', `${name}, body`, 'temperature'), figure('resistance', `${name}, resistance`, 'resistance'), figure('energy', `${name}, energy`, 'energy')];
  const columns = [figure('time', 'Time', 'time', 76), figure('current', 'Current, peak after the fold', 'current', 104), figure('rms', 'Current, rms', 'current'), figure('bus', 'Bus', 'voltage'), ...body, remark];
  return <DataTable caption="Traces of the nominal run" columns={columns} rows={rows} rowKey={(row) => row.key} />;
};
