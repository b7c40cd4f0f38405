import { join } from 'node:path';
import type { Express } from 'express';
import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';

import type { Simulated } from '../shared/contracts/simulation';
import type { Clock } from './clock';
import { HealthService } from './health/health-service';
import { createApp } from './http/app';
import { type ClientFiles, readClientFiles } from './http/client-files';
import { PartService } from './parts/part-service';
import { ScenarioService } from './scenarios/scenario-service';
import { VerdictFiller } from './scenarios/verdict-filler';
import { Passwords } from './sessions/passwords';
import { SessionService } from './sessions/session-service';
import { SignInLimit } from './sessions/sign-in-limit';
import { SignInService } from './sessions/sign-in-service';
import { TokenService } from './sessions/token-service';
import { SimulationService } from './simulations/simulation-service';
import type { SimulationTask } from './simulations/simulation-worker';
import { WorkerPool } from './worker-pool';

export interface Settings {
  database: DataSource;
  sessionSecret: string;
  staticDir: string | null;
  log: Logger;
  clock?: Clock;
  /** Another file may stand in for the engine in a test. */
  simulationWorker?: string;
  /** ms; half a minute where absent. */
  simulationTimeLimit?: number;
}

export interface Composed {
  app: Express;
  client: ClientFiles | null;
  passwords: Passwords;
  simulations: SimulationService;
  verdicts: VerdictFiller;
  /** Ends the threads; the database is the caller's. */
  close: () => Promise<void>;
}

const SIMULATION_THREADS = 2;
const MOST_WAITING_RUNS = 16;

/** Puts the parts of the server together; the only place where they meet. */
export const compose = ({ database, sessionSecret, staticDir, log, clock = () => new Date(), simulationWorker, simulationTimeLimit }: Settings): Composed => {
  const passwords = new Passwords();
  const simulations = new SimulationService(
    new WorkerPool<SimulationTask, Simulated>({
      filename: simulationWorker ?? join(__dirname, 'simulations', 'simulation-worker.ts'),
      threads: SIMULATION_THREADS,
      mostWaiting: MOST_WAITING_RUNS,
    }),
    simulationTimeLimit,
  );
  const verdicts = new VerdictFiller(database, simulations, log);
  const sessions = new SessionService(database, sessionSecret, clock, log);
  const services = {
    health: new HealthService(database),
    signIn: new SignInService(database, passwords, new SignInLimit(database), sessions, log),
    sessions,
    tokens: new TokenService(database, clock),
    scenarios: new ScenarioService(database, verdicts, clock),
    parts: new PartService(database),
    simulations,
  };
  const client = staticDir === null ? null : readClientFiles(staticDir);
  const close = async () => {
    await Promise.all([verdicts.close(), simulations.close(), passwords.close()]);
  };
  return { app: createApp({ services, log, client }), client, passwords, simulations, verdicts, close };
};
