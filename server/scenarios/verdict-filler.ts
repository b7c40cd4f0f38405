import type { Logger } from 'pino';
import { type DataSource, In, IsNull, Not } from 'typeorm';

import { isDatabaseUnavailable } from '../database/availability';
import { ProblemError } from '../http/problem-error';
import type { SimulationService } from '../simulations/simulation-service';
import { ScenarioRow } from './scenario-entity';

const PAUSE = 2000;

/** What passes by itself: the database is away, or people's own runs fill the queue. */
const isPassing = (error: unknown): boolean => isDatabaseUnavailable(error) || (error instanceof ProblemError && error.code === 'busy');

/**
 * Computes the verdict of every saved draft, one after the other, behind the answers: a save is
 * acknowledged as soon as it is durable. The rows without a verdict are the queue, so a server that
 * was killed goes on where it stopped.
 */
export class VerdictFiller {
  private running: Promise<void> | null = null;
  private wanted = false;
  private closed = false;
  /** Versions that the engine could not compute; tried again at the next start. */
  private readonly failed = new Set<string>();

  constructor(
    private readonly database: DataSource,
    private readonly simulations: SimulationService,
    private readonly log: Logger,
  ) {}

  /** Verdicts of an older engine are out of date. */
  async discardOlderThan(engineVersion: string): Promise<void> {
    await this.scenarios.update({ engineVersion: Not(engineVersion) }, { verdict: null, closest: null, engineVersion: null });
  }

  wake(): void {
    this.wanted = true;
    this.running ??= this.work().finally(() => {
      this.running = null;
      if (this.wanted && !this.closed) this.wake();
    });
  }

  /** Resolves when nothing waits for a verdict. */
  async settled(): Promise<void> {
    while (this.running) await this.running;
  }

  async close(): Promise<void> {
    this.closed = true;
    await this.settled();
  }

  private async work(): Promise<void> {
    this.wanted = false;
    try {
      let more = true;
      while (more && !this.closed) more = await this.fillOne();
    } catch (error) {
      if (this.closed) return;
      this.log.warn({ err: error }, 'verdicts wait');
      if (!isPassing(error)) return;
      this.wanted = true;
      await new Promise((resolve) => setTimeout(resolve, PAUSE).unref());
    }
  }

  /** @returns whether there was one to fill */
  private async fillOne(): Promise<boolean> {
    const [row] = await this.scenarios.find({ where: { verdict: IsNull(), id: Not(In([...this.failed])) }, order: { updatedAt: 'DESC' }, take: 1 });
    if (!row) return false;
    try {
      const { assessment } = await this.simulations.assess(row.document);
      const closest = assessment.checks.find((check) => check.setAside === null) ?? null;
      // A save in the meantime has raised the version; its own verdict follows.
      await this.scenarios.update({ id: row.id, version: row.version }, { verdict: assessment.verdict, closest, engineVersion: assessment.engineVersion });
    } catch (error) {
      if (isPassing(error)) throw error;
      if (!this.closed) this.log.error({ err: error, scenarioId: row.id, version: row.version }, 'a verdict could not be computed');
      this.failed.add(row.id);
    }
    return true;
  }

  private get scenarios() {
    return this.database.getRepository(ScenarioRow);
  }
}
