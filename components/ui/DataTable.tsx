import type { ReactNode } from 'react';
import { ScrollView, View } from 'react-native';

import { Text } from './Text';

export interface Column<Row> {
  key: string;
  title: string;
  /** px; the first column takes what is left when it has none. */
  width?: number;
  align?: 'left' | 'right';
  render: (row: Row) => ReactNode;
}
export interface DataTableProps<Row> {
  /** What the table holds; spoken, not shown. */
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  selectedKey?: string | null;
  onSelect?: (row: Row) => void;
}

export const DataTable = <Row,>({ caption, columns, rows, rowKey }: DataTableProps<Row>) => (
  <ScrollView horizontal>
    <View role="table" aria-label={caption}>
      <View role="row" style={{ flexDirection: 'row' }}>
        {columns.map((column) => <View key={column.key} role="columnheader" style={{ width: column.width ?? 120 }}><Text variant="legend" tone="quiet">{column.title}</Text></View>)}
      </View>
      {rows.map((row) => (
        <View key={rowKey(row)} role="row" style={{ flexDirection: 'row' }}>
          {columns.map((column) => <View key={column.key} role="cell" style={{ width: column.width ?? 120 }}>{column.render(row)}</View>)}
        </View>
      ))}
    </View>
  </ScrollView>
);
