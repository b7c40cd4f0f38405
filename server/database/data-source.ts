import 'reflect-metadata';

import type { Logger } from 'pino';
import { DataSource } from 'typeorm';

import { PartRow } from '../parts/part-entity';
import { ScenarioRow } from '../scenarios/scenario-entity';
import { ApiToken } from '../sessions/api-token-entity';
import { RefreshToken } from '../sessions/refresh-token-entity';
import { SessionRow } from '../sessions/session-entity';
import { Person, RoleGrant } from '../teams/person-entity';
import { Team } from '../teams/team-entity';
import { FirstTables1764565200000 } from './migrations/1764565200000-first-tables';
import { VerdictsToCompute1764568800000 } from './migrations/1764568800000-verdicts-to-compute';

/** The one place that knows every table. Tables change by migrations only. */
export const createDataSource = (url: string, log: Logger): DataSource =>
  new DataSource({
    type: 'postgres',
    url,
    entities: [Team, Person, RoleGrant, SessionRow, RefreshToken, ApiToken, ScenarioRow, PartRow],
    migrations: [FirstTables1764565200000, VerdictsToCompute1764568800000],
    synchronize: false,
    installExtensions: false,
    poolSize: 10,
    connectTimeoutMS: 3000,
    extra: { statement_timeout: 15_000, idle_in_transaction_session_timeout: 15_000 },
    // An idle connection that breaks when the database goes away must not end the server.
    poolErrorHandler: (error: unknown) => log.warn({ err: error }, 'an idle database connection broke'),
  });
