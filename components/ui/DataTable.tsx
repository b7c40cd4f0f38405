import { useState, type ReactNode } from 'react';
import { Pressable, ScrollView, View, type ViewStyle } from 'react-native';

import { Button } from './Button';
import { Text } from './Text';
import { useLayout, useTheme } from './theme';

export interface Column<Row> {
  key: string;
  title: string;
  /** px; without it the column shares what is left, and is at least `LEAST` wide. */
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
  /** Makes the first cell of each row a button. */
  onSelect?: (row: Row) => void;
  /** What the button of a row is called. */
  rowName?: (row: Row) => string;
}

const LEAST = 96;
/** Rows drawn at once: a long table stays quick, the rest is one press away. */
const PAGE = 100;
/** The first column stays in sight while the others scroll; React Native's types do not know the place of the web. */
const STAYS = { position: 'sticky', left: 0, zIndex: 1 } as object;

const cellStyle = <Row,>({ width, align }: Column<Row>): ViewStyle => ({
  width,
  minWidth: width ?? LEAST,
  flexGrow: width ? 0 : 1,
  flexShrink: 0,
  flexBasis: width ? 'auto' : LEAST,
  paddingVertical: 6,
  paddingRight: 8,
  justifyContent: 'center',
  alignItems: align === 'right' ? 'flex-end' : 'flex-start',
});

interface RowProps<Row> extends Omit<DataTableProps<Row>, 'rows' | 'rowKey' | 'selectedKey' | 'caption'> {
  row: Row;
  selected: boolean;
  fixed: boolean;
}
const TableRow = <Row,>({ row, columns, selected, fixed, onSelect, rowName }: RowProps<Row>) => {
  const { colors } = useTheme();
  const ground = selected ? colors.panel : colors.paper;
  const cells = columns.map((column, index) => {
    const first = index === 0;
    const own: ViewStyle = { ...cellStyle(column), backgroundColor: first ? ground : undefined, paddingLeft: first && onSelect ? 12 : 0, minHeight: onSelect ? 44 : undefined };
    const style = [own, first && fixed ? STAYS : null];
    const content = column.render(row);
    const button = (
      <Pressable role="button" aria-pressed={selected} aria-label={rowName?.(row)} onPress={() => onSelect?.(row)} style={{ minHeight: 32, justifyContent: 'center', alignSelf: 'stretch' }}>
        {content}
      </Pressable>
    );
    return <View key={column.key} role={first ? 'rowheader' : 'cell'} style={style}>{first && onSelect ? button : content}</View>;
  });
  const line = { flexDirection: 'row', borderBottomWidth: 1, borderBottomColor: colors.rule, backgroundColor: ground } as const;
  return (
    <View role="row" style={line}>
      {cells}
      {selected ? <View aria-hidden style={{ position: 'absolute', left: 0, top: 0, bottom: 0, width: 4, backgroundColor: colors.ink, zIndex: 2 }} /> : null}
    </View>
  );
};

/** Rows under thin lines. On a phone the first column stays while the others scroll; the page never scrolls sideways. */
export const DataTable = <Row,>({ caption, rows, rowKey, selectedKey, ...rest }: DataTableProps<Row>) => {
  const { columns } = rest;
  const { colors } = useTheme();
  const { wide } = useLayout();
  const [shown, setShown] = useState(PAGE);
  const table = (
    <View role="table" aria-label={caption} aria-rowcount={rows.length + 1} style={{ flexGrow: 1 }}>
      <View role="row" style={{ flexDirection: 'row', borderBottomWidth: 1, borderBottomColor: colors.ink }}>
        {columns.map((column, index) => (
          <View key={column.key} role="columnheader" style={[{ ...cellStyle(column), paddingVertical: 4, justifyContent: 'flex-end', paddingLeft: index === 0 && rest.onSelect ? 12 : 0, backgroundColor: index === 0 ? colors.paper : undefined }, index === 0 && !wide ? STAYS : null]}>
            <Text variant="legend" tone="quiet">{column.title}</Text>
          </View>
        ))}
      </View>
      {rows.slice(0, shown).map((row) => <TableRow key={rowKey(row)} row={row} selected={rowKey(row) === selectedKey} fixed={!wide} {...rest} />)}
    </View>
  );
  const left = rows.length - shown;
  return (
    <View style={{ gap: 8 }}>
      {wide ? table : <ScrollView horizontal contentContainerStyle={{ minWidth: '100%' }} tabIndex={0} aria-label={`${caption}, scrolls sideways`}>{table}</ScrollView>}
      {left > 0 ? <Button kind="quiet" label={`Show ${Math.min(left, PAGE)} more of ${left}`} onPress={() => setShown(shown + PAGE)} /> : null}
    </View>
  );
};
