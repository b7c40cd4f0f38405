import { fireEvent, screen } from '@testing-library/react-native';

import { DataTable, type Column } from '@/components/ui/DataTable';
import { Text } from '@/components/ui/Text';

import { draw } from '../support/kit';

interface Row {
  name: string;
  ohms: number;
}
const columns: Column<Row>[] = [
  { key: 'name', title: 'Part', render: (row) => <Text>{row.name}</Text> },
  { key: 'ohms', title: 'R25', align: 'right', width: 80, render: (row) => <Text>{row.ohms}</Text> },
];
const rows = Array.from({ length: 250 }, (_, index): Row => ({ name: `Part ${index}`, ohms: index }));

describe('A table', () => {
  it('draws a long list in parts and tells how much is left', () => {
    draw(<DataTable caption="Parts" columns={columns} rows={rows} rowKey={(row) => row.name} />);
    expect(screen.getByText('Part 99')).toBeOnTheScreen();
    expect(screen.queryByText('Part 100')).toBeNull();
    fireEvent.press(screen.getByRole('button', { name: 'Show 100 more of 150' }));
    expect(screen.getByText('Part 199')).toBeOnTheScreen();
    fireEvent.press(screen.getByRole('button', { name: 'Show 50 more of 50' }));
    expect(screen.getByText('Part 249')).toBeOnTheScreen();
    expect(screen.queryByRole('button')).toBeNull();
  });

  it('lets a row be chosen by the button in its first cell', () => {
    const select = jest.fn();
    draw(<DataTable caption="Parts" columns={columns} rows={rows.slice(0, 3)} rowKey={(row) => row.name} rowName={(row) => `Open ${row.name}`} onSelect={select} />);
    fireEvent.press(screen.getByRole('button', { name: 'Open Part 1' }));
    expect(select).toHaveBeenCalledWith(rows[1]);
  });

  it('makes no button of a row that leads nowhere', () => {
    draw(<DataTable caption="Parts" columns={columns} rows={rows.slice(0, 3)} rowKey={(row) => row.name} />);
    expect(screen.queryByRole('button')).toBeNull();
  });
});
