import type { DataSource } from 'typeorm';

import type { Health } from '../../shared/contracts/health';

export class HealthService {
  constructor(private readonly database: DataSource) {}

  async check(): Promise<Health> {
    await this.database.query('SELECT 1');
    return { status: 'ok', database: 'reachable' };
  }
}
