import type { DataSource, EntityManager } from 'typeorm';

import { partSchema } from '../../shared/model/part';
import { scenarioSchema } from '../../shared/model/scenario';
import { PartRow } from '../parts/part-entity';
import { documentHash } from '../scenarios/document-hash';
import { ScenarioRow } from '../scenarios/scenario-entity';
import type { Passwords } from '../sessions/passwords';
import { Person, RoleGrant } from '../teams/person-entity';
import { Team } from '../teams/team-entity';
import { DEMO_ACCOUNTS, DEMO_PASSWORD, DEMO_TEAM } from './accounts';
import { DEMO_PARTS } from './parts';
import { DEMO_SCENARIOS } from './scenarios';

/** Two servers that start at once take turns. */
const SEED_LOCK = 7_481_240;

const holder = (role: string): string => {
  const account = DEMO_ACCOUNTS.find(({ roles }) => roles.some((one) => one === role));
  if (!account) throw new Error(`the demo team has no ${role}`);
  return account.id;
};

const addPeople = async (manager: EntityManager, hashes: readonly string[], createdAt: Date): Promise<void> => {
  await manager.insert(Team, { ...DEMO_TEAM, createdAt });
  const people = DEMO_ACCOUNTS.map(({ id, name, email }, index) => ({ id, name, email, teamId: DEMO_TEAM.id, passwordHash: hashes[index]!, createdAt }));
  await manager.insert(Person, people);
  await manager.insert(RoleGrant, DEMO_ACCOUNTS.flatMap(({ id, roles }) => roles.map((role) => ({ personId: id, role }))));
};

const addParts = async (manager: EntityManager, createdAt: Date): Promise<void> => {
  const approvedById = holder('admin');
  const rows = DEMO_PARTS.map(({ id, part, provenance }) => {
    const document = partSchema.parse(part);
    return { id, teamId: DEMO_TEAM.id, name: document.name, kind: document.kind, revision: 1, document, provenance, approvedById, createdAt };
  });
  if (rows.length > 0) await manager.insert(PartRow, rows);
};

const addScenarios = async (manager: EntityManager, createdAt: Date): Promise<void> => {
  const updatedById = holder('designer');
  const rows = DEMO_SCENARIOS.map(({ id, scenario }, index) => {
    const document = scenarioSchema.parse(scenario);
    // The list shows the last changed first: a second apart, they keep the order in which they were written down.
    const updatedAt = new Date(createdAt.getTime() - index * 1000);
    return { id, teamId: DEMO_TEAM.id, name: document.name, version: 1, document, createdHash: documentHash(document), createdAt: updatedAt, updatedAt, updatedById };
  });
  if (rows.length > 0) await manager.insert(ScenarioRow, rows);
};

/** Brings in the demo team once: a database that has it is left as it is, with whatever people changed there. */
export const seedDemo = async (database: DataSource, passwords: Passwords): Promise<void> => {
  await database.transaction(async (manager) => {
    await manager.query('SELECT pg_advisory_xact_lock($1)', [SEED_LOCK]);
    if (await manager.existsBy(Team, { id: DEMO_TEAM.id })) return;
    const hashes = await Promise.all(DEMO_ACCOUNTS.map(() => passwords.hash(DEMO_PASSWORD)));
    const now = new Date();
    await addPeople(manager, hashes, now);
    await addParts(manager, now);
    await addScenarios(manager, now);
  });
};
