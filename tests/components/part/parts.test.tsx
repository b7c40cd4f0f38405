import { fireEvent, screen } from '@testing-library/react-native';

import { PartListScreen } from '@/components/part/PartListScreen';
import { PartScreen } from '@/components/part/PartScreen';
import type { PartRecord } from '@/shared/contracts/part';
import { partSchema } from '@/shared/model/part';

import { samplePart } from '../../support/sample-scenario';
import { restoreFetch, useFakeApi, type FakeApi } from '../support/fake-api';
import { open, pass } from '../support/open';

const ID = '7a0d8a3e-0b0e-4a4e-9a54-0d1f5c2b7a01';
const part = partSchema.parse(samplePart({ ratings: { maximumTemperature: '170 °C', energy: { energy: '48', basis: 'absorbed' } } }));
const record: PartRecord = {
  id: ID,
  revision: 2,
  approvedBy: 'Palesa Drumm',
  resistance25: 10,
  part,
  curve: { temperature: [273.15, 298.15, 373.15], nominal: [25, 10, 1.3], low: [20, 8, 1], high: [30, 12, 1.6], valid: { min: 273.15, max: 443.15 } },
  provenance: [{ figure: 'law.r25', document: 'Sheet 3', page: 'p. 2', condition: 'zero power' }],
  usedIn: [{ id: '5a0d8a3e-0b0e-4a4e-9a54-0d1f5c2b7a01', name: 'Bench supply', status: 'fail' }],
};

let api: FakeApi;
beforeEach(() => {
  jest.useFakeTimers();
  api = useFakeApi();
});
afterEach(() => {
  jest.useRealTimers();
  restoreFetch();
});

const openPart = async () => {
  open({ index: () => <PartScreen id={ID} /> }, '/');
  await pass(100);
};

describe('A part', () => {
  it('gives every figure with its source, and says where none is filed', async () => {
    api.on(`GET /api/parts/${ID}`, () => ({ body: record }));
    await openPart();
    expect(screen.getByText(/^8 \/ 10 \/ 12/)).toBeOnTheScreen();
    expect(screen.getByText('Sheet 3, p. 2')).toBeOnTheScreen();
    expect(screen.getAllByText('no source filed').length).toBeGreaterThan(0);
  });

  it('lists the figures that are missing, with what that leaves undone', async () => {
    api.on(`GET /api/parts/${ID}`, () => ({ body: record }));
    await openPart();
    expect(screen.getByText('6 of 8 given')).toBeOnTheScreen();
    expect(screen.getAllByText('its check is not assessed')).toHaveLength(2);
  });

  it('cautions against its heat and defers to local codes', async () => {
    api.on(`GET /api/parts/${ID}`, () => ({ body: record }));
    await openPart();
    expect(screen.getByText(/may reach 170 °C/)).toHaveTextContent(/Local codes and licensed practice come first/);
  });

  it('shows where it is used', async () => {
    api.on(`GET /api/parts/${ID}`, () => ({ body: record }));
    await openPart();
    expect(screen.getByText('Bench supply')).toBeOnTheScreen();
  });

  it('says in plain words that there is no such part', async () => {
    await openPart();
    expect(screen.getByText(/Nothing is here, or it belongs to another team/)).toBeOnTheScreen();
  });
});

describe('The list of parts', () => {
  it('asks for a kind and a name, and says when none fits', async () => {
    api.on('GET /api/parts', ({ path }) => ({ body: { parts: path.includes('kind=resistor') ? [] : [record], next: null } }));
    open({ index: PartListScreen }, '/');
    await pass(100);
    expect(screen.getByText('Aldersyke Heron')).toBeOnTheScreen();
    fireEvent.press(screen.getByRole('radio', { name: 'Resistor' }));
    fireEvent.changeText(screen.getByLabelText('Search parts'), 'heron');
    await pass(100);
    expect(api.asked.at(-1)?.path).toBe('/api/parts?search=heron&kind=resistor');
    expect(screen.getByText(/No part fits/)).toBeOnTheScreen();
  });
});
