import { fireEvent, screen } from '@testing-library/react-native';
import { Text } from 'react-native';

import { FirstPlace } from '@/components/session/FirstPlace';
import { Guard } from '@/components/session/Guard';
import { SignInScreen } from '@/components/session/SignInScreen';

import { sampleCheck, sampleRecord } from '../../support/sample-record';
import { fakeStore, restoreFetch, useFakeApi, type FakeApi } from '../support/fake-api';
import { DESIGNER, open, pass } from '../support/open';

const Private = () => (
  <Guard>
    <Text>the parts</Text>
  </Guard>
);
const Bare = () => <Text>the list</Text>;
const Scenario = () => <Text>the scenario</Text>;
const ROUTES = { index: FirstPlace, 'sign-in': SignInScreen, parts: Private, 'scenarios/index': Bare, 'scenarios/[scenarioId]': Scenario };

let api: FakeApi;
beforeEach(() => {
  jest.useFakeTimers();
  fakeStore();
  api = useFakeApi();
  api.on('GET /api/session', () => ({ status: 401, body: { code: 'not-signed-in', instance: 'urn:uuid:1' } }));
  api.on('GET /api/scenarios', () => ({ body: { scenarios: [], next: null } }));
});
afterEach(() => {
  jest.useRealTimers();
  restoreFetch();
});

const signIn = async (password: string) => {
  fireEvent.changeText(screen.getByLabelText('E-mail address'), 'designer@ninebar.example');
  fireEvent.changeText(screen.getByLabelText('Password'), password);
  fireEvent.press(screen.getByRole('button', { name: 'Sign in' }));
  await pass(50);
};

describe('The door', () => {
  it('lets nobody past who is not signed in, and brings them to the page they wanted afterwards', async () => {
    api.on('POST /api/session', () => ({ body: DESIGNER }));
    open(ROUTES, '/parts');
    await pass(50);
    expect(screen.queryByText('the parts')).toBeNull();
    await signIn('quiet-estuary-lamp');
    expect(screen.getByText('the parts')).toBeOnTheScreen();
  });

  it('says that address and password do not belong together', async () => {
    api.on('POST /api/session', () => ({ status: 401, body: { code: 'wrong-credentials', instance: 'urn:uuid:1' } }));
    open(ROUTES, '/sign-in');
    await pass(50);
    await signIn('wrong');
    expect(screen.getByText(/do not belong together/)).toBeOnTheScreen();
  });

  it('asks the server nothing while a field is empty, and says which', async () => {
    open(ROUTES, '/sign-in');
    await pass(50);
    fireEvent.press(screen.getByRole('button', { name: 'Sign in' }));
    await pass(50);
    expect(screen.getByText('Write your password')).toBeOnTheScreen();
    expect(api.of('POST /api/session')).toHaveLength(0);
  });
});

describe('The bare address', () => {
  const failing = sampleRecord({ verdict: { status: 'fail', counts: { fail: 1, 'not-assessed': 0, caution: 0, pass: 4, 'set-aside': 0 } }, closest: sampleCheck({ id: 'restart-peak-current', status: 'fail' }) });

  beforeEach(() => {
    api.on('GET /api/session', () => ({ body: DESIGNER }));
    api.on('GET /api/scenarios', () => ({ body: { scenarios: [failing], next: null } }));
  });

  it('leads a new person to the scenario that fails on hot restart', async () => {
    const router = open(ROUTES, '/');
    await pass(50);
    expect(router.getPathname()).toBe(`/scenarios/${failing.id}`);
  });

  it('leads everybody else to the list', async () => {
    localStorage.setItem(`tidegate.welcomed.${DESIGNER.user.id}`, 'before');
    const router = open(ROUTES, '/');
    await pass(50);
    expect(router.getPathname()).toBe('/scenarios');
  });
});
