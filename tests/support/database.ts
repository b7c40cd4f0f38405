import { randomBytes } from 'node:crypto';
import { Client } from 'pg';
import pino from 'pino';

import { createDataSource } from '../../server/database/data-source';
import { migrate } from '../../server/database/migrate';

/** The role of the application: it owns its databases and may no more than that. */
const APPLICATION = 'tidegate';
const TEMPLATE = 'tidegate_template';
const UNFINISHED = 'tidegate_template_unfinished';
/** Test files in different processes want the template at once; one makes it, the others wait. */
const TEMPLATE_LOCK = 5_150_077;

export interface TestDatabase {
  /** The address for the application's own role. */
  url: string;
  drop: () => Promise<void>;
}

const clusterUrl = (): string => {
  const url = process.env.TEST_CLUSTER_URL;
  if (!url) throw new Error('TEST_CLUSTER_URL is not set: this test belongs into a jest project that starts the test cluster');
  return url;
};

/** In the test cluster the administrator and the application share a password. */
const applicationUrl = (database: string): string => {
  const url = new URL(clusterUrl());
  url.username = APPLICATION;
  url.pathname = `/${database}`;
  return url.href;
};

const asAdministrator = async <T>(work: (client: Client) => Promise<T>): Promise<T> => {
  const client = new Client({ connectionString: clusterUrl() });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
};

const migrateTemplate = async (): Promise<void> => {
  const database = createDataSource(applicationUrl(UNFINISHED), pino({ level: 'silent' }));
  await database.initialize();
  try {
    await migrate(database);
  } finally {
    await database.destroy();
  }
};

const makeTemplate = async (client: Client): Promise<void> => {
  const { rowCount } = await client.query('SELECT 1 FROM pg_database WHERE datname = $1', [TEMPLATE]);
  if (rowCount !== 0) return;
  await client.query(`DROP DATABASE IF EXISTS ${UNFINISHED} WITH (FORCE)`);
  await client.query(`CREATE DATABASE ${UNFINISHED} OWNER ${APPLICATION}`);
  await migrateTemplate();
  await client.query(`ALTER DATABASE ${UNFINISHED} RENAME TO ${TEMPLATE}`);
};

/** A migrated, empty database of its own, as a copy of one that is migrated once for each run. */
export const createTestDatabase = (): Promise<TestDatabase> =>
  asAdministrator(async (client) => {
    await client.query('SELECT pg_advisory_lock($1)', [TEMPLATE_LOCK]);
    try {
      await makeTemplate(client);
    } finally {
      await client.query('SELECT pg_advisory_unlock($1)', [TEMPLATE_LOCK]);
    }
    const name = `test_${randomBytes(6).toString('hex')}`;
    await client.query(`CREATE DATABASE ${name} OWNER ${APPLICATION} TEMPLATE ${TEMPLATE} STRATEGY WAL_LOG`);
    const drop = () => asAdministrator(async (later) => void (await later.query(`DROP DATABASE ${name} WITH (FORCE)`)));
    return { url: applicationUrl(name), drop };
  });

/** An empty database without tables, for what migrates by itself. */
export const createEmptyDatabase = (): Promise<TestDatabase> =>
  asAdministrator(async (client) => {
    const name = `test_${randomBytes(6).toString('hex')}`;
    await client.query(`CREATE DATABASE ${name} OWNER ${APPLICATION}`);
    const drop = () => asAdministrator(async (later) => void (await later.query(`DROP DATABASE ${name} WITH (FORCE)`)));
    return { url: applicationUrl(name), drop };
  });
