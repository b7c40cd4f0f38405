import type { DataSource } from 'typeorm';

/** Any number will do, as long as every server of this database takes the same. */
const MIGRATION_LOCK = 7_481_239;

/** Brings the tables up to date. Two servers that start at once take turns. */
export const migrate = async (database: DataSource): Promise<void> => {
  const holder = database.createQueryRunner();
  try {
    await holder.query('SELECT pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await database.runMigrations({ transaction: 'each' });
  } finally {
    await holder.query('SELECT pg_advisory_unlock($1)', [MIGRATION_LOCK]).finally(() => holder.release());
  }
};
