import { API } from '../../shared/contracts/routes';
import { ROLES } from '../../shared/contracts/session';
import { simulatedSchema, simulateSchema } from '../../shared/contracts/simulation';
import { guardedRoute, type Route } from '../http/route';

export const simulationRoutes: readonly Route[] = [
  guardedRoute({
    method: 'post',
    path: API.simulations,
    name: 'simulate',
    tag: 'Simulations',
    summary: 'Compute a scenario',
    description: 'Nothing is saved. Hang up to cancel. The status says whether each value is within its rating; a person decides what follows from it.',
    who: ROLES,
    body: simulateSchema,
    answer: { status: 200, description: 'Nominal run, envelope of all corners, and every check', schema: simulatedSchema },
    problems: ['busy'],
    handle: async ({ body, signal }, services) => ({ status: 200, body: await services.simulations.assess(body.scenario, signal) }),
  }),
];
