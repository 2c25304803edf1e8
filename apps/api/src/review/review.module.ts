import { Module } from '@nestjs/common';
import { CompaniesModule } from '../companies/companies.module';
import { ProjectionModule } from '../projection/projection.module';
import { FeedModule } from '../sync/feed/feed.module';
import { VisitsModule } from '../visits/visits.module';
import { DecisionsService } from './decisions.service';
import { HeldService } from './held.service';
import { QueueService } from './queue.service';
import { RecordService } from './record.service';
import { ReturnVisits } from './return-visits';
import { ReviewDevicesService } from './devices.service';
import { HeldController } from './held.controller';
import { ReviewController } from './review.controller';

/** The morning's review: what came in, worst first, and what is decided on it. */
@Module({
  imports: [CompaniesModule, FeedModule, ProjectionModule, VisitsModule],
  controllers: [ReviewController, HeldController],
  providers: [QueueService, RecordService, DecisionsService, ReturnVisits, HeldService, ReviewDevicesService],
})
export class ReviewModule {}
