import { fireEvent, screen, within } from '@testing-library/react-native';

import { ScenarioScreen } from '@/components/scenario/ScenarioScreen';
import { TeamFrame } from '@/components/shell/TeamFrame';
import type { Scenario } from '@/shared/model/scenario';

import { sampleAssessment } from '../../support/sample-assessment';
import { readScenario, sampleCheck, sampleRecord } from '../../support/sample-record';
import { fakeStore, restoreFetch, useFakeApi, type FakeApi } from '../support/fake-api';
import { DESIGNER, open, pass, REVIEWER } from '../support/open';

const record = sampleRecord();
const PATH = `/api/scenarios/${record.id}`;
const SAVE = `PUT ${PATH}` as const;
const Bench = () => (
  <TeamFrame>
    <ScenarioScreen id={record.id} />
  </TeamFrame>
);

/** The look of a verdict is hidden from a screen reader, which hears it in a sentence. */
const HIDDEN = { includeHiddenElements: true };
const PLATE = 'Before your last edit';

let api: FakeApi;
let store: Map<string, string>;

const sentScenario = (body: unknown) => (body as { scenario: Scenario }).scenario;
/** More load resistance, less trouble: enough for a verdict that changes. */
const judge = (scenario: Scenario) => {
  const light = scenario.load.kind === 'resistance' && scenario.load.resistance > 2000;
  const aside = scenario.setAside.find(({ check }) => check === 'peak-current')?.reason ?? null;
  return sampleAssessment([sampleCheck(light ? { setAside: aside } : { status: 'fail', value: 120, ratio: 1.5, margin: -0.5, setAside: aside })]);
};

beforeEach(() => {
  jest.useFakeTimers();
  store = fakeStore();
  api = useFakeApi();
  api.on('GET /api/session', () => ({ body: DESIGNER }));
  api.on('GET /api/health', () => ({ body: {} }));
  api.on(`GET ${PATH}`, () => ({ body: record }));
  api.on('POST /api/simulations', ({ body }) => ({ body: { assessment: judge(sentScenario(body)), milliseconds: 7 } }));
  api.on(SAVE, ({ body }) => ({ body: sampleRecord({ version: (body as { version: number }).version + 1, scenario: sentScenario(body) }) }));
});
afterEach(() => {
  jest.useRealTimers();
  restoreFetch();
});

const openBench = async () => {
  const opened = open({ index: Bench }, '/');
  await pass(400);
  return opened;
};
const openBlock = async (name: RegExp) => {
  fireEvent.press(screen.getByRole('tab', { name }));
  await pass(50);
};
const typeLoad = async (text: string) => {
  await openBlock(/^Load/);
  fireEvent(screen.getByLabelText('Load resistance'), 'focus');
  await pass(50);
  fireEvent.changeText(screen.getByLabelText('Load resistance'), text);
  await pass(50);
};

describe('A scenario on the bench', () => {
  it('shows its verdict in words and the checks behind it', async () => {
    await openBench();
    expect(screen.getByText('Over rating. A cold start draws 120 A peak, limit 80 A.')).toBeOnTheScreen();
    expect(within(screen.getByLabelText('Checks, closest to failing first')).getByText('Peak current, cold start')).toBeOnTheScreen();
  });

  it('follows typing: the old result is marked, then the new verdict is there', async () => {
    await openBench();
    await typeLoad('4k7');
    expect(screen.getByText(PLATE, HIDDEN)).toBeOnTheScreen();
    expect(screen.getByLabelText('Load resistance').props.value).toBe('4k7');
    await pass(400);
    expect(sentScenario(api.of('POST /api/simulations').at(-1)?.body).load).toEqual({ kind: 'resistance', resistance: 4700 });
    expect(screen.getByText(/^Within rating\. /)).toBeOnTheScreen();
    expect(screen.queryByText(PLATE, HIDDEN)).toBeNull();
  });

  it('saves two seconds after the last key, once, on the version it began with', async () => {
    await openBench();
    await typeLoad('4k');
    await pass(1500);
    fireEvent.changeText(screen.getByLabelText('Load resistance'), '4k7');
    await pass(1500);
    expect(api.of(SAVE)).toHaveLength(0);
    await pass(1000);
    expect(api.of(SAVE)).toHaveLength(1);
    expect(api.of(SAVE)[0]?.body).toMatchObject({ version: 3, scenario: { load: { resistance: 4700 } } });
    expect(screen.getByText(/draft 4, saved/)).toBeOnTheScreen();
    expect(store.size).toBe(0);
  });

  it('sends nothing that it cannot read, says what is wrong with an example, and keeps what was typed', async () => {
    await openBench();
    const before = api.of('POST /api/simulations').length;
    await typeLoad('8mm');
    await pass(5000);
    expect(screen.getAllByText(/write for example 4k7/).length).toBeGreaterThan(0);
    expect(screen.getByText(/kept here, 1 field to correct/)).toBeOnTheScreen();
    expect(api.of('POST /api/simulations')).toHaveLength(before);
    expect(api.of(SAVE)).toHaveLength(0);
    expect([...store.values()].join()).toContain('8mm');
  });

  it('undoes and redoes an edit', async () => {
    await openBench();
    await typeLoad('4k7');
    fireEvent.press(screen.getByRole('button', { name: 'Undo' }));
    await pass(50);
    expect(screen.getByLabelText('Load resistance').props.value).toBe('1k');
  });

  it('sets a check aside only with a reason, and takes it back', async () => {
    await openBench();
    fireEvent.press(screen.getByRole('button', { name: /Peak current, cold start/ }));
    await pass(50);
    expect(screen.getByRole('button', { name: 'Set aside' })).toBeDisabled();
    fireEvent.changeText(screen.getByLabelText('Set aside because'), 'Covered by report 12');
    fireEvent.press(screen.getByRole('button', { name: 'Set aside' }));
    await pass(600);
    expect(sentScenario(api.of('POST /api/simulations').at(-1)?.body).setAside).toEqual([{ check: 'peak-current', reason: 'Covered by report 12' }]);
    expect(screen.getByText('1 set aside')).toBeOnTheScreen();
  });

  it('cautions beside the mains and beside the stored charge, and defers to local codes', async () => {
    await openBench();
    await openBlock(/^Source/);
    expect(screen.getByText(/live at up to 230 V rms/)).toHaveTextContent(/Local codes and licensed practice come first/);
    await openBlock(/^Bulk capacitor/);
    expect(screen.getByText(/there is no bleeder/)).toHaveTextContent(/Measure before touching.*Local codes and licensed practice come first/);
  });
});

