import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Every save asks which drafts have no verdict yet; hardly any has none. */
export class VerdictsToCompute1764568800000 implements MigrationInterface {
  name = 'VerdictsToCompute1764568800000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query('CREATE INDEX scenario_to_compute_idx ON scenario (updated_at) WHERE verdict IS NULL');
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP INDEX scenario_to_compute_idx');
  }
}
