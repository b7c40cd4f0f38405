import type { DataSource } from 'typeorm';
import type { z } from 'zod';

import { storableText } from '../../shared/contracts/text';
import type { partListQuerySchema, partListSchema, PartRecord } from '../../shared/contracts/part';
import { containing, pageOf, readCursor } from '../http/cursor';
import { ProblemError } from '../http/problem-error';
import { ScenarioRow } from '../scenarios/scenario-entity';
import type { Identity } from '../sessions/identity';
import { PartRow } from './part-entity';
import { presentPart, presentPartRecord } from './part-presenter';

export class PartService {
  constructor(private readonly database: DataSource) {}

  /** By name. */
  async list(reader: Identity, query: z.output<typeof partListQuerySchema>): Promise<z.output<typeof partListSchema>> {
    const rows = this.database
      .getRepository(PartRow)
      .createQueryBuilder('part')
      .leftJoinAndSelect('part.approvedBy', 'person')
      .where('part.teamId = :teamId', { teamId: reader.team.id })
      .orderBy('part.name', 'ASC')
      .addOrderBy('part.id', 'ASC')
      .limit(query.limit + 1);
    if (query.kind) rows.andWhere('part.kind = :kind', { kind: query.kind });
    if (query.search) rows.andWhere('part.name ILIKE :pattern', { pattern: containing(query.search) });
    if (query.after !== undefined) {
      const [name, id] = readCursor(query.after, storableText);
      rows.andWhere('(part.name, part.id) > (:name, CAST(:id AS uuid))', { name, id });
    }
    const { page, next } = pageOf(await rows.getMany(), query.limit, (row) => [row.name, row.id]);
    return { parts: page.map(presentPart), next };
  }

  async read(reader: Identity, id: string): Promise<PartRecord> {
    const where = { id, teamId: reader.team.id };
    const [row] = await this.database.getRepository(PartRow).find({ where, relations: { approvedBy: true } });
    if (!row) throw new ProblemError('not-found', 'The library of your team has no such part.');
    return presentPartRecord(row, await this.usedIn(reader, id));
  }

  private usedIn(reader: Identity, partId: string): Promise<ScenarioRow[]> {
    return this.database
      .getRepository(ScenarioRow)
      .createQueryBuilder('scenario')
      .where('scenario.teamId = :teamId', { teamId: reader.team.id })
      .andWhere('scenario.document @> CAST(:uses AS jsonb)', { uses: JSON.stringify({ limiter: [{ part: { libraryId: partId } }] }) })
      .orderBy('scenario.name', 'ASC')
      .addOrderBy('scenario.id', 'ASC')
      .getMany();
  }
}
