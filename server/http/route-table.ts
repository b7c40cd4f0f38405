import { healthRoutes } from '../health/health-routes';
import { partRoutes } from '../parts/part-routes';
import { scenarioRoutes } from '../scenarios/scenario-routes';
import { sessionRoutes } from '../sessions/session-routes';
import { tokenRoutes } from '../sessions/token-routes';
import { simulationRoutes } from '../simulations/simulation-routes';
import type { Route } from './route';

/** Every route of the API: what is not here does not exist, and what is here is in the OpenAPI document. */
export const ROUTE_TABLE: readonly Route[] = [
  ...healthRoutes,
  ...sessionRoutes,
  ...tokenRoutes,
  ...scenarioRoutes,
  ...partRoutes,
  ...simulationRoutes,
];
