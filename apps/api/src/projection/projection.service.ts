import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { CompanyContext } from '../database/company-context';
import { VisitProjector } from './visit-projector';
import { markUnprojected, noteFailure, staleVisits } from './stale-rows';

/** Pushes follow each other: what they change is projected together once they have paused, but not later than the last limit. */
const pauseMs = 1_000;
const longestWaitMs = 10_000;
const visitsAtOnce = 100;

/**
 * Keeps the at-a-glance copies up to date with the log. What has to be done stands in the database, written with the log
 * itself, so that neither a failure here nor a killed process loses a push or leaves a visit behind for ever.
 */
@Injectable()
export class ProjectionService implements OnModuleDestroy {
  private readonly logger = new Logger(ProjectionService.name);
  private readonly timers = new Map<string, { timer: NodeJS.Timeout; until: number }>();
  private readonly running = new Map<string, Promise<void>>();

  constructor(
    private readonly context: CompanyContext,
    private readonly projector: VisitProjector,
  ) {}

  onModuleDestroy(): void {
    for (const { timer } of this.timers.values()) clearTimeout(timer);
    this.timers.clear();
  }

  /** Something of this company has changed and is committed. Returns at once. */
  wake(companyId: string): void {
    const waiting = this.timers.get(companyId);
    clearTimeout(waiting?.timer);
    const until = waiting?.until ?? Date.now() + longestWaitMs;
    const run = (): void => {
      this.timers.delete(companyId);
      void this.freshen(companyId);
    };
    const timer = setTimeout(run, Math.min(pauseMs, Math.max(0, until - Date.now())));
    timer.unref();
    this.timers.set(companyId, { timer, until });
  }

  /** Brings the copies up to date if it can; what asks for it goes on with older ones if it cannot. */
  async freshen(companyId: string): Promise<void> {
    try {
      await this.catchUp(companyId);
    } catch (error) {
      this.logger.error({ err: error, companyId }, 'projections could not be brought up to date');
    }
  }

  /** Projects everything that was marked before this call; a visit that fails is left for later and does not stop the rest. */
  async catchUp(companyId: string): Promise<void> {
    const before = this.running.get(companyId);
    const mine = (before ?? Promise.resolve()).then(
      () => this.drain(companyId),
      () => this.drain(companyId),
    );
    this.running.set(companyId, mine);
    try {
      await mine;
    } finally {
      if (this.running.get(companyId) === mine) this.running.delete(companyId);
    }
  }

  private async drain(companyId: string): Promise<void> {
    const failed = new Set<string>();
    for (;;) {
      const stale = await this.context.run(companyId, async (manager) => {
        await markUnprojected(manager);
        return staleVisits(manager, visitsAtOnce + failed.size);
      });
      const visits = stale.filter((visitId) => !failed.has(visitId));
      if (visits.length === 0) return;
      for (const visitId of visits) {
        if (!(await this.projectOne(companyId, visitId))) failed.add(visitId);
      }
      if (visits.length < visitsAtOnce) return;
    }
  }

  private async projectOne(companyId: string, visitId: string): Promise<boolean> {
    try {
      await this.context.run(companyId, (manager) => this.projector.project(manager, visitId));
      return true;
    } catch (error) {
      this.logger.error({ err: error, companyId, visitId }, 'a visit could not be projected');
      await this.context.run(companyId, async (manager) => {
        await this.projector.projectPlainly(manager, visitId);
        await noteFailure(manager, visitId, String(error));
      });
      return false;
    }
  }
}
