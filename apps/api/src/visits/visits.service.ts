import { Injectable } from '@nestjs/common';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { FeedService } from '../sync/feed/feed.service';
import { Visit } from './entities/visit.entity';
import { VisitAssignment } from './entities/visit-assignment.entity';

export interface PlannedVisit {
  siteId: string;
  systemId: string;
  date: string;
  purpose: Visit['purpose'];
  note: string | null;
  crewId: string | null;
  assigned: string[];
}

/** Who goes where on which day. Every change is told to the phones. */
@Injectable()
export class VisitsService {
  constructor(private readonly feed: FeedService) {}

  /** Plans a visit as the last stop of its crew's day. */
  async plan(manager: EntityManager, companyId: string, planned: PlannedVisit): Promise<string> {
    const { assigned, ...about } = planned;
    const id = randomUUID();
    const last = await manager.maximum(Visit, 'sequence', { companyId, date: planned.date });
    await manager.insert(Visit, { companyId, id, ...about, sequence: (last ?? 0) + 1 });
    const rows = assigned.map((userId) => ({ companyId, visitId: id, userId }));
    if (rows.length > 0) await manager.insert(VisitAssignment, rows);
    await this.feed.touch(manager, { kind: 'visit', id });
    return id;
  }

  /** A visit to the same system on another day, by the same people. Null when the visit does not exist. */
  async planAgain(
    manager: EntityManager,
    companyId: string,
    visitId: string,
    { date, note }: { date: string; note: string | null },
  ): Promise<string | null> {
    const visit = await manager.findOneBy(Visit, { companyId, id: visitId });
    if (!visit) return null;
    const people = await manager.findBy(VisitAssignment, { companyId, visitId });
    const { siteId, systemId, crewId } = visit;
    const assigned = people.map(({ userId }) => userId);
    return this.plan(manager, companyId, {
      siteId,
      systemId,
      crewId,
      date,
      note,
      purpose: 'return-visit',
      assigned,
    });
  }
}
