import { idParamsSchema } from '../../shared/contracts/record-id';
import { API } from '../../shared/contracts/routes';
import { createScenarioSchema, saveScenarioSchema, scenarioListQuerySchema, scenarioListSchema, scenarioRecordSchema } from '../../shared/contracts/scenario';
import { guardedRoute, type Route } from '../http/route';
import { SCENARIO_POLICY } from './scenario-policy';

const TAG = 'Scenarios';

export const scenarioRoutes: readonly Route[] = [
  guardedRoute({
    method: 'get',
    path: API.scenarios,
    name: 'listScenarios',
    tag: TAG,
    summary: 'Scenarios of the team, the last changed first',
    who: SCENARIO_POLICY.read,
    query: scenarioListQuerySchema,
    answer: { status: 200, description: 'One page', schema: scenarioListSchema },
    handle: async ({ identity, query }, services) => ({ status: 200, body: await services.scenarios.list(identity, query) }),
  }),
  guardedRoute({
    method: 'post',
    path: API.scenarios,
    name: 'createScenario',
    tag: TAG,
    summary: 'Create a scenario',
    description: 'With an id of your own, a repeated request makes no second scenario. The verdict is computed after the answer.',
    who: SCENARIO_POLICY.write,
    body: createScenarioSchema,
    answer: { status: 201, description: 'The scenario', schema: scenarioRecordSchema },
    problems: ['version-conflict'],
    handle: async ({ identity, body }, services) => {
      const record = await services.scenarios.create(identity, body);
      return { status: 201, body: record, location: API.scenario(record.id) };
    },
  }),
  guardedRoute({
    method: 'get',
    path: API.scenario(':id'),
    name: 'readScenario',
    tag: TAG,
    summary: 'Read a scenario',
    who: SCENARIO_POLICY.read,
    params: idParamsSchema,
    answer: { status: 200, description: 'The scenario, in SI units', schema: scenarioRecordSchema },
    problems: ['not-found'],
    handle: async ({ identity, params }, services) => ({ status: 200, body: await services.scenarios.read(identity, params.id) }),
  }),
  guardedRoute({
    method: 'put',
    path: API.scenario(':id'),
    name: 'saveScenario',
    tag: TAG,
    summary: 'Save a scenario',
    description: 'Give the version that you started from; where it is no longer the newest, nothing is saved. The verdict is computed after the answer.',
    who: SCENARIO_POLICY.write,
    params: idParamsSchema,
    body: saveScenarioSchema,
    answer: { status: 200, description: 'The scenario with its new version', schema: scenarioRecordSchema },
    problems: ['not-found', 'version-conflict'],
    handle: async ({ identity, params, body }, services) => ({ status: 200, body: await services.scenarios.save(identity, params.id, body) }),
  }),
  guardedRoute({
    method: 'delete',
    path: API.scenario(':id'),
    name: 'deleteScenario',
    tag: TAG,
    summary: 'Delete a scenario',
    who: SCENARIO_POLICY.write,
    params: idParamsSchema,
    answer: { status: 204, description: 'It is gone', schema: null },
    problems: ['not-found'],
    handle: async ({ identity, params }, services) => {
      await services.scenarios.delete(identity, params.id);
      return { status: 204 };
    },
  }),
];
