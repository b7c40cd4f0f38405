import { randomUUID } from 'node:crypto';
import type { DataSource } from 'typeorm';
import { z } from 'zod';

import type { createScenarioSchema, saveScenarioSchema, scenarioListQuerySchema, scenarioListSchema, ScenarioRecord } from '../../shared/contracts/scenario';
import type { Scenario } from '../../shared/model/scenario';
import { containing, pageOf, readCursor } from '../http/cursor';
import { ProblemError } from '../http/problem-error';
import type { Clock } from '../clock';
import type { Identity } from '../sessions/identity';
import { documentHash } from './document-hash';
import { ScenarioRow } from './scenario-entity';
import { presentRecord, presentSummary } from './scenario-presenter';
import type { VerdictFiller } from './verdict-filler';

const NOT_FOUND = 'Your team has no such scenario; it may have been deleted.';

/** Columns that follow from what was saved; the verdict is computed afterwards. */
const saved = (scenario: Scenario, by: Identity, at: Date) => ({
  name: scenario.name,
  document: scenario,
  verdict: null,
  closest: null,
  engineVersion: null,
  updatedAt: at,
  updatedById: by.personId,
});

export class ScenarioService {
  constructor(
    private readonly database: DataSource,
    private readonly verdicts: VerdictFiller,
    private readonly clock: Clock,
  ) {}

  /** The last changed first. */
  async list(reader: Identity, query: z.output<typeof scenarioListQuerySchema>): Promise<z.output<typeof scenarioListSchema>> {
    const rows = this.scenarios
      .createQueryBuilder('scenario')
      .innerJoinAndSelect('scenario.updatedBy', 'person')
      .where('scenario.teamId = :teamId', { teamId: reader.team.id })
      .orderBy('scenario.updatedAt', 'DESC')
      .addOrderBy('scenario.id', 'DESC')
      .limit(query.limit + 1);
    if (query.search) rows.andWhere('scenario.name ILIKE :pattern', { pattern: containing(query.search) });
    if (query.after !== undefined) {
      const [at, id] = readCursor(query.after, z.iso.datetime());
      rows.andWhere('(scenario.updatedAt, scenario.id) < (CAST(:at AS timestamptz), CAST(:id AS uuid))', { at: new Date(at), id });
    }
    const { page, next } = pageOf(await rows.getMany(), query.limit, (row) => [row.updatedAt.toISOString(), row.id]);
    return { scenarios: page.map(presentSummary), next };
  }

  async read(reader: Identity, id: string): Promise<ScenarioRecord> {
    const row = await this.find(reader, id);
    if (!row) throw new ProblemError('not-found', NOT_FOUND);
    return presentRecord(row, reader);
  }

  /** Repeating a request with its id and content answers with the scenario that the first one made. */
  async create(author: Identity, { id = randomUUID(), scenario }: z.output<typeof createScenarioSchema>): Promise<ScenarioRecord> {
    const now = this.clock();
    const createdHash = documentHash(scenario);
    await this.scenarios
      .createQueryBuilder()
      .insert()
      .values({ id, teamId: author.team.id, version: 1, createdHash, createdAt: now, ...saved(scenario, author, now) })
      .orIgnore()
      .execute();
    const row = await this.find(author, id);
    if (row?.createdHash !== createdHash)
      throw new ProblemError('version-conflict', 'This id is taken by another scenario; choose a new one.', row ? { conflict: presentRecord(row, author) } : {});
    this.verdicts.wake();
    return presentRecord(row, author);
  }

  /** Saves over the version that the author started from, and no other. */
  async save(author: Identity, id: string, { version, scenario }: z.output<typeof saveScenarioSchema>): Promise<ScenarioRecord> {
    const where = { id, teamId: author.team.id, version };
    const { affected } = await this.scenarios.update(where, { version: version + 1, ...saved(scenario, author, this.clock()) });
    const row = await this.find(author, id);
    if (!row) throw new ProblemError('not-found', NOT_FOUND);
    if (affected !== 1)
      throw new ProblemError('version-conflict', `${row.updatedBy.name} saved version ${row.version} in the meantime.`, { conflict: presentRecord(row, author) });
    this.verdicts.wake();
    return presentRecord(row, author);
  }

  async delete(author: Identity, id: string): Promise<void> {
    const { affected } = await this.scenarios.delete({ id, teamId: author.team.id });
    if (affected !== 1) throw new ProblemError('not-found', NOT_FOUND);
  }

  private async find(reader: Identity, id: string): Promise<ScenarioRow | null> {
    const [row] = await this.scenarios.find({ where: { id, teamId: reader.team.id }, relations: { updatedBy: true } });
    return row ?? null;
  }

  private get scenarios() {
    return this.database.getRepository(ScenarioRow);
  }
}
