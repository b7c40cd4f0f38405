import pino from 'pino';

import { createDataSource } from '../../server/database/data-source';
import { migrate } from '../../server/database/migrate';
import { createEmptyDatabase } from '../support/database';

const open = async (url: string) => createDataSource(url, pino({ level: 'silent' })).initialize();

test('the migrations make exactly the tables that the entities describe', async () => {
  const created = await createEmptyDatabase();
  const database = await open(created.url);
  await migrate(database);
  const drift = await database.driver.createSchemaBuilder().log();
  expect(drift.upQueries.map(({ query }) => query)).toEqual([]);
  await database.destroy();
  await created.drop();
});

test('the drift test above would see a difference', async () => {
  const created = await createEmptyDatabase();
  const database = await open(created.url);
  await migrate(database);
  await database.query('ALTER TABLE scenario DROP COLUMN engine_version');
  await database.query('DROP INDEX part_list_idx, scenario_to_compute_idx');
  const drift = await database.driver.createSchemaBuilder().log();
  expect(drift.upQueries.map(({ query }) => query).join('\n')).toMatch(/engine_version[^]*part_list_idx[^]*scenario_to_compute_idx/);
  await database.destroy();
  await created.drop();
});

test('servers that start at once take turns, and one that starts later changes nothing', async () => {
  const created = await createEmptyDatabase();
  const servers = await Promise.all([open(created.url), open(created.url), open(created.url)]);
  await Promise.all(servers.map(migrate));
  await migrate(servers[0]!);
  const runs: unknown[] = await servers[0]!.query('SELECT name FROM migrations');
  expect(runs).toHaveLength(servers[0]!.migrations.length);
  await Promise.all(servers.map((database) => database.destroy()));
  await created.drop();
});

test('every migration can be taken back', async () => {
  const created = await createEmptyDatabase();
  const database = await open(created.url);
  await migrate(database);
  for (let count = database.migrations.length; count > 0; count -= 1) await database.undoLastMigration();
  const tables: { table_name: string }[] = await database.query(`SELECT table_name FROM information_schema.tables WHERE table_schema = 'public'`);
  expect(tables.map((row) => row.table_name)).toEqual(['migrations']);
  await database.destroy();
  await created.drop();
});

test.each(['2026-12-01T10:00:00.123Z', '1999-12-31T23:59:59.999Z'])('the time %s comes back as it was stored', async (text) => {
  const created = await createEmptyDatabase();
  const database = await open(created.url);
  await migrate(database);
  await database.query('INSERT INTO team (id, name, created_at) VALUES (gen_random_uuid(), $1, $2)', ['Clock', new Date(text)]);
  const [row]: { created_at: Date }[] = await database.query('SELECT created_at FROM team');
  expect(row!.created_at.toISOString()).toBe(text);
  await database.destroy();
  await created.drop();
});
