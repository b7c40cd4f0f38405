import type { HealthService } from './health/health-service';
import type { PartService } from './parts/part-service';
import type { ScenarioService } from './scenarios/scenario-service';
import type { SessionService } from './sessions/session-service';
import type { SignInService } from './sessions/sign-in-service';
import type { TokenService } from './sessions/token-service';
import type { SimulationService } from './simulations/simulation-service';

/** Everything a route may call; put together in compose.ts. */
export interface Services {
  health: HealthService;
  signIn: SignInService;
  sessions: SessionService;
  tokens: TokenService;
  scenarios: ScenarioService;
  parts: PartService;
  simulations: SimulationService;
}