describe('A scenario without a connection', () => {
  it('keeps the edits and sends them once when the server is back', async () => {
    await openBench();
    api.away = true;
    await typeLoad('4k7');
    await pass(3000);
    expect(screen.getByText(/kept here until connected/)).toBeOnTheScreen();
    expect([...store.values()].join()).toContain('4k7');
    api.away = false;
    await pass(15_000);
    expect(api.of(SAVE)).toHaveLength(1);
    expect(api.of(SAVE)[0]?.body).toMatchObject({ version: 3, scenario: { load: { resistance: 4700 } } });
    expect(screen.getByText(/draft 4, saved/)).toBeOnTheScreen();
    expect(screen.getByText(/^Within rating\. /)).toBeOnTheScreen();
  });

  it('has the edits again after the page was closed and opened', async () => {
    const first = await openBench();
    await typeLoad('8mm');
    await pass(100);
    first.unmount();
    await openBench();
    await pass(500);
    await openBlock(/^Load/);
    expect(screen.getByLabelText('Load resistance').props.value).toBe('8mm');
  });
});

describe('Two people in one draft', () => {
  const theirs = sampleRecord({ version: 4, updatedBy: 'Maridel Quost', scenario: readScenario({ load: { kind: 'resistance', resistance: '3k3' }, duration: 1 }) });

  it('are told, see both values, and nothing is overwritten until one is chosen', async () => {
    let taken = false;
    api.on(SAVE, ({ body }) => {
      if (taken) return { body: sampleRecord({ version: 5, scenario: sentScenario(body) }) };
      taken = true;
      return { status: 409, body: { code: 'version-conflict', instance: 'urn:uuid:1', conflict: theirs } };
    });
    await openBench();
    await typeLoad('4k7');
    await pass(3000);
    expect(screen.getByText(/Maridel Quost saved this scenario/)).toBeOnTheScreen();
    fireEvent.press(screen.getByRole('button', { name: 'Compare' }));
    await pass(50);
    expect(screen.getByText('mine 4.7 kΩ, theirs 3.3 kΩ')).toBeOnTheScreen();
    expect(screen.getByText('mine 500 ms, theirs 1 s')).toBeOnTheScreen();
    await pass(5000);
    expect(api.of(SAVE)).toHaveLength(1);
    fireEvent.press(screen.getByRole('button', { name: 'Go on with these' }));
    await pass(3000);
    expect(api.of(SAVE)[1]?.body).toMatchObject({ version: 4, scenario: { load: { resistance: 4700 }, duration: 1 } });
  });
});

describe('A reader without the role to change', () => {
  it('sees the fields, cannot change them, and is told why', async () => {
    api.on('GET /api/session', () => ({ body: REVIEWER }));
    api.on(`GET ${PATH}`, () => ({ body: { ...record, mayEdit: false } }));
    await openBench();
    await openBlock(/^Load/);
    expect(screen.getByText(/Read only: your role reads scenarios/)).toBeOnTheScreen();
    expect(screen.getByLabelText('Load resistance').props.readOnly ?? !screen.getByLabelText('Load resistance').props.editable).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Undo' })).toBeNull();
    expect(screen.queryByRole('button', { name: /Take|Add/ })).toBeNull();
  });
});
