import { healthSchema } from '../../shared/contracts/health';
import { API } from '../../shared/contracts/routes';
import { publicRoute, type Route } from '../http/route';

export const healthRoutes: readonly Route[] = [
  publicRoute({
    method: 'get',
    path: API.health,
    name: 'readHealth',
    tag: 'Server',
    summary: 'Whether the server can serve',
    who: 'anyone',
    answer: { status: 200, description: 'It can', schema: healthSchema },
    problems: ['database-unavailable'],
    handle: async (_call, services) => ({ status: 200, body: await services.health.check() }),
  }),
];
