import { problemSchema } from '../../shared/contracts/problem';
import { ApiServer } from '../support/api-server';
import { badScenarios, names } from '../support/bad-scenarios';

const COUNT = 600;
const SEED = 20_261_201;

let server: ApiServer;
let designer: string;
beforeAll(async () => {
  server = await ApiServer.start();
  designer = await server.signIn(server.people.designer);
});
afterAll(() => server.stop());

test.each(['/api/simulations', '/api/scenarios'])(`%s refuses each of ${COUNT} bad scenarios with its field named`, async (address) => {
  const wrong: string[] = [];
  for (const { mutation, field, scenario } of badScenarios(COUNT, SEED)) {
    const answer = await server.send('post', address, designer).set('Content-Type', 'application/json').send(JSON.stringify({ scenario }));
    const problem = problemSchema.safeParse(answer.body);
    const fields = (problem.data?.issues ?? []).map(({ path }) => path.replace(/^scenario\.?/, ''));
    if (answer.status !== 400 || !fields.some((one) => names(one, field))) wrong.push(`${mutation}: ${answer.status} naming ${fields.join(', ')}`);
  }
  expect(wrong).toEqual([]);
  expect((await server.send('get', '/api/scenarios', designer).expect(200)).body.scenarios).toEqual([]);
});
