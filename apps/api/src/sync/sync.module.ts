import { Module } from '@nestjs/common';
import { CompaniesModule } from '../companies/companies.module';
import { ProjectionModule } from '../projection/projection.module';
import { VisitsModule } from '../visits/visits.module';
import { FeedModule } from './feed/feed.module';
import { FeedItems } from './pull/feed-items.service';
import { PullController } from './pull/pull.controller';
import { PullService } from './pull/pull.service';
import { KnownVisits } from './push/known-visits';
import { PushController } from './push/push.controller';
import { PushService } from './push/push.service';
import { Receipts } from './push/receipts';

/** Between phones and office: what phones bring, and what they are told. */
@Module({
  imports: [CompaniesModule, FeedModule, ProjectionModule, VisitsModule],
  controllers: [PushController, PullController],
  providers: [PushService, KnownVisits, Receipts, PullService, FeedItems],
})
export class SyncModule {}
